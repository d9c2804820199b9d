import { eq } from "drizzle-orm";
import { v7 as uuid } from "uuid";
import { describe, expect, test } from "vitest";
import { makeFirstAdmin, openSession, revokeSession } from "@/db/access/commands";
import { heldOf, listAccounts, listSessionRoles } from "@/db/access/queries";
import { setupLinks } from "@/db/access/tables";
import { addAccount, closeAccount, setPassword, setRoles } from "@/db/accounts/commands";
import type { Db } from "@/db/client";
import type { AccountForm } from "@/lib/access/schema";
import { makeFactory } from "@/tests/make/factory";
import { withDb } from "@/tests/setup/db";

const now = new Date("2026-05-14T08:00:00Z");
const hand = { by: "account:test", now };

const form = (fields: Partial<AccountForm> = {}): AccountForm & { passwordHash: string } => ({
  id: uuid(),
  name: "Devika Rao",
  email: "devika@larkmoor.example",
  roles: ["admin"],
  cells: [],
  worker: "",
  passwordHash: "hash",
  ...fields,
});

async function withAdmin(db: Db) {
  const factory = await makeFactory(db);
  const admin = form();
  await addAccount(factory, admin, hand);
  return { ...factory, admin };
}

async function signedIn(db: Db, accountId: string) {
  const id = uuid();
  await openSession(db, { id, accountId, expiresAt: new Date(now.getTime() + 3_600_000) });
  return id;
}

describe("listAccounts", () => {
  test("pages by name and finds a part of a name or e-mail, signs of a pattern taken as they are", () =>
    withDb(async (db) => {
      const { admin, cellIds: _cells, ...scope } = await withAdmin(db);
      for (const [name, email] of [
        ["Ilo Varn", "varn@larkmoor.example"],
        ["Ilo Varn", "other.varn@larkmoor.example"],
        ["Zora 100%", "zora_b@larkmoor.example"],
      ])
        await addAccount(scope, form({ id: uuid(), name: name!, email: email! }), hand);
      const emails: string[] = [];
      for (let after: string | null = null; ; ) {
        const page = await listAccounts(scope, "", { after, limit: 2 });
        emails.push(...page.map(({ email }) => email));
        if (page.length < 2) break;
        after = page.at(-1)!.id;
      }
      expect(emails).toHaveLength(4);
      expect(new Set(emails).size).toBe(4);
      expect(emails.at(-1)).toBe("zora_b@larkmoor.example");
      const found = async (text: string) =>
        (await listAccounts(scope, text, { after: null, limit: 9 })).map(({ email }) => email);
      expect(await found("VARN")).toHaveLength(2);
      expect(await found("0%")).toEqual(["zora_b@larkmoor.example"]);
      expect(await found("a_b")).toEqual(["zora_b@larkmoor.example"]);
      expect(await found("%%")).toEqual([]);
      expect(await found(admin.email)).toEqual([admin.email]);
    }));
});

describe("addAccount", () => {
  test("gives the roles, a lead's by cell, and the worker that the person is", () =>
    withDb(async (db) => {
      const { cellIds, admin, ...scope } = await withAdmin(db);
      const lead = form({
        email: "lead@larkmoor.example",
        name: "Ilo Varn",
        roles: ["inspector"],
        cells: [cellIds.Mill, cellIds.Neck],
        worker: "1042",
      });
      expect(await addAccount(scope, lead, hand)).toEqual({ ok: true });
      expect(await listAccounts(scope, "", { after: null, limit: 10 })).toMatchObject([
        { email: admin.email, isClosed: false, held: [{ role: "admin", cells: [] }], worker: null },
        {
          email: lead.email,
          held: [
            { role: "inspector", cells: [] },
            { role: "lead", cells: expect.arrayContaining([cellIds.Mill, cellIds.Neck]) },
          ],
          worker: "1042",
        },
      ]);
    }));

  test("an e-mail that signs in already is refused, the same form again is not", () =>
    withDb(async (db) => {
      const { admin, ...scope } = await withAdmin(db);
      expect(await addAccount(scope, form(), hand)).toMatchObject({
        problem: { errors: [{ path: "email" }] },
      });
      expect(await addAccount(scope, admin, hand)).toEqual({ ok: true });
      expect(await listAccounts(scope, "", { after: null, limit: 10 })).toHaveLength(1);
    }));

  test.each<[string, Partial<AccountForm>, string]>([
    ["no role at all", { roles: [] }, "roles"],
    ["an unknown worker", { roles: ["planner"], worker: "77" }, "worker"],
  ])("%s is refused and nothing stays", (_, fields, path) =>
    withDb(async (db) => {
      const { admin: _admin, ...scope } = await withAdmin(db);
      const account = form({ email: "x@larkmoor.example", ...fields });
      expect(await addAccount(scope, account, hand)).toMatchObject({
        problem: { errors: [{ path }] },
      });
      expect(await listAccounts(scope, "", { after: null, limit: 10 })).toHaveLength(1);
    }),
  );

  test("one worker is one account", () =>
    withDb(async (db) => {
      const { admin: _admin, ...scope } = await withAdmin(db);
      await addAccount(scope, form({ email: "a@x.example", worker: "1042" }), hand);
      const second = form({ email: "b@x.example", worker: "1042" });
      expect(await addAccount(scope, second, hand)).toMatchObject({
        problem: { errors: [{ path: "worker" }] },
      });
    }));
});

