import { sql } from "drizzle-orm";
import pg from "pg";
import { describe, expect, inject, test } from "vitest";
import { bookEvents } from "@/db/ledger/commands";
import { makeFactory } from "@/tests/make/factory";
import { makeKiosk, tap } from "@/tests/make/kiosk";
import { ownDatabase } from "@/tests/setup/db";

const own = ownDatabase();
const receivedAt = new Date("2026-05-14T09:00:00Z");

/** Asks the server one thing as its superuser. */
async function ask(text: string, values: unknown[]) {
  const client = new pg.Client({ connectionString: `${inject("server")}postgres` });
  await client.connect();
  return client.query(text, values).finally(() => client.end());
}

/** Asks the server again and again until it answers with a row. */
async function until(text: string, values: unknown[]) {
  for (;;) {
    const { rows } = await ask(text, values);
    if (rows[0]) return rows[0];
  }
}

describe("bookEvents", () => {
  // the tables that a booking writes last, in the middle and near the beginning
  test.each(["audit_log", "loose_ends", "segments", "event_ids"])(
    "killed while it waits for %s leaves nothing behind, and books once when sent again",
    async (table) => {
      const factory = await makeFactory(own.db);
      const kiosk = await makeKiosk(factory);
      const scope = { db: own.db, siteId: factory.siteId };
      const events = [
        tap(kiosk, "08:00", { kind: "indirect", code: "cleaning" }),
        tap(kiosk, "08:30", { kind: "shift-end" }),
      ];
      const batch = { kioskId: kiosk.kioskId, events, receivedAt };
      const count = async () => {
        const { rows } = await own.db.execute(sql`select
          (select count(*)::int from clock_events where site_id = ${scope.siteId}) as events,
          (select count(*)::int from event_ids where site_id = ${scope.siteId}) as ids,
          (select count(*)::int from timeline_heads where site_id = ${scope.siteId}) as heads,
          (select count(*)::int from segments where site_id = ${scope.siteId}) as segments,
          (select count(*)::int from loose_ends where site_id = ${scope.siteId}) as ends`);
        return rows[0];
      };
      await own.db.execute(sql`select make_partition('clock_events', ${receivedAt.toISOString()})`);
      await own.db.execute(sql`select make_partition('segments', ${receivedAt.toISOString()})`);

      const blocker = new pg.Client({ connectionString: own.ownerUrl });
      await blocker.connect();
      await blocker.query(`begin; lock table ${table} in share mode`);
      const killed = bookEvents(scope, batch).then(
        () => "answered",
        () => "killed",
      );
      const database = new URL(own.url).pathname.slice(1);
      const { pid } = await until(
        `select pid from pg_stat_activity
         where datname = $1 and wait_event_type = 'Lock' and query like 'select book(%'`,
        [database],
      );
      await ask("select pg_terminate_backend($1)", [pid]);
      expect(await killed).toBe("killed");
      await blocker.query("rollback");
      await blocker.end();
      expect(await count()).toEqual({ events: 0, ids: 0, heads: 0, segments: 0, ends: 0 });

      const again = await bookEvents(scope, batch);
      expect(again.ok && again.value.results.map(({ verdict }) => verdict)).toEqual([
        "booked",
        "booked",
      ]);
      expect(await count()).toEqual({ events: 2, ids: 2, heads: 1, segments: 1, ends: 1 });
    },
  );
});
