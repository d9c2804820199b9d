import { createHash } from "node:crypto";
import { sql } from "drizzle-orm";
import type { Scope } from "@/db/client";
import type { DayPart } from "@/lib/agreement/day-text";
import type { Confirmed } from "@/lib/agreement/signatures";

/** Whose time is wanted, from an instant up to another, epoch milliseconds. */
export interface PartsWanted {
  /** Home cells; null for all. */
  within: readonly string[] | null;
  /** The one worker; left out for all. */
  workerId?: string;
  fromMs: number;
  toMs: number;
}

/** A part of somebody's time, with who it is and what the operation is called. */
export interface PartRow extends DayPart {
  workerId: string;
  number: string;
  name: string;
  cell: string;
  operationName: string | null;
}

const instant = (ms: number) => new Date(ms).toISOString();

/** Lists the time of workers that reaches into a window, by worker's number and time. */
export async function listDayParts(scope: Scope, wanted: PartsWanted): Promise<PartRow[]> {
  const { siteId } = scope;
  const { fromMs, toMs } = wanted;
  const { rows } = await scope.db.execute<PartRow & Record<string, unknown>>(sql`
    select
      w.id as "workerId",
      w.number,
      w.name,
      c.name as cell,
      (extract(epoch from s.start_at) * 1000)::float8 as "startMs",
      (extract(epoch from s.end_at) * 1000)::float8 as "endMs",
      s.item,
      s.activity,
      s.ticket,
      s.operation,
      s.code,
      s.seconds,
      o.name as "operationName"
    from workers w
    join cells c on c.site_id = w.site_id and c.id = w.home_cell_id
    join segments s on s.site_id = w.site_id and s.worker_id = w.id
    left join operations o on o.site_id = s.site_id and o.code = s.operation
    where w.site_id = ${siteId} ${ofWorkers(wanted)}
      and s.start_at > ${instant(fromMs)}::timestamptz - interval '36 hours'
      and s.start_at < ${instant(toMs)}::timestamptz
      and coalesce(s.end_at, 'infinity') > ${instant(fromMs)}::timestamptz
    order by length(w.number), w.number, s.start_at, s.item`);
  return rows;
}

/** Lists what was agreed to since an instant, by whom; `by` names the person where one is known. */
export async function listConfirms(
  scope: Scope,
  wanted: PartsWanted,
): Promise<(Confirmed & { workerId: string })[]> {
  const { rows } = await scope.db.execute<
    Confirmed & { workerId: string } & Record<string, unknown>
  >(sql`
    select
      w.id as "workerId",
      (extract(epoch from e.at) * 1000)::float8 as "atMs",
      coalesce(l.name, a.name, e.by) as by,
      e.body ->> 'subject' as subject
    from workers w
    join clock_events e on e.site_id = w.site_id and e.worker_id = w.id
    left join workers l on l.site_id = e.site_id and l.number = e.by
    left join accounts a on e.by = 'account:' || a.id
    where w.site_id = ${scope.siteId} ${ofWorkers(wanted)}
      and e.kind = 'confirm'
      and e.kept_for is null
      and e.received_at >= ${instant(wanted.fromMs)}
      and e.at >= ${instant(wanted.fromMs)}`);
  return rows;
}

function ofWorkers({ within, workerId }: PartsWanted) {
  return sql`
    ${within === null ? sql`` : sql`and w.home_cell_id = any (${sql.param([...within])}::uuid[])`}
    ${workerId === undefined ? sql`` : sql`and w.id = ${workerId}`}`;
}

/** The digest of a day's text: SHA-256 in hex (LEDGER.md 4). */
export function digestOf(text: string): string {
  return createHash("sha256").update(text).digest("hex");
}
