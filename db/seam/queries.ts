import { type SQL, sql } from "drizzle-orm";
import type { Db, Scope } from "@/db/client";
import type { SeamBoard, SeamSegment } from "@/lib/analytics/facts";
import type { DaySpan } from "@/lib/analytics/range";
import type { WorkRow } from "@/lib/analytics/sums";

/** Which work is summed; what is left out is all. */
export interface WorkWanted {
  /** Ids of the cells that the asker may see; null: the whole site. */
  cells: readonly string[] | null;
  cell?: string | undefined;
  model?: string | undefined;
  stage?: string | undefined;
  /** Code of an operation. */
  operation?: string | undefined;
}

/** What a sum is of, beside its range. */
export type SummedBy = "operation" | "cell" | "model" | "options" | "ticket" | "range";

/** Tickets come from the parts; they are too many for a page beyond this, the farthest off first. */
const KEYS_MAX = 500;

/**
 * Sums what work took and earned on both bases, for several ranges at once, in one statement: so the
 * figures reconcile.
 *
 * @param ranges each is known by its place in the list
 */
export async function sumWork(
  { db, siteId }: Scope,
  wanted: WorkWanted,
  { ranges, by }: { ranges: readonly DaySpan[]; by: SummedBy },
): Promise<WorkRow[]> {
  const places = JSON.stringify(ranges.map((range, place) => ({ place, ...range })));
  const level = by === "ticket" ? "parts" : "days";
  const where = workWhere(siteId, wanted);
  const { rows } = await db.execute<WorkRow & Record<string, unknown>>(sql`
    with r as (
      select x.place, x.first, x.past
      from jsonb_to_recordset(${places}::jsonb) as x (place integer, first date, past date))
    select 'booked' as basis, r.place, ${keys[by]} as key,
      sum(d.pieces)::int as pieces,
      coalesce(sum(d.seconds) filter (where d.activity = 'earned'), 0)::int as "earnedSeconds",
      coalesce(sum(d.seconds) filter (where d.activity <> 'earned'), 0)::int as "directSeconds",
      sum(d.no_standard_seconds)::int as "noStandardSeconds",
      coalesce(sum(d.seconds) filter (where d.activity = 'rework'), 0)::int as "reworkSeconds",
      coalesce(sum(d.no_standard_seconds) filter (where d.activity = 'rework'), 0)::int
        as "noStandardReworkSeconds",
      sum(d.elsewhere_seconds)::int as "elsewhereSeconds",
      coalesce(sum(d.seconds) filter (where d.activity = 'earned'), 0)::int
        as "reportEarnedSeconds"
    from r
    join ${sql.raw(`booked_${level}`)} d on d.day >= r.first and d.day < r.past
    where ${where}
    group by 2, 3
    union all
    select 'matched', r.place, ${keys[by]},
      sum(d.pieces)::int, sum(d.earned_seconds)::int, sum(d.actual_seconds)::int,
      sum(d.no_standard_seconds)::int, sum(d.rework_seconds)::int,
      sum(d.no_standard_rework_seconds)::int, sum(d.elsewhere_seconds)::int,
      sum(d.report_earned_seconds)::int
    from r
    join ${sql.raw(`matched_${level}`)} d on d.day >= r.first and d.day < r.past
    where ${where}
    group by 2, 3
    order by 2, 3
    ${by === "ticket" ? sql`limit ${KEYS_MAX * 2}` : sql``}`);
  return rows;
}

const keys: Record<SummedBy, SQL> = {
  operation: sql`d.operation`,
  cell: sql`d.cell_id::text`,
  model: sql`coalesce((
    select m.name from models m where m.site_id = d.site_id and m.id = d.model_id), '')`,
  options: sql`coalesce((
    select string_agg(o.name, ', ' order by o.name)
    from options o where o.site_id = d.site_id and o.id = any (d.option_ids)), '')`,
  ticket: sql`d.ticket`,
  range: sql`''::text`,
};

/** The conditions on a row `d` that has a site, a cell, a model and an operation. */
function workWhere(siteId: string, wanted: WorkWanted): SQL {
  const { cells, cell, model, stage, operation } = wanted;
  const conditions = [
    sql`d.site_id = ${siteId}`,
    cells && sql`d.cell_id = any (${sql.param(cells)}::uuid[])`,
    cell &&
      sql`d.cell_id = (select c.id from cells c where c.site_id = ${siteId} and c.name = ${cell})`,
    model &&
      sql`d.model_id = (
        select m.id from models m where m.site_id = ${siteId} and m.name = ${model})`,
    stage &&
      sql`d.operation in (
        select o.code from operations o where o.site_id = ${siteId} and o.stage = ${stage})`,
    operation && sql`d.operation = ${operation}`,
  ];
  return sql.join(
    conditions.flatMap((condition) => condition || []),
    sql` and `,
  );
}

