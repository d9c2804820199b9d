import type { Act } from "@/lib/acts/act";
import { effectiveEvents } from "@/lib/acts/effective";
import { groupBy } from "@/lib/group";
import { inOrder } from "@/lib/ledger/order";
import type { Step } from "@/lib/sheet/cell-sheet";
import type { LedgerEvent } from "@/lib/timeline/schema";

/** What was said of a step: it is done, it is open again after all, it does not apply. */
export type TapKind = "done" | "open" | "skip";

/** One tap on a step of an operation that stands. */
export interface StepTap {
  event: string;
  kind: TapKind;
  step: string;
  /** Number of the worker who tapped. */
  worker: string;
  atMs: number;
  /** What it weighs in a bunch, in whole seconds, as it was stored when it was booked. */
  weight: number;
  /** The word why a step does not apply; null where none was given. */
  reason: string | null;
}

/** An operation handed to a colleague, who has not said yes yet. */
export interface HandOver {
  event: string;
  /** Numbers of the workers. */
  from: string;
  to: string;
  atMs: number;
  reason: string | null;
}

/** An event with whose it is (the worker's number) and the word that came with it. */
export type SaidEvent = LedgerEvent & { worker: string; note: string | null };

/** The same as an act, after all corrections. */
export type SaidAct = Act & { worker: string; note: string | null };

/** Carries out the corrections among some events, each worker's by themselves. */
export function saidActs(events: readonly SaidEvent[]): SaidAct[] {
  return [...groupBy(events, ({ worker }) => worker)].flatMap(([worker, own]) => {
    const notes = new Map(own.map(({ id, note }) => [id, note]));
    return effectiveEvents(own).acts.map((act) => ({
      ...act,
      worker,
      note: notes.get(act.id) ?? null,
    }));
  });
}

const kinds: Partial<Record<Act["body"]["kind"], TapKind>> = {
  "step-done": "done",
  "step-open": "open",
  "step-skip": "skip",
};

interface ItemRef {
  ticket: string;
  operation: string;
}

/**
 * The taps on an operation's steps among some acts, in the ledger's order. One that is not booked yet
 * weighs what its step takes by the routing; a step that is not on it weighs 1.
 */
export function tapsOf(
  acts: readonly SaidAct[],
  item: ItemRef,
  steps: readonly Pick<Step, "step" | "seconds">[],
): StepTap[] {
  return inOrder(acts).flatMap(({ id, body, atMs, worker, weights, note }) => {
    const kind = kinds[body.kind];
    if (!kind || !("step" in body) || !isOf(body, item)) return [];
    const { step } = body;
    const weight = weights[0] ?? steps.find((one) => one.step === step)?.seconds ?? 1;
    return [{ event: id, kind, step, worker, atMs, weight, reason: note }];
  });
}

/**
 * The last hand-over of an operation that was not answered: the colleague has not worked on it since,
 * nor gone back to it whoever gave it away. Null where there is none.
 *
 * @param time who worked on the operation from when on; epoch seconds
 */
export function handOverOf(
  acts: readonly SaidAct[],
  item: ItemRef,
  time: readonly { start: number; worker: string }[],
): HandOver | null {
  const last = inOrder(acts).findLast(({ body }) => body.kind === "hand-over" && isOf(body, item));
  if (last?.body.kind !== "hand-over") return null;
  const { id, body, atMs, worker, note } = last;
  const isTaken = time.some(
    (one) => one.start >= Math.floor(atMs / 1000) && [worker, body.to].includes(one.worker),
  );
  if (isTaken) return null;
  return { event: id, from: worker, to: body.to, atMs, reason: note };
}

function isOf(body: object, { ticket, operation }: ItemRef): boolean {
  return (
    "ticket" in body &&
    "operation" in body &&
    body.ticket === ticket &&
    body.operation === operation
  );
}
