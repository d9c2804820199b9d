import { sql } from "drizzle-orm";
import fc from "fast-check";
import { v7 as uuid } from "uuid";
import { describe, expect, test } from "vitest";
import type { Db } from "@/db/client";
import { countLooseEnds, sumHours, sumPlanned } from "@/db/hours/queries";
import { plannedShifts, workers } from "@/db/people/tables";
import { looseEnds, segments } from "@/db/timeline/tables";
import { cardsOf } from "@/lib/hours/cards";
import { datesOf } from "@/lib/hours/range";
import { dayBounds } from "@/lib/time/site-day";
import { sumDays } from "@/lib/timeline/day-sums";
import type { Doing, Segment } from "@/lib/timeline/schema";
import { type Factory, makeFactory, makeSegment, makeWorker } from "@/tests/make/factory";
import { withDb } from "@/tests/setup/db";

const rules = [{ fromMs: 0, timeZone: "America/Chicago", productionDayStartsAtMinutes: 0 }];
const LATER = new Date("2026-12-31T00:00:00Z");
const all = { within: null, after: null, limit: 100 };

const boundDays = (from: string, to: string) =>
  datesOf({ from, to }).map((date) => ({ date, ...dayBounds(date, rules) }));

async function cards(scope: Factory, from: string, to: string, now = LATER) {
  return cardsOf(await sumHours(scope, boundDays(from, to), all, now));
}

const attendedOf = (found: Awaited<ReturnType<typeof cards>>) =>
  found[0]!.days.map(({ date, sums }) => [date, sums.attendedSeconds]);

describe("sumHours", () => {
  test("a night shift over the end of summer time gives each day its own seconds", () =>
    withDb(async (db) => {
      const factory = await makeFactory(db);
      // 22:00 on Saturday to 06:00 on Sunday in Chicago: nine hours on the night clocks go back
      const start = "2026-11-01T03:00:00Z";
      await makeSegment(factory, { start, seconds: 9 * 3600, activity: "run", item: 0 });
      expect(attendedOf(await cards(factory, "2026-10-31", "2026-11-01"))).toEqual([
        ["2026-10-31", 2 * 3600],
        ["2026-11-01", 7 * 3600],
      ]);
      expect(attendedOf(await cards(factory, "2026-11-01", "2026-11-01"))).toEqual([
        ["2026-11-01", 7 * 3600],
      ]);
    }));

  test("two tickets at once are one interval, and a running one is cut at now", () =>
    withDb(async (db) => {
      const factory = await makeFactory(db);
      const both = { start: "2026-05-14T13:00:00Z", activity: "run" as const };
      await makeSegment(factory, { ...both, item: 0, ticket: "1", operation: "1" });
      await makeSegment(factory, { ...both, item: 1, ticket: "2", operation: "1" });
      const found = await cards(
        factory,
        "2026-05-14",
        "2026-05-14",
        new Date("2026-05-14T14:00:00Z"),
      );
      expect(found[0]!.total).toMatchObject({ attendedSeconds: 3600, directSeconds: 3600 });
    }));

  test("people page by name, and a lead sees the own cells only", () =>
    withDb(async (db) => {
      const factory = await makeFactory(db);
      await makeWorker(factory, "1050");
      await makeWorker(factory, "1051");
      const days = boundDays("2026-05-14", "2026-05-14");
      const numbers = async (wanted: Partial<typeof all> | object) =>
        cardsOf(await sumHours(factory, days, { ...all, ...wanted }, LATER)).map((c) => c.number);
      expect(await numbers({})).toEqual(["1042", "1050", "1051"]);
      expect(await numbers({ limit: 2 })).toEqual(["1042", "1050"]);
      expect(await numbers({ after: "1050" })).toEqual(["1051"]);
      expect(await numbers({ within: [factory.cellIds.Mill] })).toEqual(["1042"]);
      expect(await numbers({ within: [] })).toEqual([]);
    }));

  test("who left before the range is not there, unless there is time on it", () =>
    withDb(async (db) => {
      const factory = await makeFactory(db);
      await db.update(workers).set({ endsOn: "2026-05-13" });
      expect(await cards(factory, "2026-05-13", "2026-05-14")).toHaveLength(1);
      expect(await cards(factory, "2026-05-14", "2026-05-14")).toEqual([]);
      await makeSegment(factory, {
        start: "2026-05-14T13:00:00Z",
        seconds: 60,
        activity: "indirect",
        item: 0,
      });
      expect(attendedOf(await cards(factory, "2026-05-14", "2026-05-14"))).toEqual([
        ["2026-05-14", 60],
      ]);
    }));

  test("nothing of another site is summed", () =>
    withDb(async (db) => {
      const factory = await makeFactory(db);
      const start = "2026-05-14T13:00:00Z";
      await makeSegment(factory, { start, seconds: 60, activity: "run", item: 0 });
      const other = await makeFactory(db);
      expect((await cards(other, "2026-05-14", "2026-05-14"))[0]!.days).toEqual([]);
    }));

  test("for any timeline, SQL sums what the timeline's own sums say", () =>
    withDb(async (db) => {
      const length = fc.integer({ min: 1, max: 20_000 });
      const kinds = fc.constantFrom("run", "rework", "indirect", "meal", "rest", "unassigned");
      const timelines = fc.array(fc.tuple(length, kinds, fc.integer({ min: 0, max: 30_000 })), {
        minLength: 1,
        maxLength: 25,
      });
      for (const timeline of fc.sample(timelines, { numRuns: 5, seed: 26_048_176 })) {
        const factory = await makeFactory(db);
        const made = segmentsFrom(timeline);
        await insert(db, factory, made);
        const [card] = await cards(factory, "2026-10-30", "2026-11-10");
        const expected = [...sumDays(made, rules, LATER.getTime() / 1000)];
        expect(
          card!.days.map(({ date, sums }) => [date, sums.attendedSeconds, sums.mealSeconds]),
        ).toEqual(expected.map(([date, s]) => [date, s.attendanceSeconds, s.mealSeconds]));
        expect(card!.days.map(({ sums }) => sums.directSeconds)).toEqual(
          expected.map(([, sums]) => sums.directSeconds),
        );
      }
    }));
});

