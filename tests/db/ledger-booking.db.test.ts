import { sql } from "drizzle-orm";
import { describe, expect, test } from "vitest";
import { bookEvents } from "@/db/ledger/commands";
import { makeFactory, makeTicket } from "@/tests/make/factory";
import { makeKiosk, tap } from "@/tests/make/kiosk";
import { withDb } from "@/tests/setup/db";

const at = (time: string) => new Date(`2026-05-14T${time}:00Z`);

describe("bookEvents", () => {
  test("books a shift with work, a break and a count, and derives its segments", async () => {
    await withDb(async (db) => {
      const factory = await makeFactory(db);
      const kiosk = await makeKiosk(factory);
      await makeTicket(factory, { number: "26000017" });
      const scope = { db, siteId: factory.siteId };
      const item = { ticket: "26000017", operation: "010" };
      const events = [
        tap(kiosk, "06:00", { kind: "shift-start" }),
        tap(kiosk, "06:05", { kind: "work", activity: "setup", items: [item] }),
        tap(kiosk, "06:20", { kind: "work", activity: "run", items: [item] }),
        tap(kiosk, "09:00", { kind: "break-start", break: "rest" }),
        tap(kiosk, "09:10", { kind: "break-end", break: "rest" }),
        tap(kiosk, "11:00", { kind: "report", ...item, good: 1, rework: 0, scrap: 0, stop: true }),
        tap(kiosk, "14:00", { kind: "shift-end" }),
      ];
      const booked = await bookEvents(scope, {
        kioskId: kiosk.kioskId,
        events,
        receivedAt: at("14:00"),
      });
      expect(booked.ok && booked.value.results.map(({ verdict }) => verdict)).toEqual(
        events.map(() => "booked"),
      );
      const { rows } = await db.execute(
        sql`select activity, seconds, weight from segments where site_id = ${factory.siteId} order by start_at`,
      );
      expect(rows).toEqual([
        { activity: "unassigned", seconds: 300, weight: null },
        { activity: "setup", seconds: 900, weight: 2400 },
        { activity: "run", seconds: 9600, weight: 2400 },
        { activity: "rest", seconds: 600, weight: null },
        { activity: "run", seconds: 6600, weight: 2400 },
        { activity: "unassigned", seconds: 10800, weight: null },
      ]);
      const again = await bookEvents(scope, {
        kioskId: kiosk.kioskId,
        events,
        receivedAt: at("14:01"),
      });
      expect(again.ok && again.value.results.map(({ verdict }) => verdict)).toEqual(
        events.map(() => "duplicate"),
      );
    });
  });
});
