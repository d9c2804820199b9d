import type { Rounding } from "@/lib/pay/schema";
import type { Stretch } from "@/lib/time/site-day";
import { offsetMs } from "@/lib/time/zone";
import type { Paid } from "@/lib/timesheet/breaks";

/**
 * The start and end of a shift as the policy rounds them: to the nearest n minutes of the local
 * clock, half up on exact seconds (29 CFR 785.48(b)). Breaks inside are never rounded.
 */
export function roundShift({ start, end }: Stretch, rounding: Rounding, zone: string): Stretch {
  if (rounding.mode === "none") return { start, end };
  const step = rounding.minutes * 60;
  return { start: nearest(start, step, zone), end: nearest(end, step, zone) };
}

/**
 * Fits paid time to a rounded shift: what rounding adds at an end is paid at the rate next to it,
 * what it takes is cut off.
 *
 * @param paid in order, inside `real`
 */
export function fitPaid(paid: readonly Paid[], real: Stretch, rounded: Stretch): Paid[] {
  const [first, last] = [paid[0], paid.at(-1)];
  if (!first || !last || rounded.end <= rounded.start) return [];
  const added = [
    { start: rounded.start, end: real.start, rate: first.rate },
    { start: real.end, end: rounded.end, rate: last.rate },
  ];
  return [added[0]!, ...paid.map((one) => clipped(one, rounded)), added[1]!].filter(
    ({ start, end }) => end > start,
  );
}

function clipped(paid: Paid, { start, end }: Stretch): Paid {
  return { ...paid, start: Math.max(paid.start, start), end: Math.min(paid.end, end) };
}

function nearest(atSecond: number, step: number, zone: string): number {
  const local = atSecond + offsetMs(atSecond * 1000, zone) / 1000;
  return atSecond + Math.floor((local + step / 2) / step) * step - local;
}
