import { z } from "zod";
import { addDays, listDays } from "@/lib/time/site-day";

/** The most days that one look at hours spans: a quarter of a year. */
const DAYS_MAX = 92;

const date = z.iso.date().catch("");
const name = z.string().max(200).catch("");

/** What the address says of the hours wanted; anything odd in it counts as not said. */
export const hoursFilter = z.object({
  from: date,
  to: date,
  cell: name,
  /** The number of the worker whose days are open, and the day whose taps are. */
  worker: z
    .string()
    .regex(/^\d{1,8}$/)
    .catch(""),
  day: date,
});
export type HoursFilter = z.infer<typeof hoursFilter>;

/** The production days from `from` to `to`, both included, as a person says a range. */
export interface DayRange {
  from: string;
  to: string;
}

/**
 * The range that a filter means: what is not said is the week up to today, ends the wrong way round
 * are turned, and a range that is too long keeps its last days.
 *
 * @param today the site's production day
 */
export function rangeOf({ from, to }: Pick<HoursFilter, "from" | "to">, today: string): DayRange {
  const last = to || (from > today ? from : today);
  const first = from || addDays(last, -6);
  const [start, end] = first <= last ? [first, last] : [last, first];
  const isTooLong = listDays(start, end).length >= DAYS_MAX;
  return { from: isTooLong ? addDays(end, 1 - DAYS_MAX) : start, to: end };
}
