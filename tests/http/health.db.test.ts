import pg from "pg";
import { afterEach, describe, expect, test } from "vitest";
import { GET as unknownAddress } from "@/app/api/[...path]/route";
import { GET as health } from "@/app/api/health/route";
import { GET as contract } from "@/app/api/v1/openapi.json/route";
import { ownSchema } from "@/db/schema-version";
import * as answers from "@/lib/api/schema";
import { call } from "@/tests/make/call";
import { ownDatabase } from "@/tests/setup/db";

const own = ownDatabase();
const held = globalThis as typeof globalThis & { bookmatchPool?: pg.Pool };

afterEach(() => {
  held.bookmatchPool = own.pool;
});

describe("GET /api/health", () => {
  test("200: needs no key and tells what it looked at", async () => {
    const answer = await call(health, { path: "/api/health" });
    expect(answer.status).toBe(200);
    expect(answers.health.strict().parse(answer.json)).toEqual({
      status: "ok",
      database: "up",
      migrations: { applied: ownSchema.name, isCurrent: true },
      queueDepth: 0,
      lastBackupAt: null,
    });
  });
  test("503: the database is away", async () => {
    const away = new pg.Pool({ connectionString: "postgres://nobody@127.0.0.1:1/none" });
    held.bookmatchPool = away;
    const answer = await call(health, { path: "/api/health" });
    await away.end();
    expect(answer).toMatchObject({
      status: 503,
      json: { status: "unavailable", database: "down", migrations: null, queueDepth: null },
    });
  });
});

describe("GET /api/v1/openapi.json", () => {
  test("200: needs no key", async () => {
    const answer = await call(contract, { path: "/api/v1/openapi.json" });
    expect(answer).toMatchObject({ status: 200, json: { openapi: "3.1.0" } });
  });
});

describe("any other address under /api", () => {
  test("404: a problem, never a page", async () => {
    const answer = await call(unknownAddress, { path: "/api/v1/nothing" });
    expect(answer.status).toBe(404);
    expect(answer.type).toBe("application/problem+json");
    expect(answer.json.detail).toContain("nothing at this address");
  });
});
