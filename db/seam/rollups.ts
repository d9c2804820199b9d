import { sql } from "drizzle-orm";
import type { Scope } from "@/db/client";
import type { CellDay, OperationDay } from "@/lib/matching/mark-keys";
import { UNKNOWN } from "@/lib/matching/parts";

/** Nothing in a fold is longer than this (LEDGER.md 1), so a segment of a day began not before. */
const LONGEST = "36 hours";

/**
 * Sums what was booked and earned on some operations' days again, from the parts of all tickets.
 * Within a transaction, each key locked until its end, and summed in a later statement than the
 * locks: so it sees all that was committed until then, whoever summed meanwhile.
 *
 * @returns how many rows changed
 */
export async function sumBooked(scope: Scope, keys: readonly OperationDay[]): Promise<number> {
  if (keys.length === 0) return 0;
  await lockKeys(scope, "booked", keys.map(textOf));
  const { db, siteId } = scope;
  const { rows } = await db.execute<{ changed: number }>(sql`
    with k as (${operationDays(keys)}),
    fresh as (
      select p.day, p.operation, p.cell_id, p.model_id, p.option_ids, p.activity,
        sum(p.seconds)::int as seconds, sum(p.no_standard_seconds)::int as no_standard_seconds,
        sum(p.elsewhere_seconds)::int as elsewhere_seconds, sum(p.pieces)::int as pieces
      from k
      join booked_parts p on p.site_id = ${siteId} and p.operation = k.operation and p.day = k.day
      group by 1, 2, 3, 4, 5, 6),
    gone as (
      delete from booked_days d
      using k
      where d.site_id = ${siteId} and d.day = k.day and d.operation = k.operation
        and not exists (
          select from fresh f
          where (f.day, f.operation, f.cell_id, f.model_id, f.option_ids, f.activity)
            = (d.day, d.operation, d.cell_id, d.model_id, d.option_ids, d.activity))
      returning 1),
    kept as (
      insert into booked_days as d (site_id, day, operation, cell_id, model_id, option_ids,
        activity, seconds, no_standard_seconds, elsewhere_seconds, pieces)
      select ${siteId}, f.day, f.operation, f.cell_id, f.model_id, f.option_ids, f.activity,
        f.seconds, f.no_standard_seconds, f.elsewhere_seconds, f.pieces
      from fresh f
      on conflict on constraint booked_days_pk do update
        set seconds = excluded.seconds, no_standard_seconds = excluded.no_standard_seconds,
          elsewhere_seconds = excluded.elsewhere_seconds, pieces = excluded.pieces
        where (d.seconds, d.no_standard_seconds, d.elsewhere_seconds, d.pieces)
          is distinct from (excluded.seconds, excluded.no_standard_seconds,
            excluded.elsewhere_seconds, excluded.pieces)
      returning 1)
    select ((select count(*) from gone) + (select count(*) from kept))::int as changed`);
  return rows[0]!.changed;
}

/** The same for what was finished on these days. */
export async function sumMatched(scope: Scope, keys: readonly OperationDay[]): Promise<number> {
  if (keys.length === 0) return 0;
  await lockKeys(scope, "matched", keys.map(textOf));
  const { db, siteId } = scope;
  const { rows } = await db.execute<{ changed: number }>(sql`
    with k as (${operationDays(keys)}),
    fresh as (
      select p.day, p.operation, p.cell_id, p.model_id, p.option_ids,
        sum(p.pieces)::int as pieces, sum(p.actual_seconds)::int as actual_seconds,
        sum(p.rework_seconds)::int as rework_seconds,
        sum(p.elsewhere_seconds)::int as elsewhere_seconds,
        sum(p.no_standard_seconds)::int as no_standard_seconds,
        sum(p.no_standard_rework_seconds)::int as no_standard_rework_seconds,
        sum(p.earned_seconds)::int as earned_seconds,
        sum(p.report_earned_seconds)::int as report_earned_seconds
      from k
      join matched_parts p on p.site_id = ${siteId} and p.operation = k.operation and p.day = k.day
      group by 1, 2, 3, 4, 5),
    gone as (
      delete from matched_days d
      using k
      where d.site_id = ${siteId} and d.day = k.day and d.operation = k.operation
        and not exists (
          select from fresh f
          where (f.day, f.operation, f.cell_id, f.model_id, f.option_ids)
            = (d.day, d.operation, d.cell_id, d.model_id, d.option_ids))
      returning 1),
    kept as (
      insert into matched_days as d (site_id, day, operation, cell_id, model_id, option_ids, pieces,
        actual_seconds, rework_seconds, elsewhere_seconds, no_standard_seconds,
        no_standard_rework_seconds, earned_seconds, report_earned_seconds)
      select ${siteId}, f.*
      from fresh f
      on conflict on constraint matched_days_pk do update
        set pieces = excluded.pieces, actual_seconds = excluded.actual_seconds,
          rework_seconds = excluded.rework_seconds,
          elsewhere_seconds = excluded.elsewhere_seconds,
          no_standard_seconds = excluded.no_standard_seconds,
          no_standard_rework_seconds = excluded.no_standard_rework_seconds,
          earned_seconds = excluded.earned_seconds,
          report_earned_seconds = excluded.report_earned_seconds
        where d is distinct from excluded
      returning 1)
    select ((select count(*) from gone) + (select count(*) from kept))::int as changed`);
  return rows[0]!.changed;
}

