"use client";

import { useTranslations } from "use-intl";
import { dayStretches } from "@/components/bench/day";
import { useSeamWords } from "@/components/bench/words";
import { DayStrip } from "@/components/seam/day-strip";
import { SeamGauge } from "@/components/seam/gauge";
import type { Deed, KioskState } from "@/lib/bench/schema";
import type { BenchView } from "@/lib/bench/view";
import { seamScale } from "@/lib/seam/scale";
import { actualMinutes, standardMinutes } from "@/lib/seam/verdict";
import { hoursAndMinutes } from "@/lib/time/format";

/**
 * The picture of a deed: a count's time against setup and the good pieces, a shift's day. Other
 * acts need no picture.
 */
export function DoneGauge({
  state,
  view,
  deed,
}: {
  state: KioskState;
  view: BenchView | null;
  deed: Deed;
}) {
  if (deed.what === "finish" || deed.what === "count") return <CountedGauge deed={deed} />;
  if (deed.what === "shift-end" && view) return <WholeDay state={state} view={view} />;
  return null;
}

function CountedGauge({ deed }: { deed: Extract<Deed, { what: "finish" | "count" }> }) {
  const t = useTranslations("done");
  const words = useSeamWords();
  const scaleSeconds = seamScale([deed.time]);
  const { standardSeconds, actualSeconds } = deed.time;
  return (
    <div className="grid gap-2">
      <p className="mirror text-k-2 font-semibold">
        <span className="pr-[26px] pl-8 text-standard-ink">
          {standardSeconds !== null &&
            `${standardMinutes(standardSeconds)} ${t("standard", { good: deed.counts.good })}`}
        </span>
        <span className="pr-8 pl-[26px] text-actual">
          {actualMinutes(actualSeconds)} {t("actual")}
        </span>
      </p>
      <SeamGauge
        flush
        size="bench"
        state={deed.what === "finish" ? "finished" : "live"}
        words={words}
        standardSeconds={standardSeconds}
        actualSeconds={actualSeconds}
        scaleSeconds={scaleSeconds}
      />
    </div>
  );
}

function WholeDay({ state, view }: { state: KioskState; view: BenchView }) {
  const t = useTranslations("done");
  const { stretches, span, planned } = dayStretches(state, view);
  const attended = `${hoursAndMinutes(view.today.attendanceSeconds)} ${t("attended")}`;
  return (
    <div className="mirror items-end">
      <p className="pr-[26px] pl-8 text-k-4 font-bold">{attended}</p>
      <div className="pr-8 pl-[26px]">
        <DayStrip
          stretches={stretches}
          span={span}
          label={attended}
          className="[--h:52px]"
          {...(planned ? { planned } : {})}
        />
      </div>
    </div>
  );
}
