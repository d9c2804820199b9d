import { describe, expect, test } from "vitest";
import { clearTries, reserveTry } from "@/db/access/commands";
import { ownDatabase, withDb } from "@/tests/setup/db";

const waitsSeconds = [0, 0, 10, 60, 86_400];
const at = (seconds: number) => new Date(Date.UTC(2026, 4, 14, 8, 0, seconds));
const tried = (key: string, seconds: number) => ({ key, waitsSeconds, now: at(seconds) });

describe("reserveTry", () => {
  test("slips are free, then the wait of the list holds, to the second", () =>
    withDb(async (db) => {
      expect(await reserveTry(db, tried("a", 0))).toBe(0);
      expect(await reserveTry(db, tried("a", 0))).toBe(0);
      expect(await reserveTry(db, tried("a", 1))).toBe(0);
      expect(await reserveTry(db, tried("a", 2))).toBe(9);
      expect(await reserveTry(db, tried("a", 10))).toBe(1);
      expect(await reserveTry(db, tried("a", 11))).toBe(0);
      expect(await reserveTry(db, tried("a", 12))).toBe(59);
    }));

  test("a refused try does not lengthen the wait, and one thing never slows another", () =>
    withDb(async (db) => {
      for (let n = 0; n < 3; n += 1) await reserveTry(db, tried("a", 0));
      for (let n = 0; n < 5; n += 1) await reserveTry(db, tried("a", 1));
      expect(await reserveTry(db, tried("a", 1))).toBe(9);
      expect(await reserveTry(db, tried("b", 1))).toBe(0);
    }));

  test("past the end of the list its last wait holds", () =>
    withDb(async (db) => {
      for (let n = 0; n < 5; n += 1) await reserveTry(db, tried("a", n * 100_000));
      expect(await reserveTry(db, tried("a", 400_000 + 86_400))).toBe(0);
      expect(await reserveTry(db, tried("a", 400_000 + 86_401))).toBe(86_399);
    }));

  test("a right try clears the count", () =>
    withDb(async (db) => {
      for (let n = 0; n < 3; n += 1) await reserveTry(db, tried("a", 0));
      await clearTries(db, ["a"]);
      expect(await reserveTry(db, tried("a", 1))).toBe(0);
    }));
});

describe("reserveTry, all at once", () => {
  const own = ownDatabase();

  test("of ten tries in one moment only the free ones pass", async () => {
    const waits = await Promise.all(
      Array.from({ length: 10 }, () => reserveTry(own.db, tried("a", 0))),
    );
    expect(waits.filter((wait) => wait === 0)).toHaveLength(3);
  });
});
