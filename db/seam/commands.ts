import { sql } from "drizzle-orm";
import type { Db, Scope } from "@/db/client";
import { sumAttendance, sumBooked, sumMatched } from "@/db/seam/rollups";
import { findSite } from "@/db/sites/queries";
import { groupBy } from "@/lib/group";
import {
  attendanceKey,
  type OperationDay,
  readCellDays,
  readOperationDays,
  readStandardKey,
  type StandardKey,
  standardKey,
} from "@/lib/matching/mark-keys";
import { type DayRule, dayBounds } from "@/lib/time/site-day";

/** How many marks one transaction claims. */
const CLAIM_MAX = 500;
/** How many keys a rebuild sums at a time. */
const REBUILD_BATCH = 500;

type Claimed = Record<"siteId" | "kind" | "key", string>;

/**
 * Claims marks and sums each key that they name once (LEDGER.md 7). The marks go with the same
 * commit as the sums. A mark is a row of its own, so what is booked meanwhile leaves one that stays.
 *
 * @returns how many marks were claimed; 0 when there is nothing left to do
 */
export async function sumMarked(db: Db): Promise<number> {
  return db.transaction(async (tx) => {
    const { rows } = await tx.execute<Claimed>(sql`
      with claimed as (
        select m.site_id, m.id
        from dirty_marks m
        where m.kind in ('standard', 'booked', 'matched', 'attendance')
        order by m.id
        limit ${CLAIM_MAX}
        for update skip locked)
      delete from dirty_marks m
      using claimed c
      where m.site_id = c.site_id and m.id = c.id
      returning m.site_id as "siteId", m.kind, m.key`);
    for (const [siteId, marks] of [...groupBy(rows, (row) => row.siteId)].sort(bySite)) {
      await sumKeys({ db: tx, siteId }, marks);
    }
    return rows.length;
  });
}

const bySite = ([a]: readonly [string, unknown], [b]: readonly [string, unknown]) =>
  a < b ? -1 : 1;

async function sumKeys(scope: Scope, marks: readonly Claimed[]): Promise<void> {
  const of = (kind: string) => marks.flatMap((mark) => (mark.kind === kind ? [mark.key] : []));
  const standards = [...new Set(of("standard"))];
  const attended = of("attendance");
  if (standards.length + attended.length > 0) {
    const rules = await rulesOf(scope);
    for (const key of standards) await markTickets(scope, readStandardKey(key), rules);
    await sumAttendance(scope, readCellDays(attended, rules));
  }
  await sumBooked(scope, readOperationDays(of("booked")));
  await sumMatched(scope, readOperationDays(of("matched")));
}

async function rulesOf(scope: Scope): Promise<DayRule[]> {
  return (await findSite(scope))?.rules ?? [];
}

/**
 * Marks a standard that was set: for a day that is past, the work that began since takes it. One row
 * in the transaction that sets it; which tickets those are is found out afterwards.
 */
export async function markStandard({ db, siteId }: Scope, key: StandardKey): Promise<void> {
  await db.execute(sql`
    insert into dirty_marks (site_id, kind, key)
    values (${siteId}, 'standard', ${standardKey(key)})`);
}

/** Marks the tickets whose operation began, or was only counted, on a day that a standard is for. */
async function markTickets(
  { db, siteId }: Scope,
  { modelId, from, operation }: StandardKey,
  rules: readonly DayRule[],
): Promise<void> {
  const since = new Date(dayBounds(from, rules).start * 1000).toISOString();
  await db.execute(sql`
    insert into dirty_marks (site_id, kind, key)
    select t.site_id, 'ticket', t.number
    from ticket_operations p
    join operations o on o.site_id = p.site_id and o.id = p.operation_id
    join tickets t on t.site_id = p.site_id and t.id = p.ticket_id
    where p.site_id = ${siteId} and o.code = ${operation} and t.model_id = ${modelId}
      and (p.first_work_at >= ${since}::timestamptz
        or (p.first_work_at is null and p.good + p.rework + p.scrap > 0))`);
}

/**
 * Sums every day of a site again, from the parts of its tickets and its segments.
 *
 * @returns how many rows were put right; at a quiet moment of a sound database none
 */
export async function rebuildRollups(scope: Scope): Promise<number> {
  const booked = await listKeys(scope, "booked");
  const matched = await listKeys(scope, "matched");
  const attended = await listCellDays(scope);
  const sums = [
    ...inBatches(booked).map((keys) => (within: Scope) => sumBooked(within, keys)),
    ...inBatches(matched).map((keys) => (within: Scope) => sumMatched(within, keys)),
    ...inBatches(attended).map((keys) => (within: Scope) => sumAttendance(within, keys)),
  ];
  let changed = 0;
  for (const sum of sums) changed += await scope.db.transaction((db) => sum({ ...scope, db }));
  return changed;
}

/** The keys of parts that are there, and of sums whose parts may be gone. */
async function listKeys(
  { db, siteId }: Scope,
  roll: "booked" | "matched",
): Promise<OperationDay[]> {
  const { rows } = await db.execute<{ day: string; operation: string }>(sql`
    select p.day::text as day, p.operation
    from ${sql.raw(`${roll}_parts`)} p
    where p.site_id = ${siteId}
    union
    select d.day::text, d.operation
    from ${sql.raw(`${roll}_days`)} d
    where d.site_id = ${siteId}
    order by 1, 2`);
  return rows;
}

async function listCellDays(scope: Scope) {
  const { db, siteId } = scope;
  const rules = await rulesOf(scope);
  const { rows: time } = await db.execute<{ cell: string | null; startMs: string; endMs: string }>(
    sql`
      select s.cell_id as cell, epoch_ms(min(s.start_at)) as "startMs",
        epoch_ms(max(s.end_at)) as "endMs"
      from segments s
      where s.site_id = ${siteId} and s.end_at is not null
      group by s.cell_id`,
  );
  const { rows: sums } = await db.execute<{ cell: string; day: string }>(sql`
    select d.cell_id as cell, d.day::text as day
    from attendance_days d
    where d.site_id = ${siteId}`);
  const keys = [
    ...time.map(({ cell, startMs, endMs }) => {
      return { cell, startMs: Number(startMs), endMs: Number(endMs) };
    }),
    ...sums.map(({ cell, day }) => {
      const startMs = dayBounds(day, rules).start * 1000;
      return { cell, startMs, endMs: startMs + 1000 };
    }),
  ];
  return readCellDays(keys.map(attendanceKey), rules);
}

function inBatches<T>(keys: readonly T[]): T[][] {
  return Array.from({ length: Math.ceil(keys.length / REBUILD_BATCH) }, (_, batch) =>
    keys.slice(batch * REBUILD_BATCH, (batch + 1) * REBUILD_BATCH),
  );
}
