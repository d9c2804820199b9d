import "server-only";
import { migrate as applyPending } from "drizzle-orm/node-postgres/migrator";
import pg from "pg";
import { wrap } from "@/db/client";
import { grantToApp, makeAppGroup } from "@/db/grants";
import { MIGRATIONS_FOLDER, ownSchema, servedCode } from "@/db/schema-version";
import { no, ok, type Result } from "@/lib/result";

/** Any number that nothing else locks: two starts at once migrate one after the other. */
const MIGRATION_LOCK = 4_817_626_001;

const TOO_NEW =
  "This database was changed by a newer Bookmatch that this one cannot work with. " +
  "Start the newer one again, or restore a backup from before the change.";

/**
 * Brings a database to this code's schema: makes the app's group, applies what is pending, all in
 * one transaction, and grants the app its rights. Safe at every start, and from two at once.
 *
 * @param ownerUrl a login that owns the database; the app itself owns nothing
 * @returns `conflict` where the schema is from newer code that this code cannot work with
 */
export async function migrate(ownerUrl: string): Promise<Result<null>> {
  const client = new pg.Client({ connectionString: ownerUrl });
  await client.connect();
  try {
    // of the connection, which goes straight to the server and is closed below
    await client.query("select pg_advisory_lock($1)", [MIGRATION_LOCK]);
    if (await isTooNew(client)) return no("conflict", TOO_NEW);
    await makeAppGroup(client);
    await applyPending(wrap(client), { migrationsFolder: MIGRATIONS_FOLDER });
    await noteServedCode(client);
    await grantToApp(client);
    return ok(null);
  } finally {
    await client.end();
  }
}

/** Newer code that still serves ours may have migrated first: then there is nothing to refuse. */
async function isTooNew(client: pg.Client): Promise<boolean> {
  const known = await client.query("select to_regclass('drizzle.oldest_code') as known");
  if (known.rows[0]?.known === null) return false;
  const newer = await client.query<{ oldest: string | null }>(
    "select max(oldest) as oldest from drizzle.oldest_code where applied > $1",
    [ownSchema.when],
  );
  return Number(newer.rows[0]?.oldest ?? 0) > ownSchema.when;
}

/** Keeps, for code older than a migration, which code its schema still serves. */
async function noteServedCode(client: pg.Client): Promise<void> {
  await client.query(
    "create table if not exists drizzle.oldest_code " +
      "(applied bigint primary key, oldest bigint not null)",
  );
  for (const { applied, oldest } of servedCode()) {
    await client.query("insert into drizzle.oldest_code values ($1, $2) on conflict do nothing", [
      applied,
      oldest,
    ]);
  }
}
