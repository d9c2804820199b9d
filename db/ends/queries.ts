import { type SQL, sql } from "drizzle-orm";
import type { Scope } from "@/db/client";
import type { EndPosition } from "@/lib/ends/schema";
import { rankOf } from "@/lib/ends/urgency";
import type { Activity } from "@/lib/hours/sheet";
import type { EventBody, LooseEndCode } from "@/lib/ledger/schema";

/** Which loose ends a list is about. */
export interface EndsWanted {
  /** Home cells of the workers, and cells of the kiosks of records that are nobody's; null for all. */
  within: readonly string[] | null;
  /** Name of a home cell; empty for any. */
  cell: string;
  code: LooseEndCode | "";
  /** The number of the one worker, or the id; left out for all. */
  worker?: string;
  workerId?: string;
}

/** A loose end as a list shows it; instants are epoch milliseconds. */
export interface EndRow {
  rank: number;
  code: LooseEndCode;
  subject: string;
  atMs: number;
  ticket: string | null;
  worker: string | null;
  name: string | null;
  cell: string | null;
  kiosk: string | null;
  workerId: string | null;
  kioskId: string | null;
}

const shown = sql`
  r.rank,
  l.code,
  l.subject,
  (extract(epoch from l.at) * 1000)::float8 as "atMs",
  l.ticket,
  w.number as worker,
  w.name,
  c.name as cell,
  k.name as kiosk,
  l.worker_id as "workerId",
  l.kiosk_id as "kioskId"`;

const ranked = sql`
  unnest(
    ${sql.param([...rankOf.keys()])}::text[],
    ${sql.param([...rankOf.values()])}::integer[]) as r (code, rank)`;

/** Loose ends with their workers and kiosks, within reach. */
function ends({ siteId }: Scope, within: readonly string[] | null): SQL {
  return sql`
    from loose_ends l
    join ${ranked} on r.code = l.code
    left join workers w on w.site_id = l.site_id and w.id = l.worker_id
    left join cells c on c.site_id = w.site_id and c.id = w.home_cell_id
    left join kiosks k on k.site_id = l.site_id and k.id = l.kiosk_id
    where l.site_id = ${siteId} ${within === null ? sql`` : sql`and ${isWithin(within)}`}`;
}

/** A record that is nobody's is for the leads of the cells that its kiosk serves last. */
function isWithin(cells: readonly string[]): SQL {
  const own = sql`any (${sql.param([...cells])}::uuid[])`;
  return sql`(
    w.home_cell_id = ${own}
    or w.id is null and exists (
      select from kiosk_cells s
      where s.site_id = l.site_id and s.kiosk_id = l.kiosk_id and s.cell_id = ${own}))`;
}

/** Lists what must be settled, the worst rank first, in each the oldest. */
export async function listEnds(
  scope: Scope,
  wanted: EndsWanted,
  page: { after: EndPosition | undefined; limit: number },
): Promise<EndRow[]> {
  const { after } = page;
  const { rows } = await scope.db.execute<EndRow & Record<string, unknown>>(sql`
    select ${shown} ${wantedEnds(scope, wanted)}
    ${
      after
        ? sql`and (r.rank, (extract(epoch from l.at) * 1000)::float8, l.code, l.subject)
            > (${after[0]}, ${after[1]}::float8, ${after[2]}, ${after[3]})`
        : sql``
    }
    order by r.rank, l.at, l.code, l.subject
    limit ${page.limit}`);
  return rows;
}

/** Counts what must be settled by code; codes without any are left out. */
export async function countEnds(
  scope: Scope,
  wanted: EndsWanted,
): Promise<{ code: LooseEndCode; count: number }[]> {
  const { rows } = await scope.db.execute<{ code: LooseEndCode; count: number }>(sql`
    select l.code, count(*)::integer as count ${wantedEnds(scope, wanted)}
    group by l.code, r.rank
    order by r.rank, l.code`);
  return rows;
}

/** Counts by worker what must be settled between two instants; workers without any are left out. */
export async function listOpenByWorker(
  scope: Scope,
  within: readonly string[] | null,
  { from, to }: { from: Date; to: Date },
): Promise<ReadonlyMap<string, number>> {
  const { rows } = await scope.db.execute<{ workerId: string; count: number }>(sql`
    select l.worker_id as "workerId", count(*)::integer as count
    ${ends(scope, within)}
      and not l.settled
      and l.worker_id is not null
      and l.at >= ${from.toISOString()} and l.at < ${to.toISOString()}
    group by l.worker_id`);
  return new Map(rows.map(({ workerId, count }) => [workerId, count]));
}

