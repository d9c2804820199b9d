import { cpSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { migrate as applyPending } from "drizzle-orm/node-postgres/migrator";
import pg from "pg";
import { afterAll, describe, expect, inject, test } from "vitest";
import { wrap } from "@/db/client";
import { makeAppGroup } from "@/db/grants";
import { migrate } from "@/db/migrate";
import journal from "@/db/migrations/meta/_journal.json";
import { MIGRATIONS_FOLDER, ownSchema, servedCode } from "@/db/schema-version";
import { ask, OWNER, urlFor } from "@/tests/setup/clone";
import { ownDatabase } from "@/tests/setup/db";

const own = ownDatabase();

/** Runs one statement as the owner. */
async function asOwner(url: string, text: string, values: unknown[] = []) {
  const client = new pg.Client({ connectionString: url });
  await client.connect();
  return client.query<Record<string, unknown>>(text, values).finally(() => client.end());
}

describe("migrate", () => {
  test("changes nothing the second time, also when two start at once", async () => {
    const applied = () =>
      asOwner(own.ownerUrl, "select count(*) from drizzle.__drizzle_migrations");
    const before = (await applied()).rows;
    const both = await Promise.all([migrate(own.ownerUrl), migrate(own.ownerUrl)]);
    expect(both.map(({ ok }) => ok)).toEqual([true, true]);
    expect((await applied()).rows).toEqual(before);
  });

  test("refuses a database of newer code that serves ours no longer, and leaves it alone", async () => {
    const newer = [ownSchema.when + 1000, ownSchema.when + 1000];
    await asOwner(own.ownerUrl, "insert into drizzle.oldest_code values ($1, $2)", newer);
    const refused = await migrate(own.ownerUrl);
    expect(refused).toMatchObject({ ok: false, problem: { code: "conflict" } });
    await asOwner(own.ownerUrl, "delete from drizzle.oldest_code where applied = $1", [newer[0]]);
  });

  test("works with a database of newer code that still serves ours", async () => {
    const newer = [ownSchema.when + 1000, ownSchema.when];
    await asOwner(own.ownerUrl, "insert into drizzle.oldest_code values ($1, $2)", newer);
    expect((await migrate(own.ownerUrl)).ok).toBe(true);
    await asOwner(own.ownerUrl, "delete from drizzle.oldest_code where applied = $1", [newer[0]]);
  });
});

describe("servedCode", () => {
  test("gives each migration, in order, the rank of the oldest code that it serves", () => {
    const served = servedCode();
    expect(served.map(({ applied }) => applied)).toEqual(journal.entries.map(({ when }) => when));
    expect(served.every(({ applied, oldest }) => oldest <= applied)).toBe(true);
  });
});

describe("an upgrade", () => {
  const name = `${inject("run")}upgrade`;
  const url = urlFor(inject("server"), OWNER, name);
  const folder = mkdtempSync(path.join(tmpdir(), "bookmatch-migrations-"));
  afterAll(async () => {
    rmSync(folder, { recursive: true });
    await ask(inject("server"), `drop database if exists ${name} with (force)`);
  });

  test.each(journal.entries.map(({ tag }, at) => [tag, at + 1] as const))(
    "from the schema of %s ends at this code's own",
    async (_tag, count) => {
      await ask(inject("server"), `drop database if exists ${name} with (force)`);
      await ask(inject("server"), `create database ${name} owner ${OWNER.login}`);
      await applyFirst(url, folder, count);
      expect((await migrate(url)).ok).toBe(true);
      const last = await asOwner(url, "select max(created_at) from drizzle.__drizzle_migrations");
      expect(Number(last.rows[0]?.max)).toBe(ownSchema.when);
    },
  );
});

/** Applies the first migrations only, as code that knew no more would have. */
async function applyFirst(url: string, folder: string, count: number): Promise<void> {
  cpSync(MIGRATIONS_FOLDER, folder, { recursive: true });
  const file = path.join(folder, "meta/_journal.json");
  const whole = JSON.parse(readFileSync(file, "utf8")) as typeof journal;
  writeFileSync(file, JSON.stringify({ ...whole, entries: whole.entries.slice(0, count) }));
  const client = new pg.Client({ connectionString: url });
  await client.connect();
  await makeAppGroup(client);
  await applyPending(wrap(client), { migrationsFolder: folder }).finally(() => client.end());
}
