import { sql } from "drizzle-orm";
import { v7 as uuid } from "uuid";
import { beforeAll, beforeEach, describe, expect, test } from "vitest";
import { currentSealKey } from "@/app/_server/seal";
import { POST as sendEvents } from "@/app/api/kiosk/events/route";
import { kiosks } from "@/db/kiosks/tables";
import { sealPin } from "@/lib/kiosks/seal-format";
import { call } from "@/tests/make/call";
import { type Factory, makeFactory } from "@/tests/make/factory";
import { givePin, type MadeKiosk, makeKiosk, tap } from "@/tests/make/kiosk";
import { ownDatabase } from "@/tests/setup/db";

const own = ownDatabase();
let factory: Factory;
let kiosk: MadeKiosk;
const now = () => new Date().toISOString();

beforeAll(async () => {
  factory = await makeFactory(own.db);
  await givePin(factory, "271828");
});

beforeEach(async () => {
  kiosk = await makeKiosk(factory, { openedAt: now() });
});

function send(events: unknown[], more: object = {}, cookie = kiosk.cookie) {
  const body = { events, deviceTime: now(), ...more };
  return call(sendEvents, { path: "/api/kiosk/events", cookie, body });
}

const verdictsOf = ({ json }: Awaited<ReturnType<typeof send>>) =>
  // safe because a test reads what it expects
  (json.results as unknown as { verdict: string; looseEnds: string[] }[]).map(
    ({ verdict, looseEnds }) => [verdict, ...looseEnds],
  );

const countRows = async (table: string) => {
  const { rows } = await own.db.execute<{ n: number }>(
    sql`select count(*)::int as n from ${sql.raw(table)}`,
  );
  return rows[0]?.n;
};

describe("200", () => {
  test("the same batch again is all duplicates, and booked once", async () => {
    const event = tap(kiosk, now(), { kind: "shift-start" });
    expect(verdictsOf(await send([event]))).toEqual([["booked"]]);
    const before = await countRows("clock_events");
    expect(verdictsOf(await send([event, event]))).toEqual([["duplicate"], ["duplicate"]]);
    expect(await countRows("clock_events")).toBe(before);
  });

  test("two senders of one record at the same moment book it once", async () => {
    const event = tap(kiosk, now(), { kind: "indirect", code: "cleaning" });
    const answers = await Promise.all([send([event]), send([event]), send([event])]);
    expect(answers.map((answer) => verdictsOf(answer)[0]?.[0]).sort()).toEqual([
      "booked",
      "duplicate",
      "duplicate",
    ]);
  });

  test("keeps whatever cannot be read or stored, and books its neighbours", async () => {
    const odd = [
      null,
      7,
      [],
      { kind: "\0" },
      { deep: JSON.parse("[".repeat(900) + "]".repeat(900)) },
    ];
    const event = tap(kiosk, now(), { kind: "indirect", code: "cleaning" });
    const answer = await send([...odd, { ...event, mood: 1 }, event]);
    expect(verdictsOf(answer).slice(0, 6)).toEqual(Array(6).fill(["looseEnd", "unreadable"]));
    expect(verdictsOf(answer)[6]?.[0]).toBe("booked");
    expect(answer.json.results).toHaveLength(7);
    expect(verdictsOf(await send(odd))).toEqual(Array(5).fill(["duplicate", "unreadable"]));
  });

  test("keeps the record of a session that this kiosk does not know, and shows no bench for it", async () => {
    const other = await makeKiosk(factory, { cell: "Neck" });
    const answer = await send([tap(other, now(), { kind: "indirect", code: "x" })]);
    expect(verdictsOf(answer)).toEqual([["looseEnd", "unproved"]]);
    expect(JSON.stringify(answer.json)).not.toContain("bench");
  });

  describe("a session sealed while the server was away", () => {
    async function sealed(pin: string, boundTo: { session: string; kioskId?: string }) {
      const scope = { db: own.db, siteId: factory.siteId };
      const { session, kioskId = kiosk.kioskId } = boundTo;
      const binding = { siteId: factory.siteId, kioskId, worker: "1042", session };
      return {
        session,
        worker: "1042",
        sealed: await sealPin(pin, await currentSealKey(scope), binding),
      };
    }
    const tapIn = (session: string) =>
      tap({ ...kiosk, session }, now(), { kind: "indirect", code: "cleaning" });

    test("proves its records, once for all", async () => {
      const session = uuid();
      const box = await sealed("271828", { session });
      expect(verdictsOf(await send([tapIn(session)], { sessions: [box] }))[0]?.[0]).toBe("booked");
      expect(verdictsOf(await send([tapIn(session)]))[0]?.[0]).toBe("booked");
    });

    test("proves nothing with a wrong PIN, in another kiosk's box, or for another session", async () => {
      const session = uuid();
      const boxes = [
        await sealed("000000", { session }),
        await sealed("271828", { session, kioskId: uuid() }),
        { ...(await sealed("271828", { session: uuid() })), session },
        { session, worker: "1042", sealed: "v1.unknown.AAAA" },
      ];
      for (const box of boxes) {
        const answer = await send([tapIn(session)], { sessions: [box] });
        expect(verdictsOf(answer)).toEqual([["looseEnd", "unproved"]]);
      }
    });

    test("counts wrong PINs in the same throttle, so that a batch tells nobody a PIN", async () => {
      for (let tries = 0; tries < 5; tries += 1) {
        const session = uuid();
        await send([tapIn(session)], { sessions: [await sealed("000000", { session })] });
      }
      const session = uuid();
      const answer = await send([tapIn(session)], {
        sessions: [await sealed("271828", { session })],
      });
      expect(verdictsOf(answer)).toEqual([["looseEnd", "unproved"]]);
    });
  });

  test("a kiosk out of use hands in what it kept, all of it as loose ends", async () => {
    await own.db.update(kiosks).set({ revokedAt: new Date() }).where(sql`id = ${kiosk.kioskId}`);
    const answer = await send([tap(kiosk, now(), { kind: "shift-end" })]);
    expect(verdictsOf(answer)).toEqual([["looseEnd", "revoked"]]);
  });
});

