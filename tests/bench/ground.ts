import path from "node:path";
import { root } from "@/scripts/ground/place.mjs";
import { freePortFrom } from "@/scripts/ground/ports.mjs";
import { localAddress, startServer, tailOf, waitForHealth } from "@/scripts/ground/server.mjs";
import { APP, ask, cloneDatabase, urlFor } from "@/tests/setup/clone";

/** Where logs and scripts of the bench are left. */
export const FOLDER = path.join(root, ".test/bench");
/** The database that every measurement is cloned from. */
export const STATE = "bench_state";

/** What `scripts/bench.mjs` gives: the database server, and where PostgreSQL's programs are. */
export function given(name: "BENCH_SERVER" | "BENCH_PROGRAMS"): string {
  const value = process.env[name];
  if (!value) throw new Error(`${name} is missing: run it by npm run bench`);
  return value;
}

/** Runs a measurement on a fresh clone of the state. */
export async function onClone<T>(work: (name: string) => Promise<T>): Promise<T> {
  const server = given("BENCH_SERVER");
  const name = `bench_${process.pid}`;
  await cloneDatabase(server, STATE, name);
  // what the checkpointer would write in the middle of a measurement is written now
  await ask(server, "checkpoint");
  try {
    return await work(name);
  } finally {
    await ask(server, `drop database ${name} with (force)`);
  }
}

/** The same, with a production server of its own. */
export async function onServer<T>(work: (url: string) => Promise<T>): Promise<T> {
  return onClone(async (name) => {
    const port = await freePortFrom(28_500);
    const url = localAddress("127.0.0.1", port);
    const logFile = path.join(FOLDER, "server.log");
    const env = {
      ...process.env,
      NODE_ENV: "production" as const,
      DATABASE_URL: urlFor(given("BENCH_SERVER"), APP, name),
      LOG_LEVEL: "warn",
    };
    const server = startServer({ env, host: "127.0.0.1", port, logFile });
    try {
      if (!(await waitForHealth(url, server.ended))) throw new Error(tailOf(logFile));
      return await work(url);
    } finally {
      await server.stop();
    }
  });
}
