"use client";

import { useTranslations } from "use-intl";
import { dayStretches } from "@/components/bench/day";
import { Pair } from "@/components/bench/pair";
import { DayStrip } from "@/components/seam/day-strip";
import type { Deed, KioskState } from "@/lib/bench/schema";
import type { BenchView } from "@/lib/bench/view";
import { hoursAndMinutes } from "@/lib/time/format";

/**
 * The picture of a deed: a count's time against setup and the good pieces, the pair of a ticket just
 * begun, a shift's day. Other acts need no picture.
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
  const t = useTranslations("done");
  const bench = useTranslations("bench");
  const [begun, ...more] = view?.items ?? [];
  if (deed.what === "finish" || deed.what === "count") {
    const standard = t("standard", { good: deed.counts.good });
    const finished = deed.what === "finish";
    return (
      <Pair pair={deed.time} standard={standard} actual={bench("actual")} finished={finished} />
    );
  }
  if ((deed.what === "work" || deed.what === "run") && begun && more.length === 0) {
    const standard = begun.quantity > 1 ? bench("standardLot") : bench("standardOne");
    return <Pair pair={begun} standard={standard} actual={bench("actual")} />;
  }
  if (deed.what === "shift-end" && view) return <WholeDay state={state} view={view} />;
  return null;
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
