import { and, eq, sql } from "drizzle-orm";
import { v7 as uuid } from "uuid";
import { describe, expect, test } from "vitest";
import { auditLog } from "@/db/audit/tables";
import type { Db } from "@/db/client";
import { setStandard } from "@/db/standards/commands";
import { listModels, listRouting, listStandardEntries } from "@/db/standards/entries";
import { listReplayed } from "@/db/standards/replayed";
import { routingOperations, routings, standards } from "@/db/standards/tables";
import { ticketOperations } from "@/db/tickets/tables";
import { reports } from "@/db/timeline/tables";
import type { StandardEntry } from "@/lib/standards/schema";
import { type Factory, makeFactory, makeTicket } from "@/tests/make/factory";
import { withDb } from "@/tests/setup/db";

const rules = [{ fromMs: 0, timeZone: "America/Chicago", productionDayStartsAtMinutes: 0 }];
const now = new Date("2026-05-14T15:00:00Z");
const hand = { by: "account:test", now, rules };

const entry = (change: Partial<StandardEntry & { id: string }> = {}) => ({
  id: uuid(),
  model: "Heron",
  operation: "010",
  option: null,
  setupSeconds: 300,
  runSeconds: 2400,
  effectiveFrom: "2026-05-18",
  reason: "Time study of May",
  ...change,
});

async function withRouting(db: Db): Promise<Factory> {
  const factory = await makeFactory(db);
  const { siteId, modelId, operationIds } = factory;
  for (const [revision, ids] of [
    [1, operationIds.slice(0, 1)],
    [2, operationIds],
  ] as const) {
    const routingId = uuid();
    await db.insert(routings).values({ siteId, id: routingId, modelId, revision });
    await db.insert(routingOperations).values(
      ids.map((operationId, position) => {
        return { siteId, id: uuid(), routingId, operationId, position };
      }),
    );
  }
  return factory;
}

const figures = async (scope: Factory) =>
  (await listStandardEntries(scope, { model: "Heron" })).map((row) => [
    row.option,
    row.setupSeconds,
    row.runSeconds,
    row.effectiveFrom,
  ]);

describe("setStandard", () => {
  test("adds a row, changes none, and leaves its mark and its audit in the same commit", () =>
    withDb(async (db) => {
      const factory = await withRouting(db);
      const set = await setStandard(factory, entry(), hand);
      expect(set).toMatchObject({
        ok: true,
        value: { model: "Heron", operation: "010", operationName: "Mill work", runSeconds: 2400 },
      });
      expect(await figures(factory)).toEqual([
        [null, 600, 1800, "2026-01-01"],
        [null, 300, 2400, "2026-05-18"],
      ]);
      const { rows: marks } = await db.execute(
        sql`select key from dirty_marks where site_id = ${factory.siteId} and kind = 'standard'`,
      );
      expect(marks).toEqual([{ key: `${factory.modelId} 2026-05-18 010` }]);
      const written = await db
        .select({ action: auditLog.action, actor: auditLog.actor, detail: auditLog.detail })
        .from(auditLog)
        .where(eq(auditLog.siteId, factory.siteId));
      expect(written).toMatchObject([
        { action: "standards.set", actor: "account:test", detail: { runSeconds: 2400 } },
      ]);
      expect(JSON.stringify(written)).not.toContain("Time study");
    }));

  test("two changes for one day both stay; the same form again is the same row", () =>
    withDb(async (db) => {
      const factory = await withRouting(db);
      const first = entry();
      const set = await setStandard(factory, first, hand);
      expect(await setStandard(factory, first, hand)).toEqual(set);
      await setStandard(factory, entry({ runSeconds: 2700 }), hand);
      expect((await figures(factory)).slice(1)).toEqual([
        [null, 300, 2400, "2026-05-18"],
        [null, 300, 2700, "2026-05-18"],
      ]);
    }));

  test("one id with two contents is refused, and nothing is added", () =>
    withDb(async (db) => {
      const factory = await withRouting(db);
      const first = entry();
      await setStandard(factory, first, hand);
      expect(await setStandard(factory, { ...first, runSeconds: 9 }, hand)).toMatchObject({
        problem: { code: "conflict", detail: expect.stringContaining("Take a new one") },
      });
      expect(await figures(factory)).toHaveLength(2);
    }));

  test("an option's adder stands beside the base", () =>
    withDb(async (db) => {
      const factory = await withRouting(db);
      const adder = entry({ option: "Sunburst", setupSeconds: 0, runSeconds: 240 });
      expect((await setStandard(factory, adder, hand)).ok).toBe(true);
      expect((await figures(factory)).at(-1)).toEqual(["Sunburst", 0, 240, "2026-05-18"]);
    }));

  test.each<[Partial<StandardEntry>, string, string]>([
    [{ model: "Wren" }, "model", "No model here is called Wren"],
    [{ operation: "999" }, "operation", "Heron has no operation 999"],
    [{ option: "Inlay" }, "option", "Heron has no option Inlay"],
    [{ effectiveFrom: "2025-12-31" }, "effectiveFrom", "known here since 2026-01-01"],
    [{ runSeconds: 0 }, "runSeconds", "A standard of 0 earns nothing"],
  ])("refuses %j at %s: %s", (change, path, words) =>
    withDb(async (db) => {
      const factory = await withRouting(db);
      expect(await setStandard(factory, entry(change), hand)).toMatchObject({
        problem: { code: "invalid", errors: [{ path, message: expect.stringContaining(words) }] },
      });
      expect(await figures(factory)).toHaveLength(1);
    }),
  );

  test("of two sites with the same names each has its own", () =>
    withDb(async (db) => {
      const [here, there] = [await withRouting(db), await withRouting(db)];
      await setStandard(here, entry(), hand);
      expect(await figures(here)).toHaveLength(2);
      expect(await figures(there)).toHaveLength(1);
      const own = await db
        .select({ modelId: standards.modelId, operationId: standards.operationId })
        .from(standards)
        .where(and(eq(standards.siteId, here.siteId), eq(standards.runSeconds, 2400)));
      expect(own).toEqual([{ modelId: here.modelId, operationId: here.operationIds[0] }]);
    }));
});

