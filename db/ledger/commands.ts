import { sql } from "drizzle-orm";
import type { Scope } from "@/db/client";
import { type Booking, payloadOf } from "@/db/ledger/payload";
import { readContext } from "@/db/ledger/queries";
import { receiveRecords } from "@/db/ledger/receive";
import { askedBy } from "@/lib/ledger/asked";
import type { BookingContext } from "@/lib/ledger/context";
import {
  type DecidedBooking,
  decideBooking,
  type ProvedSession,
} from "@/lib/ledger/decide-booking";
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
  const { kioskId, isRevoked = false, proved = [], withBench = false, arrivals } = batch;
  // a timeline is never derived as of a moment before the last of its records came
  const receivedMs = Math.max(batch.receivedAt.getTime(), ...(arrivals ?? []));
  const deviceMs = batch.deviceMs ?? receivedMs;
  const records = receiveRecords(batch.events, { kioskId, receivedMs, deviceMs, arrivals });
  const benchAtMs = withBench ? receivedMs : null;
  const asked = askedBy(records, { kioskId, proved, benchAtMs });
  for (let tries = 0; tries < TRIES_MAX; tries += 1) {
    const context = await readContext(scope, asked);
    const decided = decideBooking(records, context, { kioskId, isRevoked, receivedMs, proved });
    const timelines = decided.timelines.filter(({ isTouched }) => isTouched);
    const isNew = decided.rows.length + decided.sessions.length > 0;
    const booking = { ...decided, timelines, siteId: scope.siteId, kioskId };
    if (!isNew || (await book(scope, booking))) return ok({ ...decided, context });
  }
  return no("unavailable", "Others are booking for the same people. Send it again in a moment.", {
    retryAfterSeconds: 1,
  });
}

/**
 * Writes a booking in one statement; false where a timeline that it was decided on was derived again
 * meanwhile, and nothing was written: read and decide again.
 */
export async function book(scope: Scope, booking: Booking): Promise<boolean> {
  try {
    await scope.db.execute(sql`select book(${booking.siteId}, ${payloadOf(booking)}::jsonb)`);
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
