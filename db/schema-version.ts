import "server-only";
import { sql } from "drizzle-orm";
import { readMigrationFiles } from "drizzle-orm/migrator";
import type { Db } from "@/db/client";
import journal from "@/db/migrations/meta/_journal.json";

/** Where the migrations lie, from the folder in which every program of the project runs. */
export const MIGRATIONS_FOLDER = "db/migrations";

/** The line with which a migration names the oldest code that still runs on its schema. */
const SERVES = /^-- Oldest code served: (\S+)$/m;

/** The last migration that this code knows: its time is its rank. */
export const ownSchema = { name: "", when: 0, ...lastOf(journal.entries) };

function lastOf(entries: readonly { tag: string; when: number }[]) {
  const last = entries.at(-1);
  return last ? { name: last.tag, when: last.when } : undefined;
}

/**
 * Lists this code's migrations by rank, each with the rank of the oldest code that it serves: what
 * its first line says, or itself where it says nothing.
 */
export function servedCode(): { applied: number; oldest: number }[] {
  return readMigrationFiles({ migrationsFolder: MIGRATIONS_FOLDER }).map((file) => {
    const name = SERVES.exec(file.sql.join("\n"))?.[1];
    const served = journal.entries.find(({ tag }) => tag === name);
    return { applied: file.folderMillis, oldest: served?.when ?? file.folderMillis };
  });
}

/** Tells which schema a database has and whether it is this code's own; null where it has none. */
export async function findSchemaVersion(db: Db) {
  const { rows } = await db.execute<{ when: string | null }>(
    sql`select max(created_at) as when from drizzle.__drizzle_migrations`,
  );
  const when = rows[0]?.when;
  if (!when) return null;
  const name = journal.entries.find((entry) => entry.when === Number(when))?.tag ?? null;
  return { name, isOwn: Number(when) === ownSchema.when };
}
