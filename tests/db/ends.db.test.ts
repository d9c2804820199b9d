import { sql } from "drizzle-orm";
import { v7 as uuid } from "uuid";
import { describe, expect, test } from "vitest";
import type { Db } from "@/db/client";
import { type Settling, settleEnd } from "@/db/ends/commands";
import { countEnds, findEnd, findOpenEnd, listEnds } from "@/db/ends/queries";
import { bookEvents } from "@/db/ledger/commands";
import { findSite } from "@/db/sites/queries";
import { rebuild } from "@/db/timeline/rebuild";
import type { SettleForm } from "@/lib/ends/schema";
import { makeFactory } from "@/tests/make/factory";
import { makeKiosk, makeWorker, tap } from "@/tests/make/kiosk";
import { ownDatabase, withDb } from "@/tests/setup/db";

const NEXT_DAY = new Date("2026-05-15T10:00:00Z");
const all = { within: null, cell: "", code: "" } as const;
const page = { after: undefined, limit: 50 };

/** Worker 1042 of the Mill came in and left without a word; one record of theirs was not proved. */
async function makeEnds(db: Db) {
  const factory = await makeFactory(db, "UTC");
  const kiosk = await makeKiosk(factory);
  const unproved = tap(kiosk, "09:00", { kind: "indirect", code: "meeting" }, { session: uuid() });
  const unknown = tap(kiosk, "08:00", { kind: "shift-start" }, { worker: "77" });
  const events = [
    tap(kiosk, "06:00", { kind: "shift-start" }),
    tap(kiosk, "06:05", { kind: "indirect", code: "cleaning" }),
    unproved,
    unknown,
    "scribble",
  ];
  const scope = { db, siteId: factory.siteId };
  const receivedAt = new Date("2026-05-14T09:00:00Z");
  await bookEvents(scope, { kioskId: kiosk.kioskId, events, receivedAt });
  const later = [tap(kiosk, "2026-05-15T09:00:00Z", { kind: "shift-start" })];
  const openedAt = "2026-05-15T08:59:00Z";
  const again = await makeKiosk(factory, { openedAt });
  await bookEvents(scope, {
    kioskId: again.kioskId,
    events: later.map((event) => ({ ...event, session: again.session })),
    receivedAt: new Date("2026-05-15T09:00:00Z"),
  });
  const { rules } = (await findSite(scope))!;
  const settling: Settling = {
    by: "account:a",
    actor: "account:a",
    within: null,
    now: NEXT_DAY,
    rules,
  };
  return { factory, scope, settling, start: events[0] as { id: string }, unproved, unknown };
}

function form(code: SettleForm["code"], subject: string, other: Partial<SettleForm>): SettleForm {
  const empty = { time: "", worker: "", reason: "asked them" };
  return { id: uuid(), code, subject, answer: "accept", ...empty, ...other };
}

const spans = async (db: Db, siteId: string) => {
  const { rows } = await db.execute<{ activity: string; seconds: number }>(sql`
    select s.activity, coalesce(s.code, '') as code, s.seconds from segments s
    where s.site_id = ${siteId} and s.end_at is not null order by s.start_at`);
  return rows;
};

describe("listEnds", () => {
  test("lists the worst first, in pages, and a lead's own cells only", async () => {
    await withDb(async (db) => {
      const { scope, factory } = await makeEnds(db);
      const rows = await listEnds(scope, all, page);
      expect(rows.map(({ code }) => code)).toEqual([
        "no-shift-end",
        "unknown-worker",
        "unproved",
        "unreadable",
      ]);
      expect(rows[0]).toMatchObject({ worker: "1042", name: "Ilo Varn", cell: "Mill" });
      const [second] = await listEnds(scope, all, {
        after: [rows[0]!.rank, rows[0]!.atMs, rows[0]!.code, rows[0]!.subject],
        limit: 1,
      });
      expect(second).toEqual(rows[1]);
      const mill = { ...all, within: [factory.cellIds.Mill] };
      const neck = { ...all, within: [factory.cellIds.Neck] };
      expect(await listEnds(scope, mill, page)).toEqual(rows);
      expect(await listEnds(scope, neck, page)).toEqual([]);
      expect(await countEnds(scope, { ...all, worker: "1042" })).toEqual([
        { code: "no-shift-end", count: 1 },
        { code: "unproved", count: 1 },
      ]);
    });
  });

  test("nothing crosses to another site", async () => {
    await withDb(async (db) => {
      const { start } = await makeEnds(db);
      const other = await makeFactory(db);
      const scope = { db, siteId: other.siteId };
      expect(await listEnds(scope, all, page)).toEqual([]);
      expect(await findEnd(scope, { code: "no-shift-end", subject: start.id }, null)).toBeNull();
    });
  });
});

