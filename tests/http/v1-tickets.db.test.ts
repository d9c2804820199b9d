import { beforeAll, describe, expect, test } from "vitest";
import { hashSecret } from "@/app/_server/secret";
import { GET as read } from "@/app/api/v1/tickets/[code]/route";
import { GET as list } from "@/app/api/v1/tickets/route";
import { cursorOf } from "@/lib/api/cursor";
import { birthRecord, ticketPage } from "@/lib/api/tickets";
import { call } from "@/tests/make/call";
import { makeFactory, makeKey, makeSegment, makeTicket } from "@/tests/make/factory";
import { ownDatabase } from "@/tests/setup/db";

const own = ownDatabase();
const keys = { planner: "", lead: "", payroll: "", elsewhere: "" };

beforeAll(async () => {
  const factory = await makeFactory(own.db);
  await makeTicket(factory, { number: "26000010", withOption: true });
  await makeTicket(factory, { number: "26000029", finished: 1 });
  await makeTicket(factory, { number: "26000032", finished: 3, status: "finished" });
  const run = { activity: "run", ticket: "26000010", operation: "010" } as const;
  await makeSegment(factory, { ...run, start: "2026-03-02T14:00:00Z", seconds: 1500, item: 0 });
  for (const role of ["planner", "lead", "payroll"] as const) {
    keys[role] = await makeKey(factory, role, hashSecret);
  }
  keys.elsewhere = await makeKey(await makeFactory(own.db), "planner", hashSecret);
});

const ask = (query: string, bearer?: string) =>
  call(list, { path: `/api/v1/tickets${query}`, ...(bearer === undefined ? {} : { bearer }) });

describe("GET /api/v1/tickets: 200", () => {
  test("answers as the contract says, to a planner and to a lead", async () => {
    const answer = await ask("", keys.planner);
    expect(answer.status).toBe(200);
    const { items, nextCursor } = ticketPage.strict().parse(answer.json);
    expect(items.map(({ ticket, status, cell }) => [ticket, status, cell])).toEqual([
      ["26000010", "open", "Mill"],
      ["26000029", "open", "Neck"],
      ["26000032", "finished", null],
    ]);
    expect(nextCursor).toBeNull();
    expect((await ask("", keys.lead)).json).toEqual(answer.json);
  });
  test("pages lead through the list without a gap or a repeat", async () => {
    const first = ticketPage.parse((await ask("?limit=2", keys.planner)).json);
    const rest = await ask(`?limit=2&cursor=${first.nextCursor}`, keys.planner);
    expect(first.items.map(({ ticket }) => ticket)).toEqual(["26000010", "26000029"]);
    expect(rest.json).toMatchObject({ items: [{ ticket: "26000032" }], nextCursor: null });
  });
  test("filters narrow the list", async () => {
    const filtered = await ask("?status=open&cell=Neck&model=Heron", keys.planner);
    expect(filtered.json).toMatchObject({ items: [{ ticket: "26000029" }] });
  });
  test("a key of another site sees nothing of this one", async () => {
    expect((await ask("", keys.elsewhere)).json).toEqual({ items: [], nextCursor: null });
  });
});

describe("GET /api/v1/tickets: 401", () => {
  test.each([undefined, "bm_unknown", "nonsense"])("with the key %j", async (key) => {
    const answer = await ask("", key);
    expect(answer.status).toBe(401);
    expect(answer.type).toBe("application/problem+json");
    expect(answer.headers.get("www-authenticate")).toBe("Bearer");
    expect(answer.json).toMatchObject({
      status: 401,
      detail: expect.stringContaining("valid key"),
    });
  });
});

describe("GET /api/v1/tickets: 403", () => {
  test("to a role that it is not for", async () => {
    const answer = await ask("", keys.payroll);
    expect(answer.json).toMatchObject({ status: 403, detail: expect.stringContaining("role") });
  });
});

describe("GET /api/v1/tickets: 422", () => {
  test.each([
    ["?status=late", "status"],
    ["?limit=0", "limit"],
    ["?cursor=made-up", "cursor"],
    [`?cursor=${cursorOf("1 or true")}`, "cursor"],
    ["?colour=red", "colour"],
  ])("to %s, naming the parameter", async (query, path) => {
    const answer = await ask(query, keys.planner);
    expect(answer.status).toBe(422);
    expect(answer.json.errors).toMatchObject([{ path }]);
  });
});

const recordOf = (code: string, bearer = keys.planner) =>
  call(read, { path: `/api/v1/tickets/${code}`, params: { code }, bearer });

describe("GET /api/v1/tickets/{code}: 200", () => {
  test.each(["26000010", "T26000010", "26-00001-0"])("%s is one ticket", async (code) => {
    const answer = await recordOf(code);
    expect(answer.status).toBe(200);
    const record = birthRecord.strict().parse(answer.json);
    expect(record).toMatchObject({ ticket: "26000010", options: ["Sunburst"], reports: [] });
    expect(record.operations).toMatchObject([
      { operation: "010", standardSeconds: 2400, actualSeconds: 1500 },
      { operation: "020", standardSeconds: null, actualSeconds: 0 },
      { operation: "030", standardSeconds: null, actualSeconds: 0 },
    ]);
    expect(record.segments).toMatchObject([{ activity: "run", seconds: 1500 }]);
  });
});

describe("GET /api/v1/tickets/{code}: 403, 404, 422", () => {
  test("403: to a role that it is not for", async () => {
    expect((await recordOf("26000010", keys.payroll)).status).toBe(403);
  });
  test.each([
    ["26-99999-6", "planner"],
    ["26-00001-0", "elsewhere"],
  ] as const)("404: %s to %s", async (code, key) => {
    expect((await recordOf(code, keys[key])).json).toMatchObject({
      status: 404,
      detail: `There is no ticket ${code} here.`,
    });
  });
  test.each([
    ["26-00001-4", "check digit"],
    ["26-0001", "no ticket number"],
    ["W5724", "badge"],
  ])("422: %s, saying what is wrong", async (code, why) => {
    const message = expect.stringContaining(why);
    expect((await recordOf(code)).json).toMatchObject({
      status: 422,
      errors: [{ path: "code", message }],
    });
  });
});
