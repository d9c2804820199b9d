import { Temporal } from "temporal-polyfill";
import { assert } from "@/lib/assert";
import { boundaryMs } from "@/lib/time/wall-time";
import { wallClock } from "@/lib/time/zone";

/** Where a site's days begin, from an instant on (LEDGER.md 2: the zone is effective-dated too). */
export interface DayRule {
  fromMs: number;
  timeZone: string;
  /** Minutes after local midnight at which a production day begins: 0 to 1439. */
  productionDayStartsAtMinutes: number;
}

/** A half-open stretch of time, `[start, end)` in epoch seconds. */
export interface Stretch {
  start: number;
  end: number;
}

/** The date that a calendar on the wall shows in the zone at an instant (epoch milliseconds). */
export function localDate(atMs: number, zone: string): string {
  return wallClock(atMs, zone).toPlainDate().toString();
}

/** The date `days` later, or earlier when negative. */
export function addDays(date: string, days: number): string {
  return Temporal.PlainDate.from(date).add({ days }).toString();
}

/** The dates from `from` up to, not including, `to`; empty when there is none between. */
export function listDays(from: string, to: string): string[] {
  const count = Temporal.PlainDate.from(from).until(to, { largestUnit: "days" }).days;
  return Array.from({ length: Math.max(0, count) }, (_, index) => addDays(from, index));
}

/**
 * The row in force at an instant: the latest that began by then. What comes before the first row
 * goes by the first.
 *
 * @param rules sorted by `fromMs`; at least one
 */
export function ruleAt<R extends { fromMs: number }>(rules: readonly R[], atMs: number): R {
  assert(rules.length > 0, "ruleAt: a site has at least one row of rules");
  return rules.findLast(({ fromMs }) => fromMs <= atMs) ?? rules[0]!;
}

/**
 * The bounds of a production day. Days follow each other without gap or overlap, also on the days
 * on which clocks or rules change: a new row of rules begins with the first day that starts under
 * it, and the day before lasts until then.
 *
 * @param date the date on which the day begins
 * @param rules sorted by `fromMs`; at least one
 */
export function dayBounds(date: string, rules: readonly DayRule[]): Stretch {
  return { start: dayStart(date, rules), end: dayStart(addDays(date, 1), rules) };
}

/** The bounds of the production days from `from` up to, not including, `to`. */
export function rangeBounds(from: string, to: string, rules: readonly DayRule[]): Stretch {
  return { start: dayStart(from, rules), end: dayStart(to, rules) };
}

/** The production day that an instant belongs to, named by the date on which it begins. */
export function productionDay(atMs: number, rules: readonly DayRule[]): string {
  const atSecond = Math.floor(atMs / 1000);
  const near = daysNear(Math.floor(atSecond / DAY_SECONDS), rules);
  const day = near.findLast(({ start }) => start <= atSecond);
  assert(day !== undefined, "productionDay: a day begins within two days before any instant");
  return day.date;
}

const DAY_SECONDS = 86_400;

/**
 * The production days that may hold an instant of a day of UTC: a zone is at most 14 hours off, and a
 * day may begin late in the evening before or after. Asked for each record and slow to find out.
 */
function daysNear(
  utcDay: number,
  rules: readonly DayRule[],
): readonly { date: string; start: number }[] {
  const days = near.get(rules) ?? new Map<number, { date: string; start: number }[]>();
  near.set(rules, days);
  const known = days.get(utcDay);
  if (known) return known;
  const date = localDate(utcDay * DAY_SECONDS * 1000, "UTC");
  const found = [-3, -2, -1, 0, 1, 2].map((days) => {
    const day = addDays(date, days);
    return { date: day, start: dayStart(day, rules) };
  });
  days.set(utcDay, found);
  return found;
}

const near = new WeakMap<readonly DayRule[], Map<number, { date: string; start: number }[]>>();

/** The production days that a stretch of epoch seconds touches, each with its bounds; in order. */
export function daysTouched(
  { start, end }: Stretch,
  rules: readonly DayRule[],
): (Stretch & { date: string })[] {
  if (end <= start) return [];
  const first = productionDay(start * 1000, rules);
  const last = productionDay((end - 1) * 1000, rules);
  return listDays(first, addDays(last, 1)).map((date) => ({ date, ...dayBounds(date, rules) }));
}

/** Each record of a batch asks for the same few days, and wall time is slow to ask. */
const known = new WeakMap<readonly DayRule[], Map<string, number>>();

function dayStart(date: string, rules: readonly DayRule[]): number {
  const starts = known.get(rules) ?? new Map<string, number>();
  const start = starts.get(date) ?? askDayStart(date, rules);
  known.set(rules, starts.set(date, start));
  return start;
}

/** The latest row of rules under which the day begins no earlier than the row itself. */
function askDayStart(date: string, rules: readonly DayRule[]): number {
  assert(rules.length > 0, "dayStart: a site has at least one row of rules");
  const starts = rules.map((rule) => ({ rule, startMs: startUnder(date, rule) }));
  const governed = starts.findLast(({ rule, startMs }) => rule.fromMs <= startMs) ?? starts[0]!;
  return Math.floor(governed.startMs / 1000);
}

function startUnder(date: string, rule: DayRule): number {
  const minutes = rule.productionDayStartsAtMinutes;
  const time = Temporal.PlainTime.from({ hour: Math.floor(minutes / 60), minute: minutes % 60 });
  return boundaryMs(`${date}T${time.toString()}`, rule.timeZone);
}
