import { v7 as uuid } from "uuid";
import { beforeAll, describe, expect, test } from "vitest";
import { hashSecret } from "@/app/_server/secret";
import { GET as list, POST as set } from "@/app/api/v1/standards/route";
import { routingOperations, routings } from "@/db/standards/tables";
import { standardItem, standardPage } from "@/lib/standards/schema";
import { call } from "@/tests/make/call";
import { makeFactory, makeKey } from "@/tests/make/factory";
import { ownDatabase } from "@/tests/setup/db";

const own = ownDatabase();
const keys = { planner: "", lead: "", payroll: "", elsewhere: "" };

beforeAll(async () => {
  const factory = await makeFactory(own.db);
  const { siteId, modelId, operationIds } = factory;
  const routingId = uuid();
  await own.db.insert(routings).values({ siteId, id: routingId, modelId, revision: 1 });
  await own.db.insert(routingOperations).values(
    operationIds.map((operationId, position) => {
      return { siteId, id: uuid(), routingId, operationId, position };
    }),
  );
  for (const role of ["planner", "lead", "payroll"] as const) {
    keys[role] = await makeKey(factory, role, hashSecret);
  }
  keys.elsewhere = await makeKey(await makeFactory(own.db), "planner", hashSecret);
});

const entry = {
  model: "Heron",
  operation: "020",
  setupSeconds: 300,
  runSeconds: 2400,
  effectiveFrom: "2026-05-18",
  reason: "Time study",
};
const ask = (query: string, bearer = keys.planner) =>
  call(list, { path: `/api/v1/standards${query}`, bearer });
const send = (body: unknown, bearer = keys.planner, key?: string) =>
  call(set, {
    path: "/api/v1/standards",
    bearer,
    body,
    ...(key === undefined ? {} : { headers: { "idempotency-key": key } }),
  });

describe("POST /api/v1/standards: 200", () => {
  test("answers the row that it added; the same key and body again is the same row", async () => {
    const first = await send(entry, keys.planner, "plan-1");
    expect(first.status).toBe(200);
    expect(standardItem.strict().parse(first.json)).toMatchObject({ ...entry, option: null });
    const again = await send(entry, keys.planner, "plan-1");
    expect(again.json).toEqual(first.json);
    const { items } = standardPage.parse((await ask("?operation=020")).json);
    expect(items).toEqual([first.json]);
  });
});

describe("POST /api/v1/standards: refusals", () => {
  test("409: one key for two bodies", async () => {
    await send({ ...entry, operation: "030" }, keys.planner, "plan-2");
    const answer = await send(
      { ...entry, operation: "030", runSeconds: 9 },
      keys.planner,
      "plan-2",
    );
    expect(answer.status).toBe(409);
  });
  test.each([
    [{ ...entry, runSeconds: 0 }, "runSeconds", "A standard of 0 earns nothing"],
    [{ ...entry, runSeconds: -60 }, "runSeconds", "give 0 or more"],
    [{ ...entry, effectiveFrom: "2020-01-01" }, "effectiveFrom", "known here since"],
    [{ ...entry, effectiveFrom: "soon" }, "effectiveFrom", "Give a date"],
    [{ ...entry, model: "Nobody" }, "model", "No model here"],
    [{ ...entry, reason: "" }, "reason", "Fill this in"],
    [{ ...entry, cost: 1 }, "", "cost"],
  ])("422: %j at %s: %s", async (body, path, words) => {
    const answer = await send(body);
    expect(answer.status).toBe(422);
    expect(answer.json).toMatchObject({ errors: [{ path: expect.stringContaining(path) }] });
    expect(JSON.stringify(answer.json)).toContain(words);
  });
  test("422: a key without a sign, or endlessly long", async () => {
    expect((await send(entry, keys.planner, "x".repeat(201))).status).toBe(422);
  });
  test("403: not a planner's key; 401: no key of ours", async () => {
    for (const key of [keys.lead, keys.payroll]) expect((await send(entry, key)).status).toBe(403);
    expect((await send(entry, "bm_unknown")).status).toBe(401);
  });
  test("another site's planner finds no such operation in a routing there", async () => {
    expect((await send(entry, keys.elsewhere)).status).toBe(422);
  });
});

describe("GET /api/v1/standards", () => {
  test("200: pages in the order of entry without a gap or a repeat", async () => {
    const all = standardPage.parse((await ask("")).json).items;
    expect(all[0]).toMatchObject({ operation: "010", effectiveFrom: "2026-01-01" });
    const ids: string[] = [];
    for (let cursor = ""; ; ) {
      const page = standardPage.parse((await ask(`?limit=1${cursor}`)).json);
      ids.push(...page.items.map(({ id }) => id));
      if (!page.nextCursor) break;
      cursor = `&cursor=${page.nextCursor}`;
    }
    expect(ids).toEqual(all.map(({ id }) => id));
  });
  test("422 names what cannot be taken; 403 for a lead's key", async () => {
    expect((await ask("?cursor=nonsense")).json).toMatchObject({ errors: [{ path: "cursor" }] });
    expect((await ask("", keys.lead)).status).toBe(403);
  });
});
