import { sql } from "drizzle-orm";
import { v7 as uuid } from "uuid";
import { describe, expect, test } from "vitest";
import { accounts } from "@/db/access/tables";
import type { Db } from "@/db/client";
import { findBench } from "@/db/kiosks/bench";
import { bookEvents } from "@/db/ledger/commands";
import { bookDeed, type OfficeDeed } from "@/db/ledger/office";
import { rebuild } from "@/db/timeline/rebuild";
import type { EventBody } from "@/lib/ledger/schema";
import { type Factory, makeFactory, makeTicket } from "@/tests/make/factory";
import { makeKiosk, tap } from "@/tests/make/kiosk";
import { ownDatabase, withDb } from "@/tests/setup/db";

const at = (time: string) => new Date(`2026-05-14T${time}:00Z`);
const item = { ticket: "26000017", operation: "010" };

/** A day of worker 1042 on a ticket, whose end nobody tapped. */
async function makeDay(db: Db) {
  const factory = await makeFactory(db);
  const kiosk = await makeKiosk(factory);
  await makeTicket(factory, { number: item.ticket });
  const events = [
    tap(kiosk, "06:00", { kind: "shift-start" }),
    tap(kiosk, "06:05", { kind: "work", activity: "run", items: [item] }),
    tap(kiosk, "11:00", { kind: "report", ...item, good: 1, rework: 0, scrap: 0, stop: true }),
  ];
  const scope = { db, siteId: factory.siteId };
  await bookEvents(scope, { kioskId: kiosk.kioskId, events, receivedAt: at("11:00") });
  await rebuild(scope); // the ticket is judged, as the job would have by then
  return { factory, kiosk, events, scope };
}

const LEAD = "0193d5a0-0000-7000-8000-000000000001";

function deed(body: EventBody, other: Partial<OfficeDeed> = {}, id: string = uuid()): OfficeDeed {
  return {
    acts: [{ id, worker: "1042", body, note: "asked at the bench" }],
    by: `account:${LEAD}`,
    actor: `account:${LEAD}`,
    now: at("16:00"),
    within: null,
    ...other,
  };
}

async function count(db: Db, { siteId }: Factory, table: string): Promise<number> {
  const { rows } = await db.execute<{ count: number }>(
    sql`select count(*)::int as count from ${sql.raw(table)} where site_id = ${siteId}`,
  );
  return rows[0]!.count;
}

