import type { z } from "zod";
import { type EventBody, eventBodies } from "@/lib/ledger/schema";
import { instantMs } from "@/lib/time/instant";
import type { LedgerEvent } from "@/lib/timeline/schema";

/** A ticket operation by name. */
export interface ItemRef {
  ticket: string;
  operation: string;
}

/** An event as it counts after all corrections, with what it takes out of the work. */
export interface Act extends LedgerEvent {
  /** The items that leave the work at it; "all" ends whatever is being done. */
  out: readonly ItemRef[] | "all";
  /** The shift that an answer ends by name (its start's event); null for every tap. */
  closes: string | null;
}

/** Kinds that say what a person does from then on: without an open shift each starts one. */
const changes = ["break-start", "break-end", "work", "indirect"];
/** Kinds that record work at a bench: tapped there by the worker, they start a shift too. */
const records = ["pause", "report", "inspect", "hand-over", "step-done", "step-open", "step-skip"];
/** Kinds that only show that the worker was there. */
const signs = ["reading", "caution-read", "reassign"];

/** Says whether an act without an open shift starts one. */
export function startsShift({ body, by }: LedgerEvent): boolean {
  return changes.includes(body.kind) || (by === null && records.includes(body.kind));
}

/**
 * Says whether an act shows that the worker was there: the last such act bounds a shift that nobody
 * ended. What a lead counts for a worker does not, what a lead says that the worker did does.
 */
export function isPresence(event: LedgerEvent): boolean {
  const { kind } = event.body;
  if (kind === "shift-start" || kind === "shift-end") return true;
  return startsShift(event) || (event.by === null && signs.includes(kind));
}

/** The items that an event takes out of the work: a count with `stop`, a pause, a hand-over. */
export function takenOut(body: EventBody): ItemRef[] {
  switch (body.kind) {
    case "report":
      return body.stop ? [itemRef(body)] : [];
    case "hand-over":
      return [itemRef(body)];
    case "pause":
      return body.items.map(itemRef);
    default:
      return [];
  }
}

/** Says whether two names are of the same ticket operation. */
export function isSameItem(a: ItemRef, b: ItemRef): boolean {
  return a.ticket === b.ticket && a.operation === b.operation;
}

/** The name of a ticket operation alone, without weight or counts. */
export function itemRef({ ticket, operation }: ItemRef): ItemRef {
  return { ticket, operation };
}

/**
 * The act that a lead entered whole, and when it happened; null where the record holds none that
 * says or counts what a person did. Fields that travel with every event are left out of the body.
 */
export function insertedAct(body: EventBody): { atMs: number; body: EventBody } | null {
  if (body.kind !== "insert") return null;
  const { event } = body;
  const kind = insertable.find((one) => one === event.kind);
  const atMs = typeof event.at === "string" ? instantMs(event.at) : null;
  const read = kind && bodySchema(kind).safeParse(event);
  if (!kind || atMs === null || !read?.success) return null;
  // safe because the body was just read by the schema of that kind
  return { atMs, body: { kind, ...read.data } as EventBody };
}

const insertable = [
  "shift-start",
  "shift-end",
  "break-start",
  "break-end",
  "work",
  "indirect",
  "pause",
  "report",
  "inspect",
  "hand-over",
  "step-done",
  "step-open",
  "step-skip",
  "reading",
] as const;

/** Making a schema takes a millisecond, and a fold may read it often: each is made once. */
const bodySchemas = new Map<string, { safeParse: z.ZodObject["safeParse"] }>();

/** A kind's body, what travels with every event left out. */
function bodySchema(kind: (typeof insertable)[number]) {
  const made = bodySchemas.get(kind) ?? eventBodies[kind].strip();
  bodySchemas.set(kind, made);
  return made;
}
