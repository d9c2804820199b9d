import { sql } from "drizzle-orm";
import type { Scope } from "@/db/client";
import { rebuildTickets } from "@/db/tickets/commands";
import { rebuildTimelines } from "@/db/timeline/commands";

/** How many rows a rebuild put right: all 0 on a sound database. */
export interface Rebuilt {
  timelines: number;
  tickets: number;
  receipts: number;
}

/**
 * Makes everything that follows from the ledger again: timelines, then the tickets judged from them,
 * and what was kept without being counted. It must change nothing; what it changes was spoilt.
 */
export async function rebuild(scope: Scope): Promise<Rebuilt> {
  const timelines = await rebuildTimelines(scope);
  const tickets = await rebuildTickets(scope);
  return { timelines, tickets, receipts: await rebuildReceipts(scope) };
}

/** The loose ends of records that were kept and not counted, one a record. */
async function rebuildReceipts({ db, siteId }: Scope): Promise<number> {
  const { rows } = await db.execute<{ changed: number }>(sql`
    with kept as (
      select e.kept_for as code, e.id::text as subject, e.worker_id, e.kiosk_id,
        coalesce(e.at, e.received_at) as at
      from clock_events e
      where e.site_id = ${siteId} and e.kept_for is not null),
    gone as (
      delete from loose_ends l
      where l.site_id = ${siteId} and l.source = 'receipt'
        and (l.code, l.subject) not in (select k.code, k.subject from kept k)
      returning 1),
    added as (
      insert into loose_ends (site_id, code, subject, source, worker_id, kiosk_id, at)
      select ${siteId}, k.code, k.subject, 'receipt', k.worker_id, k.kiosk_id, k.at
      from kept k
      on conflict (site_id, code, subject) do nothing
      returning 1)
    select ((select count(*) from gone) + (select count(*) from added))::int as changed`);
  return rows[0]?.changed ?? 0;
}
