import { and, asc, eq, gte, lt, sql } from "drizzle-orm";
import { cells } from "@/db/cells/tables";
import type { Scope } from "@/db/client";
import { workers } from "@/db/people/tables";
import { segments } from "@/db/timeline/tables";

/** Which segments a list wants; all begin in the half-open window. */
export interface SegmentsWanted {
  window: { from: Date; to: Date };
  /** Name of a cell. */
  cell?: string | undefined;
  /** The last segment of the page before. */
  after?: { worker: string; start: Date; item: number } | undefined;
  limit: number;
}

const shown = {
  startAt: segments.startAt,
  endAt: segments.endAt,
  seconds: segments.seconds,
  activity: segments.activity,
  ticket: segments.ticket,
  operation: segments.operation,
  code: segments.code,
  cell: cells.name,
  said: segments.said,
  item: segments.item,
  workerId: segments.workerId,
  workerNumber: workers.number,
  workerName: workers.name,
};

/** Lists segments one worker after the other, each worker's in the order of time. */
export async function listSegments(scope: Scope, wanted: SegmentsWanted) {
  const { window, cell, after } = wanted;
  return segmentsOf(scope)
    .where(
      and(
        eq(segments.siteId, scope.siteId),
        gte(segments.startAt, window.from),
        lt(segments.startAt, window.to),
        cell === undefined ? undefined : eq(cells.name, cell),
        after &&
          sql`(${segments.workerId}, ${segments.startAt}, ${segments.item})
            > (${after.worker}::uuid, ${after.start.toISOString()}::timestamptz, ${after.item})`,
      ),
    )
    .orderBy(asc(segments.workerId), asc(segments.startAt), asc(segments.item))
    .limit(wanted.limit);
}

/** Lists every segment of a ticket in the order of time, with who it was. */
export async function listSegmentsOfTicket(scope: Scope, number: string) {
  return segmentsOf(scope)
    .where(and(eq(segments.siteId, scope.siteId), eq(segments.ticket, number)))
    .orderBy(asc(segments.startAt), asc(segments.workerId), asc(segments.item));
}

function segmentsOf({ db }: Scope) {
  return db
    .select(shown)
    .from(segments)
    .innerJoin(workers, and(eq(workers.siteId, segments.siteId), eq(workers.id, segments.workerId)))
    .leftJoin(cells, and(eq(cells.siteId, segments.siteId), eq(cells.id, segments.cellId)));
}
