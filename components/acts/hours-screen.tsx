"use client";

import { useTranslations } from "use-intl";
import { Ask, Foot, Leaves } from "@/components/bench/ask";
import { dayStretches } from "@/components/bench/day";
import { type SeenBench, useClock } from "@/components/bench/seen";
import { DayStrip } from "@/components/seam/day-strip";
import { KioskFrame } from "@/components/shell/kiosk-frame";
import { Plate } from "@/components/ui/plate";
import { hoursAndMinutes } from "@/lib/time/format";
import { split } from "@/lib/timeline/split";

/** A worker's own hours of today, as tapped, and what can be put right about them. */
export function HoursScreen(seen: SeenBench) {
  const { state, view, tap } = seen;
  const t = useTranslations("hours");
  const words = useTranslations("common");
  return (
    <KioskFrame state={state}>
      <div className="grid min-h-0 grid-rows-[auto_minmax(0,1fr)_auto]">
        <Ask
          className="pt-2 text-k-5"
          book={t("title")}
          day={t("attendedDay", { time: hoursAndMinutes(view.today.attendanceSeconds) })}
        />
        <Leaves className="pt-5" book={<Sums {...seen} />} day={<Day {...seen} />} />
        <Foot
          book={
            <Plate icon="back" rim="left" onClick={() => tap({ on: "back" })}>
              {words("back")}
            </Plate>
          }
          day={
            <>
              {view.activityEvent && (
                <Plate icon="change" onClick={() => tap({ on: "wrong-ticket" })}>
                  {t("wrongTicket")}
                  <small>{t("wrongTicketHow")}</small>
                </Plate>
              )}
              {view.reports.length > 0 && (
                <Plate icon="edit" rim="right" onClick={() => tap({ on: "wrong-count" })}>
                  {t("wrongCount")}
                  <small>{t("wrongCountHow")}</small>
                </Plate>
              )}
            </>
          }
        />
      </div>
    </KioskFrame>
  );
}

/** The parts of the day, in whole minutes that add up to what was attended. */
function Sums({ view }: SeenBench) {
  const t = useTranslations("hours");
  const { directSeconds, indirectSeconds, restSeconds, unassignedSeconds, ...rest } = view.today;
  const parts = [directSeconds, indirectSeconds, restSeconds, unassignedSeconds];
  const minutes = split(Math.floor(rest.attendanceSeconds / 60), parts);
  const terms = [t("direct"), t("indirect"), t("rest"), t("unassigned")];
  const lines = [
    ...terms.map((term, at) => [term, (minutes[at] ?? 0) * 60] as const),
    [t("attended"), rest.attendanceSeconds] as const,
    [t("meal"), rest.mealSeconds] as const,
  ];
  return (
    <dl className="hours-sums">
      {lines.map(([term, seconds]) => (
        <div key={term}>
          <dt>{term}</dt>
          <dd>{hoursAndMinutes(seconds)}</dd>
        </div>
      ))}
    </dl>
  );
}

/** The day in clock time, what waits to be looked at, and the rule that parts tapped from paid. */
function Day({ state, view }: SeenBench) {
  const t = useTranslations("hours");
  const ends = useTranslations("ends");
  const clock = useClock();
  const { stretches, span, planned, nowAt } = dayStretches(state, view);
  const [start, end] = [clock(span.from * 1000), clock(span.to * 1000)];
  const shown = [
    ...view.changes.map(({ by, at }) => t("changed", { name: by, time: clock(Date.parse(at)) })),
    ...view.looseEnds.map(({ code }) => ends(code)),
  ];
  return (
    <div className="grid content-start gap-4">
      <DayStrip
        stretches={stretches}
        span={span}
        label={t("strip", { start, end })}
        nowAt={nowAt}
        className="[--h:64px]"
        {...(planned ? { planned } : {})}
      />
      <p className="flex justify-between text-ink-2">
        <span>{start}</span>
        <span>{end}</span>
      </p>
      <p className="text-k-2">{t("note")}</p>
      <div>
        <h2 className="text-k-2 font-bold">{t("ends")}</h2>
        {shown.length === 0 && <p className="text-k-2">{t("noEnds")}</p>}
        <ul className="text-k-2">
          {shown.slice(0, 4).map((line) => (
            <li key={line} className="truncate">
              {line}
            </li>
          ))}
        </ul>
      </div>
    </div>
  );
}
