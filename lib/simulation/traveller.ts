import type { DemoModel } from "@/lib/demo/models";
import type { DemoOperation } from "@/lib/demo/operations";

/** One operation of one ticket while it waits, runs or is done. */
export interface Step {
  operation: DemoOperation;
  /** Pieces nobody has finished yet, as the share of each that is still to do: 1 is untouched. */
  toDo: number[];
  /** Pieces in somebody's hands or counted by nobody yet. */
  inHand: number;
  /** Pieces that were reported as rework and wait for it. */
  toRework: number;
  isSetUp: boolean;
  /** Worker numbers of those who are on it. */
  crew: Set<string>;
  /** Whose pieces are unfinished from a shift before: they go on first. */
  lastWorker: string | null;
  /** Epoch second of the last report; null while it is open. */
  finishedAt: number | null;
}

/** A ticket on its way through the factory. */
export interface Traveller {
  number: string;
  model: DemoModel;
  option: string;
  order: string;
  dueOn: string;
  /** Epoch second at which it was released to the floor. */
  releasedAt: number;
  /** As released, and what is left of it after scrap. */
  lot: number;
  quantity: number;
  steps: Step[];
  /** Index of the step that is next or running; `steps.length` when all are done. */
  current: number;
  /** The current step may begin from here on: glue has set, coats are hard. */
  readyAt: number;
  /** Epoch second of its end; null while it is open. */
  endedAt: number | null;
}

/** A step that nobody has touched, for so many pieces. */
export function freshStep(operation: DemoOperation, pieces: number): Step {
  return {
    operation,
    toDo: Array.from({ length: pieces }, () => 1),
    inHand: 0,
    toRework: 0,
    isSetUp: operation.setupMinutes === 0,
    crew: new Set(),
    lastWorker: null,
    finishedAt: null,
  };
}

/** The step that is next or running; null where the ticket has ended. */
export function currentStep(traveller: Traveller): Step | null {
  return traveller.endedAt === null ? (traveller.steps[traveller.current] ?? null) : null;
}

/** Pieces of the step without a final count: to do, in hand and to be put right. */
export function openPieces(step: Step): number {
  return step.toDo.length + step.inHand + step.toRework;
}

/**
 * Takes a count into the ticket: good pieces are through, rework waits, scrap is gone. The report that
 * leaves nothing open finishes the step, and the next may begin when the work has rested.
 */
export function countPieces(
  traveller: Traveller,
  step: Step,
  count: { good: number; rework: number; scrap: number; at: number; restsSeconds: number },
): void {
  step.inHand -= count.good + count.rework + count.scrap;
  step.toRework += count.rework;
  traveller.quantity -= count.scrap;
  if (openPieces(step) > 0) return;
  step.finishedAt = count.at;
  traveller.current += 1;
  traveller.readyAt = count.at + count.restsSeconds;
  const next = traveller.steps[traveller.current];
  if (!next || traveller.quantity === 0) traveller.endedAt = count.at;
  else traveller.steps[traveller.current] = freshStep(next.operation, traveller.quantity);
}