describe("400, 413 and 422 write nothing", () => {
  test.each([
    ["no JSON", 400, "{"],
    ["over 1 MB", 413, JSON.stringify({ events: ["x".repeat(1_000_001)] })],
    ["no events", 422, { events: [], deviceTime: "2026-05-14T08:00:00Z" }],
    ["more than 500", 422, { events: Array(501).fill(1), deviceTime: "2026-05-14T08:00:00Z" }],
    ["no instant", 422, { events: [1], deviceTime: "today" }],
    ["an unknown field", 422, { events: [1], deviceTime: "2026-05-14T08:00:00Z", more: 1 }],
  ])("%s: %d", async (_, status, body) => {
    const before = await countRows("clock_events");
    const answer = await call(sendEvents, {
      path: "/api/kiosk/events",
      cookie: kiosk.cookie,
      body,
    });
    expect(answer.status).toBe(status);
    expect(answer.type).toBe("application/problem+json");
    expect(await countRows("clock_events")).toBe(before);
  });
});

describe("401", () => {
  test("a browser that is no kiosk", async () => {
    expect((await send([1], {}, "bookmatch_kiosk=unknown")).status).toBe(401);
  });
});

describe("403", () => {
  test("a kiosk out of use that has handed in its share", async () => {
    await own.db.update(kiosks).set({ revokedAt: new Date() }).where(sql`id = ${kiosk.kioskId}`);
    const full = Array.from({ length: 2 }, (_, at) => `${at}${"x".repeat(490_000)}`);
    expect((await send(full)).status).toBe(200);
    expect((await send(full.map((text) => `a${text}`))).status).toBe(200);
    expect((await send(full.map((text) => `b${text}`))).status).toBe(403);
  });
});
