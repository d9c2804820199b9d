import { sql } from "drizzle-orm";
import { v7 as uuid } from "uuid";
import { beforeAll, describe, expect, test } from "vitest";
import { hashSecret } from "@/app/_server/secret";
import { GET as getBench } from "@/app/api/kiosk/bench/route";
import { POST as enrol } from "@/app/api/kiosk/enrol/route";
import { POST as sendEvents } from "@/app/api/kiosk/events/route";
import { POST as signIn } from "@/app/api/kiosk/sign-in/route";
import { GET as getTime } from "@/app/api/kiosk/time/route";
import { addEnrolmentCode } from "@/db/kiosks/enrolment";
import { bench, enrolled, eventResults, kioskTime, signedIn } from "@/lib/kiosks/schema";
import { call } from "@/tests/make/call";
import { type Factory, makeFactory, makeTicket } from "@/tests/make/factory";
import { givePin, tap } from "@/tests/make/kiosk";
import { ownDatabase } from "@/tests/setup/db";

const own = ownDatabase();
let factory: Factory;

beforeAll(async () => {
  factory = await makeFactory(own.db);
  await givePin(factory, "271828");
  await makeTicket(factory, { number: "26000017" });
  await addEnrolmentCode(
    { db: own.db, siteId: factory.siteId },
    {
      codeHash: hashSecret("K7MR4XPT"),
      name: "Mill 1",
      cellId: factory.cellIds.Mill,
      by: "command:test",
      now: new Date(),
    },
  );
});

describe("a kiosk from its first minute", () => {
  test("enrols, learns the time, signs a worker in, books the day and shows the bench", async () => {
    const made = await call(enrol, { path: "/api/kiosk/enrol", body: { code: "k7mr-4xpt" } });
    expect(made.status).toBe(200);
    const device = enrolled.parse(made.json);
    expect(device).toMatchObject({
      name: "Mill 1",
      cell: "Mill",
      site: { timeZone: "America/Chicago" },
    });
    const cookie = made.headers.get("set-cookie") ?? "";
    expect(cookie).toMatch(
      /^bookmatch_kiosk=[\w-]{43}; Path=\/; Max-Age=\d+; HttpOnly; SameSite=Strict$/,
    );

    const asked = { cookie: cookie.split(";")[0] ?? "" };
    const time = await call(getTime, {
      path: "/api/kiosk/time?build=b1&queued=3&battery=81.4",
      ...asked,
    });
    expect(kioskTime.parse(time.json).sealKey).toEqual(device.sealKey);
    const { rows } = await own.db.execute(
      sql`select build, queued, battery_percent from kiosks where id = ${device.deviceId}`,
    );
    expect(rows).toEqual([{ build: "b1", queued: 3, battery_percent: 81 }]);

    const session = uuid();
    const body = { session, worker: "1042", pin: "271828" };
    const signed = await call(signIn, { path: "/api/kiosk/sign-in", body, ...asked });
    expect(signed.status).toBe(200);
    const { token, worker, bench: empty } = signedIn.parse(signed.json);
    expect(worker).toEqual({ worker: "1042", name: "Ilo Varn", language: "en", role: "worker" });
    expect(empty).toMatchObject({ shift: null, work: null, events: [] });

    const now = Date.now();
    const kiosk = { kioskId: device.deviceId, cookie: asked.cookie, session };
    const ago = (seconds: number) => new Date(now - seconds * 1000).toISOString();
    const item = { ticket: "26000017", operation: "010" };
    const events = [
      tap(kiosk, ago(600), { kind: "shift-start" }),
      tap(kiosk, ago(500), { kind: "work", activity: "run", items: [item] }),
      { kind: "unheard-of" },
    ];
    const sent = await call(sendEvents, {
      path: "/api/kiosk/events",
      body: { events, deviceTime: new Date().toISOString() },
      ...asked,
    });
    expect(sent.status).toBe(200);
    expect(sent.headers.get("set-cookie")).toContain(asked.cookie);
    const { results } = eventResults.parse(sent.json);
    expect(results.map(({ verdict, looseEnds }) => [verdict, looseEnds])).toEqual([
      ["booked", []],
      ["booked", []],
      ["looseEnd", ["unreadable"]],
    ]);
    expect(results[0]?.bench).toBeUndefined();
    expect(results[1]?.bench).toMatchObject({
      work: {
        activity: "run",
        items: [{ ...item, model: "Heron", name: "Mill work", runSeconds: 1800, bookedSeconds: 0 }],
      },
    });

    const shown = await call(getBench, { path: "/api/kiosk/bench", bearer: token, ...asked });
    const { today, events: window, work } = bench.parse(shown.json);
    expect(window.map(({ body: { kind } }) => kind)).toEqual(["shift-start", "work"]);
    expect(work?.items[0]?.weight).toBe(2400);
    expect(today.attendanceSeconds).toBe(today.directSeconds + today.unassignedSeconds);
  });
});
