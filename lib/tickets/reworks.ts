import type { CountedReport } from "@/lib/timeline/schema";

/**
 * A rework operation (LEDGER.md 5): pieces that failed after their operation was finished. It earns
 * nothing, its time counts, and the first operation keeps its finish.
 */
export interface Rework {
  /** The event that failed them: it is the rework operation's own id. */
  event: string;
  /** The operation whose work is done again. */
  operation: string;
  /** The operation that found it. */
  foundBy: string;
  /** What caused it: an operation of the routing. */
  causedBy: string;
  pieces: number;
  /** Pieces that were put right or lost since. */
  done: number;
  /** The counts that went to it: their events. */
  counts: string[];
  openedMs: number;
  /** Epoch milliseconds; null while it is open. */
  closedMs: number | null;
}

/**
 * The rework operation that a count opens; null for a count without rework, or of an operation that
 * is still open: there a piece of rework keeps the operation itself open.
 *
 * @param isFinished says of an operation whether it was finished before this count
 */
export function reworkOf(
  report: CountedReport,
  isFinished: (operation: string) => boolean,
): Rework | null {
  const { event, operation: foundBy, causedBy, rework, atMs } = report;
  const operation = [foundBy, causedBy].find((code) => code !== null && isFinished(code));
  if (rework === 0 || operation === undefined || operation === null) return null;
  const cause = causedBy ?? operation;
  const pieces = { pieces: rework, done: 0, counts: [] };
  return { event, operation, foundBy, causedBy: cause, ...pieces, openedMs: atMs, closedMs: null };
}

/** The rework operation that a count of an operation goes to: the oldest that is open, if any. */
export function openRework(reworks: readonly Rework[], operation: string): Rework | undefined {
  return reworks.find((one) => one.operation === operation && one.closedMs === null);
}

/** The rework operation during which time on an operation began, if any; epoch milliseconds. */
export function reworkAt<R extends Rework>(
  reworks: readonly R[],
  { operation, startMs }: { operation: string; startMs: number },
): R | undefined {
  return reworks.find(
    (one) =>
      one.operation === operation &&
      second(one.openedMs) <= startMs &&
      (one.closedMs === null || startMs < one.closedMs),
  );
}

/** Time begins on whole seconds, counts do not. */
const second = (ms: number) => Math.floor(ms / 1000) * 1000;
