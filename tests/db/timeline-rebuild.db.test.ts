import { sql } from "drizzle-orm";
import { v7 as uuid } from "uuid";
import { beforeAll, describe, expect, test } from "vitest";
import { type Scope, wrap } from "@/db/client";
import { kioskSessions } from "@/db/kiosks/tables";
import { bookEvents } from "@/db/ledger/commands";
import { judgeMarkedTickets } from "@/db/tickets/commands";
import { rebuild } from "@/db/timeline/rebuild";
import type { ClockEvent } from "@/lib/ledger/schema";
import { type Factory, makeFactory, makeTicket } from "@/tests/make/factory";
import { type MadeKiosk, makeKiosk, makeLead, makeWorker } from "@/tests/make/kiosk";
import { chance, randomEvents } from "@/tests/make/stream";
import { ownDatabase } from "@/tests/setup/db";

const own = ownDatabase();
const START = Date.parse("2026-05-11T05:00:00Z");

/** More of them in the deep run. */
const STREAMS = process.env.BOOKMATCH_DEEP ? 60 : 5;

interface Plant {
  factory: Factory;
  kiosk: MadeKiosk;
  scope: Scope;
  lead: { number: string; session: string };
}

/** A site whose worker 1042 and lead 2001 are signed in on one kiosk. */
async function makePlant(): Promise<Plant> {
  const factory = await makeFactory(own.db);
  const kiosk = await makeKiosk(factory, { openedAt: "2026-05-11T04:00:00Z" });
  const workerId = await makeWorker(factory, { number: "2001" });
  await makeTicket(factory, { number: "26000000", quantity: 1 });
  await makeTicket(factory, { number: "26000001", quantity: 6 });
  const session = await makeLead(factory, kiosk, { workerId, cells: ["Mill"] });
  const scope = { db: own.db, siteId: factory.siteId };
  return { factory, kiosk, scope, lead: { number: "2001", session } };
}

/** What is derived, without what names the site. */
async function derivedOf({ siteId }: Scope, worker: string) {
  const table = (name: string) => sql`select ${sql.raw(name)}`;
  const { rows: segments } = await own.db.execute(sql`${table(
    "s.start_at, s.item, s.end_at, activity, ticket, operation, code, weight, seconds, said, event_id",
  )} from segments s join workers w on (w.site_id, w.id) = (s.site_id, s.worker_id)
    where s.site_id = ${siteId} and w.number = ${worker} order by 1, 2`);
  const { rows: shifts } = await own.db.execute(sql`${table(
    "s.start_at, s.end_at, start_event_id, end_event_id, provisional",
  )} from shifts s join workers w on (w.site_id, w.id) = (s.site_id, s.worker_id)
    where s.site_id = ${siteId} and w.number = ${worker} order by 1`);
  const { rows: ends } = await own.db.execute(sql`${table("code, subject, at, settled")}
    from loose_ends where site_id = ${siteId} and source = 'fold' and code <> 'session-late'
    order by 1, 2`);
  return { segments, shifts, ends };
}

/** Lets the judge catch up, then derives everything again; answers how many rows that changed. */
async function rebuilt(scope: Scope): Promise<number> {
  while ((await judgeMarkedTickets(own.db)) > 0);
  const { timelines, tickets, receipts } = await rebuild(scope);
  return timelines + tickets + receipts;
}

const clone = <T>(value: T): T => JSON.parse(JSON.stringify(value));

/** Books events in batches of a few, some of them twice. */
async function bookAll(
  { scope, kiosk }: Plant,
  events: readonly ClockEvent[],
  how: { draw: (below: number) => number; receivedAt: (last: ClockEvent) => Date },
) {
  for (let from = 0; from < events.length; ) {
    const size = 1 + how.draw(5);
    const batch = events.slice(Math.max(0, from - how.draw(2)), from + size);
    const receivedAt = how.receivedAt(batch.at(-1)!);
    const booked = await bookEvents(scope, {
      kioskId: kiosk.kioskId,
      events: clone(batch),
      receivedAt,
    });
    if (!booked.ok) throw new Error(booked.problem.detail);
    expect(booked.value.results.filter(({ verdict }) => verdict === "looseEnd")).toEqual([]);
    from += size;
  }
}

function shuffled<T>(list: readonly T[], draw: (below: number) => number): T[] {
  return list
    .map((value) => ({ value, key: draw(1_000_000) }))
    .sort((a, b) => a.key - b.key)
    .map(({ value }) => value);
}

