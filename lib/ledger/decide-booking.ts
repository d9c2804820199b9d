import { isSessionOver } from "@/lib/kiosks/session";
import type { KnownSession } from "@/lib/ledger/admit";
import type { BookingContext, Window } from "@/lib/ledger/context";
import {
  type Batch,
  type Decided,
  decideBatch,
  type LedgerRow,
  type ReceivedRecord,
} from "@/lib/ledger/decide";
import type { LooseEndCode, Verdict } from "@/lib/ledger/schema";
import { type Derived, deriveWindow } from "@/lib/timeline/derive";

/** A session proved by what came along with the batch, not by an earlier sign-in. */
export interface ProvedSession {
  session: string;
  worker: string;
  /** The hash of its sealed credential; null where it is trusted otherwise. */
  sealedHash: string | null;
}

export interface NewSession extends KnownSession {
  sealedHash: string | null;
}

/** A worker's window, with the events of the batch, and what they make of it. */
export interface DerivedTimeline {
  workerId: string;
  window: Window;
  derived: Derived;
  /** True where the batch adds to it, so that it must be written. */
  isTouched: boolean;
}

export interface DecidedBooking {
  /** One per record, in the order in which they were sent. */
  results: { id: string; verdict: Verdict; looseEnds: LooseEndCode[] }[];
  /** By worker id, the place of the last record that was proved to be theirs. */
  lastOf: ReadonlyMap<string, number>;
  rows: LedgerRow[];
  timelines: DerivedTimeline[];
  sessions: NewSession[];
}

/**
 * Decides what a batch becomes: verdicts, rows of the ledger, and the timelines of its workers as
 * derived with it. A verdict names the questions of booking and those that the fold hangs on the
 * record.
 */
export function decideBooking(
  records: readonly ReceivedRecord[],
  read: BookingContext,
  batch: Batch & { proved: readonly ProvedSession[] },
): DecidedBooking {
  const sessions = newSessions(records, read, batch.proved);
  const context = { ...read, sessions: [...read.sessions, ...sessions] };
  const first = decideBatch(records, context, batch);
  const derive = (decided: readonly Decided[]) =>
    context.windows.map((window) => deriveTimeline(window, decided, context, batch.receivedMs));
  const attended = derive(first);
  const decided = first.map((one) => withLateness(one, attended, context));
  const isAnyLate = decided.some((one, place) => one !== first[place]);
  const timelines = isAnyLate ? derive(decided) : attended;
  return {
    results: decided.map((one) => resultOf(one, timelines)),
    lastOf: new Map(
      decided.flatMap(({ worker, isProved }, place) =>
        worker && isProved ? [[worker, place] as const] : [],
      ),
    ),
    rows: decided.flatMap(({ row }) => row ?? []),
    timelines,
    sessions,
  };
}

/** Sessions that are proved now and were not known before; opened at their first record. */
function newSessions(
  records: readonly ReceivedRecord[],
  { workers, sessions }: BookingContext,
  proved: readonly ProvedSession[],
): NewSession[] {
  return proved.flatMap(({ session, worker, sealedHash }) => {
    const workerId = workers.find(({ number }) => number === worker)?.id;
    if (!workerId || sessions.some(({ id }) => id === session)) return [];
    const acts = records.flatMap(({ readable }) =>
      readable?.event.session === session ? readable.placed.atMs : [],
    );
    if (acts.length === 0) return [];
    return { id: session, workerId, sealedHash, openedMs: Math.min(...acts) };
  });
}

function deriveTimeline(
  window: Window,
  decided: readonly Decided[],
  { rules }: BookingContext,
  receivedMs: number,
): DerivedTimeline {
  const { workerId } = window;
  const added = decided.flatMap((one) => (one.worker === workerId ? (one.added ?? []) : []));
  const derived = deriveWindow(window, added, { rules, asOfMs: receivedMs });
  const events = [...window.events, ...added];
  return { workerId, window: { ...window, events }, derived, isTouched: added.length > 0 };
}

/** An act after its session was over is booked, and asks (LEDGER.md 9); a lead needs no shift. */
function withLateness(
  decided: Decided,
  timelines: readonly DerivedTimeline[],
  { sessions }: BookingContext,
): Decided {
  const { row, added } = decided;
  const session = sessions.find(({ id }) => id === added?.session);
  if (!row || !added || !session) return decided;
  const timeline = timelines.find(({ workerId }) => workerId === session.workerId);
  const ended = row.by === null ? (timeline?.derived.folded.shifts ?? []) : [];
  const act = { atMs: added.atMs, kind: added.body.kind };
  if (!isSessionOver(session, act, ended)) return decided;
  const questions: LooseEndCode[] = [...added.questions, "session-late"];
  return {
    ...decided,
    looseEnds: questions,
    row: { ...row, questions },
    added: { ...added, questions },
  };
}

function resultOf(decided: Decided, timelines: readonly DerivedTimeline[]) {
  const { id, verdict, looseEnds, added, worker } = decided;
  const folded = timelines.find(({ workerId }) => workerId === worker)?.derived.folded;
  const asked = (folded?.looseEnds ?? []).filter(
    ({ subject, settled }) => subject === added?.id && !settled,
  );
  return { id, verdict, looseEnds: [...new Set([...looseEnds, ...asked.map(({ code }) => code)])] };
}
