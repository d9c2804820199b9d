import { readdirSync } from "node:fs";
import path from "node:path";
import { describe, expect, test } from "vitest";
import { apiRoutes } from "@/lib/api/routes";

/** Routes of our own pages, no part of the contract, and the one that answers for all others. */
const unlisted = ["/api/{path}", "/api/floor"];

interface Entrance {
  actor: string;
  may?: string;
  body?: unknown;
  query?: unknown;
}

const files = readdirSync("app/api", { recursive: true, encoding: "utf8" })
  .filter((file) => path.basename(file) === "route.ts")
  .map((file) => path.join("app/api", file));

const folderOf = (file: string) => path.dirname(file).slice("app".length);
const addressOf = (file: string) => folderOf(file).replace(/\[(?:\.\.\.)?(\w+)\]/g, "{$1}");

/** The entrances of a route's file by method; each was made by `handle`. */
async function entrancesOf(file: string): Promise<[string, Entrance][]> {
  const handlers: Record<string, { entrance: Entrance }> = await import(
    /* @vite-ignore */ path.resolve(file)
  );
  return Object.entries(handlers).map(([method, handler]) => [
    method.toLowerCase(),
    handler.entrance,
  ]);
}

const listed = files.filter((file) => !unlisted.includes(addressOf(file)));

describe("apiRoutes", () => {
  test("there are routes to hold it against", () => expect(listed.length).toBeGreaterThan(5));
  test.each(listed)("describes %s as it is: who, what it may, what it takes", async (file) => {
    for (const [method, entrance] of await entrancesOf(file)) {
      const route = apiRoutes.find((one) => one.path === addressOf(file) && one.method === method);
      expect(route, `add ${method} ${addressOf(file)} to lib/api/routes.ts`).toBeDefined();
      const { actor, may, body, query } = route!;
      expect({ actor, may }).toEqual({ actor: entrance.actor, may: entrance.may });
      expect(body === entrance.body, "the same body schema").toBe(true);
      expect(query === entrance.query, "the same query schema").toBe(true);
    }
  });
  test.each(apiRoutes.map(({ path: address }) => address))("%s has a route", (address) => {
    expect(listed.map(addressOf)).toContain(address);
  });
});
