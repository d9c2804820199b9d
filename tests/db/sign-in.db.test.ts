import { v7 as uuid } from "uuid";
import { describe, expect, test } from "vitest";
import { hashPassword } from "@/app/_server/password";
import { proveAccount } from "@/app/_server/sign-in";
import { accounts } from "@/db/access/tables";
import type { Db } from "@/db/client";
import { withDb } from "@/tests/setup/db";

const now = new Date("2026-05-14T08:00:00Z");
const email = "devika@larkmoor.example";
const password = "four words of the bench";

async function withAccount(db: Db, disabledAt: Date | null = null) {
  const id = uuid();
  const passwordHash = await hashPassword(password);
  await db.insert(accounts).values({ id, email, name: "Devika Rao", passwordHash, disabledAt });
  return id;
}

const tried = (db: Db, fields: Partial<{ email: string; password: string; now: Date }> = {}) =>
  proveAccount(db, { email, password, now, ...fields });

describe("proveAccount", () => {
  test("e-mail and password find the account", () =>
    withDb(async (db) => {
      const accountId = await withAccount(db);
      expect(await tried(db)).toEqual({ ok: true, value: { accountId } });
    }));

  test("a wrong password, an unknown e-mail and a closed account get the same answer", () =>
    withDb(async (db) => {
      await withAccount(db);
      const wrong = await tried(db, { password: "four words of the hall" });
      const unknown = await tried(db, { email: "nobody@larkmoor.example" });
      await db.update(accounts).set({ disabledAt: now });
      const closed = await tried(db, { now: new Date(now.getTime() + 1000) });
      expect(wrong).toMatchObject({ ok: false, problem: { code: "unauthenticated" } });
      expect(unknown).toEqual(wrong);
      expect(closed).toEqual(wrong);
    }));

  test("after some slips it says how long to wait, and the right password must wait too", () =>
    withDb(async (db) => {
      await withAccount(db);
      for (let slip = 0; slip < 5; slip += 1) await tried(db, { password: "not this one" });
      expect(await tried(db)).toMatchObject({
        problem: { code: "throttled", retryAfterSeconds: 5 },
      });
      const later = new Date(now.getTime() + 5000);
      expect(await tried(db, { now: later })).toMatchObject({ ok: true });
    }));

  test("a right one begins the count anew", () =>
    withDb(async (db) => {
      await withAccount(db);
      for (let round = 0; round < 3; round += 1) {
        for (let slip = 0; slip < 3; slip += 1) await tried(db, { password: "not this one" });
        expect(await tried(db)).toMatchObject({ ok: true });
      }
    }));
});
