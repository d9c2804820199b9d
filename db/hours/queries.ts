import { type SQL, sql } from "drizzle-orm";
import type { Scope } from "@/db/client";
import type { Activity, HoursRow } from "@/lib/hours/sheet";
import type { Tap } from "@/lib/hours/taps";

/** A production day with its bounds, epoch seconds; `lib/time` decides where days begin. */
interface DayWindow {
  date: string;
  start: number;
  end: number;
}

/** Whose hours are wanted, on which days. */
export interface HoursWanted {
  /** In order, without a gap; at least one. */
  days: readonly DayWindow[];
  /** Ids of home cells; null means all. */
  homeCells: readonly string[] | null;
  /** Name of a home cell. */
  cell?: string | undefined;
  /** The one worker whose hours the person may see; null means all. */
  workerId: string | null;
  /** The number of the last worker of the page before. */
  after?: string | undefined;
  /** How many workers; null means all. */
  limit: number | null;
  /** Where time that runs is cut. */
  now: Date;
}

const instant = (second: number) => new Date(second * 1000).toISOString();

/** The workers wanted, by number, who have any time in the range. */
function people({ siteId }: Scope, wanted: HoursWanted): SQL {
  const { days, homeCells, cell, workerId, after, limit } = wanted;
  const [from, to] = [instant(days[0]!.start), instant(days.at(-1)!.end)];
  const cells = homeCells && sql`and w.home_cell_id = any (${uuids(homeCells)})`;
  return sql`
    select w.id, w.number, w.name, c.name as cell
    from workers w
    join cells c on c.site_id = w.site_id and c.id = w.home_cell_id
    where w.site_id = ${siteId}
      ${cells ?? sql``}
      ${cell ? sql`and c.name = ${cell}` : sql``}
      ${workerId ? sql`and w.id = ${workerId}` : sql``}
      ${after ? sql`and (length(w.number), w.number) > (${after.length}, ${after})` : sql``}
      and exists (
        select from segments s
        where s.site_id = w.site_id
          and s.worker_id = w.id
          and s.start_at > ${from}::timestamptz - interval '36 hours'
          and s.start_at < ${to}::timestamptz
          and coalesce(s.end_at, 'infinity') > ${from}::timestamptz)
    order by length(w.number), w.number
    limit ${limit}`;
}

/**
 * Sums time by worker, production day and sort, in one statement, so that attendance is its parts
 * at every moment. An interval that several tickets share counts once; one that reaches over the
 * start of a day gives each day its own seconds.
 */
export async function sumHours(scope: Scope, wanted: HoursWanted): Promise<HoursRow[]> {
  const { days, now } = wanted;
  const until = sql`least(coalesce(s.end_at, ${now.toISOString()}::timestamptz), d.ends)`;
  const found = await scope.db.execute<HoursRow & Record<string, unknown>>(sql`
    with people as (${people(scope, wanted)})
    select
      p.number as worker,
      p.name,
      p.cell,
      d.named as date,
      s.activity,
      sum(extract(epoch from ${until} - greatest(s.start_at, d.starts)))::integer as seconds,
      bool_or(s.end_at is null) as runs
    from people p
    join segments s
      on s.site_id = ${scope.siteId}
      and s.worker_id = p.id
      and s.item = 0
      and s.start_at > ${instant(days[0]!.start)}::timestamptz - interval '36 hours'
      and s.start_at < ${instant(days.at(-1)!.end)}::timestamptz
    join unnest(
      ${texts(days.map(({ date }) => date))},
      ${instants(days.map(({ start }) => start))},
      ${instants(days.map(({ end }) => end))}) as d (named, starts, ends)
      on s.start_at < d.ends and ${until} > greatest(s.start_at, d.starts)
    group by p.number, p.name, p.cell, d.named, s.activity
    order by length(p.number), p.number, d.named, s.activity`);
  return found.rows;
}

/** Planned presence of a worker on a day, epoch seconds. */
export interface PlannedDay {
  worker: string;
  date: string;
  start: number;
  end: number;
}

/** Lists what the workers wanted were planned to attend; for each date the plan entered last. */
export async function listPlanned(scope: Scope, wanted: HoursWanted): Promise<PlannedDay[]> {
  const { days } = wanted;
  const found = await scope.db.execute<PlannedDay & Record<string, unknown>>(sql`
    with people as (${people(scope, wanted)})
    select distinct on (p.number, s.work_on)
      p.number as worker,
      s.work_on::text as date,
      extract(epoch from s.start_at)::integer as start,
      extract(epoch from s.end_at)::integer as end
    from people p
    join planned_shifts s on s.site_id = ${scope.siteId} and s.worker_id = p.id
    where s.work_on >= ${days[0]!.date} and s.work_on <= ${days.at(-1)!.date}
    order by p.number, s.work_on, s.seq desc`);
  return found.rows;
}

