import { groupBy } from "@/lib/group";
import { type DecimalHours, decimalDays } from "@/lib/hours/decimals";
import { type ActivitySeconds, addHours, type HourSums, hourSums } from "@/lib/hours/sums";

/** One worker's seconds of one activity on one day, as the database sums them; none: no time. */
export interface HoursRow {
  number: string;
  name: string;
  cell: string;
  date: string | null;
  activity: ActivitySeconds["activity"] | null;
  seconds: number;
}

/** A day with time on it. */
export interface DayHours {
  date: string;
  sums: HourSums;
}

/** A worker's hours of a range: days with time on them, their total, and both in decimal hours. */
export interface HoursCard {
  number: string;
  name: string;
  cell: string;
  days: DayHours[];
  total: HourSums;
  decimals: DecimalHours;
}

/** Gathers the rows of one worker after the other into cards, in the order in which they come. */
export function cardsOf(rows: readonly HoursRow[]): HoursCard[] {
  return [...groupBy(rows, ({ number }) => number).values()].map(cardOf);
}

function cardOf(rows: readonly HoursRow[]): HoursCard {
  const { number, name, cell } = rows[0]!;
  const byDate = groupBy(rows, ({ date }) => date);
  const days = [...byDate]
    .flatMap(([date, ofDay]) => (date === null ? [] : [{ date, sums: hourSums(timed(ofDay)) }]))
    .sort((a, b) => (a.date < b.date ? -1 : 1));
  const sums = days.map((day) => day.sums);
  return { number, name, cell, days, total: addHours(sums), decimals: decimalDays(sums) };
}

function timed(rows: readonly HoursRow[]): ActivitySeconds[] {
  return rows.flatMap(({ activity, seconds }) => (activity ? [{ activity, seconds }] : []));
}
