import { sql } from "drizzle-orm";
import { v7 as uuid } from "uuid";
import { beforeAll, describe, expect, test } from "vitest";
import { type Db, type Scope, wrap } from "@/db/client";
import { kioskSessions } from "@/db/kiosks/tables";
import { bookEvents } from "@/db/ledger/commands";
import { markStandard, sumMarked } from "@/db/seam/commands";
import { standards } from "@/db/standards/tables";
import { judgeMarkedTickets } from "@/db/tickets/commands";
import { rebuild } from "@/db/timeline/rebuild";
import type { ClockEvent } from "@/lib/ledger/schema";
import { type Factory, makeFactory, makeTicket } from "@/tests/make/factory";
import { type MadeKiosk, makeKiosk, makeLead, makeWorker, tap } from "@/tests/make/kiosk";
import { keptRollups, recomputedRollups } from "@/tests/make/recomputed";
import { chance, randomEvents } from "@/tests/make/stream";
import { ownDatabase } from "@/tests/setup/db";

const own = ownDatabase();
const START = Date.parse("2026-05-11T05:00:00Z");
/** More of them in the deep run. */
const STREAMS = process.env.BOOKMATCH_DEEP ? 40 : 4;

interface Plant {
  factory: Factory;
  kiosk: MadeKiosk;
  scope: Scope;
  lead: { number: string; session: string };
}

/** A site of Chicago with three tickets, whose operation 010 alone has a standard. */
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

async function catchUp(db: Db = own.db): Promise<void> {
  for (let left = 1; left > 0; ) {
    left = 0;
    for (let n = 1; n > 0; left += n) n = await judgeMarkedTickets(db);
    for (let n = 1; n > 0; left += n) n = await sumMarked(db);
  }
}

async function signIn({ factory, kiosk, scope }: Plant, number: string): Promise<string> {
  const session = uuid();
  const workerId = await makeWorker(factory, { number });
  const row = { siteId: scope.siteId, id: session, kioskId: kiosk.kioskId, workerId };
  await own.db.insert(kioskSessions).values({ ...row, openedAt: new Date(START) });
  return session;
}

async function bookAll({ scope, kiosk }: Plant, events: readonly ClockEvent[], receivedAt: Date) {
  const booked = await bookEvents(scope, { kioskId: kiosk.kioskId, events, receivedAt });
  if (!booked.ok) throw new Error(booked.problem.detail);
}

/** Sets a standard for a day that may be past, as the planner does. */
async function setStandard(
  { factory, scope }: Plant,
  operation: 0 | 1 | 2,
  { from, runSeconds }: { from: string; runSeconds: number },
) {
  const { modelId, operationIds } = factory;
  await own.db.insert(standards).values({
    siteId: scope.siteId,
    id: uuid(),
    modelId,
    operationId: operationIds[operation],
    setupSeconds: 120,
    runSeconds,
    effectiveFrom: from,
    enteredBy: "Testing",
    reason: "study",
  });
  await markStandard(scope, { modelId, from, operation: `0${operation + 1}0` });
}