describe("listRouting", () => {
  test("gives the latest routing in its order; no name means the first model", () =>
    withDb(async (db) => {
      const factory = await withRouting(db);
      const codes = ["010", "020", "030"];
      expect((await listRouting(factory, "Heron")).map((row) => row.operation)).toEqual(codes);
      expect((await listRouting(factory, null)).map((row) => row.operation)).toEqual(codes);
      expect(await listRouting(factory, "Wren")).toEqual([]);
      expect(await listModels(factory)).toMatchObject([
        { name: "Heron", firstStandardOn: "2026-01-01", options: ["Sunburst"] },
      ]);
    }));
});

describe("listReplayed", () => {
  test("lists what is open and what was begun or finished since, with its counts up to the finish", () =>
    withDb(async (db) => {
      const factory = await withRouting(db);
      const { siteId, workerId } = factory;
      await makeTicket(factory, { number: "26000010", quantity: 4, withOption: true });
      const done = await makeTicket(factory, { number: "26000029", finished: 1, quantity: 2 });
      const old = await makeTicket(factory, { number: "26000032", finished: 1 });
      const finish = async (ticketId: string, at: string) =>
        db
          .update(ticketOperations)
          .set({ firstWorkAt: new Date(at), finishedAt: new Date(at), actualSeconds: 5000 })
          .where(
            and(
              eq(ticketOperations.ticketId, ticketId),
              eq(ticketOperations.operationId, factory.operationIds[0]),
            ),
          );
      await finish(done, "2026-05-12T15:00:00Z");
      await finish(old, "2026-03-12T15:00:00Z");
      const count = (at: string, good: number) => ({
        siteId,
        id: uuid(),
        kind: "report" as const,
        workerId,
        at: new Date(at),
        ticket: "26000029",
        operation: "010",
        good,
        rework: 0,
        scrap: 0,
        stop: false,
      });
      await db
        .insert(reports)
        .values([count("2026-05-12T15:00:00Z", 2), count("2026-05-13T15:00:00Z", 1)]);
      const since = new Date("2026-04-16T05:00:00Z");
      const rows = await listReplayed(factory, { model: "Heron", operation: "010", since });
      expect(rows).toMatchObject([
        {
          ticket: "26000010",
          isOpen: true,
          openQuantity: 4,
          quantity: 4,
          firstWorkMs: null,
          finishedMs: null,
          options: ["Sunburst"],
          setupEarned: "first-good",
          reports: [],
        },
        {
          ticket: "26000029",
          isOpen: false,
          good: 2,
          quantity: 2,
          actualSeconds: 5000,
          firstWorkMs: Date.parse("2026-05-12T15:00:00Z"),
          finishedMs: Date.parse("2026-05-12T15:00:00Z"),
          reports: [{ kind: "report", good: 2, atMs: Date.parse("2026-05-12T15:00:00Z") }],
        },
      ]);
      expect(rows[1]!.reports).toHaveLength(1);
    }));
});
