"use client";

import { useTranslations } from "use-intl";
import { dayStretches, todayText } from "@/components/bench/day";
import { type SeenBench, useClock } from "@/components/bench/seen";
import { DayStrip } from "@/components/seam/day-strip";
import { Plate } from "@/components/ui/plate";

/** The foot of a bench: the way out of the screen, the day so far, and the end of the shift. */
export function BenchFoot({ state, view, tap }: SeenBench) {
  const t = useTranslations("bench");
  const words = useTranslations("common");
  return (
    <footer className="bench-foot">
      <div>
        <Plate icon="back" rim="left" onClick={() => tap({ on: "leave" })}>
          {words("leave")}
        </Plate>
        <Planned view={view} />
      </div>
      <div>
        <HoursPlate state={state} view={view} tap={tap} />
        <Plate icon="out" iconLast rim="right" onClick={() => tap({ on: "end-shift" })}>
          {t("endShift")}
        </Plate>
      </div>
    </footer>
  );
}

function Planned({ view }: Pick<SeenBench, "view">) {
  const t = useTranslations("bench");
  const clock = useClock();
  const { planned, looseEnds, changes } = view;
  const count = looseEnds.length + changes.length;
  return (
    <p className="leading-tight">
      <b className="block">
        {planned
          ? t("shift", { start: clock(planned.start * 1000), end: clock(planned.end * 1000) })
          : t("noShift")}
      </b>
      {count > 0 && <span className="text-ink-2">{t("toLook", { count })}</span>}
    </p>
  );
}

function HoursPlate({ state, view, tap }: SeenBench) {
  const t = useTranslations("bench");
  const clock = useClock();
  const start = view.shiftStart ?? Math.floor(state.nowMs / 1000);
  const { stretches, span, planned, nowAt } = dayStretches(state, view);
  const spoken = `${t("inSince", { time: clock(start * 1000) })}, ${todayText(view)}`;
  return (
    <button type="button" onClick={() => tap({ on: "show-hours" })} className="plate hours-plate">
      <DayStrip
        stretches={stretches}
        span={span}
        label={spoken}
        nowAt={nowAt}
        {...(planned ? { planned } : {})}
      />
      <span className="leading-tight">
        <b>{t("hours")}</b>{" "}
        <span className="font-medium">{t("today", { time: todayText(view) })}</span>
      </span>
    </button>
  );
}