/**
 * Finds what stands beside the sums of work in one statement: attendance by range and cell, the
 * unfinished tickets over their standard, what is not summed yet, and by what one may ask.
 */
export async function findSeamBoard(
  { db, siteId }: Scope,
  wanted: WorkWanted,
  ranges: readonly DaySpan[],
): Promise<SeamBoard> {
  const places = JSON.stringify(ranges.map((range, place) => ({ place, ...range })));
  const { cells } = wanted;
  const own = cells ? sql`c.id = any (${sql.param(cells)}::uuid[])` : sql`true`;
  const { rows } = await db.execute<{ board: SeamBoard }>(sql`
    select jsonb_build_object(
      'cells', (
        select coalesce(jsonb_agg(jsonb_build_object('id', c.id, 'name', c.name)
          order by c.position, c.name), '[]')
        from cells c where c.site_id = ${siteId} and ${own}),
      'models', array(select m.name from models m where m.site_id = ${siteId} order by m.name),
      'operations', (
        select coalesce(jsonb_agg(jsonb_build_object(
          'code', o.code, 'name', o.name, 'stage', o.stage, 'cell', c.name) order by o.code), '[]')
        from operations o
        join cells c on c.site_id = o.site_id and c.id = o.cell_id
        where o.site_id = ${siteId}),
      'attendance', (
        select coalesce(jsonb_agg(to_jsonb(a)), '[]')
        from (
          select x.place, d.cell_id as cell,
            sum(d.setup_seconds + d.run_seconds + d.rework_seconds + d.inspect_seconds)::int
              as "directSeconds",
            sum(d.rework_seconds)::int as "reworkSeconds",
            sum(d.indirect_seconds)::int as "indirectSeconds",
            sum(d.rest_seconds)::int as "restSeconds",
            sum(d.unassigned_seconds)::int as "unassignedSeconds",
            sum(d.meal_seconds)::int as "mealSeconds"
          from jsonb_to_recordset(${places}::jsonb) as x (place integer, first date, past date)
          join attendance_days d on d.site_id = ${siteId} and d.day >= x.first and d.day < x.past
          where ${cells ? sql`d.cell_id = any (${sql.param(cells)}::uuid[])` : sql`true`}
            and ${
              wanted.cell
                ? sql`d.cell_id = (
                  select c.id from cells c where c.site_id = ${siteId} and c.name = ${wanted.cell})`
                : sql`true`
            }
          group by 1, 2) a),
      'over', (
        select coalesce(jsonb_agg(jsonb_build_object(
          'ticket', d.ticket, 'operation', d.operation, 'standardSeconds', d.standard_seconds,
          'actualSeconds', d.actual_seconds)
          order by d.actual_seconds - d.standard_seconds desc, d.ticket, d.operation), '[]')
        from over_parts d
        where ${workWhere(siteId, wanted)}),
      'waiting', (
        select jsonb_build_object('marks', count(*), 'sinceMs', epoch_ms(min(m.marked_at)))
        from dirty_marks m where m.site_id = ${siteId})) as board`);
  return rows[0]!.board;
}

/** Lists the segments of a ticket on an operation in the order of time; nobody is named. */
export async function listSeamSegments(
  { db, siteId }: Scope,
  { ticket, operation }: { ticket: string; operation: string },
  cells: readonly string[] | null,
): Promise<SeamSegment[]> {
  const { rows } = await db.execute<SeamSegment & Record<string, unknown>>(sql`
    select epoch_ms(s.start_at)::float as "startMs", epoch_ms(s.end_at)::float as "endMs",
      s.activity, s.seconds, c.name as cell
    from segments s
    left join cells c on c.site_id = s.site_id and c.id = s.cell_id
    where s.site_id = ${siteId} and s.ticket = ${ticket} and s.operation = ${operation}
      and ${cells ? sql`s.cell_id = any (${sql.param(cells)}::uuid[])` : sql`true`}
    order by s.start_at, s.worker_id, s.item`);
  return rows;
}

/** Reads figures that must reconcile as of one moment. */
export async function asOfOneMoment<T>(db: Db, read: (db: Db) => Promise<T>): Promise<T> {
  return db.transaction(read, { isolationLevel: "repeatable read", accessMode: "read only" });
}
