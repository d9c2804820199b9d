import { sql } from "drizzle-orm";
import type { Scope } from "@/db/client";
import type { BookedPart, MatchedPart, OverPart } from "@/lib/matching/parts";
import type { SetupTime } from "@/lib/matching/setups";
import type { SiteRules } from "@/lib/timeline/schema";

/** What the parts of a ticket are kept under: whose they are. */
interface Owner {
  ticket: string;
  modelId: string;
  /** Sorted. */
  optionIds: readonly string[];
}

export type KeptBooked = BookedPart & Owner;
export type KeptMatched = MatchedPart & Owner;
export type KeptOver = OverPart & Owner;

/** What is known of the tickets and kept of their parts, and what holds at the site. */
export interface PartsContext {
  rules: SiteRules[];
  whenBooked: string[];
  owners: Owner[];
  booked: KeptBooked[];
  matched: KeptMatched[];
  over: KeptOver[];
}

/** Reads all that the parts of some tickets need beside their books; one statement. */
export async function readPartsContext(
  { db, siteId }: Scope,
  numbers: readonly string[],
): Promise<PartsContext> {
  const wanted = sql`${siteId} and p.ticket = any (${sql.param(numbers)}::text[])`;
  const { rows } = await db.execute<{ context: PartsContext }>(sql`
    select jsonb_build_object(
      'rules', site_rules_of(${siteId}),
      'whenBooked', array(
        select o.code from operations o
        where o.site_id = ${siteId} and o.setup_earned = 'when-booked'),
      'owners', (
        select coalesce(jsonb_agg(jsonb_build_object(
          'ticket', t.number, 'modelId', t.model_id, 'optionIds', array(
            select c.option_id from ticket_options c
            where c.site_id = ${siteId} and c.ticket_id = t.id
            order by 1))), '[]')
        from tickets t
        where t.site_id = ${siteId} and t.number = any (${sql.param(numbers)}::text[])),
      'booked', (
        select coalesce(jsonb_agg(jsonb_build_object(
          'ticket', p.ticket, 'modelId', p.model_id, 'optionIds', p.option_ids,
          'operation', p.operation, 'day', p.day, 'cell', p.cell_id, 'activity', p.activity,
          'seconds', p.seconds, 'noStandardSeconds', p.no_standard_seconds,
          'elsewhereSeconds', p.elsewhere_seconds, 'pieces', p.pieces,
          'firstMs', epoch_ms(p.first_at))), '[]')
        from booked_parts p
        where p.site_id = ${wanted}),
      'matched', (
        select coalesce(jsonb_agg(jsonb_build_object(
          'ticket', p.ticket, 'modelId', p.model_id, 'optionIds', p.option_ids,
          'operation', p.operation, 'rework', p.rework, 'day', p.day, 'cell', p.cell_id,
          'pieces', p.pieces, 'actualSeconds', p.actual_seconds,
          'reworkSeconds', p.rework_seconds, 'elsewhereSeconds', p.elsewhere_seconds,
          'noStandardSeconds', p.no_standard_seconds,
          'noStandardReworkSeconds', p.no_standard_rework_seconds,
          'earnedSeconds', p.earned_seconds,
          'reportEarnedSeconds', p.report_earned_seconds)), '[]')
        from matched_parts p
        where p.site_id = ${wanted}),
      'over', (
        select coalesce(jsonb_agg(jsonb_build_object(
          'ticket', p.ticket, 'modelId', p.model_id, 'optionIds', p.option_ids,
          'operation', p.operation, 'cell', p.cell_id, 'standardSeconds', p.standard_seconds,
          'actualSeconds', p.actual_seconds)), '[]')
        from over_parts p
        where p.site_id = ${wanted})) as context`);
  return rows[0]!.context;
}

/** Lists the setup times of tickets other than these in the same cells and on the same days. */
export async function listRivals(
  { db, siteId }: Scope,
  groups: readonly Omit<SetupTime, "ticket" | "firstMs">[],
  numbers: readonly string[],
): Promise<SetupTime[]> {
  const { rows } = await db.execute<{ rivals: SetupTime[] }>(sql`
    select coalesce(jsonb_agg(jsonb_build_object(
      'ticket', p.ticket, 'operation', p.operation, 'day', p.day, 'cell', p.cell_id,
      'firstMs', epoch_ms(p.first_at))), '[]') as rivals
    from jsonb_to_recordset(${JSON.stringify(groups)}::jsonb) as g
      (operation text, day date, cell uuid)
    join booked_parts p on p.site_id = ${siteId} and p.operation = g.operation and p.day = g.day
      and p.cell_id = g.cell
    where p.activity = 'setup' and not p.ticket = any (${sql.param(numbers)}::text[])`);
  return rows[0]!.rivals;
}

/** One interval that several items share, and each item's seconds of it, in their order. */
export interface SharedInterval {
  worker: string;
  startMs: number;
  shares: number[];
}

/** Lists the shares of intervals, named by worker and start. */
export async function listShares(
  { db, siteId }: Scope,
  intervals: readonly { worker: string; startMs: number }[],
): Promise<SharedInterval[]> {
  const starts = intervals.map(({ worker, startMs }) => {
    return { worker, at: new Date(startMs).toISOString() };
  });
  const { rows } = await db.execute<{ shared: SharedInterval[] }>(sql`
    select coalesce(jsonb_agg(jsonb_build_object(
      'worker', w.worker, 'startMs', epoch_ms(w.at), 'shares', (
        select jsonb_agg(s.seconds order by s.item)
        from segments s
        where s.site_id = ${siteId} and s.start_at = w.at and s.worker_id = w.worker))), '[]')
      as shared
    from jsonb_to_recordset(${JSON.stringify(starts)}::jsonb) as w (worker uuid, at timestamptz)`);
  return rows[0]!.shared;
}