/** Segments one after the other with gaps between, from the eve of the change of clocks on. */
function segmentsFrom(timeline: readonly (readonly [number, string, number])[]): Segment[] {
  let at = Date.UTC(2026, 9, 31, 20) / 1000;
  return timeline.map(([seconds, kind, gap]) => {
    const start = at + gap;
    at = start + seconds;
    return { start, end: at, doing: doingOf(kind), cell: null, said: false, event: "e" };
  });
}

function doingOf(kind: string): Doing {
  if (kind === "run" || kind === "rework") {
    return { kind: "work", activity: kind, items: [{ ticket: "1", operation: "1", weight: 1 }] };
  }
  if (kind === "indirect") return { kind, code: "cleaning" };
  return { kind: kind as "meal" | "rest" | "unassigned" };
}

async function insert(db: Db, { siteId, workerId }: Factory, made: readonly Segment[]) {
  for (const month of ["2026-10-15", "2026-11-15"]) {
    await db.execute(sql`select make_partition('segments', ${month}::timestamptz)`);
  }
  await db.insert(segments).values(
    made.map(({ start, end, doing }) => ({
      siteId,
      workerId,
      item: 0,
      startAt: new Date(start * 1000),
      endAt: new Date(end! * 1000),
      activity: doing.kind === "work" ? doing.activity : doing.kind,
      seconds: end! - start,
      eventId: uuid(),
    })),
  );
}

describe("sumPlanned", () => {
  test("the plan entered last counts for its date", () =>
    withDb(async (db) => {
      const factory = await makeFactory(db);
      const { siteId, workerId } = factory;
      const plan = (workOn: string, hours: number) =>
        db.insert(plannedShifts).values({
          siteId,
          id: uuid(),
          workerId,
          workOn,
          startAt: new Date(`${workOn}T12:00:00Z`),
          endAt: new Date(Date.parse(`${workOn}T12:00:00Z`) + hours * 3_600_000),
        });
      await plan("2026-05-13", 8);
      await plan("2026-05-14", 8);
      await plan("2026-05-14", 6);
      const range = { from: "2026-05-13", to: "2026-05-14" };
      expect(await sumPlanned(factory, range, null)).toEqual([
        { number: "1042", plannedSeconds: 14 * 3600 },
      ]);
      expect(await sumPlanned(factory, range, [factory.cellIds.Neck])).toEqual([]);
    }));
});

describe("countLooseEnds", () => {
  test("counts what nobody has settled, in the range", () =>
    withDb(async (db) => {
      const factory = await makeFactory(db);
      const { siteId, workerId } = factory;
      const end = { siteId, source: "fold" as const, workerId, code: "no-shift-end" };
      const at = (hour: number) => new Date(Date.UTC(2026, 4, 14, hour));
      await db.insert(looseEnds).values([
        { ...end, subject: "a", at: at(8) },
        { ...end, subject: "b", at: at(9), settled: true },
        { ...end, subject: "c", at: at(20) },
      ]);
      const stretch = { start: at(8).getTime() / 1000, end: at(20).getTime() / 1000 };
      expect(await countLooseEnds(factory, stretch, null)).toEqual([{ number: "1042", count: 1 }]);
      expect(await countLooseEnds(factory, stretch, [factory.cellIds.Neck])).toEqual([]);
    }));
});
