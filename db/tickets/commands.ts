import { sql } from "drizzle-orm";
import type { Db, Scope } from "@/db/client";
import { keepParts } from "@/db/seam/keep-parts";
import { listTicketBooks } from "@/db/tickets/books";
import { countChanges, type Judgement, judgementOf } from "@/lib/tickets/judgement";

/** How many marks one transaction claims: few enough that a ticket is never locked for long. */
export const CLAIM_MAX = 100;
/** How many tickets a rebuild judges at a time. */
const REBUILD_BATCH = 100;

/**
 * Claims marked tickets and judges each once. The marks go with the same commit as what was made of
 * them, so that a crash in between leaves both; a mark that is booked meanwhile is another row and
 * stays. Two at once claim different marks, and one ticket is judged by one of them at a time.
 *
 * @returns how many marks were claimed; 0 when there is nothing left to do
 */
export async function judgeMarkedTickets(db: Db): Promise<number> {
  return db.transaction(async (tx) => {
    const { rows } = await tx.execute<{ siteId: string; key: string }>(sql`
      with claimed as (
        select m.site_id, m.id
        from dirty_marks m
        where m.kind = 'ticket'
        order by m.id
        limit ${CLAIM_MAX}
        for update skip locked)
      delete from dirty_marks m
      using claimed c
      where m.site_id = c.site_id and m.id = c.id
      returning m.site_id as "siteId", m.key`);
    const sites = new Map<string, Set<string>>();
    for (const { siteId, key } of rows) {
      sites.set(siteId, (sites.get(siteId) ?? new Set()).add(key));
    }
    for (const [siteId, numbers] of [...sites].sort()) {
      await judgeTickets({ db: tx, siteId }, [...numbers].sort());
    }
    return rows.length;
  });
}

/**
 * Judges every ticket of a site again, and every number that was booked to without being one.
 *
 * @returns how many rows were put right; on a sound database none
 */
export async function rebuildTickets(scope: Scope): Promise<number> {
  const { rows } = await scope.db.execute<{ number: string }>(sql`
    select number from tickets where site_id = ${scope.siteId}
    union select ticket from segments where site_id = ${scope.siteId} and ticket is not null
    union select ticket from reports where site_id = ${scope.siteId}
    union select ticket from loose_ends where site_id = ${scope.siteId} and source = 'judge'
    order by 1`);
  let changed = 0;
  for (let from = 0; from < rows.length; from += REBUILD_BATCH) {
    const numbers = rows.slice(from, from + REBUILD_BATCH).map(({ number }) => number);
    changed += await scope.db.transaction((db) => judgeTickets({ ...scope, db }, numbers));
  }
  return changed;
}

/**
 * Judges tickets within a transaction, each locked until its end; answers how many rows changed.
 *
 * @param numbers sorted, so that two transactions never wait for each other
 */
export async function judgeTickets(scope: Scope, numbers: readonly string[]): Promise<number> {
  const { db, siteId } = scope;
  await db.execute(sql`
    select pg_advisory_xact_lock(hashtextextended(${siteId}::text || n.number, 0))
    from unnest(${sql.param(numbers)}::text[]) as n (number)`);
  // in a later statement than the locks, so that it sees what was booked until then
  const books = await listTicketBooks(scope, numbers);
  const judged = books.map((book) => ({ ticket: book.ticket, judgement: judgementOf(book) }));
  const changes = judged.reduce((total, one) => total + countChanges(one.judgement), 0);
  if (changes > 0) {
    await db.execute(sql`select keep_judgement(${siteId}, ${payloadOf(judged)}::jsonb)`);
  }
  return changes + (await keepParts(scope, books));
}

function payloadOf(judged: readonly { ticket: string; judgement: Judgement }[]): string {
  const instant = (ms: number | null) => (ms === null ? null : new Date(ms).toISOString());
  return JSON.stringify({
    operations: judged.flatMap(({ judgement }) =>
      judgement.operations.map((one) => ({
        id: one.id,
        state: one.state,
        good: one.good,
        rework: one.rework,
        scrap: one.scrap,
        open_quantity: one.openQuantity,
        actual_seconds: one.actualSeconds,
        first_work_at: instant(one.firstWorkMs),
        finished_at: instant(one.finishedMs),
      })),
    ),
    tickets: judged.flatMap(({ judgement: { ticket } }) =>
      ticket
        ? { id: ticket.id, status: ticket.status, finished_at: instant(ticket.finishedMs) }
        : [],
    ),
    gone: judged.flatMap(({ judgement }) =>
      judgement.looseEnds.gone.map(({ code, subject }) => ({ code, subject })),
    ),
    loose_ends: judged.flatMap(({ ticket, judgement }) =>
      judgement.looseEnds.changed.map(({ code, subject, worker, atMs, settled }) => {
        return { code, subject, ticket, worker_id: worker, at: instant(atMs), settled };
      }),
    ),
  });
}
