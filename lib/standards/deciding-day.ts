import { type DayRule, productionDay } from "@/lib/time/site-day";

/**
 * The production day whose standard holds for a whole ticket operation (CALCULATIONS.md 3): that of
 * its first setup, run or inspect second, and where none is booked that of its first count, so that
 * nobody gains by holding a report back. Null before there is either.
 *
 * @param first instants in epoch milliseconds; null where there is none
 */
export function decidingDay(
  first: { workMs: number | null; countMs: number | null },
  rules: readonly DayRule[],
): string | null {
  const atMs = first.workMs ?? first.countMs;
  return atMs === null ? null : productionDay(atMs, rules);
}
