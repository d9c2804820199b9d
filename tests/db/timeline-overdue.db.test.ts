import { sql } from "drizzle-orm";
import { describe, expect, test } from "vitest";
import type { Db } from "@/db/client";
import { bookEvents } from "@/db/ledger/commands";
import { closeOverdueShifts } from "@/db/timeline/commands";
import { listOpenShifts } from "@/db/timeline/queries";
import { rebuild } from "@/db/timeline/rebuild";
import { siteRules } from "@/tests/make/events";
import { makeFactory } from "@/tests/make/factory";
import { makeKiosk, tap } from "@/tests/make/kiosk";
import { withDb } from "@/tests/setup/db";

const at = (text: string) => new Date(`${text}Z`);

/** A site where worker 1042 started a shift at six and forgot to end it. */
async function makeForgotten(db: Db) {
  const factory = await makeFactory(db);
  const kiosk = await makeKiosk(factory);
  const scope = { db, siteId: factory.siteId };
  const events = [
    tap(kiosk, "06:00", { kind: "shift-start" }),
    tap(kiosk, "09:00", { kind: "indirect", code: "cleaning" }),
  ];
  const { kioskId } = kiosk;
  await bookEvents(scope, { kioskId, events, receivedAt: at("2026-05-14T09:00:01") });
  return { scope, kiosk, factory };
}

describe("closeOverdueShifts", () => {
  test("closes a shift past the site's limit, asks, and a rebuild leaves it closed", async () => {
    await withDb(async (db) => {
      const { scope } = await makeForgotten(db);
      const close = (now: string) => closeOverdueShifts(scope, [siteRules], at(now));
      expect(await close("2026-05-14T20:00:00")).toBe(0);
      expect(await listOpenShifts(scope)).toHaveLength(1);
      expect(await close("2026-05-14T20:00:01")).toBe(1);
      expect(await listOpenShifts(scope)).toEqual([]);
      const { rows } = await db.execute(
        sql`select code from loose_ends where site_id = ${scope.siteId}`,
      );
      expect(rows).toEqual([{ code: "no-shift-end" }]);
      expect(await rebuild(scope)).toEqual({ timelines: 0, tickets: 0, rollups: 0, receipts: 0 });
      expect(await close("2026-05-15T20:00:00")).toBe(0);
    });
  });
});

describe("bookEvents", () => {
  test("closes what was forgotten before, also where a late record touches another day", async () => {
    await withDb(async (db) => {
      const { scope, kiosk } = await makeForgotten(db);
      const late = tap(kiosk, "2026-05-10T06:00:00Z", { kind: "indirect", code: "meeting" });
      const receivedAt = at("2026-05-16T06:00:00");
      await bookEvents(scope, { kioskId: kiosk.kioskId, events: [late], receivedAt });
      expect(await listOpenShifts(scope)).toEqual([]);
      expect(await rebuild(scope)).toEqual({ timelines: 0, tickets: 0, rollups: 0, receipts: 0 });
    });
  });

  test("of two sites with equal numbers and ids, each books its own", async () => {
    await withDb(async (db) => {
      const [one, two] = [await makeForgotten(db), await makeForgotten(db)];
      const event = tap(one.kiosk, "10:00", { kind: "shift-end" });
      const receivedAt = at("2026-05-14T10:00:01");
      const send = ({ scope, kiosk }: typeof one) =>
        bookEvents(scope, {
          kioskId: kiosk.kioskId,
          events: [{ ...event, session: kiosk.session }],
          receivedAt,
        });
      const foreign = await bookEvents(two.scope, {
        kioskId: two.kiosk.kioskId,
        events: [{ ...event, id: two.kiosk.session, session: one.kiosk.session }],
        receivedAt,
      });
      expect(foreign.ok && foreign.value.results[0]?.looseEnds).toEqual(["unproved"]);
      for (const site of [one, two]) {
        const booked = await send(site);
        expect(booked.ok && booked.value.results[0]?.verdict).toBe("booked");
        expect(await listOpenShifts(site.scope)).toEqual([]);
      }
    });
  });

  test("takes two statements, one to read and one to write, whatever the batch holds", async () => {
    await withDb(async (db) => {
      const { scope, kiosk } = await makeForgotten(db);
      let statements = 0;
      const counted = new Proxy(db, {
        get(target, name, receiver) {
          if (name === "execute") statements += 1;
          const value: unknown = Reflect.get(target, name, receiver);
          return typeof value === "function" ? value.bind(target) : value;
        },
      });
      const events = ["10:00", "10:10", "10:20"].map((time) =>
        tap(kiosk, time, { kind: "indirect", code: "x" }),
      );
      const receivedAt = at("2026-05-14T10:30:00");
      const batch = { kioskId: kiosk.kioskId, events, receivedAt, withBench: true };
      await bookEvents({ ...scope, db: counted }, batch);
      expect(statements).toBe(2);
      await bookEvents({ ...scope, db: counted }, batch);
      expect(statements).toBe(3);
    });
  });
});
