import "server-only";
import { env } from "@/app/_server/env";
import { log } from "@/app/_server/log";
import { type Db, openPool, type Pool, wrap } from "@/db/client";

const held = globalThis as typeof globalThis & { bookmatchPool?: Pool };

/** The process's one pool; kept on `globalThis` so that a hot reload opens no second one. */
export function database(): Db {
  held.bookmatchPool ??= openPool(env().DATABASE_URL, (error) =>
    log().warn({ err: error.message }, "a database connection broke"),
  );
  return wrap(held.bookmatchPool);
}
