import "server-only";
import type { NodePgDatabase } from "drizzle-orm/node-postgres";
import type pg from "pg";
import { env } from "@/app/_server/env";
import { log } from "@/app/_server/log";
import { openPool, wrap } from "@/db/client";

const held = globalThis as typeof globalThis & { bookmatchPool?: pg.Pool };

/** The process's one pool; kept on `globalThis` so that a hot reload opens no second one. */
export function database(): NodePgDatabase {
  held.bookmatchPool ??= openPool(env().DATABASE_URL, (error) =>
    log().warn({ err: error.message }, "a database connection broke"),
  );
  return wrap(held.bookmatchPool);
}
