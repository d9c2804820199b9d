import { sql } from "drizzle-orm";
import { v7 as uuid } from "uuid";
import { describe, expect, test } from "vitest";
import { type HoursWanted, listStretches, sumHours } from "@/db/hours/queries";
import { segments } from "@/db/timeline/tables";
import { hoursSheet } from "@/lib/hours/sheet";
import { addDays, dayBounds, listDays } from "@/lib/time/site-day";
import { type Factory, makeFactory } from "@/tests/make/factory";
import { withDb } from "@/tests/setup/db";

const rules = [{ fromMs: 0, timeZone: "America/Chicago", productionDayStartsAtMinutes: 0 }];
const days = (from: string, to: string) =>
  listDays(from, addDays(to, 1)).map((date) => ({ date, ...dayBounds(date, rules) }));
const all = { homeCells: null, workerId: null, limit: null, now: new Date("2026-12-01T00:00:00Z") };
const wantedFor = (from: string, to: string, more: Partial<HoursWanted> = {}): HoursWanted => ({
  ...all,
  days: days(from, to),
  ...more,
});

type NewSegment = typeof segments.$inferInsert;

async function worked(factory: Factory, rows: (Partial<NewSegment> & { startAt: Date })[]) {
  const { db, siteId, workerId } = factory;
  const each = { siteId, workerId, item: 0, activity: "run" as const, eventId: uuid() };
  for (const { startAt } of rows) {
    await db.execute(sql`select make_partition('segments', ${startAt.toISOString()}::timestamptz)`);
  }
  await db.insert(segments).values(rows.map((row) => ({ ...each, ...row })));
}

describe("sumHours", () => {
  test("gives a night shift's seconds to both days, also on the night clocks change", () =>
    withDb(async (db) => {
      const factory = await makeFactory(db);
      // 22:00 to 06:00 in Chicago: nine hours long, as 01:00 to 02:00 comes twice
      const [startAt, endAt] = ["2026-11-01T03:00:00Z", "2026-11-01T12:00:00Z"].map(
        (text) => new Date(text),
      ) as [Date, Date];
      await worked(factory, [{ startAt, endAt, seconds: 9 * 3600 }]);
      const [worker] = hoursSheet(await sumHours(factory, wantedFor("2026-10-31", "2026-11-01")));
      expect(worker?.days.map(({ date, sums }) => [date, sums.directSeconds / 3600])).toEqual([
        ["2026-10-31", 2],
        ["2026-11-01", 7],
      ]);
      expect(await sumHours(factory, wantedFor("2026-11-02", "2026-11-02"))).toEqual([]);
    }));

  test("counts an interval of several tickets once, and cuts what runs at now", () =>
    withDb(async (db) => {
      const factory = await makeFactory(db);
      const at = (time: string) => new Date(`2026-05-14T${time}:00Z`);
      const shared = { startAt: at("12:00"), endAt: at("13:00"), ticket: "26048176" };
      await worked(factory, [
        { ...shared, item: 0, seconds: 1800 },
        { ...shared, item: 1, seconds: 1800 },
        { startAt: at("13:00"), endAt: null, seconds: null, activity: "rest" },
      ]);
      const wanted = wantedFor("2026-05-14", "2026-05-14", { now: at("13:10") });
      const [worker] = hoursSheet(await sumHours(factory, wanted));
      expect(worker).toMatchObject({ worker: "1042", cell: "Mill", runs: true });
      expect(worker?.sums).toMatchObject({ directSeconds: 3600, restSeconds: 600 });
    }));

  test("shows nobody beyond the reach: other home cells, other people, other sites", () =>
    withDb(async (db) => {
      const factory = await makeFactory(db);
      const startAt = new Date("2026-05-14T12:00:00Z");
      await worked(factory, [{ startAt, endAt: new Date("2026-05-14T13:00:00Z"), seconds: 3600 }]);
      const count = async (scope: Factory, more: Partial<HoursWanted>) =>
        (await sumHours(scope, wantedFor("2026-05-14", "2026-05-14", more))).length;
      const { Mill, Neck } = factory.cellIds;
      expect(await count(factory, { homeCells: [Mill, Neck] })).toBe(1);
      expect(await count(factory, { homeCells: [Neck] })).toBe(0);
      expect(await count(factory, { homeCells: [] })).toBe(0);
      expect(await count(factory, { cell: "Mill" })).toBe(1);
      expect(await count(factory, { cell: "Neck" })).toBe(0);
      expect(await count(factory, { workerId: factory.workerId })).toBe(1);
      expect(await count(factory, { workerId: factory.siteId })).toBe(0);
      expect(await count(factory, { after: "1042" })).toBe(0);
      expect(await count({ ...factory, siteId: uuid() }, {})).toBe(0);
    }));
});

describe("listStretches", () => {
  test("lists what reaches into the window, item by item", () =>
    withDb(async (db) => {
      const factory = await makeFactory(db);
      const startAt = new Date("2026-05-14T12:00:00Z");
      const endAt = new Date("2026-05-14T13:00:00Z");
      await worked(factory, [
        { startAt, endAt, item: 0, seconds: 1200 },
        { startAt, endAt, item: 1, seconds: 2400 },
      ]);
      const start = startAt.getTime() / 1000;
      const wanted = wantedFor("2026-05-14", "2026-05-14");
      const inside = { worker: "1042", start: start + 60, end: start + 120 };
      const found = await listStretches(factory, wanted, inside);
      expect(found.map(({ item, seconds }) => [item, seconds])).toEqual([
        [0, 1200],
        [1, 2400],
      ]);
      const later = { worker: "1042", start: start + 3600, end: start + 7200 };
      expect(await listStretches(factory, wanted, later)).toEqual([]);
    }));
});
