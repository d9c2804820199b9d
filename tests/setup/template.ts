import { createHash } from "node:crypto";
import { readdirSync, readFileSync } from "node:fs";
import path from "node:path";
import pg from "pg";
import { giveAppLogin } from "@/db/logins";
import { migrate } from "@/db/migrate";

/** Owns the databases of the tests, as the installation's owner owns its one. */
export const OWNER = { login: "bookmatch_owner", password: "owner-of-test-data" };
/** What tests connect as: the app's rights and no more, so that a missing grant is found. */
export const APP = { login: "bookmatch_tests", password: "app-on-test-data" };

/** The address of a database of the test server, for one of its logins. */
export function urlFor(server: string, who: { login: string; password: string }, name: string) {
  const url = new URL(name, server);
  url.username = who.login;
  url.password = who.password;
  return url.href;
}

/** Asks the server one thing as its superuser. */
export async function ask(server: string, text: string, values: unknown[] = []) {
  const client = new pg.Client({ connectionString: `${server}postgres` });
  await client.connect();
  try {
    return await client.query<Record<string, unknown>>(text, values);
  } finally {
    await client.end();
  }
}

/**
 * Makes the migrated, empty database that all tests are cloned from, unless it is there; its name
 * says which schema it has. Built under another name first, so that a half-made one is never used.
 */
export async function makeTemplate(server: string): Promise<string> {
  const name = `template_${schemaDigest()}`;
  const found = await ask(server, "select 1 from pg_database where datname = $1", [name]);
  if (found.rowCount) return name;
  const making = `making_${process.pid}`;
  await makeOwner(server);
  await ask(server, `drop database if exists ${making}`);
  await ask(server, `create database ${making} owner ${OWNER.login}`);
  await migrate(urlFor(server, OWNER, making));
  await withClient(urlFor(server, OWNER, making), (client) => giveAppLogin(client, APP));
  await ask(server, `alter database ${making} rename to ${name}`);
  return name;
}

/** Clones a database; nobody may be connected to `from`. */
export async function cloneDatabase(server: string, from: string, name: string): Promise<void> {
  await ask(server, `create database ${name} template ${from} owner ${OWNER.login}`);
}

/** Drops every database whose name begins so, with whoever is still connected. */
export async function dropAll(server: string, prefix: string): Promise<void> {
  const found = await ask(
    server,
    "select datname from pg_database where starts_with(datname, $1)",
    [prefix],
  );
  for (const { datname } of found.rows) await ask(server, `drop database ${datname} with (force)`);
}

async function makeOwner(server: string): Promise<void> {
  const found = await ask(server, "select 1 from pg_roles where rolname = $1", [OWNER.login]);
  if (found.rowCount) return;
  await ask(server, `create role ${OWNER.login} login createrole password '${OWNER.password}'`);
}

async function withClient(url: string, run: (client: pg.Client) => Promise<void>): Promise<void> {
  const client = new pg.Client({ connectionString: url });
  await client.connect();
  await run(client).finally(() => client.end());
}

function schemaDigest(): string {
  const folder = path.join(process.cwd(), "db/migrations");
  const names = readdirSync(folder).filter((name) => name.endsWith(".sql"));
  const files = [...names.sort().map((name) => path.join(folder, name)), "db/grants.ts"];
  const digest = createHash("sha256");
  for (const file of files) digest.update(readFileSync(file));
  return digest.digest("hex").slice(0, 16);
}
