import { openPool, wrap } from "@/db/client";
import { loadWithProgress } from "@/scripts/ground/demo";
import { startTestServer } from "@/scripts/ground/test-data.mjs";
import { APP, ask, cloneDatabase, urlFor } from "@/tests/setup/clone";
import { makeTemplate } from "@/tests/setup/template";

/** A demo younger than this still has its shift running: a second run of the browser tests uses it. */
const FRESH_MS = 30 * 60_000;

/**
 * Makes the database that every browser test is cloned from: migrated, with the demo scenario. Its
 * name ends in the instant it was begun. Prints the name; run by `scripts/test.mjs`.
 */
const { server } = await startTestServer();
const template = await makeTemplate(server);
const prefix = `seeded_${template.slice(-8)}_`;
const fresh = await freshest(prefix);
process.stdout.write(fresh ?? (await seed(`${prefix}${Date.now()}`)));

async function freshest(prefix: string): Promise<string | null> {
  const { rows } = await ask(
    server,
    "select datname from pg_database where starts_with(datname, 'seeded_') order by 1 desc",
  );
  const names = rows.map(({ datname }) => String(datname));
  const fresh = names.find(
    (name) => name.startsWith(prefix) && Number(name.split("_")[2]) > Date.now() - FRESH_MS,
  );
  for (const name of names) if (name !== fresh) await ask(server, `drop database ${name}`);
  return fresh ?? null;
}

/** Loaded under another name first, so that a half-loaded one is never used. */
async function seed(name: string): Promise<string> {
  const making = `loading_${process.pid}`;
  await cloneDatabase(server, template, making);
  const pool = openPool(urlFor(server, APP, making), (error) => {
    throw error;
  });
  await loadWithProgress(wrap(pool)).finally(() => pool.end());
  await ask(server, `alter database ${making} rename to ${name}`);
  return name;
}
