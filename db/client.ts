import "server-only";
import { drizzle, type NodePgDatabase } from "drizzle-orm/node-postgres";
import pg from "pg";

/** A pool or an open transaction: every query and command takes one, inside a `Scope`. */
export type Db = Pick<
  NodePgDatabase,
  | "select"
  | "selectDistinct"
  | "insert"
  | "update"
  | "delete"
  | "execute"
  | "transaction"
  | "$count"
>;

/** The connections of a process; only `openPool` makes one. */
export type Pool = pg.Pool;

/** Where a query or command works: which connection, which site (LEDGER.md 11). */
export interface Scope {
  db: Db;
  siteId: string;
}

/** Opens a pool; `onError` hears of idle connections that broke, so that they do not end the process. */
export function openPool(url: string, onError: (error: Error) => void, max = 20): Pool {
  const pool = new pg.Pool({ connectionString: url, max });
  pool.on("error", onError);
  return pool;
}

/** Wraps a pool or one connection in Drizzle, with snake_case columns. */
export function wrap(client: Pool | pg.PoolClient | pg.Client): NodePgDatabase {
  return drizzle({ client, casing: "snake_case" });
}
