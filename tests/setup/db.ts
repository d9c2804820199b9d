import pg from "pg";
import { afterAll, beforeAll, inject } from "vitest";
import { type Db, wrap } from "@/db/client";
import { APP, ask, cloneDatabase, OWNER, urlFor } from "@/tests/setup/clone";

/** The worker's own clone: every test in it is rolled back, so it stays empty. */
let shared: Promise<pg.Pool> | undefined;

/**
 * Runs `work` as the app's login in a transaction that is rolled back, whatever happens in it.
 * Inner transactions become savepoints. For what needs COMMIT or two connections: `ownDatabase`.
 */
export async function withDb<T>(work: (db: Db) => Promise<T>): Promise<T> {
  shared ??= openShared();
  const client = await (await shared).connect();
  try {
    let answer: { value: T } | undefined;
    const undone = new Error("rolled back");
    await wrap(client)
      .transaction(async (db) => {
        answer = { value: await work(db) };
        throw undone;
      })
      .catch((error: unknown) => {
        if (error !== undone) throw error;
      });
    return answer!.value;
  } finally {
    client.release();
  }
}

/** A database of this file alone. Its parts are there from `beforeAll` on. */
export interface OwnDatabase {
  /** As the app's login; `database()` of the app's server code answers with the same pool. */
  db: Db;
  pool: pg.Pool;
  /** For a connection of one's own as the app. */
  url: string;
  /** For what only the owner may do. */
  ownerUrl: string;
}

/** Gives the file that calls it at its top a database of its own, where commits stay. */
export function ownDatabase(): OwnDatabase {
  const own = {} as OwnDatabase;
  const name = `${inject("run")}own_${poolId()}`;
  const held = globalThis as typeof globalThis & { bookmatchPool?: pg.Pool };
  beforeAll(async () => {
    await cloneDatabase(inject("server"), inject("template"), name);
    const url = urlFor(inject("server"), APP, name);
    const pool = openPool(url);
    held.bookmatchPool = pool;
    const ownerUrl = urlFor(inject("server"), OWNER, name);
    Object.assign(own, { db: wrap(pool), pool, url, ownerUrl });
  });
  afterAll(async () => {
    delete held.bookmatchPool;
    await own.pool.end();
    await ask(inject("server"), `drop database ${name} with (force)`);
  });
  return own;
}

async function openShared(): Promise<pg.Pool> {
  const name = `${inject("run")}shared_${poolId()}`;
  const found = await ask(inject("server"), "select 1 from pg_database where datname = $1", [name]);
  if (!found.rowCount) await cloneDatabase(inject("server"), inject("template"), name);
  return openPool(urlFor(inject("server"), APP, name));
}

/** The server is stopped under the pool at the end of a run: that breaks idle connections. */
function openPool(url: string): pg.Pool {
  const pool = new pg.Pool({ connectionString: url, max: 8, allowExitOnIdle: true });
  pool.on("error", () => undefined);
  return pool;
}

/** Vitest numbers its workers; two files never run in one worker at once. */
function poolId(): string {
  return process.env.VITEST_POOL_ID ?? "0";
}
