import { sql } from "drizzle-orm";
import { v7 as uuid } from "uuid";
import { beforeAll, beforeEach, describe, expect, test } from "vitest";
import { currentSealKey } from "@/app/_server/seal";
import { retrySealedBoxes } from "@/app/_server/sealed-sessions";
import { POST as sendEvents } from "@/app/api/kiosk/events/route";
import { kiosks } from "@/db/kiosks/tables";
import { rebuild } from "@/db/timeline/rebuild";
import { sealPin } from "@/lib/kiosks/seal-format";
import { call } from "@/tests/make/call";
import { type Factory, makeFactory } from "@/tests/make/factory";
import { givePin, type MadeKiosk, makeKiosk, tap } from "@/tests/make/kiosk";
import { ownDatabase } from "@/tests/setup/db";

const own = ownDatabase();
let factory: Factory;
let kiosk: MadeKiosk;
const scope = () => ({ db: own.db, siteId: factory.siteId });
const ago = (minutes: number) => new Date(Date.now() - minutes * 60_000).toISOString();
/** When nothing slows down any more what was tried now. */
const later = () => new Date(Date.now() + 2 * 3_600_000);

beforeAll(async () => {
  factory = await makeFactory(own.db);
  await givePin(factory, "271828");
});

beforeEach(async () => {
  await own.db.execute(sql`delete from throttles`);
  await own.db.execute(sql`delete from sealed_boxes`);
  kiosk = await makeKiosk(factory);
});

async function sealed(session: string, pin: string) {
  const key = await currentSealKey(scope());
  const boundTo = { siteId: factory.siteId, kioskId: kiosk.kioskId, worker: "1042", session };
  return { session, worker: "1042", sealed: await sealPin(pin, key, boundTo) };
}

/** Hands in a shift of half an hour under a session of its own; answers with the records' ids. */
async function sendShift(pin: string, minutes = 60) {
  const session = uuid();
  const at = { ...kiosk, session };
  const events = [
    tap(at, ago(minutes), { kind: "shift-start" }),
    { ...tap(at, ago(minutes - 10), { kind: "indirect", code: "cleaning" }), note: "the bench" },
    tap(at, ago(minutes - 30), { kind: "shift-end" }),
  ];
  const sessions = [await sealed(session, pin)];
  const body = { events, sessions, deviceTime: ago(0) };
  const send = () => call(sendEvents, { path: "/api/kiosk/events", cookie: kiosk.cookie, body });
  // safe because a test reads what it expects
  const verdicts = ({ json }: Awaited<ReturnType<typeof send>>) =>
    (json.results as unknown as { verdict: string; looseEnds: string[] }[]).map(
      ({ verdict, looseEnds }) => [verdict, ...looseEnds].join(" "),
    );
  return {
    session,
    ids: events.map(({ id }) => id),
    first: verdicts(await send()),
    send,
    verdicts,
  };
}

async function slowDown() {
  for (let tries = 0; tries < 5; tries += 1) await sendShift("000000", 300 - tries * 40);
}

const count = async (query: ReturnType<typeof sql>) => {
  const { rows } = await own.db.execute<{ n: number }>(sql`select count(*)::int as n ${query}`);
  return rows[0]?.n;
};
const openEnds = () =>
  count(sql`from loose_ends where code = 'unproved' and not settled
  and kiosk_id = ${kiosk.kioskId}`);
const boxes = () => count(sql`from sealed_boxes`);
const segmentsOf = (ids: readonly string[]) =>
  count(sql`from segments where event_id = any (${sql.param(ids)}::uuid[])`);

describe("retrySealedBoxes", () => {
  test("books what came while tries were slowed down, once, and a rebuild changes nothing", async () => {
    await slowDown();
    const shift = await sendShift("271828");
    expect(shift.first).toEqual(Array(3).fill("looseEnd unproved"));
    expect(await boxes()).toBe(1);
    expect(await openEnds()).toBe(18);

    expect(await retrySealedBoxes(scope(), new Date())).toBe(0);
    expect(await boxes()).toBe(1);

    expect(await retrySealedBoxes(scope(), later())).toBe(3);
    expect(await segmentsOf(shift.ids)).toBe(2);
    expect(await openEnds()).toBe(15);
    expect(await boxes()).toBe(0);
    expect(shift.verdicts(await shift.send())).toEqual(Array(3).fill("duplicate"));
    const { timelines, receipts } = await rebuild(scope());
    expect({ timelines, receipts }).toEqual({ timelines: 0, receipts: 0 });
    expect(await retrySealedBoxes(scope(), later())).toBe(0);
  });

  test("a box with a wrong PIN books nothing, and is tried once only", async () => {
    await slowDown();
    await sendShift("000000");
    expect(await boxes()).toBe(1);
    expect(await retrySealedBoxes(scope(), later())).toBe(0);
    expect(await boxes()).toBe(0);
    expect(await openEnds()).toBe(18);
  });

  test("books what is left where the session was opened meanwhile", async () => {
    await slowDown();
    const shift = await sendShift("271828", 120);
    await own.db.execute(sql`delete from throttles`);
    expect(shift.verdicts(await shift.send())).toEqual(Array(3).fill("duplicate unproved"));
    expect(await retrySealedBoxes(scope(), new Date())).toBe(3);
    expect(await segmentsOf(shift.ids)).toBe(2);
  });

  test("two rounds at once book it once", async () => {
    await slowDown();
    const shift = await sendShift("271828", 180);
    const rounds = await Promise.allSettled([
      retrySealedBoxes(scope(), later()),
      retrySealedBoxes(scope(), later()),
    ]);
    const booked = rounds.map((one) => (one.status === "fulfilled" ? one.value : 0));
    expect(booked.sort()).toEqual([0, 3]);
    expect(
      await count(sql`from clock_events where id = any (${sql.param(shift.ids)}::uuid[])
        and kept_for is null`),
    ).toBe(3);
  });

  test("what a person has settled stays as it was settled", async () => {
    await slowDown();
    const shift = await sendShift("271828", 240);
    await own.db.execute(sql`update loose_ends set settled = true where subject = ${shift.ids[1]}`);
    expect(await retrySealedBoxes(scope(), later())).toBe(2);
    expect(await segmentsOf([shift.ids[1] ?? ""])).toBe(0);
  });

  test("a tablet taken out of use proves nothing any more", async () => {
    await slowDown();
    await sendShift("271828");
    await own.db.update(kiosks).set({ revokedAt: new Date() }).where(sql`id = ${kiosk.kioskId}`);
    expect(await retrySealedBoxes(scope(), later())).toBe(0);
  });
});
