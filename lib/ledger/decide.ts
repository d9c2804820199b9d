import { actCell, cellsServedAt } from "@/lib/ledger/act-cell";
import { type KeptCode, keptFor } from "@/lib/ledger/admit";
import type { BookingContext } from "@/lib/ledger/context";
import { effectMs, type Placed } from "@/lib/ledger/place";
import type { ClockEvent, EventBody, Item, LooseEndCode, Verdict } from "@/lib/ledger/schema";
import { actOf, namedItems, sharedItems, targetOf } from "@/lib/ledger/target";
import { stepWeight, weigh } from "@/lib/ledger/weigh";
import type { LedgerEvent } from "@/lib/timeline/schema";

/** One record of a batch, read as far as it can be, with what identifies it. */
export interface ReceivedRecord {
  /** Its own id, or the one made of its bytes where it cannot be read. */
  id: string;
  /** The id that it gets where another record has its own already. */
  clashId: string;
  hash: string;
  /** The record as it came, as text; all that there is of one that cannot be read. */
  text: string;
  /** When the server had it. */
  receivedMs: number;
  /** Null where it cannot be read or placed in time. */
  readable: { event: ClockEvent; placed: Placed } | null;
}

/** A row of the ledger; instants are epoch milliseconds. */
export interface LedgerRow {
  id: string;
  receivedMs: number;
  kind: string;
  workerId: string | null;
  workerNumber: string | null;
  sessionId: string | null;
  by: string | null;
  rawMs: number | null;
  atMs: number | null;
  targetId: string | null;
  countsMs: number | null;
  uncertaintyMs: number | null;
  seq: number | null;
  cellId: string | null;
  weights: number[] | null;
  keptFor: KeptCode | null;
  questions: LooseEndCode[] | null;
  body: unknown;
  bodyHash: string;
  note: string | null;
}

/** What becomes of one record. */
export interface Decided {
  /** The id under which it is answered. */
  id: string;
  verdict: Verdict;
  looseEnds: LooseEndCode[];
  /** Null for a duplicate: nothing is written. */
  row: LedgerRow | null;
  /** The event as the fold reads it; null where it does not count. */
  added: LedgerEvent | null;
  worker: string | null;
  /** True where it was proved that the worker made it, or made it before. */
  isProved: boolean;
}

/** What holds for a whole batch beside the context. */
export interface Batch {
  kioskId: string;
  isRevoked: boolean;
  receivedMs: number;
}

/** Decides what becomes of each record of a batch, in the order in which they came. */
export function decideBatch(
  records: readonly ReceivedRecord[],
  context: BookingContext,
  batch: Batch,
): Decided[] {
  const known = new Map(context.known.map((row) => [row.id, row]));
  return records.map((record) => {
    const decided = decideRecord(record, known, context, batch);
    if (decided.row) {
      const { id, bodyHash, keptFor, questions } = decided.row;
      known.set(id, { id, bodyHash, keptFor, questions });
    }
    return decided;
  });
}

function decideRecord(
  record: ReceivedRecord,
  known: ReadonlyMap<string, BookingContext["known"][number]>,
  context: BookingContext,
  batch: Batch,
): Decided {
  const { readable } = record;
  const other = known.get(record.id);
  const isClash = other !== undefined && other.bodyHash !== record.hash;
  const before = isClash ? known.get(record.clashId) : other;
  if (before) return duplicate(record, before, context);
  if (!readable) return unreadable(record);
  const around = knownAround(readable.event, readable.placed, context, batch);
  const kept = isClash ? "id-clash" : keptFor(readable.event, readable.placed, around);
  const row = rowOf({ ...record, ...readable }, { context, around, kept });
  if (isClash) row.id = record.clashId;
  const isProved = kept === null;
  return {
    id: record.id,
    verdict: isProved ? "booked" : "looseEnd",
    looseEnds: kept ? [kept] : (row.questions ?? []),
    row,
    added: isProved ? ledgerEvent(row, readable.event, batch) : null,
    worker: around.worker?.id ?? null,
    isProved,
  };
}

