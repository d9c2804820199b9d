import { createHash } from "node:crypto";
import { parse } from "csv-parse/sync";
import { beforeAll, describe, expect, test } from "vitest";
import { hashSecret } from "@/app/_server/secret";
import { GET as exportOf } from "@/app/api/v1/periods/[id]/export/route";
import { GET as periods } from "@/app/api/v1/periods/route";
import { closePeriod } from "@/db/pay/close";
import { workers } from "@/db/people/tables";
import { payFile } from "@/lib/periods/file";
import { periodPage } from "@/lib/periods/schema";
import { call } from "@/tests/make/call";
import { makeFactory, makeKey } from "@/tests/make/factory";
import { AFTER, CLERK, makePeriods, makeShift, TIME_ZONE } from "@/tests/make/pay-period";
import { ownDatabase } from "@/tests/setup/db";

const own = ownDatabase();
const keys = { payroll: "", planner: "", elsewhere: "" };
let ended = "";
let running = "";

beforeAll(async () => {
  const factory = await makeFactory(own.db);
  keys.payroll = await makeKey(factory, "payroll", hashSecret);
  keys.planner = await makeKey(factory, "planner", hashSecret);
  keys.elsewhere = await makeKey(await makeFactory(own.db), "payroll", hashSecret);
  ({ ended, running } = await makePeriods(factory));
  await own.db.update(workers).set({ name: "=SUM(A1)" });
  await makeShift(factory, { start: "2026-06-01T06:00", end: "2026-06-01T14:10" });
  const asked = { periodId: ended, timeZone: TIME_ZONE, now: AFTER, reason: "bank day" };
  await closePeriod(factory, { ...asked, named: [factory.workerId] }, CLERK);
});

const list = (query = "", bearer = keys.payroll) =>
  call(periods, { path: `/api/v1/periods${query}`, bearer });
const request = (id: string, query: string, bearer = keys.payroll) =>
  exportOf(
    new Request(`http://localhost/api/v1/periods/${id}/export${query}`, {
      headers: { authorization: `Bearer ${bearer}` },
    }),
    { params: Promise.resolve({ id }) },
  );

describe("GET /api/v1/periods", () => {
  test("200: the latest first, the closed one with what stands beside its file", async () => {
    const { status, json } = await list();
    expect(status).toBe(200);
    const { items } = periodPage.parse(json);
    expect(items.map(({ id, status: state, revision }) => [id, state, revision])).toEqual([
      [running, "open", 0],
      [ended, "closed", 1],
    ]);
    expect(items[1]).toMatchObject({ closedBy: CLERK.name, totals: { paidSeconds: 29_400 } });
  });
  test("200: page by page", async () => {
    const first = await list("?limit=1");
    const next = await list(`?limit=1&cursor=${first.json.nextCursor}`);
    expect(periodPage.parse(next.json)).toMatchObject({ items: [{ id: ended }], nextCursor: null });
  });
  test("200: another site sees none of it", async () => {
    expect((await list("", keys.elsewhere)).json).toEqual({ items: [], nextCursor: null });
  });
  test("401 and 403", async () => {
    expect((await list("", "bm_wrong")).status).toBe(401);
    const refused = await list("", keys.planner);
    expect(refused).toMatchObject({ status: 403, type: "application/problem+json" });
  });
  test("422 for a cursor that is none", async () => {
    expect((await list("?cursor=x")).json).toMatchObject({ status: 422 });
  });
});

describe("GET /api/v1/periods/{id}/export", () => {
  test.each(["csv", "json", "xlsx"])(
    "200: %s has the same bytes each time, and their digest",
    async (format) => {
      const [first, second] = [
        await request(ended, `?format=${format}`),
        await request(ended, `?format=${format}`),
      ];
      expect([first.status, second.status]).toEqual([200, 200]);
      const [bytes, again] = [await first.arrayBuffer(), await second.arrayBuffer()];
      expect(Buffer.from(bytes).equals(Buffer.from(again))).toBe(true);
      const sha = createHash("sha256").update(Buffer.from(bytes)).digest("base64");
      expect(first.headers.get("digest")).toBe(`sha-256=${sha}`);
      expect(first.headers.get("content-disposition")).toBe(
        `attachment; filename="hours-2026-05-31-to-2026-06-14-r1.${format}"`,
      );
    },
  );
  test("200: CSV is RFC 4180, adds up, and runs no formula", async () => {
    const text = await (await request(ended, "?format=csv")).text();
    expect(text.endsWith("\r\n")).toBe(true);
    const [row] = parse(text, { columns: true, bom: true }) as Record<string, string>[];
    expect(row).toMatchObject({
      worker: "1042",
      name: "'=SUM(A1)",
      line: "hours",
      workday: "2026-06-01",
      paid_hours: "8.17",
      regular_hours: "8.17",
      overtime_hours: "0.00",
      policy: "us-federal 1",
    });
  });
  test("200: JSON is what the contract says, and what is asked for without a format", async () => {
    const file = payFile.parse(await (await request(ended, "")).json());
    expect(file.people[0]).toMatchObject({ name: "=SUM(A1)", paidSeconds: 29_400 });
    expect(file.totals).toMatchObject({ headcount: 1, hours: { paid: "8.17" } });
  });
  test("200: XLSX is a zip with a sheet", async () => {
    const bytes = Buffer.from(await (await request(ended, "?format=xlsx")).arrayBuffer());
    expect(bytes.subarray(0, 2).toString()).toBe("PK");
    expect(bytes.includes("xl/worksheets/sheet1.xml")).toBe(true);
  });
  test.each([
    ["an open period", () => running, "", 409, "This period is open."],
    ["one that is not there", () => "01890a5d-ac96-774b-bcce-b302099a8057", "", 404, "no such"],
    ["what is no id", () => "last", "", 404, "no such"],
    ["a revision that is not there", () => ended, "?revision=2", 404, "no revision 2"],
    ["another format", () => ended, "?format=pdf", 422, "csv, json, xlsx"],
    ["another site's", () => ended, "", 404, "no such"],
  ])("%s: %i", async (what, id, query, status, words) => {
    const bearer = what === "another site's" ? keys.elsewhere : keys.payroll;
    const answer = await request(id(), query, bearer);
    expect(answer.status).toBe(status);
    expect(answer.headers.get("content-type")).toBe("application/problem+json");
    expect(await answer.text()).toContain(words);
  });
  test("403 for a wrong role, 401 without a key", async () => {
    expect((await request(ended, "?format=csv", keys.planner)).status).toBe(403);
    expect((await request(ended, "?format=csv", "bm_wrong")).status).toBe(401);
  });
});
