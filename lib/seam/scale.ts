import type { SeamPair } from "@/lib/seam/verdict";

/** A scale leaves room past the longest standard, and grows in steps so that a live one stands still. */
const STEPS = [4 / 3, 2, 3];

/** Without any standard a leaf is a little longer than the longest time on it, ten minutes at least. */
const BLANK_ROOM = 1.25;
const BLANK_LEAST_SECONDS = 600;

/**
 * Answers how many seconds one leaf is long: one scale for all pairs of a list. It is a third
 * longer than the longest standard; where more time was taken, twice or three times as long. What
 * is longer still is drawn off the scale, so that one runaway does not flatten its neighbours.
 */
export function seamScale(pairs: readonly SeamPair[]): number {
  const standard = Math.max(0, ...pairs.map(({ standardSeconds }) => standardSeconds ?? 0));
  const actual = Math.max(0, ...pairs.map(({ actualSeconds }) => actualSeconds));
  if (standard === 0) return Math.max(BLANK_LEAST_SECONDS, actual * BLANK_ROOM);
  const step = STEPS.find((times) => actual <= standard * times) ?? STEPS.at(-1)!;
  return standard * step;
}