describe("bookDeed", () => {
  test("ends a shift for someone who forgot: ledger, note, time and audit in one", async () => {
    await withDb(async (db) => {
      const { factory, scope } = await makeDay(db);
      const event = { kind: "shift-end", at: at("14:30").toISOString() };
      expect(await bookDeed(scope, deed({ kind: "insert", event }))).toMatchObject({ ok: true });
      const { rows } = await db.execute(sql`
        select s.end_at, s.provisional, e.kind, e.by, e.kiosk_id, n.text, a.actor, a.action
        from shifts s
        join clock_events e on e.site_id = s.site_id and e.id = s.end_event_id
        join notes n on n.site_id = s.site_id and n.event_id = e.id
        join audit_log a on a.site_id = s.site_id and a.subject = 'event:' || e.id
        where s.site_id = ${factory.siteId}`);
      expect(rows).toMatchObject([
        {
          end_at: "2026-05-14 14:30:00+00",
          provisional: false,
          kind: "insert",
          by: expect.stringMatching(/^account:/),
          kiosk_id: null,
          text: "asked at the bench",
          actor: expect.stringMatching(/^account:/),
          action: "records.insert",
        },
      ]);
      expect(await rebuild(scope)).toEqual({ timelines: 0, tickets: 0, rollups: 0, receipts: 0 });
    });
  });

  test("judges the ticket at once when a count is taken out", async () => {
    await withDb(async (db) => {
      const { factory, scope, events } = await makeDay(db);
      const stands = async () => {
        const { rows } = await db.execute(sql`
          select p.state, p.good
          from ticket_operations p
          join operations o on o.site_id = p.site_id and o.id = p.operation_id
          where p.site_id = ${factory.siteId} and o.code = '010'`);
        return rows;
      };
      expect(await stands()).toEqual([{ state: "finished", good: 1 }]);
      await bookDeed(scope, deed({ kind: "void", event: events[2]!.id }));
      expect(await stands()).toEqual([{ state: "working", good: 0 }]);
      expect(await rebuild(scope)).toEqual({ timelines: 0, tickets: 0, rollups: 0, receipts: 0 });
    });
  });

  test("the worker's bench tells the change, and keeps its form", async () => {
    await withDb(async (db) => {
      const { kiosk, scope, events } = await makeDay(db);
      const account = {
        id: LEAD,
        email: "lead@testing.example",
        name: "Ada Berg",
        passwordHash: "-",
      };
      await db.insert(accounts).values(account);
      await bookDeed(
        scope,
        deed({ kind: "move", event: events[0]!.id, to: at("05:50").toISOString() }),
      );
      const asked = { kioskId: kiosk.kioskId, number: "1042", at: at("16:05") };
      const bench = await findBench(scope, asked);
      expect(bench?.shift).toEqual({ start: at("05:50").toISOString() });
      expect(bench?.changes).toMatchObject([
        { kind: "move", by: "Ada Berg", note: "asked at the bench" },
      ]);
      expect(bench?.events.map(({ session }) => typeof session)).toEqual(
        bench?.events.map(() => "string"),
      );
    });
  });

  test("sent twice it books once", async () => {
    await withDb(async (db) => {
      const { factory, scope, events } = await makeDay(db);
      const twice = deed({ kind: "void", event: events[2]!.id });
      expect(await bookDeed(scope, twice)).toMatchObject({ ok: true });
      const before = await count(db, factory, "clock_events");
      expect(await bookDeed(scope, { ...twice, now: at("16:01") })).toMatchObject({ ok: true });
      expect(await count(db, factory, "clock_events")).toBe(before);
    });
  });

  test("a lead enters nothing for the people of other cells", async () => {
    await withDb(async (db) => {
      const { factory, scope, events } = await makeDay(db);
      const before = await count(db, factory, "clock_events");
      const answer = await bookDeed(
        scope,
        deed({ kind: "void", event: events[2]!.id }, { within: [factory.cellIds.Neck] }),
      );
      expect(answer).toMatchObject({
        ok: false,
        problem: { detail: "1042 is not one of your people." },
      });
      expect(await count(db, factory, "clock_events")).toBe(before);
    });
  });
});

describe("two people at once", () => {
  const own = ownDatabase();

  test("settle one question once, however they race", async () => {
    const { factory, scope, events } = await makeDay(own.db);
    const settle = (time: string) =>
      deed(
        {
          kind: "settle",
          end: `no-shift-end:${events[0]!.id}`,
          answer: `end-at:${at(time).toISOString()}`,
        },
        { now: new Date("2026-05-15T06:00:00Z") },
      );
    const answers = await Promise.all(
      ["11:30", "12:00", "12:30", "13:00"].map((time) => bookDeed(scope, settle(time))),
    );
    expect(answers.filter(({ ok }) => ok)).toHaveLength(1);
    const refusals = answers.flatMap((one) => (one.ok ? [] : one.problem.detail));
    expect(new Set(refusals)).toEqual(
      new Set(["Someone settled this meanwhile. Look at the list again."]),
    );
    const { rows } = await own.db.execute(
      sql`select kind from clock_events where site_id = ${factory.siteId} and kind = 'settle'`,
    );
    expect(rows).toHaveLength(1);
    expect(await rebuild(scope)).toEqual({ timelines: 0, tickets: 0, rollups: 0, receipts: 0 });
  });
});
