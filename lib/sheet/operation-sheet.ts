import { cellSheet, type Step } from "@/lib/sheet/cell-sheet";
import type { OperationSheet, TimePiece } from "@/lib/sheet/schema";
import type { BookedTime } from "@/lib/sheet/step-times";
import { handOverOf, type SaidEvent, saidActs, tapsOf } from "@/lib/sheet/taps";
import { split } from "@/lib/timeline/split";

/** What the routing says of a ticket's steps, and all that was said of them, corrections too. */
export interface TicketSteps {
  ticket: string;
  steps: readonly (Step & { operation: string })[];
  said: readonly SaidEvent[];
}

/** What the judge knows of the operation besides. */
interface Operation {
  operation: string;
  /** Setup and all pieces; null without a standard. */
  standardSeconds: number | null;
  isFinished: boolean;
  time: readonly TimePiece[];
}

/**
 * The sheet of a ticket operation as of an instant; null for one that is not built in steps.
 *
 * @param untilMs until when time that runs counts; null leaves it out, for a copy that is kept
 */
export function operationSheetOf(
  { ticket, steps, said }: TicketSteps,
  { operation, standardSeconds, isFinished, time }: Operation,
  untilMs: number | null,
): OperationSheet | null {
  const own = steps.filter((one) => one.operation === operation);
  if (own.length === 0) return null;
  const item = { ticket, operation };
  const acts = saidActs(said);
  const taps = tapsOf(acts, item, own);
  const until = untilMs === null ? null : Math.floor(untilMs / 1000);
  const sheet = cellSheet(own, standardSeconds, { taps, time: bookedTime(time, until) });
  const weights = new Map(own.map(({ step, seconds }) => [step, seconds]));
  return {
    steps: sheet.steps.map(({ atMs, ...step }) => ({
      ...step,
      seconds: weights.get(step.step) ?? 0,
      at: atMs === null ? null : new Date(atMs).toISOString(),
    })),
    notTappedSeconds: sheet.notTappedSeconds,
    taps,
    time: [...time],
    handOver: isFinished ? null : handOverOf(acts, item, time),
  };
}

/** Pieces of time with their shares, what runs as if it ended at `until`; null leaves that out. */
export function bookedTime(time: readonly TimePiece[], until: number | null): BookedTime[] {
  return time.flatMap(({ start, end, seconds, weights, item }) => {
    if (end !== null) return { start, end, seconds: seconds ?? 0 };
    if (until === null || until <= start || weights.length === 0) return [];
    return { start, end: until, seconds: split(until - start, weights)[item] ?? 0 };
  });
}