describe("findOpenEnd", () => {
  test("is the named one, else the first", async () => {
    await withDb(async (db) => {
      const { scope, start, unproved } = await makeEnds(db);
      const named = { code: "unproved", subject: unproved.id };
      expect(await findOpenEnd(scope, all, named)).toMatchObject({
        code: "unproved",
        body: { kind: "indirect", code: "meeting" },
        shift: null,
      });
      expect(await findOpenEnd(scope, all, { code: "", subject: "" })).toMatchObject({
        subject: start.id,
        shift: { startMs: Date.parse("2026-05-14T06:00:00Z"), provisional: true },
        stretches: [{ activity: "unassigned" }],
      });
    });
  });
});

describe("settleEnd", () => {
  test("ends a forgotten shift where a person says it ended", async () => {
    await withDb(async (db) => {
      const { scope, settling, start } = await makeEnds(db);
      const settle = form("no-shift-end", start.id, { answer: "end-at", time: "2026-05-14T14:30" });
      expect(await settleEnd(scope, settle, settling)).toEqual({ ok: true, value: undefined });
      expect(await spans(db, scope.siteId)).toEqual([
        { activity: "unassigned", code: "", seconds: 300 },
        { activity: "indirect", code: "cleaning", seconds: 8.4 * 3600 + 60 },
      ]);
      expect((await listEnds(scope, all, page)).map(({ code }) => code)).not.toContain(
        "no-shift-end",
      );
      expect(await rebuild(scope)).toEqual({ timelines: 0, tickets: 0, receipts: 0, rollups: 0 });
      expect(await settleEnd(scope, settle, settling)).toMatchObject({ ok: true });
      const other = form("no-shift-end", start.id, { answer: "end-at", time: "2026-05-14T13:00" });
      expect(await settleEnd(scope, other, settling)).toMatchObject({
        ok: false,
        problem: { detail: expect.stringMatching(/settled this meanwhile/) },
      });
    });
  });

  test("takes a record in that was kept, and a rebuild keeps both", async () => {
    await withDb(async (db) => {
      const { scope, settling, unproved } = await makeEnds(db);
      const settle = form("unproved", unproved.id, { answer: "take-in" });
      expect(await settleEnd(scope, settle, settling)).toMatchObject({ ok: true });
      expect(await spans(db, scope.siteId)).toContainEqual({
        activity: "indirect",
        code: "cleaning",
        seconds: 175 * 60,
      });
      expect(await rebuild(scope)).toEqual({ timelines: 0, tickets: 0, receipts: 0, rollups: 0 });
    });
  });

  test("a record of a number that nobody has is given to whoever made it", async () => {
    await withDb(async (db) => {
      const { scope, settling, unknown, factory } = await makeEnds(db);
      await makeWorker(factory, { number: "1077" });
      const settle = form("unknown-worker", unknown.id, { answer: "take-in" });
      expect(await settleEnd(scope, settle, settling)).toMatchObject({
        ok: false,
        problem: { errors: [{ path: "worker" }] },
      });
      const given = await settleEnd(scope, { ...settle, worker: "1077" }, settling);
      expect(given).toMatchObject({ ok: true });
      expect(await listEnds(scope, { ...all, worker: "1077" }, page)).toMatchObject([
        { code: "no-shift-end", atMs: Date.parse("2026-05-14T08:00:00Z") },
      ]);
      expect(await rebuild(scope)).toEqual({ timelines: 0, tickets: 0, receipts: 0, rollups: 0 });
    });
  });

  test("what nobody can read is left out, and stays in the ledger", async () => {
    await withDb(async (db) => {
      const { scope, settling } = await makeEnds(db);
      const rows = await listEnds(scope, { ...all, code: "unreadable" }, page);
      const settle = form("unreadable", rows[0]!.subject, { answer: "leave-out" });
      expect(await settleEnd(scope, settle, settling)).toMatchObject({ ok: true });
      expect(await listEnds(scope, { ...all, code: "unreadable" }, page)).toEqual([]);
      expect(await rebuild(scope)).toEqual({ timelines: 0, tickets: 0, receipts: 0, rollups: 0 });
    });
  });

  test("a lead settles nothing of other cells", async () => {
    await withDb(async (db) => {
      const { scope, settling, start, factory } = await makeEnds(db);
      const settle = form("no-shift-end", start.id, { answer: "end-at", time: "2026-05-14T14:30" });
      const answer = await settleEnd(scope, settle, {
        ...settling,
        within: [factory.cellIds.Neck],
      });
      expect(answer).toMatchObject({ ok: false, problem: { code: "notFound" } });
    });
  });
});

describe("two leads at once", () => {
  const own = ownDatabase();

  test("leave out one unreadable record once", async () => {
    const { scope, settling } = await makeEnds(own.db);
    const [row] = await listEnds(scope, { ...all, code: "unreadable" }, page);
    const answers = await Promise.all(
      [1, 2, 3].map(() =>
        settleEnd(scope, form("unreadable", row!.subject, { answer: "leave-out" }), settling),
      ),
    );
    expect(answers.filter(({ ok }) => ok)).toHaveLength(1);
    const { rows } = await own.db.execute(
      sql`select 1 from clock_events where site_id = ${scope.siteId} and kind = 'settle'`,
    );
    expect(rows).toHaveLength(1);
  });
});