describe("roll-ups: at any quiet moment they are a full recomputation", () => {
  test.each(Array.from({ length: STREAMS }, (_, at) => at + 1))(
    "for random history %d with corrections and backdated standards",
    async (seed) => {
      const plant = await makePlant();
      const draw = chance(seed * 7919);
      const streams = await Promise.all(
        ["3001", "3002"].map(async (number) => {
          const session = await signIn(plant, number);
          const made = { worker: number, session, startMs: START + draw(86_400) * 1000 };
          return randomEvents({ draw, ...made, lead: plant.lead, count: 40 });
        }),
      );
      const events = streams.flat();
      const receivedAt = new Date(Math.max(...events.map(({ at }) => Date.parse(at))) + 144e6);
      for (let from = 0; from < events.length; ) {
        const size = 1 + draw(9);
        await bookAll(plant, events.slice(from, from + size), receivedAt);
        from += size;
        if (draw(5) === 0) await judgeMarkedTickets(own.db);
        if (draw(5) === 0) await sumMarked(own.db);
        if (draw(6) === 0) {
          const from = `2026-05-${11 + draw(12)}`;
          await setStandard(plant, draw(3) as 0 | 1 | 2, { from, runSeconds: 60 * draw(60) });
        }
        if (draw(8) > 0) continue;
        await catchUp();
        expect(await keptRollups(plant.scope)).toEqual(await recomputedRollups(plant.scope));
      }
      await catchUp();
      const kept = await keptRollups(plant.scope);
      expect(kept).toEqual(await recomputedRollups(plant.scope));
      expect(kept.attendance.length).toBeGreaterThan(2);
      expect(kept.booked.length).toBeGreaterThan(2);
      expect(await rebuild(plant.scope)).toEqual({
        timelines: 0,
        tickets: 0,
        rollups: 0,
        receipts: 0,
      });
    },
    60_000,
  );

  test("a rebuild puts right what somebody spoilt", async () => {
    const plant = await makePlant();
    await workADay(plant);
    await catchUp();
    const { siteId } = plant.scope;
    const right = await keptRollups(plant.scope);
    await own.db.execute(sql`delete from matched_parts where site_id = ${siteId}`);
    await own.db.execute(sql`update booked_days set seconds = 7 where site_id = ${siteId}`);
    await own.db.execute(sql`delete from attendance_days where site_id = ${siteId}`);
    const changed = await rebuild(plant.scope);
    expect(changed.tickets).toBeGreaterThan(0);
    expect(changed.rollups).toBeGreaterThan(2);
    expect(await keptRollups(plant.scope)).toEqual(right);
    expect(await rebuild(plant.scope)).toMatchObject({ tickets: 0, rollups: 0 });
  });
});

/** Worker 1042 runs 26000000 through its first operation in forty minutes on 14 May. */
async function workADay(plant: Plant): Promise<void> {
  const item = { ticket: "26000000", operation: "010" };
  const count = { good: 1, rework: 0, scrap: 0, stop: true };
  const events = [
    tap(plant.kiosk, "06:00", { kind: "shift-start" }),
    tap(plant.kiosk, "06:10", { kind: "work", activity: "run", items: [item] }),
    tap(plant.kiosk, "06:50", { kind: "report", ...item, ...count }),
    tap(plant.kiosk, "07:00", { kind: "shift-end" }),
  ];
  await bookAll(plant, events, new Date("2026-05-14T23:00:00Z"));
}

