import { sql } from "drizzle-orm";
import type { Scope } from "@/db/client";
import type { NamedSegment } from "@/lib/hours/day-sheet";
import type { Tap } from "@/lib/hours/tap-words";
import type { Stretch } from "@/lib/time/site-day";

/** Nothing in a fold is longer (LEDGER.md 1): a segment that reaches into a day began after this. */
const LONGEST_SECONDS = 36 * 3600;

/** Lists one worker's segments that touch a stretch, in order, with the words for their work. */
export async function listOwnSegments(
  { db, siteId }: Scope,
  workerId: string,
  { start, end }: Stretch,
): Promise<NamedSegment[]> {
  const found = await db.execute<NamedSegment & Record<string, unknown>>(sql`
    select
      epoch_ms(s.start_at)::float8 as "startMs",
      epoch_ms(s.end_at)::float8 as "endMs",
      s.item,
      s.activity,
      s.ticket,
      s.operation,
      o.name as "operationName",
      s.code,
      s.weight,
      s.seconds,
      s.said,
      s.event_id as "eventId",
      c.name as cell
    from segments s
    left join operations o on o.site_id = s.site_id and o.code = s.operation
    left join cells c on c.site_id = s.site_id and c.id = s.cell_id
    where s.site_id = ${siteId}
      and s.worker_id = ${workerId}
      and s.start_at >= ${instant(start - LONGEST_SECONDS)}
      and s.start_at < ${instant(end)}
      and (s.end_at is null or s.end_at > ${instant(start)})
    order by s.start_at, s.item`);
  return found.rows;
}

/** Lists one worker's records in a stretch, in the ledger's order: also what is not counted. */
export async function listTaps(
  { db, siteId }: Scope,
  workerId: string,
  { start, end }: Stretch,
): Promise<Tap[]> {
  const found = await db.execute<Tap & Record<string, unknown>>(sql`
    select
      e.id,
      e.kind,
      epoch_ms(e.at)::float8 as "atMs",
      epoch_ms(e.received_at)::float8 as "receivedMs",
      k.name as kiosk,
      e.by,
      e.kept_for as "keptFor",
      e.body,
      n.text as note
    from clock_events e
    left join kiosks k on k.site_id = e.site_id and k.id = e.kiosk_id
    left join notes n on n.site_id = e.site_id and n.event_id = e.id
    where e.site_id = ${siteId}
      and e.worker_id = ${workerId}
      and e.at >= ${instant(start)}
      and e.at < ${instant(end)}
    order by e.at, e.seq, e.id`);
  return found.rows;
}

/** Finds what one worker was planned to attend, by date; the plan entered last counts. */
export async function findPlans(
  { db, siteId }: Scope,
  workerId: string,
  range: { from: string; to: string },
): Promise<Map<string, Stretch>> {
  const found = await db.execute<{ workOn: string; start: number; end: number }>(sql`
    select distinct on (p.work_on)
      p.work_on::text as "workOn",
      extract(epoch from p.start_at)::integer as start,
      extract(epoch from p.end_at)::integer as end
    from planned_shifts p
    where p.site_id = ${siteId}
      and p.worker_id = ${workerId}
      and p.work_on >= ${range.from}
      and p.work_on <= ${range.to}
    order by p.work_on, p.seq desc`);
  return new Map(found.rows.map(({ workOn, start, end }) => [workOn, { start, end }]));
}

/** A question about one worker's time that nobody has settled; `at` in epoch seconds. */
export interface OwnLooseEnd {
  code: string;
  at: number;
}

/** Lists the open questions of one worker in a stretch, in the order of time. */
export async function listOwnLooseEnds(
  { db, siteId }: Scope,
  workerId: string,
  { start, end }: Stretch,
): Promise<OwnLooseEnd[]> {
  const found = await db.execute<OwnLooseEnd & Record<string, unknown>>(sql`
    select e.code, extract(epoch from e.at)::integer as at
    from loose_ends e
    where e.site_id = ${siteId}
      and e.worker_id = ${workerId}
      and not e.settled
      and e.at >= ${instant(start)}
      and e.at < ${instant(end)}
    order by e.at, e.code, e.subject`);
  return found.rows;
}

const instant = (seconds: number) => sql`${new Date(seconds * 1000).toISOString()}::timestamptz`;
