import { sql } from "drizzle-orm";
import { describe, expect, test } from "vitest";
import { findSchemaVersion, ownSchema } from "@/db/schema-version";
import { sites } from "@/db/sites/tables";
import { withDb } from "@/tests/setup/db";

const site = { id: "01890a5d-ac96-774b-bcce-b302099a8057", name: "Testing" };

describe("the app's login", () => {
  test("owns nothing: no table, no function, no schema, not its database", async () => {
    const owned = await withDb((db) =>
      db.execute(sql`
        select 1 from pg_class where relowner = current_user::regrole
        union all select 1 from pg_proc where proowner = current_user::regrole
        union all select 1 from pg_namespace where nspowner = current_user::regrole
        union all select 1 from pg_database where datdba = current_user::regrole`),
    );
    expect(owned.rowCount).toBe(0);
  });

  test("has no power over the server: no superuser, no roles, no databases", async () => {
    const { rows } = await withDb((db) =>
      db.execute(sql`
        select rolsuper, rolcreaterole, rolcreatedb, rolbypassrls
        from pg_roles where rolname = current_user`),
    );
    expect(rows).toEqual([
      { rolsuper: false, rolcreaterole: false, rolcreatedb: false, rolbypassrls: false },
    ]);
  });

  test("makes no table", async () => {
    const making = withDb((db) => db.execute(sql`create table public.mine (id integer)`));
    await expect(making).rejects.toMatchObject({
      cause: { message: "permission denied for schema public" },
    });
  });
});

describe("withDb", () => {
  test("leaves nothing behind, also of an inner transaction", async () => {
    const during = await withDb(async (db) => {
      await db.transaction((tx) => tx.insert(sites).values(site));
      return db.$count(sites);
    });
    expect(during).toBe(1);
    expect(await withDb((db) => db.$count(sites))).toBe(0);
  });
});

describe("findSchemaVersion", () => {
  test("names this code's last migration after migrating", async () => {
    const version = await withDb(findSchemaVersion);
    expect(version).toEqual({ name: ownSchema.name, isOwn: true });
  });
});
