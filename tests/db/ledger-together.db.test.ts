import { sql } from "drizzle-orm";
import { v7 as uuid } from "uuid";
import { describe, expect, test } from "vitest";
import { bookInLine } from "@/app/_server/booking-line";
import type { Db } from "@/db/client";
import { kioskSessions } from "@/db/kiosks/tables";
import { bookBatches, bookEvents } from "@/db/ledger/commands";
import { rebuild } from "@/db/timeline/rebuild";
import type { EventBody } from "@/lib/ledger/schema";
import { type Factory, makeFactory, makeTicket } from "@/tests/make/factory";
import { type MadeKiosk, makeKiosk, makeWorker, tap } from "@/tests/make/kiosk";
import { ownDatabase, withDb } from "@/tests/setup/db";

const receivedAt = new Date("2026-05-14T12:00:00Z");
const item = { ticket: "26000017", operation: "010" };
const acts: [string, EventBody][] = [
  ["06:00", { kind: "shift-start" }],
  ["06:10", { kind: "work", activity: "run", items: [item] }],
  ["09:00", { kind: "break-start", break: "rest" }],
  ["11:00", { kind: "shift-end" }],
];

interface Tablet extends MadeKiosk {
  worker: string;
}

/** So many tablets, each with a worker of its own signed in. */
async function makeTablets(factory: Factory, numbers: readonly string[]): Promise<Tablet[]> {
  const tablets: Tablet[] = [];
  for (const worker of numbers) {
    const kiosk = await makeKiosk(factory);
    const workerId = await makeWorker(factory, { number: worker });
    const session = uuid();
    const openedAt = new Date("2026-05-14T05:00:00Z");
    const { siteId, db } = factory;
    await db
      .insert(kioskSessions)
      .values({ siteId, id: session, kioskId: kiosk.kioskId, workerId, openedAt });
    tablets.push({ ...kiosk, worker, session });
  }
  return tablets;
}

const shiftOf = (tablet: Tablet) =>
  acts.map(([time, body]) => ({ ...tap(tablet, time, body), worker: tablet.worker }));
const batchOf = (tablet: Tablet) => ({
  kioskId: tablet.kioskId,
  events: shiftOf(tablet),
  receivedAt,
  withBench: true,
});

/** What became of a site's time, by worker number, without what is made anew each time. */
async function timeOf({ db, siteId }: Factory) {
  const { rows } = await db.execute(sql`
    select w.number, s.start_at, s.end_at, s.activity, s.ticket, s.seconds, s.weight
    from segments s
    join workers w on w.site_id = s.site_id and w.id = s.worker_id
    where s.site_id = ${siteId}
    order by w.number, s.start_at`);
  return rows;
}

function counting(db: Db) {
  const count = { statements: 0 };
  const counted = new Proxy(db, {
    get(target, name, receiver) {
      if (name === "execute") count.statements += 1;
      const value: unknown = Reflect.get(target, name, receiver);
      return typeof value === "function" ? value.bind(target) : value;
    },
  });
  return { count, counted };
}

describe("bookBatches", () => {
  test("books many tablets' batches in two statements, each as if it came alone", () =>
    withDb(async (db) => {
      const numbers = ["3001", "3002", "3003", "3004", "3005"];
      const [one, other] = [await makeFactory(db), await makeFactory(db)];
      for (const factory of [one, other]) await makeTicket(factory, { number: item.ticket });
      const together = (await makeTablets(one, numbers)).map(batchOf);
      const alone = (await makeTablets(other, numbers)).map(batchOf);
      const { count, counted } = counting(db);
      const booked = await bookBatches({ db: counted, siteId: one.siteId }, together);
      expect(count.statements).toBe(2);
      for (const batch of alone) await bookEvents({ db, siteId: other.siteId }, batch);
      expect(
        booked.map((each) => each.ok && each.value.results.map(({ verdict }) => verdict)),
      ).toEqual(numbers.map(() => acts.map(() => "booked")));
      const time = await timeOf(one);
      expect(time).toHaveLength(15);
      expect(time).toEqual(await timeOf(other));
      const { timelines, receipts } = await rebuild({ db, siteId: one.siteId });
      expect({ timelines, receipts }).toEqual({ timelines: 0, receipts: 0 });
    }));

  test("batches that meet in a worker or a record are booked one after the other", () =>
    withDb(async (db) => {
      const factory = await makeFactory(db);
      const scope = { db, siteId: factory.siteId };
      const [tablet] = await makeTablets(factory, ["3001"]);
      const [start, work, , end] = shiftOf(tablet!);
      const batch = { kioskId: tablet!.kioskId, receivedAt };
      const booked = await bookBatches(scope, [
        { ...batch, events: [start, work] },
        { ...batch, events: [work, end] },
        { ...batch, events: [end] },
      ]);
      expect(
        booked.map((one) => one.ok && one.value.results.map(({ verdict }) => verdict)),
      ).toEqual([["booked", "booked"], ["duplicate", "booked"], ["duplicate"]]);
      expect(await timeOf(factory)).toHaveLength(2);
    }));

  test("a session proves nothing for another tablet's batch in the same group", () =>
    withDb(async (db) => {
      const factory = await makeFactory(db);
      const [one, other] = await makeTablets(factory, ["3001", "3002"]);
      const booked = await bookBatches({ db, siteId: factory.siteId }, [
        batchOf(one!),
        { ...batchOf(other!), kioskId: one!.kioskId, events: shiftOf(other!) },
      ]);
      expect(booked[1]?.ok && booked[1].value.results[0]?.looseEnds).toEqual(["unproved"]);
    }));
});

describe("bookInLine", () => {
  const own = ownDatabase();

  test("what hands in at once goes in few statements, and every tablet gets its own answer", async () => {
    const factory = await makeFactory(own.db);
    const numbers = Array.from({ length: 20 }, (_, at) => String(3100 + at));
    const tablets = await makeTablets(factory, numbers);
    const { count, counted } = counting(own.db);
    const scope = { db: counted, siteId: factory.siteId };
    const batches = tablets.map(batchOf);
    const booked = await Promise.all(batches.map((batch) => bookInLine(scope, batch)));
    booked.forEach((one, at) => {
      const ids = batches[at]?.events.map(({ id }) => id);
      expect(one.ok && one.value.results.map(({ id }) => id)).toEqual(ids);
    });
    // one goes alone, one after it, and all that came meanwhile in a group
    expect(count.statements).toBeLessThanOrEqual(6 + 2);
    expect(await timeOf(factory)).toHaveLength(60);
  });

  test("a batch that cannot be booked at all costs no other tablet its own", async () => {
    const factory = await makeFactory(own.db);
    const [one, two, three, four] = await makeTablets(factory, ["3201", "3202", "3203", "3204"]);
    const scope = { db: own.db, siteId: factory.siteId };
    const broken = { ...batchOf(three!), kioskId: "no kiosk's id" };
    const answers = await Promise.allSettled(
      [batchOf(one!), batchOf(two!), broken, batchOf(four!)].map((batch) =>
        bookInLine(scope, batch),
      ),
    );
    expect(answers.map(({ status }) => status)).toEqual([
      "fulfilled",
      "fulfilled",
      "rejected",
      "fulfilled",
    ]);
    expect(await timeOf(factory)).toHaveLength(9);
  });
});
