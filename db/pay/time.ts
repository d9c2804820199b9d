import { sql } from "drizzle-orm";
import type { Scope } from "@/db/client";
import type { DayPart } from "@/lib/agreement/day-text";
import type { Confirmed } from "@/lib/agreement/signatures";
import type { CardWorker, WorkerTime } from "@/lib/periods/card";

/** A stretch of instants, epoch milliseconds, half-open. */
interface Window {
  startMs: number;
  endMs: number;
}

/** Whose time is read, and how far. */
export interface TimeWanted {
  /** The period itself: every item of a stretch is read, so that a day can be agreed to. */
  period: Window;
  /** Around it, so that shifts, workweeks and averages are whole. */
  around: Window;
  /** Ids of workers; null for everybody who has time in the period or works here then. */
  workers: readonly string[] | null;
  /** Ids of home cells; null for all. */
  homeCells?: readonly string[] | null;
}

/** How many workers' time is read in one statement. */
const BATCH = 250;

const instant = (ms: number) => sql`${new Date(ms).toISOString()}::timestamptz`;

/**
 * Lists who has a card in a period: who has time, a plan or a question in it, and who works here
 * during it; by number. Those who left before it without any time are left out.
 *
 * @param firstOn the first date of the period
 */
export async function listCardWorkers(
  { db, siteId }: Scope,
  { period, workers, homeCells = null }: TimeWanted,
  firstOn: string,
): Promise<CardWorker[]> {
  const { rows } = await db.execute<CardWorker & Record<string, unknown>>(sql`
    select w.id, w.number, w.name, c.name as cell, w.payroll_number as "payrollNumber"
    from workers w
    join cells c on c.site_id = w.site_id and c.id = w.home_cell_id
    where w.site_id = ${siteId}
      ${workers === null ? sql`` : sql`and w.id = any (${sql.param([...workers])}::uuid[])`}
      ${homeCells === null ? sql`` : sql`and w.home_cell_id = any (${sql.param([...homeCells])}::uuid[])`}
      and (
        (w.created_at < ${instant(period.endMs)} and (w.ends_on is null or w.ends_on >= ${firstOn}))
        or exists (
          select from shifts s
          where s.site_id = w.site_id and s.worker_id = w.id
            and s.start_at > ${instant(period.startMs)} - interval '36 hours'
            and s.start_at < ${instant(period.endMs)}
            and coalesce(s.end_at, 'infinity') > ${instant(period.startMs)})
        or exists (
          select from loose_ends l
          where l.site_id = w.site_id and l.worker_id = w.id and not l.settled
            and l.at >= ${instant(period.startMs)} and l.at < ${instant(period.endMs)}))
    order by length(w.number), w.number`);
  return rows;
}

/** Reads the time of some workers with the agreements to it and what is left to settle. */
export async function readTime(
  scope: Scope,
  workers: readonly CardWorker[],
  wanted: Pick<TimeWanted, "period" | "around">,
): Promise<WorkerTime[]> {
  const times: WorkerTime[] = [];
  for (let at = 0; at < workers.length; at += BATCH) {
    const some = workers.slice(at, at + BATCH);
    const rows = await readBatch(scope, some, wanted);
    const byId = new Map(rows.map((row) => [row.id, row]));
    times.push(...some.map((worker) => timeOf(worker, byId.get(worker.id)!)));
  }
  return times;
}

/** What the database sends of one worker: a list a stretch, null where there is nothing. */
interface Row extends Record<string, unknown> {
  id: string;
  parts: [
    number,
    number | null,
    number,
    DayPart["activity"],
    string | null,
    string | null,
    string | null,
    number | null,
  ][];
  confirms: Confirmed[] | null;
  ends: { code: string; atMs: number }[] | null;
}

function timeOf(worker: CardWorker, { parts, confirms, ends }: Row): WorkerTime {
  return {
    worker,
    parts: (parts ?? []).map(
      ([startMs, endMs, item, activity, ticket, operation, code, seconds]) => {
        return { startMs, endMs, item, activity, ticket, operation, code, seconds };
      },
    ),
    confirms: confirms ?? [],
    ends: ends ?? [],
  };
}

/** Questions about a ticket change nobody's pay: only what hangs on time or on a record counts. */
async function readBatch(
  { db, siteId }: Scope,
  workers: readonly CardWorker[],
  { period, around }: Pick<TimeWanted, "period" | "around">,
): Promise<Row[]> {
  const { rows } = await db.execute<Row>(sql`
    select
      n.id,
      (select json_agg(json_build_array(
          epoch_ms(s.start_at), epoch_ms(s.end_at), s.item, s.activity, s.ticket, s.operation,
          s.code, s.seconds) order by s.start_at, s.item)
        from segments s
        where s.site_id = ${siteId} and s.worker_id = n.id
          and s.start_at > ${instant(around.startMs)} - interval '36 hours'
          and s.start_at < ${instant(around.endMs)}
          and coalesce(s.end_at, 'infinity') > ${instant(around.startMs)}
          and (s.item = 0 or (
            s.start_at < ${instant(period.endMs)}
            and coalesce(s.end_at, 'infinity') > ${instant(period.startMs)}))) as parts,
      (select json_agg(json_build_object(
          'atMs', epoch_ms(e.at), 'by', e.by, 'subject', e.body ->> 'subject') order by e.at)
        from clock_events e
        where e.site_id = ${siteId} and e.worker_id = n.id and e.kind = 'confirm'
          and e.kept_for is null and e.at >= ${instant(period.startMs)}
          and e.received_at >= ${instant(period.startMs)} - interval '2 hours'
          and not exists (
            select from clock_events v
            where v.site_id = ${siteId} and v.worker_id = n.id and v.kind in ('undo', 'void')
              and v.kept_for is null and v.target_id = e.id)) as confirms,
      (select json_agg(json_build_object('code', l.code, 'atMs', epoch_ms(l.at)) order by l.at)
        from loose_ends l
        where l.site_id = ${siteId} and l.worker_id = n.id and not l.settled
          and l.source <> 'judge'
          and l.at >= ${instant(period.startMs)} and l.at < ${instant(period.endMs)}) as ends
    from unnest(${sql.param(workers.map(({ id }) => id))}::uuid[]) as n (id)`);
  return rows;
}
