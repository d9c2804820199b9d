import { sql } from "drizzle-orm";
import type { Scope } from "@/db/client";
import { closingKey } from "@/db/ledger/closing-lock";
import { type Booking, payloadOf } from "@/db/ledger/payload";
import { readContext, readContexts } from "@/db/ledger/queries";
import { receiveRecords } from "@/db/ledger/receive";
import { askedBy } from "@/lib/ledger/asked";
import type { BookingContext } from "@/lib/ledger/context";
import type { ReceivedRecord } from "@/lib/ledger/decide";
import {
  type DecidedBooking,
  decideBooking,
  type ProvedSession,
} from "@/lib/ledger/decide-booking";
import { fitTogether } from "@/lib/ledger/together";
import { no, ok, type Result } from "@/lib/result";

/** A batch as it comes from a kiosk, or as a scenario makes it. */
export interface IncomingBatch {
  kioskId: string;
  /** A kiosk taken out of use still hands in what it kept: all of it as loose ends. */
  isRevoked?: boolean;
  events: readonly unknown[];
  receivedAt: Date;
  /** When each record came, epoch milliseconds: of a history, which is not handed in at once. */
  arrivals?: readonly number[];
  /** What the tablet's own clock showed when it sent them; as received unless given. */
  deviceMs?: number;
  /** Sessions proved by what came along; those opened by a sign-in are known. */
  proved?: readonly ProvedSession[];
  /** Whether what a bench shows shall be read along. */
  withBench?: boolean;
}

export interface BookedBatch extends DecidedBooking {
  /** What was known when the batch was decided. */
  context: BookingContext;
}

/** How often a batch is decided again because somebody else booked meanwhile (LEDGER.md 8). */
const TRIES_MAX = 5;

/**
 * Books a batch: every record gets a verdict, and all that follows is written in one statement or
 * not at all. Sent twice it books once. Two statements, where nobody books for the same workers.
 */
export async function bookEvents(scope: Scope, batch: IncomingBatch): Promise<Result<BookedBatch>> {
  const [booked] = await bookBatches(scope, [batch]);
  return booked!; // safe because there is one answer a batch
}

/**
 * Books several batches together, each as if it came alone: one statement reads for all of them, one
 * writes. Those that meet in a worker, a record or a kiosk are booked one after the other.
 *
 * @returns one a batch, in their order
 */
export async function bookBatches(
  scope: Scope,
  batches: readonly IncomingBatch[],
): Promise<Result<BookedBatch>[]> {
  const received = batches.map(receive);
  const booked = new Map<Received, BookedBatch>();
  let waiting = received;
  for (let tries = 0; tries < TRIES_MAX && waiting.length > 0; ) {
    const contexts = await readContexts(
      scope,
      waiting.map(({ asked }) => asked),
    );
    // safe because there is one context a batch
    const decided = waiting.map((one, at) => decide(one, contexts[at]!));
    const fits = fitTogether(decided);
    const together = decided.filter((_, at) => fits[at]);
    if (await bookTogether(scope, together)) {
      for (const { one, ...batch } of together) booked.set(one, batch);
      waiting = waiting.filter((one) => !booked.has(one));
    } else tries += 1;
  }
  return received.map((one) => {
    const batch = booked.get(one);
    return batch ? ok(batch) : no("unavailable", BUSY, { retryAfterSeconds: 1 });
  });
}

const BUSY = "Others are booking for the same people. Send it again in a moment.";

/** A batch as it was received, with what must be known to decide it. */
type Received = ReturnType<typeof receive>;

function receive(batch: IncomingBatch) {
  const { kioskId, isRevoked = false, proved = [], withBench = false, arrivals } = batch;
  // a timeline is never derived as of a moment before the last of its records came
  const receivedMs = Math.max(batch.receivedAt.getTime(), ...(arrivals ?? []));
  const deviceMs = batch.deviceMs ?? receivedMs;
  const records = receiveRecords(batch.events, { kioskId, receivedMs, deviceMs, arrivals });
  const benchAtMs = withBench ? receivedMs : null;
  const asked = askedBy(records, { kioskId, proved, benchAtMs });
  return { records, asked, batch: { kioskId, isRevoked, receivedMs, proved } };
}

function decide(one: Received, context: BookingContext) {
  const decided = decideBooking(one.records, context, one.batch);
  return { ...decided, context, one, kioskId: one.batch.kioskId };
}

/**
 * Books records that were kept because nothing proved them, now that their session is proved. What is
 * to be kept for another reason stays as it is.
 *
 * @returns how many were booked
 */
export async function bookKept(
  scope: Scope,
  kept: {
    kioskId: string;
    proved: ProvedSession;
    records: readonly ReceivedRecord[];
    now: Date;
  },
): Promise<number> {
  const { kioskId, records } = kept;
  const batch = {
    kioskId,
    receivedMs: kept.now.getTime(),
    isRevoked: false,
    proved: [kept.proved],
  };
  const asked = askedBy(records, { ...batch, benchAtMs: null });
  const read = await readContext(scope, asked);
  const known = read.known.filter(({ keptFor }) => keptFor !== "unproved");
  const decided = decideBooking(records, { ...read, known }, batch);
  const rows = decided.rows.filter(({ keptFor }) => keptFor === null);
  if (rows.length === 0) return 0;
  const timelines = decided.timelines.filter(({ isTouched }) => isTouched);
  const booking = { ...decided, rows, timelines, siteId: scope.siteId, kioskId, isAgain: true };
  if (await book(scope, booking)) return rows.length;
  throw new Error("somebody booked for the same people: it is tried again later");
}

/** Nothing is written where nothing is new. */
async function bookTogether(
  scope: Scope,
  decided: readonly ReturnType<typeof decide>[],
): Promise<boolean> {
  const bookings = decided
    .filter(({ rows, sessions }) => rows.length + sessions.length > 0)
    .map((one) => ({
      ...one,
      siteId: scope.siteId,
      timelines: one.timelines.filter(({ isTouched }) => isTouched),
    }));
  return bookings.length === 0 || bookAll(scope, bookings);
}

/**
 * Writes a booking in one statement; false where a timeline that it was decided on was derived again
 * meanwhile, and nothing was written: read and decide again.
 */
export async function book(scope: Scope, booking: Booking): Promise<boolean> {
  return bookAll(scope, [booking]);
}

async function bookAll(scope: Scope, bookings: readonly Booking[]): Promise<boolean> {
  try {
    await scope.db.execute(sql`select book(${scope.siteId}, ${payloadOf(bookings)}::jsonb)
      from pg_advisory_xact_lock_shared(${closingKey(scope.siteId)})`);
    return true;
  } catch (error) {
    if (isInterference(error)) return false;
    throw error;
  }
}

/**
 * Says whether a statement failed because somebody else wrote meanwhile: BM001 is raised by `book`;
 * a deadlock is the same thing seen by the database.
 */
export function isInterference(error: unknown): boolean {
  const cause = error instanceof Error ? (error.cause ?? error) : error;
  const code = typeof cause === "object" && cause && "code" in cause ? cause.code : null;
  return code === "BM001" || code === "40P01";
}
