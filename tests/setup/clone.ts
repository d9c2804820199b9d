import pg from "pg";

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
export async function ask(
  server: string,
  text: string,
  values: unknown[] = [],
  database = "postgres",
) {
  const client = new pg.Client({ connectionString: `${server}${database}` });
  await client.connect();
  try {
    return await client.query<Record<string, unknown>>(text, values);
  } finally {
    await client.end();
  }
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