describe("sumMarked", () => {
  let plant: Plant;
  beforeAll(async () => {
    plant = await makePlant();
  });

  test("sums what was booked, matched and attended", async () => {
    await workADay(plant);
    await catchUp();
    const mill = plant.factory.cellIds.Mill;
    expect(await keptRollups(plant.scope)).toEqual({
      booked: [`2026-05-14 010 ${mill} earned 2400 0 0 1`, `2026-05-14 010 ${mill} run 2400 0 0 0`],
      matched: [`2026-05-14 010 ${mill} 1 2400 0 0 0 0 2400 2400`],
      attendance: [`2026-05-14 ${mill} 0 2400 0 0 0 0 1200 0`],
    });
  });

  test("a backdated standard moves the work that began since, and no other", async () => {
    const mill = plant.factory.cellIds.Mill;
    await setStandard(plant, 0, { from: "2026-05-15", runSeconds: 60 });
    await catchUp();
    expect((await keptRollups(plant.scope)).matched).toEqual([
      `2026-05-14 010 ${mill} 1 2400 0 0 0 0 2400 2400`,
    ]);
    await setStandard(plant, 0, { from: "2026-05-14", runSeconds: 60 });
    await catchUp();
    expect((await keptRollups(plant.scope)).matched).toEqual([
      `2026-05-14 010 ${mill} 1 2400 0 0 0 0 180 180`,
    ]);
  });

  test("a mark that is made while another summer has claimed the same key is not lost", async () => {
    const { siteId } = plant.scope;
    const mill = plant.factory.cellIds.Mill;
    const [booker, summer] = [await own.pool.connect(), await own.pool.connect()];
    try {
      const change = (seconds: number) => `
        update booked_parts set seconds = ${seconds}
        where site_id = '${siteId}' and activity = 'run'`;
      const mark = `
        insert into dirty_marks (site_id, kind, key) values ('${siteId}', 'booked', '2026-05-14 010')`;
      await booker.query(change(1000));
      await booker.query(mark);
      await booker.query("begin");
      await booker.query(change(2000));
      await booker.query(mark);
      // the summer sees the first change and its mark, and neither of the second
      expect(await sumMarked(wrap(summer))).toBe(1);
      const sums = async () => (await keptRollups(plant.scope)).booked;
      expect(await sums()).toContain(`2026-05-14 010 ${mill} run 1000 0 0 0`);
      await booker.query("commit");
      expect(await sumMarked(wrap(summer))).toBe(1);
      expect(await sums()).toContain(`2026-05-14 010 ${mill} run 2000 0 0 0`);
    } finally {
      booker.release();
      summer.release();
    }
  });

  test("of two summers with one key, the later sums what the earlier could not see", async () => {
    const { siteId } = plant.scope;
    const mill = plant.factory.cellIds.Mill;
    const [first, second, booker] = await Promise.all([1, 2, 3].map(() => own.pool.connect()));
    const mark = `
      insert into dirty_marks (site_id, kind, key) values ('${siteId}', 'booked', '2026-05-14 010')`;
    let waiting: Promise<number> | undefined;
    try {
      await booker!.query(mark);
      await wrap(first!).transaction(async (tx) => {
        // the first summer has claimed its mark, holds the key, and has summed
        expect(await sumMarked(tx)).toBe(1);
        await booker!.query(
          `update booked_parts set seconds = 3000 where site_id = '${siteId}' and activity = 'run'`,
        );
        await booker!.query(mark);
        waiting = sumMarked(wrap(second!));
        await waitsForLock(booker!);
      });
      expect(await waiting).toBe(1);
      expect((await keptRollups(plant.scope)).booked).toContain(
        `2026-05-14 010 ${mill} run 3000 0 0 0`,
      );
    } finally {
      for (const one of [first!, second!, booker!]) one.release();
    }
  });
});

/** Waits until some connection of this database waits for a key. */
async function waitsForLock(client: { query: (text: string) => Promise<{ rows: unknown[] }> }) {
  for (;;) {
    const { rows } = await client.query(`
      select 1 from pg_stat_activity
      where datname = current_database() and wait_event_type = 'Lock' and wait_event = 'advisory'`);
    if (rows.length > 0) return;
  }
}

describe("a setup that is earned when it is booked", () => {
  test("is earned once a cell and day, also when another ticket's turns out to be the first", async () => {
    const plant = await makePlant();
    const { scope, kiosk } = plant;
    const mill = plant.factory.cellIds.Mill;
    await own.db.execute(sql`
      update operations set setup_earned = 'when-booked'
      where site_id = ${scope.siteId} and code = '010'`);
    const setup = (at: string, ticket: string) =>
      tap(kiosk, at, { kind: "work", activity: "setup", items: [{ ticket, operation: "010" }] });
    const earned = async () => {
      const { rows } = await own.db.execute<{ ticket: string; seconds: number }>(sql`
        select ticket, seconds from booked_parts
        where site_id = ${scope.siteId} and activity = 'earned'`);
      return rows;
    };
    const receivedAt = new Date("2026-05-14T23:00:00Z");
    await bookAll(
      plant,
      [
        tap(kiosk, "06:00", { kind: "shift-start" }),
        setup("06:30", "26000000"),
        tap(kiosk, "06:50", { kind: "shift-end" }),
      ],
      receivedAt,
    );
    await catchUp();
    expect(await earned()).toEqual([{ ticket: "26000000", seconds: 600 }]);
    await bookAll(plant, [setup("06:10", "26000001")], receivedAt);
    await catchUp();
    expect(await earned()).toEqual([{ ticket: "26000001", seconds: 600 }]);
    const kept = await keptRollups(scope);
    expect(kept).toEqual(await recomputedRollups(scope, new Set(["010"])));
    expect(kept.booked).toContain(`2026-05-14 010 ${mill} earned 600 0 0 0`);
    expect(await rebuild(scope)).toMatchObject({ tickets: 0, rollups: 0 });
  });
});
