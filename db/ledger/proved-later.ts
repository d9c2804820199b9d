import { sql } from "drizzle-orm";
import type { Scope } from "@/db/client";
import { bookKept } from "@/db/ledger/commands";
import type { ReceivedRecord } from "@/lib/ledger/decide";
import type { ProvedSession } from "@/lib/ledger/decide-booking";
import { isAhead } from "@/lib/ledger/place";
import type { ClockEvent } from "@/lib/ledger/schema";

/**
 * Books the records of a session that were kept as `unproved`, now that it is proved: each gets a
 * second row in the ledger, which counts. What a person has settled meanwhile stays settled.
 *
 * @returns how many records were booked
 */
export async function bookProvedLater(
  scope: Scope,
  { kioskId, proved, now }: { kioskId: string; proved: ProvedSession; now: Date },
): Promise<number> {
  return scope.db.transaction(async (db) => {
    const within = { ...scope, db };
    const kept = await lockKept(within, { kioskId, session: proved.session });
    if (kept.length === 0) return 0;
    const records = kept.map((row) => recordOf(row, now.getTime()));
    return bookKept(within, { kioskId, proved, records, now });
  });
}

interface Kept {
  id: string;
  kind: string;
  session: string;
  worker: string;
  by: string | null;
  rawMs: number;
  atMs: number;
  uncertaintyMs: number | null;
  receivedMs: number;
  isMeasured: boolean;
  body: object;
  bodyHash: string;
}

/** Their loose ends are locked until the transaction ends, so that nobody settles them meanwhile. */
async function lockKept(
  { db, siteId }: Scope,
  { kioskId, session }: { kioskId: string; session: string },
): Promise<Kept[]> {
  const { rows } = await db.execute<Kept & Record<string, unknown>>(sql`
    select e.id, e.kind, e.session_id as session, e.worker_number as worker, e.by,
      epoch_ms(e.raw_at)::float8 as "rawMs", epoch_ms(e.at)::float8 as "atMs",
      e.uncertainty_ms as "uncertaintyMs", epoch_ms(e.received_at)::float8 as "receivedMs",
      not coalesce('clock-unmeasured' = any (e.questions), false) as "isMeasured",
      e.body, e.body_hash as "bodyHash"
    from loose_ends l
    join clock_events e on e.site_id = ${siteId} and e.id = l.subject::uuid
      and e.kept_for = 'unproved' and e.session_id = ${session} and e.kiosk_id = ${kioskId}
    where l.site_id = ${siteId} and l.code = 'unproved' and l.source = 'receipt' and not l.settled
      and l.kiosk_id = ${kioskId}
    order by e.at, e.seq, e.id
    for update of l`);
  return rows;
}

/** The record as it was read when it came; where it lies in time is not reckoned anew. */
function recordOf(row: Kept, receivedMs: number): ReceivedRecord {
  const { id, kind, session, worker, by, atMs, rawMs, isMeasured, bodyHash } = row;
  const at = new Date(atMs).toISOString();
  const author = by === null ? {} : { by };
  // safe because only what was read as an event is kept as unproved
  const event = { id, kind, session, worker, at, ...author, ...row.body } as ClockEvent;
  const uncertaintyMs = row.uncertaintyMs ?? 0;
  const isFuture = isAhead(event, { atMs, uncertaintyMs, receivedMs: row.receivedMs });
  const placed = { atMs, rawMs, uncertaintyMs, isMeasured, isFuture };
  const readable = { event, placed };
  return { id, clashId: id, hash: bodyHash, text: "", receivedMs, readable };
}
