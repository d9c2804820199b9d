import { type Bucket, buckets, type PayPolicy, type Tier } from "@/lib/pay/schema";
import type { Workweek } from "@/lib/time/workweek";
import type { Piece } from "@/lib/timesheet/attribution";

/** Which rule put an hour into its bucket. */
type LiftRule = "regular" | "daily" | "seventh-day" | "weekly";

/** Paid time that lies in one bucket; `overHours` is the tier that it passed, 0 for regular time. */
export interface Lifted extends Piece {
  bucket: Bucket;
  rule: LiftRule;
  overHours: number;
}

interface Lift {
  bucket: Bucket;
  rule: LiftRule;
  overHours: number;
}

/**
 * Puts the paid time of one workweek into buckets, in the order of time (CALCULATIONS.md 4). Daily
 * tiers count the hours of the workday; seventh-day tiers hold on the last workday of the workweek
 * when all seven have work; weekly tiers count only hours that no daily or seventh-day rule lifted
 * (no pyramiding: Monzon v. Schaefer, 1990). Where two rules meet, the higher bucket wins.
 *
 * @param pieces of the workweek, in order
 */
export function liftHours(
  pieces: readonly Piece[],
  week: Workweek,
  overtime: PayPolicy["overtime"],
): Lifted[] {
  const worked = new Set(pieces.map(({ date }) => date));
  const isSeventh = week.days.every(({ date }) => worked.has(date));
  const seventh = isSeventh ? week.days.at(-1)?.date : undefined;
  const ofDay = new Map<string, number>();
  const lifted: Lifted[] = [];
  let ofWeek = 0;
  for (const piece of pieces) {
    const seventhDay = piece.date === seventh ? overtime.seventhDay : [];
    for (let start = piece.start; start < piece.end; start = lifted.at(-1)!.end) {
      const day = ofDay.get(piece.date) ?? 0;
      const byDay = higher(
        passed("daily", overtime.daily, day),
        passed("seventh-day", seventhDay, day),
      );
      const lift = higher(byDay, passed("weekly", overtime.weekly, ofWeek));
      const isCounted = byDay.bucket === "regular";
      const next = Math.min(
        piece.end - start,
        untilNext([...overtime.daily, ...seventhDay], day),
        isCounted ? untilNext(overtime.weekly, ofWeek) : Number.POSITIVE_INFINITY,
      );
      lifted.push({ ...piece, ...lift, start, end: start + next });
      ofDay.set(piece.date, day + next);
      if (isCounted) ofWeek += next;
    }
  }
  return lifted;
}

/** The highest tier that so many seconds have passed. */
function passed(rule: LiftRule, tiers: readonly Tier[], seconds: number): Lift {
  return tiers
    .filter((tier) => secondsOf(tier) <= seconds)
    .map(({ bucket, overHours }) => ({ rule, bucket, overHours }))
    .reduce(higher, { rule: "regular", bucket: "regular", overHours: 0 });
}

/** Of two lifts that put an hour into one bucket, the first. */
function higher(one: Lift, other: Lift): Lift {
  return buckets.indexOf(other.bucket) > buckets.indexOf(one.bucket) ? other : one;
}

function untilNext(tiers: readonly Tier[], seconds: number): number {
  const ahead = tiers.map(secondsOf).filter((threshold) => threshold > seconds);
  return Math.min(Number.POSITIVE_INFINITY, ...ahead.map((threshold) => threshold - seconds));
}

function secondsOf({ overHours }: Tier): number {
  return Math.round(overHours * 3600);
}
