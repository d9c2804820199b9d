import { database } from "@/app/_server/database";
import { handle } from "@/app/_server/handle";
import type { Scope } from "@/db/client";
import { findSite } from "@/db/sites/queries";
import { listSegments } from "@/db/timeline/booked-segments";
import { reachOf } from "@/lib/access/may";
import { bookedSegmentOf } from "@/lib/api/booked-segment";
import { pageOf } from "@/lib/api/page";
import { decideSegmentRange } from "@/lib/api/segment-range";
import { type SegmentPosition, segmentsQuery } from "@/lib/api/segments";
import { assert } from "@/lib/assert";
import { ok } from "@/lib/result";
import { type DayRule, dayBounds, listDays } from "@/lib/time/site-day";

/** Lists booked segments by production day, then worker, then time (LEDGER.md 11). */
export const GET = handle(
  { actor: "key", may: "segments.read", query: segmentsQuery },
  async ({ actor, query, receivedAt }) => {
    const scope = { db: database(), siteId: actor.siteId };
    const site = await findSite(scope);
    assert(site !== null, "a key belongs to a site");
    const range = decideSegmentRange(query, site.rules, receivedAt.getTime());
    if (!range.ok) return range;
    const rows = await listByDay(scope, site.rules, { ...query, ...range.value });
    const { items, nextCursor } = pageOf(rows, query.limit, positionOf);
    const mayName = reachOf(actor.held, "segments.name-people") === "site";
    const shown = items.map((row) => ({ day: row.day, ...bookedSegmentOf(row, mayName) }));
    return ok({ items: shown, nextCursor });
  },
);

interface Wanted {
  from: string;
  to: string;
  limit: number;
  cell?: string | undefined;
  cursor?: SegmentPosition | undefined;
}

/** Asks day after day, because only `lib/time` knows when one ends, until the page is full. */
async function listByDay(scope: Scope, rules: DayRule[], wanted: Wanted) {
  const { from, to, limit, cell, cursor } = wanted;
  const rows = [];
  for (const day of listDays(from, to)) {
    if (cursor && day < cursor.day) continue;
    const { start, end } = dayBounds(day, rules);
    const found = await listSegments(scope, {
      window: { from: new Date(start * 1000), to: new Date(end * 1000) },
      cell,
      after: cursor?.day === day ? { ...cursor, start: new Date(cursor.start) } : undefined,
      limit: limit + 1 - rows.length,
    });
    rows.push(...found.map((row) => ({ day, ...row })));
    if (rows.length > limit) break;
  }
  return rows;
}

function positionOf(row: { day: string; workerId: string; startAt: Date; item: number }) {
  const { day, workerId: worker, startAt, item } = row;
  return { day, worker, start: startAt.getTime(), item } satisfies SegmentPosition;
}