/** Counts the loose ends of the workers wanted that nobody has settled, by worker. */
export async function countLooseEnds(
  scope: Scope,
  wanted: HoursWanted,
): Promise<{ worker: string; count: number }[]> {
  const { days } = wanted;
  const found = await scope.db.execute<{ worker: string; count: number }>(sql`
    with people as (${people(scope, wanted)})
    select p.number as worker, count(*)::integer as count
    from people p
    join loose_ends l on l.site_id = ${scope.siteId} and l.worker_id = p.id
    where not l.settled
      and l.at >= ${instant(days[0]!.start)}
      and l.at < ${instant(days.at(-1)!.end)}
    group by p.number`);
  return found.rows;
}

/** A stretch of a worker's time with one of its items, epoch seconds; `end` null while it runs. */
export interface HoursStretch {
  start: number;
  end: number | null;
  item: number;
  activity: Activity;
  ticket: string | null;
  operation: string | null;
  code: string | null;
  seconds: number | null;
  cell: string | null;
  said: boolean;
  event: string;
}

/** Lists the stretches of one worker of the wanted that touch a window, by time and item. */
export async function listStretches(
  scope: Scope,
  wanted: HoursWanted,
  { worker, start, end }: { worker: string; start: number; end: number },
): Promise<HoursStretch[]> {
  const found = await scope.db.execute<HoursStretch & Record<string, unknown>>(sql`
    with people as (${people(scope, { ...wanted, after: undefined, limit: null })})
    select
      extract(epoch from s.start_at)::integer as start,
      extract(epoch from s.end_at)::integer as end,
      s.item,
      s.activity,
      s.ticket,
      s.operation,
      s.code,
      s.seconds,
      c.name as cell,
      s.said,
      s.event_id as event
    from people p
    join segments s on s.site_id = ${scope.siteId} and s.worker_id = p.id
    left join cells c on c.site_id = s.site_id and c.id = s.cell_id
    where p.number = ${worker}
      and s.start_at > ${instant(start)}::timestamptz - interval '36 hours'
      and s.start_at < ${instant(end)}
      and coalesce(s.end_at, 'infinity') > ${instant(start)}
    order by s.start_at, s.item`);
  return found.rows;
}

/**
 * Lists the records of one worker of the wanted in a window, as the ledger has them, by time: one that
 * was entered later stands where it counts. What was last done about each goes with it.
 */
export async function listTaps(
  scope: Scope,
  wanted: HoursWanted,
  { worker, start, end }: { worker: string; start: number; end: number },
): Promise<Tap[]> {
  const found = await scope.db.execute<Tap & Record<string, unknown>>(sql`
    with people as (${people(scope, { ...wanted, after: undefined, limit: null })})
    select
      e.id,
      e.kind,
      (extract(epoch from t.at) * 1000)::float8 as "atMs",
      (extract(epoch from e.received_at) * 1000)::float8 as "receivedMs",
      k.name as kiosk,
      coalesce(l.name, a.name, e.by) as by,
      e.kept_for as "keptFor",
      done.corrected,
      e.body
    from people p
    join clock_events e on e.site_id = ${scope.siteId} and e.worker_id = p.id
    cross join lateral (
      select case when e.kind = 'insert' then coalesce(e.counts_at, e.at) else e.at end as at) t
    left join lateral (
      select json_build_object('kind', d.kind, 'toMs', epoch_ms(d.counts_at)) as corrected
      from clock_events d
      where d.site_id = e.site_id
        and d.worker_id = e.worker_id
        and d.kind in ('void', 'move')
        and d.kept_for is null
        and d.target_id = e.id
        and not exists (
          select from clock_events v
          where v.site_id = d.site_id
            and v.worker_id = d.worker_id
            and v.kind = 'void'
            and v.kept_for is null
            and v.target_id = d.id)
      order by d.at desc, d.seq desc, d.id desc
      limit 1) done on true
    left join kiosks k on k.site_id = e.site_id and k.id = e.kiosk_id
    left join workers l on l.site_id = e.site_id and l.number = e.by
    left join accounts a on e.by = 'account:' || a.id
    where p.number = ${worker}
      and e.received_at >= ${instant(start)}::timestamptz - interval '2 hours'
      and t.at >= ${instant(start)}
      and t.at < ${instant(end)}
      -- one that was proved later has a second row, which counts
      and not (e.kept_for is not null and exists (
        select from clock_events c
        where c.site_id = ${scope.siteId} and c.id = e.id and c.kept_for is null))
    order by t.at, e.seq, e.id`);
  return found.rows;
}

const list = (values: readonly string[], type: string) =>
  sql`array[${sql.join(
    values.map((value) => sql`${value}`),
    sql`, `,
  )}]::${sql.raw(type)}[]`;
const uuids = (values: readonly string[]) => list(values, "uuid");
const texts = (values: readonly string[]) => list(values, "text");
const instants = (seconds: readonly number[]) => list(seconds.map(instant), "timestamptz");
