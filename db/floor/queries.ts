import { sql } from "drizzle-orm";
import type { Scope } from "@/db/client";
import type { DueRow, OpenRow } from "@/lib/floor/view";

/**
 * Lists every interval that runs at the site, one row an item, with what is known of its ticket
 * operation: its pieces, all ended time booked to it, and the standards that may hold. One
 * statement, so that nobody is counted twice while they tap.
 */
export async function listOpenRows({ db, siteId }: Scope): Promise<OpenRow[]> {
  const found = await db.execute<OpenRow & Record<string, unknown>>(sql`
    select
      w.number as worker,
      w.name,
      c.name as cell,
      extract(epoch from s.start_at)::integer as since,
      s.item,
      s.activity,
      s.code,
      s.ticket,
      s.operation,
      s.weight,
      o.name as "operationName",
      m.name as model,
      coalesce(chosen.names, '{}') as options,
      t.quantity,
      extract(epoch from done.first_work_at)::integer as "firstWorkAt",
      coalesce(booked.seconds, 0)::integer as "bookedSeconds",
      coalesce(possible.standards, '[]') as standards
    from segments s
    join workers w on w.site_id = s.site_id and w.id = s.worker_id
    left join cells c on c.site_id = s.site_id and c.id = s.cell_id
    left join tickets t on t.site_id = s.site_id and t.number = s.ticket
    left join models m on m.site_id = t.site_id and m.id = t.model_id
    left join operations o on o.site_id = s.site_id and o.code = s.operation
    left join ticket_operations done
      on done.site_id = s.site_id and done.ticket_id = t.id and done.operation_id = o.id
    left join lateral (
      select sum(ended.seconds) as seconds
      from segments ended
      where ended.site_id = s.site_id
        and ended.ticket = s.ticket
        and ended.operation = s.operation
        and ended.end_at is not null
    ) booked on true
    left join lateral (
      select array_agg(p.name order by p.name) as names
      from ticket_options x
      join options p on p.site_id = x.site_id and p.id = x.option_id
      where x.site_id = t.site_id and x.ticket_id = t.id
    ) chosen on true
    left join lateral (
      select json_agg(json_build_object(
        'seq', n.seq,
        'option', p.name,
        'effectiveFrom', n.effective_from,
        'setupSeconds', n.setup_seconds,
        'runSeconds', n.run_seconds)) as standards
      from standards n
      left join options p on p.site_id = n.site_id and p.id = n.option_id
      where n.site_id = t.site_id and n.model_id = t.model_id and n.operation_id = o.id
    ) possible on true
    where s.site_id = ${siteId} and s.end_at is null
    order by w.name, w.number, s.item`);
  return found.rows;
}

/**
 * Lists who is planned to be in at an instant and is not, by name: for each worker the plan that
 * counts for a date is the one entered last.
 */
export async function listMissing({ db, siteId }: Scope, now: Date): Promise<DueRow[]> {
  const at = sql`${now.toISOString()}::timestamptz`;
  const found = await db.execute<DueRow & Record<string, unknown>>(sql`
    select
      w.number as worker,
      w.name,
      c.name as cell,
      extract(epoch from p.start_at)::integer as "plannedAt"
    from planned_shifts p
    join workers w on w.site_id = p.site_id and w.id = p.worker_id
    join cells c on c.site_id = w.site_id and c.id = w.home_cell_id
    where p.site_id = ${siteId}
      and p.start_at <= ${at}
      and p.start_at > ${at} - interval '36 hours'
      and p.end_at > ${at}
      and not exists (
        select from planned_shifts later
        where later.site_id = p.site_id
          and later.worker_id = p.worker_id
          and later.work_on = p.work_on
          and later.seq > p.seq)
      and not exists (
        select from shifts running
        where running.site_id = p.site_id
          and running.worker_id = p.worker_id
          and running.end_at is null)
    order by w.name, w.number`);
  return found.rows;
}

/** Finds the next planned start after an instant, in epoch seconds; null where none is planned. */
export async function findNextStart({ db, siteId }: Scope, now: Date): Promise<number | null> {
  const found = await db.execute<{ at: number | null }>(sql`
    select extract(epoch from min(p.start_at))::integer as at
    from planned_shifts p
    where p.site_id = ${siteId} and p.start_at > ${now.toISOString()}::timestamptz`);
  return found.rows[0]?.at ?? null;
}
