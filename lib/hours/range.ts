import { z } from "zod";
import { workerNumber } from "@/lib/ledger/schema";
import { addDays, listDays } from "@/lib/time/site-day";
import { weekdayOf } from "@/lib/time/workweek";

/** The longest range that a page shows: a year and its leap day. */
const DAYS_MAX = 366;

/** What the address says of Hours; anything odd in it counts as not said. `to` is the last day. */
export const hoursQuery = z.object({
  from: z.iso.date().or(z.literal("")).catch(""),
  to: z.iso.date().or(z.literal("")).catch(""),
  cell: z.uuid().or(z.literal("")).catch(""),
  after: workerNumber.or(z.literal("")).catch(""),
});
export type HoursQuery = z.infer<typeof hoursQuery>;

/** Production days from `from` through `to`, both included. */
export interface DayRange {
  from: string;
  to: string;
}

/**
 * The days that Hours is about: what was asked for, in order and a year at most; where nothing was,
 * the Monday of the week before today's through today.
 *
 * @param today the production day now
 */
export function rangeOf({ from, to }: Pick<HoursQuery, "from" | "to">, today: string): DayRange {
  const last = to || from || today;
  const first = from || (to ? to : mondayBefore(today));
  const [start, end] = first <= last ? [first, last] : [last, first];
  const [lastShown] = [end, addDays(start, DAYS_MAX - 1)].sort();
  return { from: start, to: lastShown! };
}

/** The dates of a range, in order. */
export function datesOf({ from, to }: DayRange): string[] {
  return listDays(from, addDays(to, 1));
}

/** The Monday of the week before the one that holds the date. */
function mondayBefore(date: string): string {
  const back = [0, 1, 2, 3, 4, 5, 6].map((days) => addDays(date, -days));
  return addDays(back.find((day) => weekdayOf(day) === "monday")!, -7);
}
