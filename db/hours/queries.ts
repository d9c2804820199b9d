import { sql } from "drizzle-orm";
import type { Scope } from "@/db/client";
import type { HoursRow } from "@/lib/hours/cards";

/** A production day and its bounds in epoch seconds; `lib/time` decides where days begin. */
export interface BoundDay {
  date: string;
  start: number;
  end: number;
}

/** Whose hours: workers of these home cells (null: the whole site), a page of them by name. */
export interface HoursWanted {
  within: readonly string[] | null;
  /** The number of the last worker of the page before. */
  after: string | null;
  limit: number;
}

/** Nothing in a fold is longer (LEDGER.md 1): a segment that reaches into a day began after this. */
const LONGEST = sql`interval '36 hours'`;

/**
 * Sums a page of workers' time by production day and activity: one statement, so that a card's parts
 * and its total are of one moment. Those without time in the range are there too, if they still work
 * here on its first day. A segment that runs is cut at `now`.
 *
 * @param days that follow each other, at least one
 */
export async function sumHours(
  { db, siteId }: Scope,
  days: readonly BoundDay[],
  wanted: HoursWanted,
  now: Date,
): Promise<HoursRow[]> {
  const first = days[0]!;
  const from = instant(first.start);
  const to = instant(days.at(-1)!.end);
  const until = sql`${now.toISOString()}::timestamptz`;
  const found = await db.execute<HoursRow & Record<string, unknown>>(sql`
    with days as (
      select * from unnest(
        ${param(days.map(({ date }) => date))}::text[],
        ${param(days.map(({ start }) => isoText(start)))}::timestamptz[],
        ${param(days.map(({ end }) => isoText(end)))}::timestamptz[]
      ) as day (date, start_at, end_at)
    ),
    people as (
      select w.id, w.number, w.name, c.name as cell
      from workers w
      join cells c on c.site_id = w.site_id and c.id = w.home_cell_id
      where w.site_id = ${siteId}
        and ${inCells(wanted.within)}
        and ${afterWorker(siteId, wanted.after)}
        and (w.ends_on is null or w.ends_on >= ${first.date} or exists (
          select from segments s
          where s.site_id = w.site_id
            and s.worker_id = w.id
            and s.start_at >= ${from} - ${LONGEST}
            and s.start_at < ${to}
            and coalesce(s.end_at, ${until}) > ${from}))
      order by w.name, w.number
      limit ${wanted.limit}
    )
    select p.number, p.name, p.cell, t.date, t.activity, coalesce(t.seconds, 0)::integer as seconds
    from people p
    left join lateral (
      select
        d.date,
        s.activity,
        sum(extract(epoch from
          least(coalesce(s.end_at, ${until}), d.end_at) - greatest(s.start_at, d.start_at)
        )) as seconds
      from segments s
      join days d on s.start_at < d.end_at and coalesce(s.end_at, ${until}) > d.start_at
      where s.site_id = ${siteId}
        and s.worker_id = p.id
        and s.item = 0
        and s.start_at >= ${from} - ${LONGEST}
        and s.start_at < least(${to}, ${until})
      group by d.date, s.activity
    ) t on true
    order by p.name, p.number, t.date`);
  return found.rows;
}

/** What was planned and what is still open, of workers of these home cells in a range of dates. */
export interface PlanRow {
  number: string;
  plannedSeconds: number;
}

/** Sums the planned shifts of the range by worker; the plan entered last counts for a date. */
export async function sumPlanned(
  { db, siteId }: Scope,
  range: { from: string; to: string },
  within: readonly string[] | null,
): Promise<PlanRow[]> {
  const found = await db.execute<PlanRow & Record<string, unknown>>(sql`
    select
      w.number,
      sum(extract(epoch from p.end_at - p.start_at))::integer as "plannedSeconds"
    from planned_shifts p
    join workers w on w.site_id = p.site_id and w.id = p.worker_id
    where p.site_id = ${siteId}
      and p.work_on >= ${range.from}
      and p.work_on <= ${range.to}
      and ${inCells(within)}
      and not exists (
        select from planned_shifts later
        where later.site_id = p.site_id
          and later.worker_id = p.worker_id
          and later.work_on = p.work_on
          and later.seq > p.seq)
    group by w.number`);
  return found.rows;
}

/** How many questions of a worker are open in a range. */
export interface EndsRow {
  number: string;
  count: number;
}

/** Counts the loose ends that nobody has settled, by worker, in a stretch of epoch seconds. */
export async function countLooseEnds(
  { db, siteId }: Scope,
  { start, end }: { start: number; end: number },
  within: readonly string[] | null,
): Promise<EndsRow[]> {
  const found = await db.execute<EndsRow & Record<string, unknown>>(sql`
    select w.number, count(*)::integer as count
    from loose_ends e
    join workers w on w.site_id = e.site_id and w.id = e.worker_id
    where e.site_id = ${siteId}
      and not e.settled
      and e.at >= ${instant(start)}
      and e.at < ${instant(end)}
      and ${inCells(within)}
    group by w.number`);
  return found.rows;
}

const param = (value: unknown) => sql`${sql.param(value)}`;

const isoText = (seconds: number) => new Date(seconds * 1000).toISOString();

const instant = (seconds: number) => sql`${isoText(seconds)}::timestamptz`;

function inCells(within: readonly string[] | null) {
  return within === null ? sql`true` : sql`w.home_cell_id = any(${param(within)}::uuid[])`;
}

function afterWorker(siteId: string, after: string | null) {
  if (after === null) return sql`true`;
  return sql`(w.name, w.number) > (
    select last.name, last.number from workers last
    where last.site_id = ${siteId} and last.number = ${after})`;
}
