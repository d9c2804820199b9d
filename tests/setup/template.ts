import { createHash } from "node:crypto";
import { readdirSync, readFileSync } from "node:fs";
import path from "node:path";
import pg from "pg";
import { giveAppLogin } from "@/db/logins";
import { migrate } from "@/db/migrate";
import { APP, ask, OWNER, urlFor } from "@/tests/setup/clone";

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
