import { z } from "zod";
import { sought } from "@/lib/forms";
import { addDays } from "@/lib/time/site-day";

/** The most days that one look at hours spans: a quarter of a year. */
const DAYS_MAX = 92;

/** Days of a factory's time: sums over any others are nobody's, and cost as much. */
const date = z.iso
  .date()
  .refine((day) => day >= "1990-01-01" && day < "2200-01-01")
  .catch("");
const name = sought(200);

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
  const earliest = addDays(end, 1 - DAYS_MAX);
  const isTooLong = start < earliest;
  return { from: isTooLong ? earliest : start, to: end };
}