describe("setRoles and closeAccount", () => {
  test("someone must stay admin", () =>
    withDb(async (db) => {
      const { admin, ...scope } = await withAdmin(db);
      const roles = { account: admin.id, roles: ["planner" as const], cells: [], worker: "" };
      const refused = { problem: { code: "conflict", detail: expect.stringContaining("admin") } };
      expect(await setRoles(scope, roles, hand)).toMatchObject(refused);
      expect(await closeAccount(scope, { id: admin.id, isClosed: true }, hand)).toMatchObject(
        refused,
      );
      await addAccount(scope, form({ email: "second@x.example" }), hand);
      expect(await setRoles(scope, roles, hand)).toEqual({ ok: true });
    }));

  test("closing ends every session at once, and opening brings none back", () =>
    withDb(async (db) => {
      const { admin: _admin, ...scope } = await withAdmin(db);
      const planner = form({ email: "p@x.example", roles: ["planner"] });
      await addAccount(scope, planner, hand);
      const session = await signedIn(db, planner.id);
      expect(await listSessionRoles(db, session, now)).toHaveLength(1);
      await closeAccount(scope, { id: planner.id, isClosed: true }, hand);
      expect(await listSessionRoles(db, session, now)).toEqual([]);
      await closeAccount(scope, { id: planner.id, isClosed: false }, hand);
      expect(await listSessionRoles(db, session, now)).toEqual([]);
    }));

  test("an account of another site is not here", () =>
    withDb(async (db) => {
      const { admin } = await withAdmin(db);
      const other = await makeFactory(db);
      await addAccount(other, form({ email: "other@x.example" }), hand);
      const account = { id: admin.id, isClosed: true };
      expect(await closeAccount(other, account, hand)).toMatchObject({
        problem: { code: "notFound" },
      });
    }));
});

describe("listSessionRoles", () => {
  test("a revoked session, one that is over and an unknown one find nobody", () =>
    withDb(async (db) => {
      const { admin } = await withAdmin(db);
      const session = await signedIn(db, admin.id);
      const found = await listSessionRoles(db, session, now);
      expect(heldOf(found.map(({ role, cellId }) => ({ role: role!, cellId })))).toEqual([
        { role: "admin", cells: [] },
      ]);
      expect(await listSessionRoles(db, session, new Date(now.getTime() + 3_600_000))).toEqual([]);
      expect(await listSessionRoles(db, uuid(), now)).toEqual([]);
      await revokeSession(db, session, now);
      expect(await listSessionRoles(db, session, now)).toEqual([]);
    }));
});

describe("setPassword", () => {
  test("ends the sessions that the old one opened", () =>
    withDb(async (db) => {
      const { admin, ...scope } = await withAdmin(db);
      const session = await signedIn(db, admin.id);
      const change = { id: admin.id, passwordHash: "new", tryKey: "email:x" };
      expect(await setPassword(scope, change, hand)).toEqual({ ok: true });
      expect(await listSessionRoles(db, session, now)).toEqual([]);
    }));
});

describe("makeFirstAdmin", () => {
  const first = { name: "Ana", email: "ana@x.example", passwordHash: "hash", now };

  async function withLink(db: Db, expiresAt: Date) {
    await db.insert(setupLinks).values({ id: uuid(), tokenHash: "token", expiresAt });
  }

  test("the link makes one admin, once", () =>
    withDb(async (db) => {
      const scope = await makeFactory(db);
      await withLink(db, new Date(now.getTime() + 1));
      const made = await makeFirstAdmin(db, { ...first, tokenHash: "token" });
      expect(made).toMatchObject({ ok: true });
      expect(await listAccounts(scope, "", { after: null, limit: 9 })).toMatchObject([
        { email: first.email, held: [{ role: "admin", cells: [] }] },
      ]);
      const again = { ...first, email: "eve@x.example", tokenHash: "token" };
      expect(await makeFirstAdmin(db, again)).toMatchObject({ problem: { code: "gone" } });
      expect(await listAccounts(scope, "", { after: null, limit: 9 })).toHaveLength(1);
    }));

  test("a link that is over or unknown makes nobody", () =>
    withDb(async (db) => {
      await makeFactory(db);
      await withLink(db, now);
      const over = await makeFirstAdmin(db, { ...first, tokenHash: "token" });
      const unknown = await makeFirstAdmin(db, { ...first, tokenHash: "guess" });
      expect([over, unknown]).toMatchObject([
        { problem: { code: "gone" } },
        { problem: { code: "gone" } },
      ]);
      const links = await db
        .select({ usedAt: setupLinks.usedAt })
        .from(setupLinks)
        .where(eq(setupLinks.tokenHash, "token"));
      expect(links).toEqual([{ usedAt: null }]);
    }));

  test("for an e-mail that signs in already it is the way back in", () =>
    withDb(async (db) => {
      const { admin, ...scope } = await withAdmin(db);
      const session = await signedIn(db, admin.id);
      await withLink(db, new Date(now.getTime() + 1));
      const back = { ...first, email: admin.email, tokenHash: "token" };
      expect(await makeFirstAdmin(db, back)).toEqual({ ok: true, value: { accountId: admin.id } });
      expect(await listSessionRoles(db, session, now)).toEqual([]);
      expect(await listAccounts(scope, "", { after: null, limit: 9 })).toHaveLength(1);
    }));
});
