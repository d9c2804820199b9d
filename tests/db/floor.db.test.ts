import { eq, sql } from "drizzle-orm";
import { v7 as uuid } from "uuid";
import { describe, expect, test } from "vitest";
import { findNextStart, listMissing, listOpenRows } from "@/db/floor/queries";
import { plannedShifts, workers } from "@/db/people/tables";
import { ticketOperations } from "@/db/tickets/tables";
import { segments, shifts } from "@/db/timeline/tables";
import { type Factory, makeFactory, makeTicket } from "@/tests/make/factory";
import { withDb } from "@/tests/setup/db";

const at = (hour: number, minute = 0) => new Date(Date.UTC(2026, 4, 14, hour, minute));
const TICKET = "26048176";

type NewSegment = typeof segments.$inferInsert;

async function worked(factory: Factory, rows: Partial<NewSegment>[]) {
  const { db, siteId, workerId, cellIds } = factory;
  const each = { siteId, workerId, item: 0, activity: "run" as const, eventId: uuid() };
  const open = {
    startAt: at(8),
    cellId: cellIds.Mill,
    ticket: TICKET,
    operation: "010",
    weight: 3,
  };
  await db.execute(sql`select make_partition('segments', ${at(8).toISOString()}::timestamptz)`);
  await db.insert(segments).values(rows.map((row) => ({ ...each, ...open, ...row })));
}

describe("listOpenRows", () => {
  test("tells who is on what, with all that has ended on it and its standards", () =>
    withDb(async (db) => {
      const factory = await makeFactory(db);
      await makeTicket(factory, { number: TICKET, quantity: 4, withOption: true });
      await db
        .update(ticketOperations)
        .set({ firstWorkAt: at(6) })
        .where(eq(ticketOperations.operationId, factory.operationIds[0]));
      await worked(factory, [
        { startAt: at(6), endAt: at(6, 10), seconds: 600 },
        { startAt: at(7), endAt: at(7, 1), seconds: 60, activity: "setup" },
        {},
      ]);
      expect(await listOpenRows(factory)).toEqual([
        {
          worker: "1042",
          name: "Ilo Varn",
          cell: "Mill",
          since: at(8).getTime() / 1000,
          item: 0,
          activity: "run",
          code: null,
          ticket: TICKET,
          operation: "010",
          weight: 3,
          operationName: "Mill work",
          model: "Heron",
          options: ["Sunburst"],
          quantity: 4,
          firstWorkAt: at(6).getTime() / 1000,
          bookedSeconds: 660,
          standards: [
            {
              seq: expect.any(Number),
              option: null,
              effectiveFrom: "2026-01-01",
              setupSeconds: 600,
              runSeconds: 1800,
            },
          ],
        },
      ]);
    }));

  test("a ticket that nobody knows, and time without a ticket, are there too", () =>
    withDb(async (db) => {
      const factory = await makeFactory(db);
      await worked(factory, [{ ticket: "99", operation: "7", cellId: null }]);
      expect(await listOpenRows(factory)).toMatchObject([
        { ticket: "99", model: null, operationName: null, cell: null, standards: [], options: [] },
      ]);
    }));

  test("nobody of another site is on the floor", () =>
    withDb(async (db) => {
      const factory = await makeFactory(db);
      await worked(factory, [{}]);
      expect(await listOpenRows(await makeFactory(db))).toEqual([]);
      expect(await listOpenRows(factory)).toHaveLength(1);
    }));
});

describe("listMissing", () => {
  const plan = (factory: Factory, start: Date, end: Date, workerId = factory.workerId) =>
    factory.db.insert(plannedShifts).values({
      siteId: factory.siteId,
      id: uuid(),
      workerId,
      workOn: "2026-05-14",
      startAt: start,
      endAt: end,
    });

  test("names who is planned to be in now and is not", () =>
    withDb(async (db) => {
      const factory = await makeFactory(db);
      await plan(factory, at(7), at(15));
      const plannedAt = at(7).getTime() / 1000;
      const missing = [{ worker: "1042", name: "Ilo Varn", cell: "Mill", plannedAt }];
      expect(await listMissing(factory, at(6, 59))).toEqual([]);
      expect(await listMissing(factory, at(7))).toEqual(missing);
      expect(await listMissing(factory, at(15))).toEqual([]);
      expect(await listMissing(await makeFactory(db), at(8))).toEqual([]);
    }));

  test("the plan entered last counts, and who is in is not missing", () =>
    withDb(async (db) => {
      const factory = await makeFactory(db);
      const { siteId, workerId } = factory;
      await plan(factory, at(7), at(15));
      await plan(factory, at(9), at(17));
      expect(await listMissing(factory, at(8))).toEqual([]);
      expect(await listMissing(factory, at(16))).toHaveLength(1);
      const shift = { siteId, workerId, startAt: at(9), startEventId: uuid() };
      await db.insert(shifts).values(shift);
      expect(await listMissing(factory, at(16))).toEqual([]);
    }));

  test("the next planned start is told for a floor that nobody is on", () =>
    withDb(async (db) => {
      const factory = await makeFactory(db);
      const [worker] = await db.select({ id: workers.id }).from(workers);
      expect(await findNextStart(factory, at(6))).toBeNull();
      await plan(factory, at(7), at(15), worker!.id);
      expect(await findNextStart(factory, at(6))).toBe(at(7).getTime() / 1000);
      expect(await findNextStart(factory, at(7))).toBeNull();
    }));
});
