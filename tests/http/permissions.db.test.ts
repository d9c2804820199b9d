import { readdirSync } from "node:fs";
import path from "node:path";
import { sealData } from "iron-session";
import { v7 as uuid } from "uuid";
import { afterAll, beforeAll, describe, expect, test, vi } from "vitest";
import { env } from "@/app/_server/env";
import { hashSecret } from "@/app/_server/secret";
import { accountRoles, accounts, officeSessions } from "@/db/access/tables";
import { type Action, permissions, reachOf } from "@/lib/access/may";
import { type Role, roles } from "@/lib/access/roles";
import { call, type Handler } from "@/tests/make/call";
import { type Factory, makeFactory, makeKey } from "@/tests/make/factory";
import { ownDatabase } from "@/tests/setup/db";

/** Next's cookies exist only inside its server; this is the one that the browser would send. */
const browser = { cookie: undefined as string | undefined };
vi.resetModules(); // another file of this worker may have loaded the routes with the real ones
vi.doMock("next/headers", () => ({
  cookies: async () => ({ get: () => browser.cookie && { value: browser.cookie } }),
}));
afterAll(() => {
  vi.doUnmock("next/headers");
  vi.resetModules();
});

interface Route {
  name: string;
  actor: string;
  may?: Action;
  method: string;
  handler: Handler;
}

/** Every handler under `app/api`; each was made by `handle`, which tells its entrance. */
async function allRoutes(): Promise<Route[]> {
  const files = readdirSync("app/api", { recursive: true, encoding: "utf8" });
  const routes = files.filter((file) => path.basename(file) === "route.ts").sort();
  const found = await Promise.all(
    routes.map(async (file) => {
      const handlers: Record<string, Handler & { entrance?: { actor: string; may?: Action } }> =
        await import(/* @vite-ignore */ path.resolve("app/api", file));
      return Object.entries(handlers).map(([method, handler]) => ({
        ...(handler.entrance ?? { actor: "made without `handle`: wrap it, so that it is guarded" }),
        name: `${method} /api/${path.dirname(file)}`,
        method,
        handler,
      }));
    }),
  );
  return found.flat();
}

const routes = await allRoutes();
const guarded = routes.filter(({ actor }) => actor === "key" || actor === "person");
const own = ownDatabase();
const keys = new Map<Role, string>();
const sessions = new Map<Role, string>();

beforeAll(async () => {
  const factory = await makeFactory(own.db);
  for (const role of roles) {
    keys.set(role, await makeKey(factory, role, hashSecret));
    sessions.set(role, await makeOfficeSession(factory, role));
  }
});

/** Signs someone with one role in to the office and answers the sealed cookie. */
async function makeOfficeSession({ db, siteId, cellIds }: Factory, role: Role): Promise<string> {
  const [accountId, sessionId] = [uuid(), uuid()];
  const email = `${role}@testing.example`;
  await db.insert(accounts).values({ id: accountId, email, name: role, passwordHash: "none" });
  const cellId = role === "lead" ? cellIds.Mill : null;
  await db.insert(accountRoles).values({ siteId, id: uuid(), accountId, role, cellId });
  const expiresAt = new Date(Date.now() + 3_600_000);
  await db.insert(officeSessions).values({ id: sessionId, accountId, expiresAt });
  return sealData({ sessionId }, { password: env().SESSION_SECRET });
}

/** Asks with nothing but who is calling: a body that is none is refused after the guard. */
async function ask({ method, handler }: Route, bearer?: string, cookie?: string) {
  browser.cookie = cookie;
  const answer = await call(handler, {
    path: "/api",
    params: { code: "26000010" },
    ...(bearer === undefined ? {} : { bearer }),
    ...(method === "GET" ? {} : { body: "" }),
  });
  return answer.status;
}

describe("every route under app/api", () => {
  test("was found and made by `handle`", () => {
    expect(routes.length).toBeGreaterThan(10);
    expect([...new Set(routes.map(({ actor }) => actor))].toSorted()).toEqual(
      expect.arrayContaining(["key", "nobody"]),
    );
    const kinds = ["nobody", "kiosk", "worker", "person", "key"];
    expect(routes.filter(({ actor }) => !kinds.includes(actor))).toEqual([]);
  });
  test.each(guarded)("$name names its action", ({ may }) => {
    expect(Object.keys(permissions)).toContain(may);
  });
  test.each(routes)("$name, asked by nobody", async (route) => {
    const status = await ask(route);
    if (route.actor === "nobody") expect([401, 403]).not.toContain(status);
    else expect(status).toBe(401);
  });
  test.each(guarded.flatMap((route) => roles.map((role) => ({ name: route.name, role, route }))))(
    "$name, asked by $role",
    async ({ route, role }) => {
      const [bearer, cookie] = [keys.get(role)!, sessions.get(role)!];
      const isKey = route.actor === "key";
      const status = isKey ? await ask(route, bearer) : await ask(route, undefined, cookie);
      const may = reachOf([{ role, cells: [] }], route.may!);
      if (may === null) expect(status).toBe(403);
      else expect([401, 403, 500]).not.toContain(status);
      const other = isKey ? await ask(route, undefined, cookie) : await ask(route, bearer);
      expect(other, "what opens the office opens no integration, and the other way").toBe(401);
    },
  );
});
