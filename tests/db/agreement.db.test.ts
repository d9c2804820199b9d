import { sql } from "drizzle-orm";
import { v7 as uuid } from "uuid";
import { describe, expect, test } from "vitest";
import { agreeDays } from "@/db/agreement/commands";
import { digestOf, listConfirms, listDayParts } from "@/db/agreement/queries";
import type { Db } from "@/db/client";
import type { Settling } from "@/db/ends/commands";
import { bookEvents } from "@/db/ledger/commands";
import { listChanges, listOwnPlanned, listPlannedSums } from "@/db/me/queries";
import { readPolicyBook } from "@/db/pay/queries";
import { plannedShifts } from "@/db/people/tables";
import { correctRecord, enterShift } from "@/db/records/commands";
import { findSite } from "@/db/sites/queries";
import { rebuild } from "@/db/timeline/rebuild";
import { cardDays, weeksOf, windowOf } from "@/lib/agreement/card";
import { zoneClock } from "@/lib/time/zone-clock";
import { type Factory, makeFactory } from "@/tests/make/factory";
import { makeKiosk, tap } from "@/tests/make/kiosk";
import { withDb } from "@/tests/setup/db";

const NOW = new Date("2026-05-15T10:00:00Z");
const range = { from: "2026-05-11", to: "2026-05-18" };

/** A whole day of worker 1042 on other work. */
async function makeDay(db: Db) {
  const factory = await makeFactory(db, "UTC");
  const kiosk = await makeKiosk(factory);
  const events = [
    tap(kiosk, "06:00", { kind: "shift-start" }),
    tap(kiosk, "06:05", { kind: "indirect", code: "cleaning" }),
    tap(kiosk, "14:30", { kind: "shift-end" }),
  ];
  const scope = { db, siteId: factory.siteId };
  const receivedAt = new Date("2026-05-14T14:30:00Z");
  await bookEvents(scope, { kioskId: kiosk.kioskId, events, receivedAt });
  const { rules } = (await findSite(scope))!;
  const lead: Settling = {
    by: "account:a",
    actor: "account:a",
    within: [factory.cellIds.Mill],
    now: NOW,
    rules,
  };
  return { factory, scope, events, lead };
}

async function cardOf(scope: Factory | { db: Db; siteId: string }, workerId: string) {
  const clock = zoneClock("UTC");
  const wanted = { within: null, workerId, ...windowOf(range, clock) };
  const parts = await listDayParts(scope, wanted);
  const confirms = await listConfirms(scope, wanted);
  const weeks = weeksOf(await readPolicyBook(scope), workerId, range, clock);
  const rules = { weeks, range, digestOf, nowMs: NOW.getTime() };
  return cardDays({ parts, confirms }, rules);
}

const dayOf = (days: Awaited<ReturnType<typeof cardOf>>) => ({
  worker: "1042",
  date: days[0]!.date,
  digest: days[0]!.digest!,
});

describe("agreeDays", () => {
  test("the worker's and the lead's agreement hold until the day changes", async () => {
    await withDb(async (db) => {
      const { factory, scope, events, lead } = await makeDay(db);
      const day = dayOf(await cardOf(scope, factory.workerId));
      const own = { ...lead, by: null, actor: "account:w", within: null };
      expect(await agreeDays(scope, { id: uuid(), days: [day] }, own)).toMatchObject({ ok: true });
      expect(await agreeDays(scope, { id: uuid(), days: [day] }, lead)).toMatchObject({ ok: true });
      const [agreed] = await cardOf(scope, factory.workerId);
      expect(agreed?.agreement).toMatchObject({
        worker: { by: null },
        lead: { by: "account:a" },
        hasLapsed: false,
      });
      const moved = await correctRecord(
        scope,
        {
          id: uuid(),
          worker: "1042",
          event: events[2]!.id,
          deed: "move",
          time: "2026-05-14T14:45",
          reason: "stayed on",
        },
        lead,
      );
      expect(moved).toMatchObject({ ok: true });
      const [changed] = await cardOf(scope, factory.workerId);
      expect(changed?.agreement).toEqual({ worker: null, lead: null, hasLapsed: true });
      const late = await agreeDays(scope, { id: uuid(), days: [day] }, lead);
      expect(late).toMatchObject({ ok: false, problem: { code: "conflict" } });
      expect(await rebuild(scope)).toEqual({ timelines: 0, tickets: 0, receipts: 0, rollups: 0 });
    });
  });

  test("sent twice it is agreed to once", async () => {
    await withDb(async (db) => {
      const { factory, scope, lead } = await makeDay(db);
      const form = { id: uuid(), days: [dayOf(await cardOf(scope, factory.workerId))] };
      await agreeDays(scope, form, lead);
      expect(await agreeDays(scope, form, lead)).toMatchObject({ ok: true });
      const { rows } = await db.execute(
        sql`select 1 from clock_events where site_id = ${scope.siteId} and kind = 'confirm'`,
      );
      expect(rows).toHaveLength(1);
    });
  });

  test("a lead agrees for the own cells alone", async () => {
    await withDb(async (db) => {
      const { factory, scope, lead } = await makeDay(db);
      const form = { id: uuid(), days: [dayOf(await cardOf(scope, factory.workerId))] };
      const other = { ...lead, within: [factory.cellIds.Neck] };
      expect(await agreeDays(scope, form, other)).toMatchObject({ ok: false });
    });
  });
});

