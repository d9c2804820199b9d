import { sql } from "drizzle-orm";
import type { Scope } from "@/db/client";
import type { EarningReport } from "@/lib/standards/earned";

/** A ticket's operation as the database has it, for a replay and for what a change does. */
export interface ReplayedRow {
  ticket: string;
  isOpen: boolean;
  openQuantity: number;
  good: number;
  quantity: number;
  firstWorkMs: number | null;
  firstCountMs: number | null;
  finishedMs: number | null;
  /** All time booked to it, without that of its rework operations. */
  actualSeconds: number;
  options: string[];
  setupEarned: "first-good" | "when-booked";
  /** In the ledger's order; those of its rework operations are not among them. */
  reports: (EarningReport & { atMs: number })[];
}

/**
 * Lists one operation of a model's tickets: those that are open, and those begun or finished since
 * an instant. One statement.
 */
export async function listReplayed(
  { db, siteId }: Scope,
  { model, operation, since }: { model: string; operation: string; since: Date },
): Promise<ReplayedRow[]> {
  const from = sql`${since.toISOString()}::timestamptz`;
  const { rows } = await db.execute<{ rows: ReplayedRow[] }>(sql`
    select coalesce(jsonb_agg(jsonb_build_object(
      'ticket', t.number,
      'isOpen', t.status = 'open' and p.state not in ('finished', 'closed'),
      'openQuantity', p.open_quantity,
      'good', p.good,
      'quantity', p.good + p.scrap + p.open_quantity,
      'firstWorkMs', epoch_ms(p.first_work_at),
      'firstCountMs', epoch_ms(counted.first_at),
      'finishedMs', epoch_ms(p.finished_at),
      'actualSeconds', coalesce(m.actual_seconds, p.actual_seconds),
      'options', array(
        select x.name from ticket_options c
        join options x on x.site_id = c.site_id and x.id = c.option_id
        where c.site_id = t.site_id and c.ticket_id = t.id
        order by x.name),
      'setupEarned', o.setup_earned,
      'reports', counted.reports) order by t.seq), '[]') as rows
    from ticket_operations p
    join operations o on o.site_id = p.site_id and o.id = p.operation_id
    join tickets t on t.site_id = p.site_id and t.id = p.ticket_id
    join models n on n.site_id = t.site_id and n.id = t.model_id
    left join lateral (
      select sum(q.actual_seconds) as actual_seconds
      from matched_parts q
      where q.site_id = p.site_id and q.ticket = t.number and q.operation = o.code
        and q.rework = '') m on true
    left join lateral (
      select min(r.at) as first_at,
        coalesce(jsonb_agg(jsonb_build_object(
          'event', r.id, 'kind', r.kind, 'good', r.good, 'rework', r.rework, 'scrap', r.scrap,
          'atMs', epoch_ms(r.at)) order by r.at, r.id)
          filter (where p.finished_at is null or r.at <= p.finished_at), '[]') as reports
      from reports r
      where r.site_id = p.site_id and r.ticket = t.number and r.operation = o.code) counted on true
    where p.site_id = ${siteId} and n.name = ${model} and o.code = ${operation}
      and ((t.status = 'open' and p.state not in ('finished', 'closed'))
        or p.finished_at >= ${from} or p.first_work_at >= ${from})`);
  return rows[0]?.rows ?? [];
}
