import { beforeAll, describe, expect, test } from "vitest";
import { hashSecret } from "@/app/_server/secret";
import { POST as checkCode } from "@/app/api/v1/calculate/check-code/route";
import { POST as split } from "@/app/api/v1/calculate/split/route";
import { call, type Handler } from "@/tests/make/call";
import { makeFactory, makeKey } from "@/tests/make/factory";
import { ownDatabase } from "@/tests/setup/db";

const own = ownDatabase();
let planner = "";
let lead = "";

beforeAll(async () => {
  const factory = await makeFactory(own.db);
  planner = await makeKey(factory, "planner", hashSecret);
  lead = await makeKey(factory, "lead", hashSecret);
});

const path = "/api/v1/calculate";
const ask = (handler: Handler, body: unknown, bearer = planner) =>
  call(handler, { path, body, bearer });

describe("POST /api/v1/calculate/check-code", () => {
  test.each([
    ["T26048176", { valid: true, kind: "ticket", number: "26048176" }],
    ["26-04817-6", { valid: true, kind: "ticket", number: "26048176" }],
    ["26048177", { valid: false, kind: "ticket", number: "26048177", problem: "check" }],
    ["w5724", { valid: true, kind: "badge", number: "572" }],
    ["hello", { valid: false, kind: null, number: null, problem: "form" }],
  ])("200: reads %j", async (text, reading) => {
    expect(await ask(checkCode, { text })).toMatchObject({ status: 200, json: reading });
  });
  test("400: what is not JSON", async () => {
    expect((await ask(checkCode, "{text:")).json).toMatchObject({
      status: 400,
      detail: expect.stringContaining("not valid JSON"),
    });
  });
  test("403: to another role", async () => {
    expect((await ask(checkCode, { text: "T26048176" }, lead)).status).toBe(403);
  });
  test("413: a body over 1 MB", async () => {
    expect((await ask(checkCode, { text: "9".repeat(1_000_001) })).json).toMatchObject({
      status: 413,
      detail: expect.stringContaining("over 1 MB"),
    });
  });
  test.each([
    [{}, "text"],
    [{ text: 26048176 }, "text"],
    [{ text: "1".repeat(201) }, "text"],
    [{ text: "1", kind: "ticket" }, "kind"],
    [[], ""],
  ])("422: %j, naming %j", async (body, where) => {
    const answer = await ask(checkCode, body);
    expect(answer.status).toBe(422);
    expect(answer.json.errors).toMatchObject([{ path: where }]);
  });
});

describe("POST /api/v1/calculate/split", () => {
  test.each([
    [{ seconds: 10, weights: [1, 1, 1] }, [4, 3, 3]],
    [{ seconds: 10, weights: [0, 0] }, [5, 5]],
    [{ seconds: 0, weights: [3] }, [0]],
  ])("200: %j", async (body, parts) => {
    expect(await ask(split, body)).toMatchObject({ status: 200, json: { parts } });
  });
  test("403: to another role", async () => {
    expect((await ask(split, { seconds: 1, weights: [1] }, lead)).status).toBe(403);
  });
  test.each([
    [{ seconds: 10, weights: [1, -1] }, "weights.1"],
    [{ seconds: 10, weights: [] }, "weights"],
    [{ seconds: 2 ** 52, weights: [0, 0] }, "weights"],
    [{ seconds: 1.5, weights: [1] }, "seconds"],
    [{ weights: [1] }, "seconds"],
    [{ seconds: 10, weights: [1], by: "standard" }, "by"],
  ])("422: %j, naming %s", async (body, where) => {
    const answer = await ask(split, body);
    expect(answer.status).toBe(422);
    expect(answer.json.errors).toMatchObject([{ path: where }]);
  });
});
