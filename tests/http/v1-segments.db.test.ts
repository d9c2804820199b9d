import { beforeAll, describe, expect, test } from "vitest";
import { hashSecret } from "@/app/_server/secret";
import { GET as list } from "@/app/api/v1/segments/route";
import { cursorOf } from "@/lib/api/cursor";
import { segmentPage } from "@/lib/api/segments";
import { call } from "@/tests/make/call";
import { makeFactory, makeKey, makeSegment, makeWorker } from "@/tests/make/factory";
import { ownDatabase } from "@/tests/setup/db";

const own = ownDatabase();
const keys = { planner: "", lead: "", payroll: "", elsewhere: "" };

/** Two days in Chicago (UTC-6): 2 March with two workers, 3 March with one, who is still at it. */
beforeAll(async () => {
  const factory = await makeFactory(own.db);
  const other = await makeWorker(factory, "1043");
  const run = { activity: "run", ticket: "26000010", operation: "010" } as const;
  const at = (start: string, seconds: number) => ({ start, seconds, item: 0 });
  await makeSegment(factory, { ...run, ...at("2026-03-03T05:59:59Z", 60) });
  await makeSegment(factory, { ...run, ...at("2026-03-02T14:00:00Z", 900) });
  await makeSegment(factory, { ...run, ...at("2026-03-02T14:00:00Z", 900), item: 1 });
  const meal = { activity: "meal", worker: other, cell: "Neck" } as const;
  await makeSegment(factory, { ...meal, ...at("2026-03-02T13:00:00Z", 1800) });
  const waiting = { activity: "indirect", code: "waiting-lead", item: 0 } as const;
  await makeSegment(factory, { ...waiting, start: "2026-03-03T06:00:00Z" });
  for (const role of ["planner", "lead", "payroll"] as const) {
    keys[role] = await makeKey(factory, role, hashSecret);
  }
  keys.elsewhere = await makeKey(await makeFactory(own.db), "planner", hashSecret);
});

const ask = (query: string, bearer = keys.planner) =>
  call(list, { path: `/api/v1/segments${query}`, bearer });
const days = "?from=2026-03-01&to=2026-03-10";

describe("GET /api/v1/segments: 200", () => {
  test("lists day by day, worker by worker, and names nobody", async () => {
    const answer = await ask(days);
    const { items, nextCursor } = segmentPage.strict().parse(answer.json);
    expect(items.map(({ day, start, activity }) => [day, start, activity])).toEqual([
      ["2026-03-02", "2026-03-02T14:00:00.000Z", "run"],
      ["2026-03-02", "2026-03-02T14:00:00.000Z", "run"],
      ["2026-03-02", "2026-03-03T05:59:59.000Z", "run"],
      ["2026-03-02", "2026-03-02T13:00:00.000Z", "meal"],
      ["2026-03-03", "2026-03-03T06:00:00.000Z", "indirect"],
    ]);
    expect(items.at(-1)).toMatchObject({ end: null, seconds: null, code: "waiting-lead" });
    expect(nextCursor).toBeNull();
    expect(JSON.stringify(answer.json)).not.toMatch(/worker|1042|1043|Ilo/);
  });
  test.each([1, 2, 3, 4])("pages of %i lead through without a gap or a repeat", async (limit) => {
    const whole = segmentPage.parse((await ask(days)).json).items;
    const paged = [];
    let cursor: string | null = "";
    while (cursor !== null) {
      const next: string = cursor && `&cursor=${cursor}`;
      const answer = await ask(`${days}&limit=${limit}${next}`);
      const { items, nextCursor } = segmentPage.parse(answer.json);
      expect(items.length).toBeLessThanOrEqual(limit);
      paged.push(...items);
      cursor = nextCursor;
    }
    expect(paged).toEqual(whole);
  });
  test.each([
    ["?from=2026-03-03&to=2026-03-04", 1],
    ["?from=2026-03-02&to=2026-03-03", 4],
    [`${days}&cell=Neck`, 1],
    [`${days}&cell=Nowhere`, 0],
    ["", 0],
  ])("%s finds %i", async (query, count) => {
    expect(segmentPage.parse((await ask(query)).json).items).toHaveLength(count);
  });
  test("a key of another site sees nothing of this one", async () => {
    expect((await ask(days, keys.elsewhere)).json).toEqual({ items: [], nextCursor: null });
  });
});

describe("GET /api/v1/segments: 401, 403", () => {
  test("without a good key", async () => {
    expect((await ask(days, "bm_unknown")).status).toBe(401);
  });
  test.each(["lead", "payroll"] as const)("to %s", async (role) => {
    expect((await ask(days, keys[role])).status).toBe(403);
  });
});

describe("GET /api/v1/segments: 422", () => {
  test.each([
    ["?from=2026-03-02&to=2026-03-02", "to"],
    ["?from=2025-03-02&to=2026-03-02", "to"],
    ["?from=2026-02-30", "from"],
    ["?day=2026-03-02", "day"],
    [`${days}&cursor=${cursorOf(7)}`, "cursor"],
  ])("to %s, naming the parameter", async (query, path) => {
    const answer = await ask(query);
    expect(answer.status).toBe(422);
    expect(answer.json.errors).toMatchObject([{ path }]);
  });
});
