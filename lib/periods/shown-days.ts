import type { DayPart } from "@/lib/agreement/day-text";
import type { Warning } from "@/lib/limits/shift-facts";
import type { TrailStep } from "@/lib/pay/answer";
import type { PaidWorkday } from "@/lib/periods/adjust";
import type { CardDay } from "@/lib/periods/card";
import { dayStretches } from "@/lib/periods/cards-view";
import { changeHours, type HourTexts, sharedHours } from "@/lib/periods/file-hours";
import type { Stretch } from "@/lib/seam/day-strip";

/** One workday of the card that is open. */
export interface ShownDay {
  /** Tells it from every other: a changed workweek may show a date twice. */
  key: string;
  date: string;
  policy: string;
  hours: HourTexts;
  trail: readonly TrailStep[];
  warnings: readonly string[];
  stretches: readonly Stretch[];
  /** For an adjustment: the day of the earlier period that it changes. */
  reference: string | null;
}

/** What the days of a card are shown from. */
export interface ShownFacts {
  periodId: string;
  /** The days as they are stated now; null where the frozen rows count. */
  stated: readonly (PaidWorkday & { trail: readonly TrailStep[] })[] | null;
  rows: readonly (PaidWorkday & {
    trail: readonly TrailStep[];
    aboutId: string;
    aboutFrom: string;
  })[];
  workdays: readonly Pick<CardDay, "date" | "startMs" | "endMs">[];
  warnings: readonly Warning[];
  parts: readonly DayPart[];
  nowMs: number;
}

/** Puts each day of a card beside its strip, its warnings and the reason for every second. */
export function shownDays(facts: ShownFacts): ShownDay[] {
  const { periodId, stated, rows } = facts;
  const own = stated ?? rows.filter(({ aboutId }) => aboutId === periodId);
  const changes = stated ? [] : rows.filter(({ aboutId }) => aboutId !== periodId);
  const hours = sharedHours(own);
  return [
    ...own.map((day, at) => shownDay(day, hours[at]!, facts)),
    ...changes.map((day) => ({
      ...shownDay(day, changeHours(day), facts),
      key: `${day.aboutFrom}/${day.workweek}/${day.date}`,
      reference: `${day.aboutFrom}/${day.date}`,
      warnings: [],
      stretches: [],
    })),
  ];
}

function shownDay(
  day: PaidWorkday & { trail: readonly TrailStep[] },
  hours: HourTexts,
  { workdays, warnings, parts, nowMs }: ShownFacts,
): ShownDay {
  const { workweek, date, policy, trail } = day;
  const bounds = workdays.find((one) => one.date === date);
  return {
    key: `${workweek}/${date}`,
    date,
    policy,
    hours,
    trail,
    warnings: warnings.filter((one) => one.date === date).map(({ text }) => text),
    stretches: bounds ? dayStretches(parts, bounds, nowMs) : [],
    reference: null,
  };
}
