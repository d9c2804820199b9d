import { Temporal } from "temporal-polyfill";
import { addDays, localDate, type Stretch } from "@/lib/time/site-day";
import type { ZoneClock } from "@/lib/time/zone-clock";

/** In ISO 8601 order. */
export const weekdays = [
  "monday",
  "tuesday",
  "wednesday",
  "thursday",
  "friday",
  "saturday",
  "sunday",
] as const;
export type Weekday = (typeof weekdays)[number];

/** The weekday and local time, "HH:MM", at which a workweek begins (29 CFR 778.105). */
export interface WorkweekRule {
  startsOn: Weekday;
  at: string;
}

/** A local day from the workweek's hour on, named for the date on which it begins. */
export interface Workday extends Stretch {
  date: string;
}

/** A workweek: seven workdays without gap or overlap, named for the date on which it begins. */
export interface Workweek extends Stretch {
  date: string;
  days: readonly Workday[];
}

/** The weekday of a date. */
export function weekdayOf(date: string): Weekday {
  return weekdays[Temporal.PlainDate.from(date).dayOfWeek - 1]!;
}

/** The date on which the workweek of a workday begins. */
export function workweekStart(date: string, startsOn: Weekday): string {
  const back = weekdays.indexOf(weekdayOf(date)) - weekdays.indexOf(startsOn);
  return addDays(date, -((back + 7) % 7));
}

/**
 * The workweek that begins on a date: 168 hours, or 167 and 169 across a change of clocks. A
 * boundary that the clocks skip is the instant after the gap, one that comes twice the earlier.
 */
export function workweekFrom(date: string, at: string, clock: ZoneClock): Workweek {
  const dates = Array.from({ length: 8 }, (_, days) => addDays(date, days));
  const bounds = dates.map((day) => clock.secondOf(day, at));
  const days = dates
    .slice(0, 7)
    .map((day, index) => ({ date: day, start: bounds[index]!, end: bounds[index + 1]! }));
  return { date, start: bounds[0]!, end: bounds[7]!, days };
}

/**
 * Finds the workweek of an instant (epoch seconds). Asked in the order of time it works out each
 * workweek once.
 */
export function workweeks(rule: WorkweekRule, clock: ZoneClock): (atSecond: number) => Workweek {
  let last: Workweek | undefined;
  return (atSecond) => {
    if (!last || atSecond < last.start || atSecond >= last.end) {
      last = workweekFrom(weekStartAt(atSecond, rule, clock), rule.at, clock);
    }
    return last;
  };
}

/** The workday of a workweek that an instant belongs to; of an earlier instant the first. */
export function workdayIn(week: Workweek, atSecond: number): Workday {
  return week.days.findLast(({ start }) => start <= atSecond) ?? week.days[0]!;
}

function weekStartAt(atSecond: number, { startsOn, at }: WorkweekRule, clock: ZoneClock): string {
  let date = addDays(localDate(atSecond * 1000, clock.zone), 1);
  while (clock.secondOf(date, at) > atSecond) date = addDays(date, -1);
  return workweekStart(date, startsOn);
}
