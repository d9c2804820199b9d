import { type DayRule, daysTouched, type Stretch } from "@/lib/time/site-day";
import type { Doing, Segment, WorkItem } from "@/lib/timeline/schema";
import { split } from "@/lib/timeline/split";

/**
 * What a stretch of time was made of, in whole seconds (LEDGER.md 4): attendance = direct + indirect
 * + rest + unassigned, span = attendance + meal; setup, run, rework and inspect make up direct.
 */
export interface TimeSums {
  spanSeconds: number;
  attendanceSeconds: number;
  directSeconds: number;
  setupSeconds: number;
  runSeconds: number;
  reworkSeconds: number;
  inspectSeconds: number;
  indirectSeconds: number;
  restSeconds: number;
  mealSeconds: number;
  unassignedSeconds: number;
}

const NOTHING: TimeSums = {
  spanSeconds: 0,
  attendanceSeconds: 0,
  directSeconds: 0,
  setupSeconds: 0,
  runSeconds: 0,
  reworkSeconds: 0,
  inspectSeconds: 0,
  indirectSeconds: 0,
  restSeconds: 0,
  mealSeconds: 0,
  unassignedSeconds: 0,
};

/**
 * Sums segments within a window, cutting those that reach over its bounds.
 *
 * @param segments of one worker or of many, in any order
 * @param window half-open, epoch seconds
 * @param now epoch seconds: where a segment that runs is cut; what begins later counts nothing
 */
export function sumWindow(segments: readonly Segment[], window: Stretch, now: number): TimeSums {
  const sums = { ...NOTHING };
  for (const segment of segments) add(sums, segment.doing, overlap(segment, window, now));
  return sums;
}

/**
 * Sums segments by production day; a segment over midnight gives each day its own seconds.
 *
 * @param now epoch seconds: where a segment that runs is cut
 * @returns one entry per day with time on it, by date
 */
export function sumDays(
  segments: readonly Segment[],
  rules: readonly DayRule[],
  now: number,
): Map<string, TimeSums> {
  if (segments.length === 0) return new Map();
  // Zones are asked once a day, not once a segment: a fortnight of a site has 10,000 segments.
  const start = segments.reduce((first, segment) => Math.min(first, segment.start), Infinity);
  const end = segments.reduce((last, segment) => Math.max(last, segment.end ?? now), -Infinity);
  const days = daysTouched({ start, end }, rules);
  const byDate = new Map<string, TimeSums>();
  for (const segment of segments) {
    for (let index = dayIndex(days, segment.start); index < days.length; index += 1) {
      const day = days[index]!;
      const seconds = overlap(segment, day, now);
      if (seconds === 0) break;
      const sums = byDate.get(day.date) ?? { ...NOTHING };
      add(sums, segment.doing, seconds);
      byDate.set(day.date, sums);
    }
  }
  return new Map([...byDate].sort(([a], [b]) => (a < b ? -1 : 1)));
}

/** The place of the day that holds a second, in days that follow each other; halves the list. */
function dayIndex(days: readonly Stretch[], second: number): number {
  let [low, high] = [0, days.length - 1];
  while (low < high) {
    const middle = Math.ceil((low + high) / 2);
    if (days[middle]!.start <= second) low = middle;
    else high = middle - 1;
  }
  return low;
}

/** An item of a segment with its share of the seconds. */
export interface ItemShare extends WorkItem {
  seconds: number;
}

/**
 * Shares a segment of work among its items (fair split), for the whole interval at once so that the
 * shares sum to its length; empty for time without a ticket.
 *
 * @param now epoch seconds: where a segment that runs is cut
 */
export function shareOf(segment: Segment, now: number): ItemShare[] {
  if (segment.doing.kind !== "work") return [];
  const { items } = segment.doing;
  const seconds = Math.max(0, (segment.end ?? now) - segment.start);
  const shares = split(
    seconds,
    items.map(({ weight }) => weight),
  );
  return items.map((item, index) => ({ ...item, seconds: shares[index]! }));
}

function overlap({ start, end }: Segment, window: Stretch, now: number): number {
  return Math.max(0, Math.min(end ?? now, window.end) - Math.max(start, window.start));
}

function add(sums: TimeSums, doing: Doing, seconds: number): void {
  sums.spanSeconds += seconds;
  if (doing.kind !== "meal") sums.attendanceSeconds += seconds;
  if (doing.kind === "work") {
    sums.directSeconds += seconds;
    sums[`${doing.activity}Seconds`] += seconds;
  } else sums[`${doing.kind}Seconds`] += seconds;
}
