import { beforeAll, describe, expect, test } from "vitest";
import { hashSecret } from "@/app/_server/secret";
import { GET as list } from "@/app/api/v1/tickets/route";
import { cursorOf } from "@/lib/api/cursor";
import { ticketPage } from "@/lib/api/tickets";
import { call } from "@/tests/make/call";
import { makeFactory, makeKey, makeTicket } from "@/tests/make/factory";
import { ownDatabase } from "@/tests/setup/db";

const own = ownDatabase();
const keys = { planner: "", lead: "", payroll: "", elsewhere: "" };

beforeAll(async () => {
  const factory = await makeFactory(own.db);
  await makeTicket(factory, { number: "26000013", withOption: true });
  await makeTicket(factory, { number: "26000021", finished: 1 });
  await makeTicket(factory, { number: "26000039", finished: 3, status: "finished" });
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
      ["26000013", "open", "Mill"],
      ["26000021", "open", "Neck"],
      ["26000039", "finished", null],
    ]);
    expect(nextCursor).toBeNull();
    expect((await ask("", keys.lead)).json).toEqual(answer.json);
  });
  test("pages lead through the list without a gap or a repeat", async () => {
    const first = ticketPage.parse((await ask("?limit=2", keys.planner)).json);
    const rest = await ask(`?limit=2&cursor=${first.nextCursor}`, keys.planner);
    expect(first.items.map(({ ticket }) => ticket)).toEqual(["26000013", "26000021"]);
    expect(rest.json).toMatchObject({ items: [{ ticket: "26000039" }], nextCursor: null });
  });
  test("filters narrow the list", async () => {
    const filtered = await ask("?status=open&cell=Neck&model=Heron", keys.planner);
    expect(filtered.json).toMatchObject({ items: [{ ticket: "26000021" }] });
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
