import { v7 as uuid } from "uuid";
import { beforeAll, describe, expect, test } from "vitest";
import { readFloor } from "@/app/_server/floor";
import { GET as getBench } from "@/app/api/kiosk/bench/route";
import { GET as getCell } from "@/app/api/kiosk/cell/route";
import { POST as sendEvents } from "@/app/api/kiosk/events/route";
import { POST as signIn } from "@/app/api/kiosk/sign-in/route";
import { GET as getTicket } from "@/app/api/kiosk/tickets/[code]/route";
import { changeKiosk, revokeKiosk } from "@/db/kiosks/commands";
import { addEnrolmentCode } from "@/db/kiosks/enrolment";
import { setPin } from "@/db/people/commands";
import { call } from "@/tests/make/call";
import { type Factory, makeFactory, makeTicket } from "@/tests/make/factory";
import { givePin, type MadeKiosk, makeKiosk, makeWorker, tap } from "@/tests/make/kiosk";
import { ownDatabase } from "@/tests/setup/db";

const own = ownDatabase();
const asked: string[] = [];
let factory: Factory;
let kiosk: MadeKiosk;

beforeAll(async () => {
  // every connection writes down what it is asked
  own.pool.on("connect", (client) => {
    const query = client.query.bind(client) as (...given: unknown[]) => unknown;
    const listening = (...given: unknown[]) => {
      const [first] = given as [string | { text: string }];
      asked.push(typeof first === "string" ? first : first.text);
      return query(...given);
    };
    Object.assign(client, { query: listening });
  });
  factory = await makeFactory(own.db);
  await givePin(factory, "271828");
  await makeTicket(factory, { number: "26000017" });
  kiosk = await makeKiosk(factory, { openedAt: new Date().toISOString() });
});

/** Lists what the database is asked by some work, without the ends of its transaction. */
async function statementsOf(work: () => Promise<unknown>): Promise<string[]> {
  asked.length = 0;
  await work();
  return asked.filter((text) => !/^(begin|commit|rollback)\b/i.test(text));
}

describe("a kiosk", () => {
  const path = "/api/kiosk/events";
  const deviceTime = new Date().toISOString();

  test("hands in with three statements: whose tablet it is, what is known, what is booked", async () => {
    const event = tap(kiosk, deviceTime, { kind: "indirect", code: "cleaning" });
    const body = { events: [event], deviceTime };
    const send = () => call(sendEvents, { path, cookie: kiosk.cookie, body });
    const first = await statementsOf(send);
    expect(first).toHaveLength(3);
    expect(first[1]).toMatch(/^select bookings_context\(/);
    expect(first[2]).toMatch(/^select book\(/);
    expect(await statementsOf(send)).toHaveLength(2);
  });

  test("hands in a batch of a whole shift with as many as one record", async () => {
    const events = Array.from({ length: 100 }, (_, at) =>
      tap(kiosk, new Date(Date.now() + at * 100).toISOString(), {
        kind: "indirect",
        code: at % 2 ? "cleaning" : "meeting",
      }),
    );
    const body = { events, deviceTime };
    expect(
      await statementsOf(() => call(sendEvents, { path, cookie: kiosk.cookie, body })),
    ).toHaveLength(3);
  });

  test("signs in with at most eight, and shows bench, ticket and cell with at most five", async () => {
    const body = { session: uuid(), worker: "1042", pin: "271828" };
    let bearer = "";
    const signedIn = await statementsOf(async () => {
      const asking = { path: "/api/kiosk/sign-in", cookie: kiosk.cookie, body };
      bearer = (await call(signIn, asking)).json.token ?? "";
    });
    expect(bearer).not.toBe("");
    expect(signedIn.length).toBeLessThanOrEqual(8);
    const by = { cookie: kiosk.cookie, bearer };
    for (const look of [
      () => call(getBench, { ...by, path: "/api/kiosk/bench" }),
      () => call(getCell, { ...by, path: "/api/kiosk/cell" }),
    ]) {
      expect((await statementsOf(look)).length).toBeLessThanOrEqual(6);
    }
    const params = { code: "26000017" };
    const ticket = () => call(getTicket, { ...by, path: "/api/kiosk/tickets/26000017", params });
    expect((await statementsOf(ticket)).length).toBeLessThanOrEqual(6);
  });
});

describe("the office", () => {
  const scope = () => ({ db: own.db, siteId: factory.siteId });
  const now = new Date();
  const by = "account:a";

  test("the floor is read with at most five", async () => {
    expect((await statementsOf(() => readFloor(scope(), now))).length).toBeLessThanOrEqual(5);
  });

  test("a command takes at most four", async () => {
    const other = await makeKiosk(factory);
    const workerId = await makeWorker(factory, { number: "7001" });
    const cellId = factory.cellIds.Neck;
    const commands = {
      addEnrolmentCode: () =>
        addEnrolmentCode(scope(), { codeHash: uuid(), name: "Wall", cellId, by, now }),
      changeKiosk: () =>
        changeKiosk(scope(), { id: other.kioskId, name: "Wall", cellId }, { by, now }),
      revokeKiosk: () => revokeKiosk(scope(), other.kioskId, { by, now }),
      setPin: () => setPin(scope(), workerId, { hash: "-", at: now, by }),
    };
    for (const [name, command] of Object.entries(commands)) {
      const statements = await statementsOf(command);
      expect([name, statements.length > 0 && statements.length <= 4]).toEqual([name, true]);
    }
  });
});
