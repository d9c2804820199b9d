import { count, eq, isNull, sql } from "drizzle-orm";
import { beforeAll, describe, expect, test, vi } from "vitest";
import { accountRoles } from "@/db/access/tables";
import { dirtyMarks } from "@/db/jobs/tables";
import { kiosks } from "@/db/kiosks/tables";
import { clockEvents } from "@/db/ledger/tables";
import { workers } from "@/db/people/tables";
import { rebuildRollups } from "@/db/seam/commands";
import { loadDemo } from "@/db/seed/load";
import { DEMO_SITE_ID, demoSignIns, findDemoSignIns } from "@/db/seed/sign-ins";
import { foundSite } from "@/db/sites/found";
import { rebuildTickets } from "@/db/tickets/commands";
import { ticketOperations, tickets } from "@/db/tickets/tables";
import { rebuildTimelines } from "@/db/timeline/commands";
import { segments, shifts } from "@/db/timeline/tables";
import { roles } from "@/lib/access/roles";
import { cast } from "@/lib/demo/cast";
import { ok } from "@/lib/result";
import { ownDatabase, withDb } from "@/tests/setup/db";

/** A slice of the scenario: few people, about a week, on a Wednesday morning. */
const slice = {
  now: new Date("2026-05-13T15:30:00Z"),
  weeks: 1,
  people: cast.filter((_, index) => index % 4 === 1),
  openTickets: 40,
};
const hash = (secret: string) => Promise.resolve(`hash of ${secret}`);

// Hundreds of bookings are made for real, which takes seconds.
vi.setConfig({ testTimeout: 60_000, hookTimeout: 120_000 });

const own = ownDatabase();
const steps: string[] = [];
let loaded: Awaited<ReturnType<typeof loadDemo>>;

beforeAll(async () => {
  const onProgress = (step: string) => steps.push(step);
  loaded = await loadDemo({ db: own.db, hash, onProgress, ...slice });
});

async function rows(
  table: typeof clockEvents | typeof workers | typeof kiosks | typeof tickets,
  where = sql`true`,
) {
  const [found] = await own.db.select({ rows: count() }).from(table).where(where);
  return found!.rows;
}

describe("loadDemo", () => {
  test("writes the house and books every event, none of which the ledger must keep apart", async () => {
    expect(loaded).toEqual(
      ok({ siteId: DEMO_SITE_ID, events: expect.any(Number), tickets: expect.any(Number) }),
    );
    expect(await rows(workers)).toBe(64);
    expect(await rows(kiosks)).toBe(11);
    expect(await rows(clockEvents)).toBe(loaded.ok && loaded.value.events);
    expect(await rows(clockEvents, isNull(clockEvents.keptFor))).toBe(await rows(clockEvents));
  });

  test("the server had each event shortly after the tap, or when the kiosk was back", async () => {
    const [late] = await own.db
      .select({ rows: count() })
      .from(clockEvents)
      .where(sql`${clockEvents.receivedAt} > ${clockEvents.at} + interval '2 hours'`);
    expect(late!.rows).toBe(0);
  });

  test("a shift is running, work is in hand, tickets stand at every stage", async () => {
    const open = await own.db
      .select({ start: shifts.startAt })
      .from(shifts)
      .where(isNull(shifts.endAt));
    expect(open.length).toBeGreaterThan(5);
    const doing = await own.db
      .select({ activity: segments.activity })
      .from(segments)
      .where(isNull(segments.endAt));
    expect(doing.map(({ activity }) => activity)).toContain("run");
    const found = await own.db
      .selectDistinct({ state: ticketOperations.state })
      .from(ticketOperations);
    const states = found.map(({ state }) => state);
    expect(states).toEqual(expect.arrayContaining(["finished", "working", "ready", "waiting"]));
    expect(await rows(tickets, eq(tickets.status, "open"))).toBe(40);
  });

  test("what was derived is what a rebuild derives, and nothing waits to be judged", async () => {
    const scope = { db: own.db, siteId: DEMO_SITE_ID };
    expect(await rebuildTimelines(scope)).toBe(0);
    expect(await rebuildTickets(scope)).toBe(0);
    expect(await rebuildRollups(scope)).toBe(0);
    expect(await own.db.$count(dirtyMarks)).toBe(0);
  });

  test("tells how far it has come", () => {
    expect([...new Set(steps)]).toEqual([
      "Playing eight weeks at Larkmoor Stringworks",
      "Building the factory",
      "Booking its hours",
      "Judging its tickets",
    ]);
  });

  test("refuses to load into a house that stands", async () => {
    const again = await loadDemo({ db: own.db, hash, ...slice });
    expect(again).toMatchObject({ ok: false, problem: { code: "conflict" } });
  });
});

describe("findDemoSignIns", () => {
  test("tells the sign-ins of the demo, each of whom is there", async () => {
    const found = await findDemoSignIns(own.db);
    expect(found).toEqual(demoSignIns());
    expect(new Set(found!.office.map(({ role }) => role))).toEqual(new Set(roles));
    const held = await own.db
      .selectDistinct({ account: accountRoles.accountId })
      .from(accountRoles);
    expect(held).toHaveLength(found!.office.length);
    expect(found!.workers).toHaveLength(64);
    expect(found!.cells).toHaveLength(11);
  });

  test("tells nothing where the factory is somebody's own", async () => {
    const found = await withDb(async (db) => {
      await foundSite(db, { name: "Somebody's own", timeZone: "America/Chicago" });
      return findDemoSignIns(db);
    });
    expect(found).toBeNull();
  });
});
