import { sum } from "@/lib/sum";
import { type DayRule, daysTouched, type Stretch } from "@/lib/time/site-day";
import { overlapOf } from "@/lib/time/stretches";
import { split } from "@/lib/timeline/split";

/** What of an item's seconds falls on a production day. */
interface DayPart {
  day: string;
  seconds: number;
}

/**
 * Cuts an interval that several items share by production day, losing no second: on each day the
 * parts sum to the day's length of the interval, and over the days to each item's own share. The
 * last day gets what is left; the others are shared in proportion, largest remainder first.
 *
 * @param interval half-open, epoch seconds
 * @param shares each item's seconds of the whole; they sum to its length
 * @param item the place of the item that is asked for
 */
export function cutByDay(
  interval: Stretch,
  { shares, item }: { shares: readonly number[]; item: number },
  rules: readonly DayRule[],
): DayPart[] {
  const days = daysTouched(interval, rules).map((day) => {
    const { start, end } = overlapOf(interval, day);
    return { day: day.date, length: end - start };
  });
  let left = [...shares];
  const parts = days.map(({ day, length }) => {
    const isAll = length >= sum(left);
    const taken = isAll ? left : split(length, left);
    left = left.map((seconds, at) => seconds - taken[at]!);
    return { day, seconds: taken[item] ?? 0 };
  });
  return parts.filter(({ seconds }) => seconds > 0);
}
