import { and, eq, inArray, sql } from "drizzle-orm";
import type { Scope } from "@/db/client";
import { dirtyMarks } from "@/db/jobs/tables";
import { bookEvents } from "@/db/ledger/commands";
import { rebuildRollups, sumMarked } from "@/db/seam/commands";
import { idOf } from "@/db/seed/factory";
import { findSite } from "@/db/sites/queries";
import { judgeMarkedTickets, rebuildTickets } from "@/db/tickets/commands";
import { closeOverdueShifts } from "@/db/timeline/commands";
import { assert } from "@/lib/assert";
import type { DemoEvent } from "@/lib/simulation/record";

/** Events after which the planner looks at the tables again; then after twice as many. */
const FIRST_LOOK = 1_000;
const WEEK_MS = 7 * 86_400_000;

/**
 * Books the history as the kiosks' batches are booked: week by week, and within a week what one worker
 * tapped on one kiosk. `onBooked` hears the share that is done.
 */
export async function bookHistory(
  scope: Scope,
  kiosks: ReadonlyMap<string, string>,
  events: readonly DemoEvent[],
  onBooked: (share: number) => void,
): Promise<void> {
  let [booked, known] = [0, 0];
  for (const batch of batchesOf(events)) {
    if (booked >= known * 2) {
      // measured: without it every batch reads as if the tables were empty, three times as slowly
      await scope.db.execute(sql`select refresh_statistics()`);
      known = Math.max(booked, FIRST_LOOK);
    }
    const kioskId = idOf(kiosks, batch[0]!.cell);
    const arrivals = batch.map(({ receivedAtMs }) => receivedAtMs);
    const answer = await bookEvents(scope, {
      kioskId,
      receivedAt: new Date(Math.max(...arrivals)),
      arrivals,
      events: batch.map(({ event }) => event),
    });
    assert(answer.ok, "the demo's events are nobody else's");
    const refused = answer.value.results.find(({ verdict }) => verdict !== "booked");
    assert(refused === undefined, `a kiosk would not have sent ${JSON.stringify(refused)}`);
    booked += batch.length;
    onBooked(booked / events.length);
  }
}

/**
 * Does what the jobs in the background would find to do after the history: shifts that nobody ended,
 * and every ticket once, with which the marks of its bookings are done.
 */
export async function settleHistory(scope: Scope, now: Date): Promise<void> {
  const { db, siteId } = scope;
  const site = await findSite(scope);
  assert(site !== null, "the demo has a site");
  await closeOverdueShifts(scope, site.rules, now);
  await db.execute(sql`select refresh_statistics()`);
  // what its bookings marked is done by this, each ticket and each day once
  await db.delete(dirtyMarks).where(eq(dirtyMarks.siteId, siteId));
  await rebuildTickets(scope);
  await rebuildRollups(scope);
  await db
    .delete(dirtyMarks)
    .where(and(eq(dirtyMarks.siteId, siteId), inArray(dirtyMarks.kind, ["booked", "matched"])));
  // tickets that changed each other's setups
  while ((await judgeMarkedTickets(db)) > 0);
  while ((await sumMarked(db)) > 0);
}

/** Events in the order of the weeks in which they were tapped, by author and kiosk. */
function batchesOf(events: readonly DemoEvent[]): DemoEvent[][] {
  const first = events[0] ? Date.parse(events[0].event.at) : 0;
  const batches = new Map<string, DemoEvent[]>();
  for (const each of events) {
    const { at, worker } = each.event;
    const week = Math.floor((Date.parse(at) - first) / WEEK_MS);
    const key = `${week} ${worker} ${each.cell}`;
    const batch = batches.get(key);
    if (batch) batch.push(each);
    else batches.set(key, [each]);
  }
  return [...batches.values()];
}
