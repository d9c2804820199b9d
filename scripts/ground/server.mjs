import { spawn } from "node:child_process";
import { existsSync, openSync, readFileSync, renameSync, statSync } from "node:fs";
import { root } from "./place.mjs";
import { next } from "./programs.mjs";
import { atMost, pause } from "./run.mjs";

/** A log over this size is set aside when the server starts; one older log is kept. */
const LOG_MAX_BYTES = 20_000_000;
/** How long a stopping server may finish its requests. */
const STOP_MS = 10_000;

/**
 * Starts the production server; what it says goes to `logFile`. It gets the app's login only, and,
 * unless it is to end with its group, a session of its own, so that Ctrl-C at the terminal reaches
 * whoever supervises it first.
 *
 * @param {{env: NodeJS.ProcessEnv, host: string, port: number, logFile: string, apart?: boolean}} how
 */
export function startServer({ env, host, port, logFile, apart = true }) {
  if (existsSync(logFile) && statSync(logFile).size > LOG_MAX_BYTES)
    renameSync(logFile, `${logFile}.1`);
  const log = openSync(logFile, "a", 0o600);
  const { DATABASE_OWNER_URL: _owner, ...own } = env;
  const child = spawn(process.execPath, [next, "start", "-H", host, "-p", String(port)], {
    cwd: root,
    env: { ...own, TZ: "UTC" },
    stdio: ["ignore", log, log],
    detached: apart,
  });
  const ended = new Promise((resolve) => {
    child.on("error", (error) => resolve(error.message));
    child.on("exit", (code, signal) => resolve(signal ?? `code ${code}`));
  });
  return { pid: child.pid, ended, stop: () => stopServer(child, ended) };
}

/** The last lines of a log: why a server ended. */
export function tailOf(logFile) {
  return existsSync(logFile) ? readFileSync(logFile, "utf8").slice(-3000).trim() : "";
}

async function stopServer(child, ended) {
  child.kill("SIGTERM");
  if ((await atMost(STOP_MS, ended)) === null) child.kill("SIGKILL");
  await ended;
}

/** The address at which a program of this machine reaches a server that listens on `host`. */
export function localAddress(host, port) {
  const near = host === "0.0.0.0" ? "127.0.0.1" : host === "::" ? "[::1]" : host;
  return `http://${near}:${port}`;
}

/** Asks the server whether it can work; false when it cannot or does not answer. */
async function isHealthy(address) {
  try {
    const answer = await fetch(`${address}/api/health`, { signal: AbortSignal.timeout(5_000) });
    await answer.arrayBuffer();
    return answer.ok;
  } catch {
    return false; // not listening yet, or too busy to answer
  }
}

/** Waits until the server is healthy; false when it ended, or took longer than `withinMs`. */
export async function waitForHealth(address, ended, withinMs = 60_000) {
  let isOver = false;
  ended.then(() => {
    isOver = true;
  });
  for (const until = Date.now() + withinMs; Date.now() < until && !isOver; await pause(150))
    if (await isHealthy(address)) return true;
  return false;
}