describe("correctRecord", () => {
  const form = (event: string, other: object = {}) => ({
    id: uuid(),
    worker: "1042",
    event,
    deed: "void" as const,
    time: "",
    reason: "tapped by mistake",
    ...other,
  });

  test("takes a record out, and its worker reads by whom and why", async () => {
    await withDb(async (db) => {
      const { factory, scope, events, lead } = await makeDay(db);
      expect(await correctRecord(scope, form(events[1]!.id), lead)).toMatchObject({ ok: true });
      const parts = await cardOf(scope, factory.workerId);
      expect(parts[0]?.parts.map(({ activity }) => activity)).toEqual(["unassigned"]);
      const since = new Date("2026-05-15T00:00:00Z");
      expect(await listChanges(scope, factory.workerId, since)).toMatchObject([
        { kind: "void", note: "tapped by mistake", targetKind: "indirect", by: "the office" },
      ]);
    });
  });

  test("refuses a move without a time, and a second taking out", async () => {
    await withDb(async (db) => {
      const { scope, events, lead } = await makeDay(db);
      const moved = await correctRecord(scope, form(events[1]!.id, { deed: "move" }), lead);
      expect(moved).toMatchObject({ ok: false, problem: { errors: [{ path: "time" }] } });
      await correctRecord(scope, form(events[1]!.id), lead);
      expect(await correctRecord(scope, form(events[1]!.id), lead)).toMatchObject({
        ok: false,
        problem: { detail: expect.stringMatching(/taken out meanwhile/) },
      });
    });
  });
});

describe("enterShift", () => {
  test("lets somebody in who forgot, and refuses who is in already", async () => {
    await withDb(async (db) => {
      const { scope, lead } = await makeDay(db);
      const form = {
        id: uuid(),
        worker: "1042",
        deed: "shift-start" as const,
        time: "2026-05-15T06:00",
        reason: "forgot",
      };
      expect(await enterShift(scope, form, lead)).toMatchObject({ ok: true });
      const { rows } = await db.execute(sql`
        select start_at, end_at from shifts
        where site_id = ${scope.siteId} and end_at is null`);
      expect(rows).toEqual([{ start_at: "2026-05-15 06:00:00+00", end_at: null }]);
      const again = { ...form, id: uuid(), time: "2026-05-15T07:00" };
      expect(await enterShift(scope, again, lead)).toMatchObject({
        ok: false,
        problem: { detail: "In since 06:00 already. Move that start instead." },
      });
      const end = { ...form, id: uuid(), deed: "shift-end" as const, time: "2026-05-15T09:30" };
      expect(await enterShift(scope, end, lead)).toMatchObject({ ok: true });
      expect(await rebuild(scope)).toEqual({ timelines: 0, tickets: 0, receipts: 0, rollups: 0 });
    });
  });
});

describe("own plans", () => {
  test("the plan of a date that was entered last counts, alone and in sums", async () => {
    await withDb(async (db) => {
      const factory = await makeFactory(db, "UTC");
      const { siteId, workerId, cellIds } = factory;
      const plan = (startHour: number) => ({
        siteId,
        id: uuid(),
        workerId,
        workOn: "2026-05-14",
        startAt: new Date(Date.UTC(2026, 4, 14, startHour)),
        endAt: new Date(Date.UTC(2026, 4, 14, 14)),
      });
      await db.insert(plannedShifts).values([plan(5), plan(6)]);
      const start = Date.UTC(2026, 4, 14, 6) / 1000;
      expect(await listOwnPlanned(factory, workerId, range)).toEqual([
        { date: "2026-05-14", start, end: start + 8 * 3600 },
      ]);
      expect([...(await listPlannedSums(factory, null, range))]).toEqual([[workerId, 8 * 3600]]);
      expect([...(await listPlannedSums(factory, [cellIds.Neck], range))]).toEqual([]);
    });
  });
});
