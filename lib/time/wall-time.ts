import { Temporal } from "temporal-polyfill";
import { offsetMs, utcMs } from "@/lib/time/zone";

/** The instants at which a wall clock shows one local time. */
export interface WallInstants {
  /** 0 where the clocks are put forward past it, 2 where they are put back over it. */
  times: 0 | 1 | 2;
  /** Epoch milliseconds; both are the same when `times` is 1. */
  earlierMs: number;
  laterMs: number;
}

const DAY_MS = 86_400_000;

/**
 * Finds when a wall clock in the zone shows a local time.
 * A time that the clocks skip is moved by the length of the gap: `earlierMs` back, `laterMs` on
 * (as ECMAScript Temporal disambiguates); ask the person rather than take either.
 *
 * @param local date and time without offset, such as "2026-11-01T01:30"
 * @throws RangeError on any other text or an unknown zone
 */
export function wallInstants(local: string, zone: string): WallInstants {
  const asUtcMs = utcMs(Temporal.PlainDateTime.from(local));
  // No zone changes twice within two days, so these two are the only offsets that may apply.
  const before = offsetMs(asUtcMs - DAY_MS, zone);
  const after = offsetMs(asUtcMs + DAY_MS, zone);
  const offsets = before === after ? [before] : [before, after];
  const found = offsets
    .map((offset) => asUtcMs - offset)
    .filter((ms) => ms + offsetMs(ms, zone) === asUtcMs)
    .sort((a, b) => a - b);
  const [first, last] = found.length > 0 ? found : [asUtcMs - after, asUtcMs - before];
  const times = found.length > 1 ? 2 : found.length === 1 ? 1 : 0;
  return { times, earlierMs: first!, laterMs: last ?? first! };
}

/**
 * The instant of a boundary given in local time: of a day, a week, a planned shift.
 * One that comes twice is the earlier, one that the clocks skip is the first instant after the gap
 * (CALCULATIONS.md 4).
 *
 * @param local date and time without offset, such as "2026-03-08T00:00"
 * @returns epoch milliseconds
 * @throws RangeError on any other text or an unknown zone
 */
export function boundaryMs(local: string, zone: string): number {
  const { times, earlierMs, laterMs } = wallInstants(local, zone);
  return times === 0 ? transitionMs(earlierMs, laterMs, zone) : earlierMs;
}

/** The instant in `(fromMs, toMs]` at which the zone's offset changes; there must be one. */
function transitionMs(fromMs: number, toMs: number, zone: string): number {
  const after = offsetMs(toMs, zone);
  let [low, high] = [fromMs, toMs];
  while (high - low > 1) {
    const middle = Math.floor((low + high) / 2);
    if (offsetMs(middle, zone) === after) high = middle;
    else low = middle;
  }
  return high;
}
