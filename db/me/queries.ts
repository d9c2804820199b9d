import { sql } from "drizzle-orm";
import type { Scope } from "@/db/client";
import type { Change } from "@/lib/me/changes";

/** Who a worker is, for the head of the own page and the badge. */
export interface Me {
  number: string;
  name: string;
  cell: string;
}

/** Finds the worker that an account is; null where it is none. */
export async function findMe({ db, siteId }: Scope, workerId: string): Promise<Me | null> {
  const { rows } = await db.execute<Me & Record<string, unknown>>(sql`
    select w.number, w.name, c.name as cell
    from workers w
    join cells c on c.site_id = w.site_id and c.id = w.home_cell_id
    where w.site_id = ${siteId} and w.id = ${workerId}`);
  return rows[0] ?? null;
}

/** A planned shift, epoch seconds, by its site date. */
export interface PlannedShift {
  date: string;
  start: number;
  end: number;
}

/** Lists what a worker was planned to attend on some dates; for each date the plan entered last. */
export async function listOwnPlanned(
  { db, siteId }: Scope,
  workerId: string,
  { from, to }: { from: string; to: string },
): Promise<PlannedShift[]> {
  const { rows } = await db.execute<PlannedShift & Record<string, unknown>>(sql`
    select distinct on (s.work_on)
      s.work_on::text as date,
      extract(epoch from s.start_at)::integer as start,
      extract(epoch from s.end_at)::integer as end
    from planned_shifts s
    where s.site_id = ${siteId} and s.worker_id = ${workerId}
      and s.work_on >= ${from} and s.work_on < ${to}
    order by s.work_on, s.seq desc`);
  return rows;
}

/** Sums planned seconds by worker on some dates; workers without a plan are left out. */
export async function listPlannedSums(
  { db, siteId }: Scope,
  within: readonly string[] | null,
  { from, to }: { from: string; to: string },
): Promise<ReadonlyMap<string, number>> {
  const { rows } = await db.execute<{ workerId: string; seconds: number }>(sql`
    select p.worker_id as "workerId",
      sum(extract(epoch from p.end_at - p.start_at))::integer as seconds
    from (
      select distinct on (s.worker_id, s.work_on) s.worker_id, s.start_at, s.end_at
      from planned_shifts s
      join workers w on w.site_id = s.site_id and w.id = s.worker_id
      where s.site_id = ${siteId} and s.work_on >= ${from} and s.work_on < ${to}
        ${within === null ? sql`` : sql`and w.home_cell_id = any (${sql.param([...within])}::uuid[])`}
      order by s.worker_id, s.work_on, s.seq desc) p
    group by p.worker_id`);
  return new Map(rows.map(({ workerId, seconds }) => [workerId, seconds]));
}

/** Lists what others altered in a worker's time since an instant, the latest first; agreements aside. */
export async function listChanges(
  { db, siteId }: Scope,
  workerId: string,
  since: Date,
): Promise<Change[]> {
  const { rows } = await db.execute<Change & Record<string, unknown>>(sql`
    select
      e.id,
      e.kind,
      (extract(epoch from e.at) * 1000)::float8 as "atMs",
      (extract(epoch from e.counts_at) * 1000)::float8 as "countsMs",
      coalesce(l.name, a.name, 'the office') as by,
      n.text as note,
      e.body,
      t.kind as "targetKind",
      t.body as "targetBody",
      (extract(epoch from t.at) * 1000)::float8 as "targetMs"
    from clock_events e
    left join workers l on l.site_id = e.site_id and l.number = e.by
    left join accounts a on e.by = 'account:' || a.id
    left join notes n on n.site_id = e.site_id and n.event_id = e.id
    left join clock_events t
      on t.site_id = e.site_id and t.worker_id = e.worker_id and t.id = e.target_id
    where e.site_id = ${siteId} and e.worker_id = ${workerId}
      and e.received_at >= ${since.toISOString()}
      and e.at >= ${since.toISOString()}
      and e.by is not null
      and e.kept_for is null
      and e.kind <> 'confirm'
    order by e.at desc, e.seq desc, e.id desc
    limit 50`);
  return rows;
}