function wantedEnds(scope: Scope, wanted: EndsWanted): SQL {
  const { within, cell, code, worker, workerId } = wanted;
  return sql`${ends(scope, within)}
    and not l.settled
    ${cell ? sql`and c.name = ${cell}` : sql``}
    ${code ? sql`and l.code = ${code}` : sql``}
    ${worker ? sql`and w.number = ${worker}` : sql``}
    ${workerId ? sql`and l.worker_id = ${workerId}` : sql``}`;
}

/** A loose end with all that decides how it may be settled. */
export interface EndFound extends EndRow {
  settled: boolean;
  receivedMs: number | null;
  eventMs: number | null;
  kind: string | null;
  body: EventBody | null;
  by: string | null;
  /** What was written with the record; null where nothing was, or it was erased. */
  note: string | null;
  shift: { startMs: number; endMs: number | null; provisional: boolean } | null;
  planned: { startMs: number; endMs: number } | null;
  /** The shift's time as it stands, epoch seconds; empty where it lies in none. */
  stretches: { start: number; end: number | null; activity: Activity }[];
}

/** The key of one loose end. */
export interface EndNamed {
  code: string;
  subject: string;
}

/** Finds one loose end, settled or not, with its record, shift and plan; null outside the reach. */
export async function findEnd(
  scope: Scope,
  { code, subject }: EndNamed,
  within: readonly string[] | null,
): Promise<EndFound | null> {
  return findFirst(
    scope,
    sql`${ends(scope, within)} and l.code = ${code} and l.subject = ${subject}`,
  );
}

/** Finds the loose end that a list shows open: the named one while it is unsettled, else the first. */
export async function findOpenEnd(
  scope: Scope,
  wanted: EndsWanted,
  { code, subject }: EndNamed,
): Promise<EndFound | null> {
  return findFirst(
    scope,
    sql`${wantedEnds(scope, wanted)}
      order by (l.code = ${code} and l.subject = ${subject}) desc, r.rank, l.at, l.code, l.subject
      limit 1`,
  );
}

async function findFirst({ db }: Scope, which: SQL): Promise<EndFound | null> {
  const { rows } = await db.execute<EndFound & Record<string, unknown>>(sql`
    with found as (
      select ${shown}, l.settled, l.at, l.site_id, l.worker_id ${which})
    select f.*,
      (extract(epoch from e.received_at) * 1000)::float8 as "receivedMs",
      (extract(epoch from e.at) * 1000)::float8 as "eventMs",
      e.kind,
      case when e.kind <> 'unreadable' then
        jsonb_build_object('kind', e.kind) || (e.body - 'v' - 'clock') end as body,
      coalesce(b.name, a.name, e.by) as by,
      n.text as note,
      s.shift,
      p.planned,
      coalesce(t.stretches, '[]') as stretches
    from found f
    left join clock_events e on e.site_id = f.site_id and e.id = case
      when right(f.subject, 36) ~ '^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$'
      then right(f.subject, 36)::uuid end
    left join notes n on n.site_id = e.site_id and n.event_id = e.id
    left join workers b on b.site_id = e.site_id and b.number = e.by
    left join accounts a on e.by = 'account:' || a.id
    left join lateral (
      select s.start_at, s.end_at, jsonb_build_object(
        'startMs', epoch_ms(s.start_at), 'endMs', epoch_ms(s.end_at),
        'provisional', s.provisional) as shift
      from shifts s
      where s.site_id = f.site_id and s.worker_id = f.worker_id and s.start_at <= f.at
        and s.start_at > f.at - interval '36 hours'
        and (s.end_at is null or s.end_at >= f.at)
      order by s.start_at desc
      limit 1) s on true
    left join lateral (
      select jsonb_agg(jsonb_build_object(
        'start', extract(epoch from g.start_at)::integer,
        'end', extract(epoch from g.end_at)::integer,
        'activity', g.activity) order by g.start_at) as stretches
      from segments g
      where g.site_id = f.site_id and g.worker_id = f.worker_id and g.item = 0
        and g.start_at >= s.start_at and g.start_at < coalesce(s.end_at, 'infinity')) t on true
    left join lateral (
      select jsonb_build_object(
        'startMs', epoch_ms(d.start_at), 'endMs', epoch_ms(d.end_at)) as planned
      from (
        select distinct on (q.work_on) q.start_at, q.end_at
        from planned_shifts q
        where q.site_id = f.site_id and q.worker_id = f.worker_id
          and q.start_at >= f.at - interval '3 days' and q.start_at <= f.at + interval '3 days'
        order by q.work_on, q.seq desc) d
      where d.end_at > coalesce(s.start_at, f.at - interval '14 hours')
        and d.start_at < coalesce(s.start_at, f.at) + interval '14 hours'
      order by abs(extract(epoch from d.start_at - coalesce(s.start_at, f.at)))
      limit 1) p on true
    limit 1`);
  return rows[0] ?? null;
}
