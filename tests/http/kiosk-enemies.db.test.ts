import { sql } from "drizzle-orm";
import fc from "fast-check";
import { beforeAll, beforeEach, describe, expect, test } from "vitest";
import { POST as sendEvents } from "@/app/api/kiosk/events/route";
import { rebuild } from "@/db/timeline/rebuild";
import { call } from "@/tests/make/call";
import { type Factory, makeFactory } from "@/tests/make/factory";
import { type MadeKiosk, makeKiosk, tap } from "@/tests/make/kiosk";
import { ownDatabase } from "@/tests/setup/db";

const own = ownDatabase();
let factory: Factory;
let kiosk: MadeKiosk;
const HOUR = 3_600_000;

beforeAll(async () => {
  factory = await makeFactory(own.db, "Europe/Berlin");
});

beforeEach(async () => {
  kiosk = await makeKiosk(factory, { openedAt: "2026-10-24T18:00:00Z" });
});

interface Answered {
  id: string;
  verdict: string;
  looseEnds: string[];
}

async function send(events: readonly unknown[], deviceTime = new Date().toISOString()) {
  const asked = { path: "/api/kiosk/events", cookie: kiosk.cookie, body: { events, deviceTime } };
  const answer = await call(sendEvents, asked);
  expect(answer.status).toBe(200);
  // safe because a test reads what it expects
  return answer.json.results as unknown as Answered[];
}

const count = async (query: ReturnType<typeof sql>) => {
  const { rows } = await own.db.execute<{ n: number }>(sql`select count(*)::int as n ${query}`);
  return rows[0]?.n;
};
const rowsOfKiosk = () => count(sql`from clock_events where kiosk_id = ${kiosk.kioskId}`);
const isSound = async () => {
  const { timelines, receipts } = await rebuild({ db: own.db, siteId: factory.siteId });
  expect({ timelines, receipts }).toEqual({ timelines: 0, receipts: 0 });
};

describe("POST /api/kiosk/events", () => {
  test("five hundred records of rubbish are each kept once and answered in their order", async () => {
    const rubbish = fc.sample(fc.jsonValue({ maxDepth: 4 }), { numRuns: 200, seed: 7 });
    const sound = tap(kiosk, "2026-10-24T20:00:00Z", { kind: "indirect", code: "cleaning" });
    const spoilt = ["id", "v", "kind", "session", "worker", "at", "clock", "code"].flatMap(
      (field) =>
        [null, -1, 1e300, "", "\0", [], {}, "x".repeat(900)].map((value) => ({
          ...sound,
          [field]: value,
        })),
    );
    const events = [...rubbish, ...spoilt];
    const before = await rowsOfKiosk();
    const [one, other] = await Promise.all([send(events), send(events)]);
    expect(one).toHaveLength(events.length);
    expect(one.map(({ id }) => id)).toEqual(other.map(({ id }) => id));
    expect(((await rowsOfKiosk()) ?? 0) - (before ?? 0)).toBe(
      new Set(one.map(({ id }) => id)).size,
    );
    expect((await send([sound]))[0]?.verdict).not.toBe("duplicate");
    await isSound();
  });

  test("two connections that hand in the same hundred at once book them once", async () => {
    const start = Date.parse("2026-10-24T18:00:00Z");
    const events = Array.from({ length: 100 }, (_, at) =>
      tap(kiosk, new Date(start + at * 60_000).toISOString(), {
        kind: "indirect",
        code: at % 2 ? "cleaning" : "meeting",
      }),
    );
    const before = (await rowsOfKiosk()) ?? 0;
    const answers = await Promise.all([send(events), send(events.toReversed()), send(events)]);
    const verdicts = events.map(({ id }) =>
      answers
        .flatMap((answer) => answer.filter((one) => one.id === id))
        .map(({ verdict }) => verdict)
        .sort(),
    );
    expect(verdicts).toEqual(events.map(() => ["booked", "duplicate", "duplicate"]));
    expect((await rowsOfKiosk()) ?? 0).toBe(before + 100);
    await isSound();
  });

  test("a clock three hours fast, and not known to be, books what the server's clock says", async () => {
    const now = Date.now();
    const wrong = new Date(now + 3 * HOUR).toISOString();
    const event = tap(kiosk, wrong, { kind: "shift-start" });
    const [answer] = await send([{ ...event, clock: { ...event.clock, offsetMs: null } }], wrong);
    expect(answer?.verdict).toBe("booked");
    const { rows } = await own.db.execute<{ at: string }>(
      sql`select epoch_ms(at)::float8 as at from clock_events where id = ${event.id}`,
    );
    expect(Math.abs(Number(rows[0]?.at) - now)).toBeLessThan(60_000);
  });

  test("a clock that says it is measured, three hours ahead, is kept and not counted", async () => {
    const wrong = new Date(Date.now() + 3 * HOUR).toISOString();
    const [answer] = await send([tap(kiosk, wrong, { kind: "shift-end" })], wrong);
    expect([answer?.verdict, answer?.looseEnds]).toEqual(["looseEnd", ["future"]]);
  });
});
