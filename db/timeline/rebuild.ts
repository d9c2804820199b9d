import { sql } from "drizzle-orm";
import type { Scope } from "@/db/client";
import { rebuildRollups, sumMarked } from "@/db/seam/commands";
import { judgeMarkedTickets, rebuildTickets } from "@/db/tickets/commands";
import { rebuildTimelines } from "@/db/timeline/commands";

/** How many rows a rebuild put right: all 0 on a sound database. */
export interface Rebuilt {
  timelines: number;
  tickets: number;
  rollups: number;
  receipts: number;
}

/**
 * Makes everything that follows from the ledger again: timelines, then the tickets judged from them,
 * the sums of days, and what was kept without being counted. It must change nothing; what it changes
 * was spoilt. What the background has still to do is done first: that is late, not wrong.
 */
export async function rebuild(scope: Scope): Promise<Rebuilt> {
  while ((await judgeMarkedTickets(scope.db)) > 0);
  while ((await sumMarked(scope.db)) > 0);
  const timelines = await rebuildTimelines(scope);
  const tickets = await rebuildTickets(scope);
  const rollups = await rebuildRollups(scope);
  return { timelines, tickets, rollups, receipts: await rebuildReceipts(scope) };
}

/**
 * The loose ends of records that were kept and not counted, one a record; settled where an answer
 * stands that was not itself taken back.
 */
async function rebuildReceipts({ db, siteId }: Scope): Promise<number> {
  const { rows } = await db.execute<{ changed: number }>(sql`
    with answers as (
      select a.body ->> 'end' as key
      from clock_events a
      where a.site_id = ${siteId} and a.kind = 'settle' and a.kept_for is null
        and not exists (
          select from clock_events v
          where v.site_id = ${siteId} and v.kind = 'void' and v.kept_for is null
            and v.worker_id = a.worker_id and v.target_id = a.id)),
    kept as (
      select e.kept_for as code, e.id::text as subject, e.worker_id, e.kiosk_id,
        coalesce(e.at, e.received_at) as at,
        e.kept_for || ':' || e.id in (select a.key from answers a) as settled
      from clock_events e
      where e.site_id = ${siteId} and e.kept_for is not null
        -- one that was proved later has a second row, which counts
        and not exists (
          select from clock_events c
          where c.site_id = ${siteId} and c.id = e.id and c.kept_for is null)),
    gone as (
      delete from loose_ends l
      where l.site_id = ${siteId} and l.source = 'receipt'
        and (l.code, l.subject) not in (select k.code, k.subject from kept k)
      returning 1),
    added as (
      insert into loose_ends as l (site_id, code, subject, source, worker_id, kiosk_id, at, settled)
      select ${siteId}, k.code, k.subject, 'receipt', k.worker_id, k.kiosk_id, k.at, k.settled
      from kept k
      on conflict (site_id, code, subject) do update
        set settled = excluded.settled
        where l.settled <> excluded.settled
      returning 1)
    select ((select count(*) from gone) + (select count(*) from added))::int as changed`);
  return rows[0]?.changed ?? 0;
}
