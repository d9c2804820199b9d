import type { Act, ItemRef } from "@/lib/acts/act";
import { ruleAt } from "@/lib/time/site-day";
import type { FoldFacts, Segment, SiteRules, Standing } from "@/lib/timeline/schema";

/** Nothing in a fold is longer (LEDGER.md 1). */
export const LONGEST_SHIFT_SECONDS = 36 * 3600;

/** What a worker is on; a break interrupts it. */
export type Activity = Standing["doing"];

/** A stretch of an open shift; it lasts until the next begins. */
type OpenStretch = Omit<Segment, "end">;

/** A shift while the fold walks through it. Seconds are epoch seconds. */
export interface OpenShift {
  start: number;
  startEvent: string;
  cell: string | null;
  /** The rules in force when it began. */
  rules: SiteRules;
  stretches: OpenStretch[];
  activity: { doing: Activity; cell: string | null; event: string; since: number; said: boolean };
  break: { kind: "meal" | "rest"; since: number; event: string } | null;
  /** Cell of the last act, for breaks and unassigned time (LEDGER.md 4). */
  lastCell: string | null;
  /** The last sign of the worker. */
  lastTap: { at: number; event: string; kiosk: string | null };
  /** The last event that changed the activity: when and where, and what it ended. */
  changed: {
    at: number;
    kiosk: string | null;
    dropped: readonly ItemRef[];
    endedBreak: boolean;
  } | null;
}

/** Begins a shift at an act; until something is booked it is unassigned. */
export function openShift(act: Act, at: number, facts: FoldFacts): OpenShift {
  const cell = act.cell ?? facts.homeCell;
  const doing = { kind: "unassigned" } as const;
  return {
    start: at,
    startEvent: act.id,
    cell,
    rules: ruleAt(facts.rules, at * 1000),
    stretches: [{ start: at, doing, cell, said: false, event: act.id }],
    activity: { doing, cell, event: act.id, since: at, said: false },
    break: null,
    lastCell: cell,
    lastTap: { at, event: act.id, kiosk: act.kiosk },
    changed: null,
  };
}

/** Lets an activity begin, or go on after a break, at `at`. */
export function beginActivity(
  shift: OpenShift,
  activity: { doing: Activity; cell: string | null; event: string },
  from: { at: number; said: boolean; event: string },
): void {
  const { at, said, event } = from;
  shift.activity = { ...activity, since: at, said };
  shift.break = null;
  const { doing, cell } = activity;
  shift.stretches.push({ start: at, doing, cell, said, event });
}

/** Lets a break interrupt the activity, or take the place of the break that runs. */
export function beginBreak(
  shift: OpenShift,
  { kind, at, event }: { kind: "meal" | "rest"; at: number; event: string },
): void {
  shift.break = { kind, since: at, event };
  shift.stretches.push({ start: at, doing: { kind }, cell: shift.lastCell, said: false, event });
}

/**
 * Says whether a shift without an end has been forgotten as of a second: once the site's limit is
 * past, or, where taps went on past the limit, once they stopped for as long as people rest.
 */
export function isPastDeadline({ start, rules, lastTap }: OpenShift, asOf: number): boolean {
  const limit = start + rules.shiftLimitSeconds;
  if (asOf > start + LONGEST_SHIFT_SECONDS) return true;
  return lastTap.at <= limit ? asOf > limit : asOf - lastTap.at >= rules.restBetweenShiftsSeconds;
}

/**
 * Where a shift that nobody ended ends for the time being (LEDGER.md 4): the later of the planned
 * end and the last tap; without a plan, the last tap. A plan reaches no further than the site's
 * limit, and the shift belongs to the plan that begins nearest to it.
 */
export function plannedEnd({ start, rules, lastTap }: OpenShift, facts: FoldFacts): number {
  const limit = start + rules.shiftLimitSeconds;
  const [plan] = facts.planned
    .filter((one) => one.end > start && one.start < limit)
    .sort((a, b) => Math.abs(a.start - start) - Math.abs(b.start - start) || a.start - b.start);
  return Math.max(lastTap.at, Math.min(plan?.end ?? 0, limit));
}

/** The segments of a shift up to its end; empty stretches are left out. Null: it runs on. */
export function segmentsOf({ stretches }: OpenShift, end: number | null): Segment[] {
  return stretches
    .map((stretch, index) => ({ ...stretch, end: stretches[index + 1]?.start ?? end }))
    .filter((segment) => segment.end === null || segment.end > segment.start);
}

/** Books everything after the last tap as unassigned: nobody knows what was done. */
export function cutAtLastTap(shift: OpenShift): void {
  const { at, event } = shift.lastTap;
  shift.stretches = shift.stretches.filter(({ start }) => start < at);
  const doing = { kind: "unassigned" } as const;
  shift.stretches.push({ start: at, doing, cell: shift.lastCell, said: false, event });
}
