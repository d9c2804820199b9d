import path from "node:path";
import { root } from "@/scripts/ground/place.mjs";
import { freePortFrom } from "@/scripts/ground/ports.mjs";
import { runScript } from "@/scripts/ground/programs.mjs";
import { localAddress, startServer, tailOf, waitForHealth } from "@/scripts/ground/server.mjs";
import { APP, ask, cloneDatabase, OWNER, urlFor } from "@/tests/setup/clone";

const HOST = "127.0.0.1";
/** Tests' servers listen from here on, each worker's on ports of its own. */
const FIRST_PORT = 28_000;
const PORTS_A_WORKER = 100;

/** The demo sign-ins, as `npm run demo -- --json` prints them. */
export interface SignIns {
  office: { email: string; password: string; role: string }[];
  workers: { worker: string; pin: string; cell: string }[];
  cells: string[];
}

/** A production server of the tests' own, on a clone of the demo data. */
export type Installation = Awaited<ReturnType<typeof openInstallation>>;

/** Clones the demo data and starts the production server on it. */
export async function openInstallation(name: string) {
  const server = given("BOOKMATCH_TEST_SERVER");
  await ask(server, `drop database if exists ${name} with (force)`);
  await cloneDatabase(server, given("BOOKMATCH_SEEDED"), name);
  const worker = Number(process.env.TEST_PARALLEL_INDEX ?? 0);
  const port = await freePortFrom(FIRST_PORT + worker * PORTS_A_WORKER);
  const url = localAddress(HOST, port);
  const logFile = path.join(root, `.test/${name}.log`);
  const env = environment(server, name);
  let running: ReturnType<typeof startServer> | null = null;
  const start = async () => {
    running = startServer({ env, host: HOST, port, logFile, apart: false });
    if (!(await waitForHealth(url, running.ended)))
      throw new Error(`The server did not come up:\n${tailOf(logFile)}`);
  };
  const stop = async () => {
    await running?.stop();
    running = null;
  };
  await start();
  /** Runs a command of `scripts/`, as `npm run` does, and gives its answer. */
  const command = async (script: string, ...args: string[]) =>
    (await runScript(script, args, env, { talk: true })).text.trim();
  let signIns: Promise<SignIns> | null = null;
  const askSignIns = async () => JSON.parse(await command("demo.ts", "--json")) as SignIns;
  return {
    url,
    command,
    /** Asked for once: the demo's sign-ins are made when it is loaded. */
    signIns: () => {
      signIns ??= askSignIns();
      return signIns;
    },
    /** The database as the app, and as its owner. */
    databaseUrl: env.DATABASE_URL,
    ownerUrl: env.DATABASE_OWNER_URL,
    start,
    stop,
    /** Ends the server as a power cut does. */
    kill: async () => {
      if (running?.pid) process.kill(running.pid, "SIGKILL");
      await running?.ended;
      running = null;
    },
    close: async () => {
      await stop();
      await ask(server, `drop database ${name} with (force)`);
    },
  };
}

function environment(server: string, name: string) {
  return {
    ...process.env,
    NODE_ENV: "production" as const,
    NEXT_TELEMETRY_DISABLED: "1",
    DATABASE_URL: urlFor(server, APP, name),
    DATABASE_OWNER_URL: urlFor(server, OWNER, name),
    SESSION_SECRET: "a secret of the browser tests, known to all",
    BOOKMATCH_DEMO: "1",
    LOG_LEVEL: "warn",
  };
}

function given(name: string): string {
  const value = process.env[name];
  if (!value) throw new Error(`${name} is missing: run the browser tests by npm run test:browser`);
  return value;
}
