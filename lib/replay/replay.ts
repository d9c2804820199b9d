import { efficiency } from "@/lib/analytics/ratios";
import { type Draft, rowsUnder } from "@/lib/replay/draft";
import type { EarningReport } from "@/lib/standards/earned";
import { type EarningOperation, operationEarning } from "@/lib/standards/earning";
import { sum } from "@/lib/sum";
import { addDays, type DayRule, productionDay } from "@/lib/time/site-day";

/** A ticket operation that is finished, with all the time ever booked to it. */
export interface FinishedOperation extends EarningOperation<EarningReport> {
  ticket: string;
  finishedMs: number;
  good: number;
  actualSeconds: number;
}

/** Finished work re-earned: what it earned, what it would have, and what it took. */
export interface ReplaySums {
  pieces: number;
  /** Null where nothing of it has a standard. */
  wasSeconds: number | null;
  wouldSeconds: number;
  actualSeconds: number;
  /** Earned ÷ actual; null where there is nothing to divide by, or no standard. */
  wasEfficiency: number | null;
  wouldEfficiency: number | null;
}

/** A week of production days, `from` and `to` both in it. */
export interface ReplayWeek extends ReplaySums {
  from: string;
  to: string;
}

export interface Replay {
  weeks: ReplayWeek[];
  total: ReplaySums;
  /** Minutes that a good piece took, ticket by ticket: what the draft is held against. */
  secondsPerPiece: number[];
}

const WEEKS = 4;

/** The first production day that a replay looks at: four weeks, today the last day of them. */
export function replayFrom(today: string): string {
  return addDays(today, 1 - 7 * WEEKS);
}

/**
 * Replays the finished work of the last four weeks at a drafted standard, week by week: the same
 * work, the same time, earned by the one rule of earning, once as it was and once as if the draft
 * had held all along (CALCULATIONS.md 3, the matched basis). Work finished on other days is left
 * out.
 */
export function replay(
  operations: readonly FinishedOperation[],
  { draft, today, rules }: { draft: Draft; today: string; rules: readonly DayRule[] },
): Replay {
  const first = replayFrom(today);
  const earned = operations
    .map((operation) => ({ ...operation, day: productionDay(operation.finishedMs, rules) }))
    .filter(({ day }) => day >= first && day <= today)
    .map((operation) => reEarned(operation, { draft, rules }));
  const weeks = Array.from({ length: WEEKS }, (_, week) => {
    const from = addDays(first, 7 * week);
    const to = addDays(from, 6);
    return { from, to, ...sumsOf(earned.filter(({ day }) => day >= from && day <= to)) };
  });
  const secondsPerPiece = earned
    .filter(({ good }) => good > 0)
    .map(({ good, actualSeconds }) => actualSeconds / good);
  return { weeks, total: sumsOf(earned), secondsPerPiece };
}

type ReEarned = FinishedOperation & { day: string; was: number | null; would: number };

function reEarned(
  operation: FinishedOperation & { day: string },
  { draft, rules }: { draft: Draft; rules: readonly DayRule[] },
): ReEarned {
  const was = operationEarning(operation, rules);
  const standards = rowsUnder(draft, operation.standards);
  const would = operationEarning({ ...operation, standards }, rules);
  return { ...operation, was: was.standard ? was.seconds : null, would: would.seconds };
}

function sumsOf(operations: readonly ReEarned[]): ReplaySums {
  const timed = operations.filter(({ was }) => was !== null);
  const actualSeconds = sum(operations.map((one) => one.actualSeconds));
  const timedSeconds = sum(timed.map((one) => one.actualSeconds));
  const wasSeconds = timed.length > 0 ? sum(timed.map(({ was }) => was ?? 0)) : null;
  const wouldSeconds = sum(operations.map(({ would }) => would));
  return {
    pieces: sum(operations.map(({ good }) => good)),
    wasSeconds,
    wouldSeconds,
    actualSeconds,
    wasEfficiency:
      wasSeconds === null
        ? null
        : efficiency({
            earnedSeconds: wasSeconds,
            directSeconds: timedSeconds,
            noStandardSeconds: 0,
          }),
    wouldEfficiency: efficiency({
      earnedSeconds: wouldSeconds,
      directSeconds: actualSeconds,
      noStandardSeconds: 0,
    }),
  };
}