describe("rebuild", () => {
  let live: Plant;
  let late: Plant;
  beforeAll(async () => {
    live = await makePlant();
    late = await makePlant();
  });

  test.each(Array.from({ length: STREAMS }, (_, at) => at + 1))(
    "changes nothing for stream %d, booked live or late, twice and out of order",
    async (seed) => {
      const draw = chance(seed);
      const number = String(3000 + seed);
      const session = uuid();
      for (const { factory, kiosk, scope } of [live, late]) {
        const workerId = await makeWorker(factory, { number });
        const row = { siteId: scope.siteId, id: session, kioskId: kiosk.kioskId, workerId };
        await own.db.insert(kioskSessions).values({ ...row, openedAt: new Date(START) });
      }
      const made = { draw, worker: number, session, startMs: START, count: 45 };
      const events = randomEvents({ ...made, lead: live.lead });
      await bookAll(live, events, {
        draw,
        receivedAt: ({ at }) => new Date(Date.parse(at) + 1000),
      });
      expect(await rebuilt(live.scope)).toBe(0);

      const end = Math.max(...events.map(({ at }) => Date.parse(at))) + 40 * 3_600_000;
      const theirs = events.map((event) =>
        event.session === live.lead.session ? { ...event, session: late.lead.session } : event,
      );
      const receivedAt = () => new Date(end);
      await bookAll(late, shuffled(theirs, draw), { draw, receivedAt });
      expect(await rebuilt(late.scope)).toBe(0);

      const order = await makePlant();
      const workerId = await makeWorker(order.factory, { number });
      const row = {
        siteId: order.scope.siteId,
        id: session,
        kioskId: order.kiosk.kioskId,
        workerId,
      };
      await own.db.insert(kioskSessions).values({ ...row, openedAt: new Date(START) });
      const once = events.map((event) =>
        event.session === live.lead.session ? { ...event, session: order.lead.session } : event,
      );
      await bookAll(order, once, { draw: () => 0, receivedAt });
      const [shuffledEnds, orderedEnds] = [late, order].map(({ scope }) =>
        derivedOf(scope, number),
      );
      const { segments, shifts } = await shuffledEnds!;
      expect({ segments, shifts }).toEqual({
        segments: (await orderedEnds!).segments,
        shifts: (await orderedEnds!).shifts,
      });
      expect(segments.length).toBeGreaterThan(5);
    },
  );

  test("puts right what somebody spoilt, and then has nothing left to do", async () => {
    await own.db.execute(
      sql`delete from segments where site_id = ${live.scope.siteId} and item = 0`,
    );
    await own.db.execute(
      sql`update shifts set end_at = null, provisional = false where site_id = ${late.scope.siteId}`,
    );
    const before = await derivedOf(live.scope, "3001");
    expect(await rebuilt(live.scope)).toBeGreaterThan(20);
    expect((await derivedOf(live.scope, "3001")).segments.length).toBeGreaterThan(
      before.segments.length,
    );
    expect(await rebuilt(late.scope)).toBeGreaterThan(5);
    for (const { scope } of [live, late]) expect(await rebuilt(scope)).toBe(0);
  });

  test("two connections that book for one worker at the same time lose nothing", async () => {
    const plant = await makePlant();
    const session = uuid();
    const workerId = await makeWorker(plant.factory, { number: "4001" });
    const row = { siteId: plant.scope.siteId, id: session, kioskId: plant.kiosk.kioskId, workerId };
    await own.db.insert(kioskSessions).values({ ...row, openedAt: new Date(START) });
    const draw = chance(99);
    const made = { draw, worker: "4001", session, startMs: START, count: 40 };
    const events = randomEvents({ ...made, lead: plant.lead });
    const receivedAt = () => new Date(START + 20 * 86_400_000);
    const second = wrap(own.pool);
    const halves = [events.filter((_, at) => at % 2 === 0), events.filter((_, at) => at % 2 === 1)];
    await Promise.all(
      halves.map((half, at) =>
        bookAll({ ...plant, scope: { ...plant.scope, db: at ? second : own.db } }, half, {
          draw: () => 0,
          receivedAt,
        }),
      ),
    );
    const { rows } = await own.db.execute(
      sql`select count(*)::int as booked from clock_events where site_id = ${plant.scope.siteId}`,
    );
    expect(rows).toEqual([{ booked: 40 }]);
    expect(await rebuilt(plant.scope)).toBe(0);
  });
});
