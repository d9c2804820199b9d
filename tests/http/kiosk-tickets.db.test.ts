import { v7 as uuid } from "uuid";
import { beforeAll, describe, expect, test } from "vitest";
import { GET as getCell } from "@/app/api/kiosk/cell/route";
import { POST as sendEvents } from "@/app/api/kiosk/events/route";
import { POST as signIn } from "@/app/api/kiosk/sign-in/route";
import { GET as getTicket } from "@/app/api/kiosk/tickets/[code]/route";
import { judgeMarkedTickets, rebuildTickets } from "@/db/tickets/commands";
import { ticketNumberOf } from "@/lib/codes/ticket-code";
import { kioskCell, kioskTicket } from "@/lib/kiosks/schema";
import { call } from "@/tests/make/call";
import { type Factory, makeFactory, makeTicket } from "@/tests/make/factory";
import { givePin, type MadeKiosk, makeKiosk, tap } from "@/tests/make/kiosk";
import { ownDatabase } from "@/tests/setup/db";

const own = ownDatabase();
const ticket = ticketNumberOf(26, 17);
let factory: Factory;
let kiosk: MadeKiosk;
let bearer = "";

beforeAll(async () => {
  factory = await makeFactory(own.db);
  kiosk = await makeKiosk(factory);
  await givePin(factory, "271828");
  await makeTicket(factory, { number: ticket });
  await rebuildTickets({ db: own.db, siteId: factory.siteId });
  const session = uuid();
  const body = { session, worker: "1042", pin: "271828" };
  const { json } = await call(signIn, { path: "/api/kiosk/sign-in", cookie: kiosk.cookie, body });
  bearer = json.token ?? "";
  kiosk = { ...kiosk, session };
});

const look = (code: string) =>
  call(getTicket, {
    path: `/api/kiosk/tickets/${code}`,
    params: { code },
    cookie: kiosk.cookie,
    bearer,
  });

async function cell(etag?: string) {
  const headers = { cookie: kiosk.cookie, ...(etag ? { "if-none-match": etag } : {}) };
  const request = new Request("http://localhost/api/kiosk/cell", { headers });
  return getCell(request, { params: Promise.resolve({}) });
}

describe("GET /api/kiosk/tickets/{code}", () => {
  test("200: shows the ticket as scanned or keyed, fresh right after a booking", async () => {
    const scanned = await look(`T${ticket}`);
    expect(
      kioskTicket.parse(scanned.json).operations.map(({ state, obstacles }) => [state, obstacles]),
    ).toEqual([
      ["ready", []],
      ["waiting", ["wrong-cell", "predecessor-open"]],
      ["waiting", ["wrong-cell", "predecessor-open"]],
    ]);
    const now = new Date().toISOString();
    const items = [{ ticket, operation: "010" }];
    const events = [
      tap(kiosk, now, { kind: "shift-start" }),
      tap(kiosk, now, { kind: "work", activity: "run", items }),
    ];
    const body = { events, deviceTime: now };
    await call(sendEvents, { path: "/api/kiosk/events", cookie: kiosk.cookie, body });
    const keyed = await look(`${ticket.slice(0, 2)}-${ticket.slice(2)}`);
    expect(kioskTicket.parse(keyed.json).operations[0]).toMatchObject({
      state: "working",
      workers: [{ worker: "1042", name: "Ilo Varn" }],
    });
  });

  test("401: without a worker's session", async () => {
    const path = `/api/kiosk/tickets/${ticket}`;
    const answer = await call(getTicket, { path, params: { code: ticket }, cookie: kiosk.cookie });
    expect(answer.status).toBe(401);
  });

  test("404: a number that is no ticket's here", async () => {
    const answer = await look(ticketNumberOf(26, 99999));
    expect(answer.status).toBe(404);
    expect(answer.json.detail).toContain("no ticket");
  });

  test("422: a code of no known form, and one with a wrong digit, in different words", async () => {
    const wrong = `${ticket.slice(0, -1)}${(Number(ticket.at(-1)) + 1) % 10}`;
    const [form, check] = [await look("hello"), await look(wrong)];
    expect([form.status, check.status]).toEqual([422, 422]);
    expect(form.json.detail).not.toBe(check.json.detail);
  });
});

describe("GET /api/kiosk/cell", () => {
  test("200: people, queue and whole tickets of the kiosk's cell, once the judge has come by", async () => {
    while ((await judgeMarkedTickets(own.db)) > 0);
    const kept = kioskCell.parse(await (await cell()).json());
    expect(kept).toMatchObject({
      cells: ["Mill"],
      people: [{ worker: "1042", homeHere: true, inSince: expect.any(String) }],
      queue: [{ ticket, operation: "010" }],
      tickets: [{ ticket, model: "Heron" }],
      rules: { shiftLimitSeconds: 14 * 3600 },
    });
  });

  test("304: while nothing changed, though time runs", async () => {
    const etag = (await cell()).headers.get("etag") ?? "";
    expect((await cell(etag)).status).toBe(304);
    expect((await cell(`"other", W/${etag}`)).status).toBe(304);
    expect((await cell('"other"')).status).toBe(200);
  });
});