/**
 * Sums what the attendance of some cells' days was made of again, from the segments that have ended;
 * one that lies on two days gives each its own seconds. Days come with their bounds: SQL knows none.
 */
export async function sumAttendance(scope: Scope, keys: readonly CellDay[]): Promise<number> {
  if (keys.length === 0) return 0;
  await lockKeys(
    scope,
    "attendance",
    keys.map(({ day, cell }) => `${day} ${cell}`),
  );
  const { db, siteId } = scope;
  const { rows } = await db.execute<{ changed: number }>(sql`
    with k as (
      select x.day, x.cell, to_timestamp(x.start) as start_at, to_timestamp(x."end") as end_at
      from jsonb_to_recordset(${JSON.stringify(keys)}::jsonb) as x
        (day date, cell uuid, start bigint, "end" bigint)),
    parts as (
      select d.day, coalesce(s.cell_id, ${UNKNOWN}::uuid) as cell, s.activity,
        sum(extract(epoch from least(s.end_at, d.end_at) - greatest(s.start_at, d.start_at)))::int
          as seconds
      from (select distinct day, start_at, end_at from k) d
      join segments s on s.site_id = ${siteId} and s.item = 0 and s.end_at > d.start_at
        and s.start_at < d.end_at and s.start_at >= d.start_at - ${LONGEST}::interval
      group by 1, 2, 3),
    fresh as (
      select k.day, k.cell,
        ${secondsAs("setup")}, ${secondsAs("run")}, ${secondsAs("rework")},
        ${secondsAs("inspect")}, ${secondsAs("indirect")}, ${secondsAs("rest")},
        ${secondsAs("unassigned")}, ${secondsAs("meal")}
      from k
      join parts p on p.day = k.day and p.cell = k.cell
      group by 1, 2),
    gone as (
      delete from attendance_days d
      using k
      where d.site_id = ${siteId} and d.day = k.day and d.cell_id = k.cell
        and not exists (select from fresh f where (f.day, f.cell) = (d.day, d.cell_id))
      returning 1),
    kept as (
      insert into attendance_days as d (site_id, day, cell_id, setup_seconds, run_seconds,
        rework_seconds, inspect_seconds, indirect_seconds, rest_seconds, unassigned_seconds,
        meal_seconds)
      select ${siteId}, f.*
      from fresh f
      on conflict (site_id, day, cell_id) do update
        set setup_seconds = excluded.setup_seconds, run_seconds = excluded.run_seconds,
          rework_seconds = excluded.rework_seconds, inspect_seconds = excluded.inspect_seconds,
          indirect_seconds = excluded.indirect_seconds, rest_seconds = excluded.rest_seconds,
          unassigned_seconds = excluded.unassigned_seconds, meal_seconds = excluded.meal_seconds
        where d is distinct from excluded
      returning 1)
    select ((select count(*) from gone) + (select count(*) from kept))::int as changed`);
  return rows[0]!.changed;
}

const secondsAs = (activity: string) =>
  sql`coalesce(sum(p.seconds) filter (where p.activity = ${activity}), 0)::int
    as ${sql.raw(`${activity}_seconds`)}`;

const textOf = ({ day, operation }: OperationDay) => `${day} ${operation}`;

function operationDays(keys: readonly OperationDay[]) {
  return sql`
    select x.day, x.operation
    from jsonb_to_recordset(${JSON.stringify(keys)}::jsonb) as x (day date, operation text)`;
}

/** Locks keys until the end of the transaction, in one order for all. */
async function lockKeys({ db, siteId }: Scope, roll: string, keys: readonly string[]) {
  const sorted = [...keys].sort();
  await db.execute(sql`
    select pg_advisory_xact_lock(hashtextextended(${`${siteId} ${roll} `}::text || k.key, 0))
    from unnest(${sql.param(sorted)}::text[]) as k (key)`);
}
