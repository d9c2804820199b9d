import { type PolicyBook, type PolicyVersion, policyOn } from "@/lib/policies/in-force";
import { addDays, type Stretch } from "@/lib/time/site-day";
import { type Workweek, workweekFrom, workweekStart, workweeks } from "@/lib/time/workweek";
import type { ZoneClock } from "@/lib/time/zone-clock";

/** A workweek of a worker with the policy version that governs all of it. */
export interface GovernedWeek {
  week: Workweek;
  version: PolicyVersion;
  /** Where the workweek's start was changed: what it shares with the one before; else null. */
  overlap: Stretch | null;
}

/** Site dates from `from` up to, not including, `to`. */
export interface Dates {
  from: string;
  to: string;
}

/**
 * How far before the range the chain of workweeks begins: a change of the workweek's start within
 * it has long run out when the range is reached.
 */
const RUN_UP_DAYS = 56;

/**
 * The workweeks of a worker that touch a range of dates, in order, each with the version that was in
 * force at its first instant and so governs all of it (CALCULATIONS.md 4). Where the start of the
 * workweek changes, the old one runs out, and the first new one is the one that its end lies in or
 * begins: the two may overlap, and whoever states the time counts it both ways (29 CFR 778.301-.302).
 *
 * @returns empty where the site has not chosen any policy yet
 */
export function governedWeeks(
  book: PolicyBook,
  worker: string | null,
  { from, to }: Dates,
  clock: ZoneClock,
): GovernedWeek[] {
  const first = policyOn(book, worker, addDays(from, -RUN_UP_DAYS));
  if (!first) return [];
  const weeks: GovernedWeek[] = [];
  let next = startingWeek(book, worker, addDays(from, -RUN_UP_DAYS), clock);
  while (next.week.date < to) {
    const after = weekAfter(book, worker, next, clock);
    // of two that share time, both are needed to state either
    const isNeeded = after.overlap !== null && lastDate(after.week) >= from;
    if (lastDate(next.week) >= from || isNeeded) weeks.push(next);
    next = after;
  }
  return weeks;
}

function startingWeek(
  book: PolicyBook,
  worker: string | null,
  date: string,
  clock: ZoneClock,
): GovernedWeek {
  // safe because a site with a policy has one on every day
  const version = policyOn(book, worker, addDays(date, -6))!;
  const { startsOn, at } = version.policy.workweek;
  return { week: workweekFrom(workweekStart(date, startsOn), at, clock), version, overlap: null };
}

function weekAfter(
  book: PolicyBook,
  worker: string | null,
  before: GovernedWeek,
  clock: ZoneClock,
): GovernedWeek {
  const endsOn = addDays(before.week.date, 7);
  const version = policyOn(book, worker, endsOn)!;
  const [old, now] = [before.version.policy.workweek, version.policy.workweek];
  if (old.startsOn === now.startsOn && old.at === now.at) {
    return { week: workweekFrom(endsOn, now.at, clock), version, overlap: null };
  }
  const week = workweeks(now, clock)(before.week.end);
  const isShared = week.start < before.week.end;
  return { week, version, overlap: isShared ? { start: week.start, end: before.week.end } : null };
}

function lastDate({ days }: Workweek): string {
  return days.at(-1)!.date;
}
