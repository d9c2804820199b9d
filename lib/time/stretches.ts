import type { Stretch } from "@/lib/time/site-day";

/** The summed length of some stretches, in seconds. */
export function secondsOf(stretches: readonly Stretch[]): number {
  return stretches.reduce((total, { start, end }) => total + end - start, 0);
}

/** What two stretches have in common; `end` is not after `start` where that is nothing. */
export function overlapOf(one: Stretch, other: Stretch): Stretch {
  return { start: Math.max(one.start, other.start), end: Math.min(one.end, other.end) };
}
