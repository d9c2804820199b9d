import { insertedAct } from "@/lib/acts/act";
import { effectiveEvents } from "@/lib/acts/effective";
import { actCell } from "@/lib/ledger/act-cell";
import type { BookingContext, Window } from "@/lib/ledger/context";
import type { LedgerRow } from "@/lib/ledger/decide";
import type { DerivedTimeline } from "@/lib/ledger/decide-booking";
import { effectMs } from "@/lib/ledger/place";
import type { EventBody, Item } from "@/lib/ledger/schema";
import { namedItems, sharedItems, targetOf } from "@/lib/ledger/target";
import { weigh } from "@/lib/ledger/weigh";
import { no, ok, type Result } from "@/lib/result";
import { deriveWindow } from "@/lib/timeline/derive";
import type { LedgerEvent } from "@/lib/timeline/schema";
import { settlementsOf } from "@/lib/timeline/settlements";

/** One record that somebody enters in the office or on a phone: no kiosk, no session. */
export interface OfficeAct {
  /** Made with the form: sent twice it books once. */
  id: string;
  hash: string;
  /** Number of the worker whose record it is; null where a kept record names nobody known. */
  worker: string | null;
  body: EventBody;
  note: string | null;
}

/** Who enters it and when. */
export interface OfficeEntry {
  /** `account:<id>` of whoever enters it for somebody; null where it is one's own. */
  by: string | null;
  nowMs: number;
}

/** What office acts become: rows of the ledger and the timelines that follow. */
export interface DecidedOffice {
  rows: LedgerRow[];
  timelines: DerivedTimeline[];
}

/** A clock in an office may be this much ahead of the server's. */
const SLACK_MS = 60_000;

/**
 * Decides office acts as a batch of a kiosk is decided, but all or nothing: a person waits for the
 * answer, so what cannot be is refused in words. Acts that are in the ledger already are left out;
 * all of them there means that the form was sent twice, and nothing is to be written.
 */
export function decideOffice(
  acts: readonly OfficeAct[],
  context: BookingContext,
  entry: OfficeEntry,
): Result<DecidedOffice> {
  const known = new Map(context.known.map((row) => [row.id, row]));
  const isReused = acts.some(({ id, hash }) => known.has(id) && known.get(id)?.bodyHash !== hash);
  if (isReused) return no("conflict", "This form was used before. Load the page again.");
  const fresh = acts.filter(({ id }) => !known.has(id));
  for (const act of fresh) {
    const refusal = refused(act, context, entry);
    if (refusal) return refusal;
  }
  const rows = fresh.map((act, place) => rowOf(act, { ...entry, context, seq: place }));
  const timelines = context.windows.flatMap((window): DerivedTimeline[] => {
    const added = rows.filter(({ workerId }) => workerId === window.workerId).map(eventOf);
    if (added.length === 0) return [];
    const { rules } = context;
    const derived = deriveWindow(window, added, { rules, asOfMs: entry.nowMs });
    const events = [...window.events, ...added];
    const { workerId } = window;
    return [{ workerId, window: { ...window, events }, derived, isTouched: true }];
  });
  return ok({ rows, timelines });
}

function refused({ worker, body }: OfficeAct, context: BookingContext, { nowMs }: OfficeEntry) {
  const found = context.workers.find(({ number }) => number === worker);
  if (worker !== null && !found) return no("notFound", `${worker} is no worker here.`);
  const window = context.windows.find(({ workerId }) => workerId === found?.id);
  const counts = effectMs(body);
  if (counts !== null && counts > nowMs + SLACK_MS)
    return no("invalid", "That is still to come. Give a time that has passed.");
  if (body.kind === "insert" && !insertedAct(body))
    return no("invalid", "That record cannot be entered. Leave it out, with the reason.");
  if (!window) return null;
  if (body.kind === "void" || body.kind === "move") return refusedTarget(body.event, window);
  if (body.kind === "settle" && isSettled(body.end, window))
    return no("conflict", "Someone settled this meanwhile. Look at the list again.");
  return null;
}

/** What is taken out or moved must be there, and must not have been taken out before. */
function refusedTarget(target: string, { events }: Window) {
  if (!events.some(({ id }) => id === target))
    return no("notFound", "That record is not this worker's. Load the page again.");
  const isThere = effectiveEvents(events).standing.some(({ id }) => id === target);
  return isThere ? null : no("conflict", "That record was taken out meanwhile.");
}

function isSettled(end: string, { events }: Window): boolean {
  return settlementsOf(effectiveEvents(events).standing).has(end);
}

function rowOf(
  { id, hash, worker, body, note }: OfficeAct,
  entry: OfficeEntry & { context: BookingContext; seq: number },
): LedgerRow {
  const { context, by, nowMs, seq } = entry;
  const inserted = insertedAct(body);
  const act = inserted?.body ?? body;
  const atMs = inserted?.atMs ?? nowMs;
  const factsOf = ({ ticket, operation }: Item) =>
    context.facts.find((facts) => facts.ticket === ticket && facts.operation === operation);
  const [first] = namedItems(act);
  const items = sharedItems(act);
  const operationCell = (first && factsOf(first)?.cellId) ?? null;
  return {
    id,
    receivedMs: nowMs,
    kind: body.kind,
    workerId: context.workers.find(({ number }) => number === worker)?.id ?? null,
    workerNumber: worker,
    sessionId: null,
    by,
    rawMs: null,
    atMs: nowMs,
    targetId: targetOf(body),
    countsMs: effectMs(body),
    uncertaintyMs: null,
    seq,
    cellId: actCell({ served: [], operationCell, isByLead: true }),
    weights: items.length ? weigh(items, factsOf, { rules: context.rules, atMs }) : null,
    keptFor: null,
    questions: null,
    body: { v: 1, ...body },
    bodyHash: hash,
    note,
  };
}

function eventOf(row: LedgerRow): LedgerEvent {
  const { v, ...body } = row.body as { v: number } & EventBody; // safe because rowOf wrote it so
  return {
    id: row.id,
    atMs: row.receivedMs,
    seq: row.seq ?? 0,
    kiosk: null,
    session: "",
    cell: row.cellId,
    by: row.by,
    receivedMs: row.receivedMs,
    weights: row.weights ?? [],
    questions: [],
    // safe because a body without its version is the act's own
    body: body as EventBody,
  };
}
