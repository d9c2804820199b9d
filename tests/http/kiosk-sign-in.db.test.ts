import { sql } from "drizzle-orm";
import { v7 as uuid } from "uuid";
import { beforeAll, describe, expect, test } from "vitest";
import { GET as getBench } from "@/app/api/kiosk/bench/route";
import { POST as signIn } from "@/app/api/kiosk/sign-in/route";
import { kiosks } from "@/db/kiosks/tables";
import { call } from "@/tests/make/call";
import { type Factory, makeFactory } from "@/tests/make/factory";
import { givePin, type MadeKiosk, makeKiosk, makeLead, makeWorker } from "@/tests/make/kiosk";
import { ownDatabase } from "@/tests/setup/db";

const own = ownDatabase();
let factory: Factory;
let kiosk: MadeKiosk;

beforeAll(async () => {
  factory = await makeFactory(own.db);
  kiosk = await makeKiosk(factory);
  await givePin(factory, "271828");
});

/** Keys a number and a PIN on a kiosk. */
function key(worker: string, pin: string, { session = uuid(), on = kiosk } = {}) {
  const body = { session, worker, pin };
  return call(signIn, { path: "/api/kiosk/sign-in", cookie: on.cookie, body });
}

const forgetTries = () => own.db.execute(sql`delete from throttles`);

describe("200", () => {
  test("the same session again, whose answer got lost, gets a new token", async () => {
    const session = uuid();
    const [first, again] = [
      await key("1042", "271828", { session }),
      await key("1042", "271828", { session }),
    ];
    expect([first.status, again.status]).toEqual([200, 200]);
    expect(again.json.token).not.toBe(first.json.token);
    const look = (bearer: string) =>
      call(getBench, { path: "/api/kiosk/bench", cookie: kiosk.cookie, bearer });
    expect((await look(first.json.token ?? "")).status).toBe(401);
    expect((await look(again.json.token ?? "")).status).toBe(200);
  });

  test("a right PIN forgets the wrong ones before it", async () => {
    for (let tries = 0; tries < 3; tries += 1) await key("1042", "000000");
    expect((await key("1042", "271828")).status).toBe(200);
    for (let tries = 0; tries < 4; tries += 1) {
      expect((await key("1042", "000000")).status).toBe(401);
    }
    await forgetTries();
  });

  test("sixteen right PINs at once are all let in: nothing is slowed down but wrong ones", async () => {
    const others = Array.from({ length: 16 }, (_, at) => String(6100 + at));
    for (const number of others) await makeWorker(factory, { number, pin: "271828" });
    // slips of this hour that leave the tablet fewer free tries than people stand in the queue
    for (let tries = 0; tries < 20; tries += 1) await key(String(9000 + tries), "000000");
    const apart = await Promise.all(others.map((number) => key(number, "271828")));
    expect(apart.map(({ status }) => status)).toEqual(others.map(() => 200));
    const same = await Promise.all(others.map(() => key("1042", "271828")));
    expect(same.map(({ status }) => status)).toEqual(others.map(() => 200));
    await forgetTries();
  });

  test("a lead sees the bench of somebody of the own cells, and of nobody else", async () => {
    const lead = await makeWorker(factory, { number: "2001", pin: "314159" });
    await makeLead(factory, kiosk, { workerId: lead, cells: ["Mill"] });
    await makeWorker(factory, { number: "3001", cell: "Spray" });
    const { json } = await key("2001", "314159");
    expect(json.worker).toMatchObject({ role: "lead" });
    const look = (worker: string) => {
      const path = `/api/kiosk/bench?worker=${worker}`;
      return call(getBench, { path, cookie: kiosk.cookie, bearer: json.token ?? "" });
    };
    expect((await look("1042")).status).toBe(200);
    expect((await look("3001")).status).toBe(403);
    expect((await look("999")).status).toBe(403);
  });
});

describe("401", () => {
  test("an unknown number, somebody who left and a wrong PIN get the same words", async () => {
    const left = await makeWorker(factory, { number: "4001", pin: "271828" });
    await own.db.execute(sql`update workers set ends_on = '2020-01-01' where id = ${left}`);
    const answers = [
      await key("1042", "111112"),
      await key("999", "271828"),
      await key("4001", "271828"),
    ];
    expect(answers.map(({ status }) => status)).toEqual([401, 401, 401]);
    expect(new Set(answers.map(({ json }) => JSON.stringify(json))).size).toBe(1);
    expect(answers[0]?.type).toBe("application/problem+json");
    await forgetTries();
  });

  test("a browser that is no kiosk", async () => {
    const body = { session: uuid(), worker: "1042", pin: "271828" };
    const { status } = await call(signIn, { path: "/api/kiosk/sign-in", body });
    expect(status).toBe(401);
  });
});

describe("403", () => {
  test("a kiosk that was taken out of use", async () => {
    const old = await makeKiosk(factory);
    await own.db.update(kiosks).set({ revokedAt: new Date() }).where(sql`id = ${old.kioskId}`);
    expect((await key("1042", "271828", { on: old })).status).toBe(403);
  });
});

describe("409", () => {
  test("a session that is somebody else's", async () => {
    const session = uuid();
    await makeWorker(factory, { number: "5001", pin: "161803" });
    expect((await key("1042", "271828", { session })).status).toBe(200);
    expect((await key("5001", "161803", { session })).status).toBe(409);
  });
});

describe("422", () => {
  test.each([
    ["worker", { session: uuid(), worker: "ten", pin: "1" }],
    ["pin", { session: uuid(), worker: "10", pin: "" }],
    ["session", { session: "1", worker: "10", pin: "1" }],
    ["extra", { session: uuid(), worker: "10", pin: "1", extra: 1 }],
  ])("names %s", async (path, body) => {
    const answer = await call(signIn, { path: "/api/kiosk/sign-in", cookie: kiosk.cookie, body });
    expect(answer.status).toBe(422);
    expect(answer.json.errors).toMatchObject([{ path }]);
  });
});

describe("429", () => {
  test("the fifth wrong try in a row waits, for a known and an unknown number alike", async () => {
    for (const number of ["1042", "998"]) {
      for (let tries = 0; tries < 5; tries += 1) await key(number, "000000");
      const answer = await key(number, "271828");
      expect(answer.status).toBe(429);
      expect(Number(answer.headers.get("retry-after"))).toBeGreaterThan(0);
    }
  });

  test("wrong PINs at once pass the limit as little as one after the other", async () => {
    const answers = await Promise.all(Array.from({ length: 12 }, () => key("995", "000000")));
    const statuses = answers.map(({ status }) => status);
    expect(statuses.filter((status) => status === 401)).toHaveLength(5);
    expect(statuses.filter((status) => status === 429)).toHaveLength(7);
  });

  test("on one tablet only: a colleague elsewhere is not locked out", async () => {
    const other = await makeKiosk(factory, { cell: "Neck" });
    expect((await key("1042", "271828", { on: other })).status).toBe(200);
  });

  test("tries at a blocked number slow nothing else down", async () => {
    const count = async () => {
      const { rows } = await own.db.execute<{ failures: number }>(
        sql`select failures from throttles where key like 'kiosk:%' and key like ${`%${kiosk.kioskId}%`}`,
      );
      return rows[0]?.failures;
    };
    for (let tries = 0; tries < 5; tries += 1) await key("997", "000000");
    const before = await count();
    for (let tries = 0; tries < 5; tries += 1) expect((await key("997", "0")).status).toBe(429);
    expect(await count()).toBe(before);
  });
});