function duplicate(
  { id, readable }: ReceivedRecord,
  { keptFor: kept, questions }: BookingContext["known"][number],
  context: BookingContext,
): Decided {
  const worker = context.workers.find(({ number }) => number === readable?.event.worker);
  return {
    id,
    verdict: "duplicate",
    // safe because only codes are ever written into these columns
    looseEnds: (kept ? [kept] : (questions ?? [])) as LooseEndCode[],
    row: null,
    added: null,
    worker: worker?.id ?? null,
    isProved: kept === null,
  };
}

function unreadable({ id, hash, text, receivedMs }: ReceivedRecord): Decided {
  const nothing = {
    workerId: null,
    workerNumber: null,
    sessionId: null,
    by: null,
    rawMs: null,
    atMs: null,
    targetId: null,
    countsMs: null,
    uncertaintyMs: null,
    seq: null,
    cellId: null,
    weights: null,
    questions: null,
    note: null,
  };
  const kept = { keptFor: "unreadable", kind: "unreadable" } as const;
  const row = { ...nothing, ...kept, id, receivedMs, body: { raw: text }, bodyHash: hash };
  return {
    id,
    verdict: "looseEnd",
    looseEnds: ["unreadable"],
    row,
    added: null,
    worker: null,
    isProved: false,
  };
}

function knownAround(event: ClockEvent, placed: Placed, context: BookingContext, batch: Batch) {
  const { workers, sessions, served } = context;
  return {
    isRevoked: batch.isRevoked,
    kioskCells: cellsServedAt(served, placed.atMs),
    worker: workers.find(({ number }) => number === event.worker),
    by: workers.find(({ number }) => number === event.by),
    session: sessions.find(({ id }) => id === event.session),
  };
}

function rowOf(
  { id, hash, event, placed, receivedMs }: ReceivedRecord & { event: ClockEvent; placed: Placed },
  decision: {
    context: BookingContext;
    around: ReturnType<typeof knownAround>;
    kept: KeptCode | null;
  },
): LedgerRow {
  const { context, around, kept } = decision;
  const act = actOf(event);
  const factsOf = ({ ticket, operation }: Item) =>
    context.facts.find((facts) => facts.ticket === ticket && facts.operation === operation);
  const [first] = namedItems(act);
  const items = sharedItems(act);
  return {
    id,
    receivedMs,
    kind: event.kind,
    workerId: around.worker?.id ?? null,
    workerNumber: event.worker,
    sessionId: event.session,
    by: event.by ?? null,
    rawMs: placed.rawMs,
    atMs: placed.atMs,
    targetId: targetOf(event),
    countsMs: effectMs(event),
    uncertaintyMs: placed.uncertaintyMs,
    seq: event.clock.seq,
    cellId: actCell({
      served: around.kioskCells,
      operationCell: (first && factsOf(first)?.cellId) ?? null,
      isByLead: event.by !== undefined,
    }),
    weights: items.length
      ? weigh(items, factsOf, { ...context, atMs: placed.atMs })
      : stepWeight(act, first && factsOf(first)),
    keptFor: kept,
    questions: placed.isMeasured ? null : ["clock-unmeasured"],
    body: { v: event.v, clock: event.clock, ...bodyOf(event) },
    bodyHash: hash,
    note: event.note ?? null,
  };
}

/** What of an event is its own: the rest has columns. */
function bodyOf(event: ClockEvent): EventBody {
  const { id, v, session, worker, at, clock, by, note, ...body } = event;
  // safe because an event is a head and a body
  return body as EventBody;
}

function ledgerEvent(row: LedgerRow, event: ClockEvent, batch: Batch): LedgerEvent {
  return {
    id: row.id,
    atMs: row.atMs ?? row.receivedMs,
    seq: event.clock.seq,
    kiosk: batch.kioskId,
    session: event.session,
    cell: row.cellId,
    by: row.by,
    receivedMs: row.receivedMs,
    weights: row.weights ?? [],
    questions: row.questions ?? [],
    body: bodyOf(event),
  };
}
