import { spawn } from "node:child_process";

/** How long what is stopped may clean up after itself. */
const PATIENCE_MS = 20_000;

/** Each with whether it leads a group of its own. */
const running = new Map();

/**
 * Runs a program to its end and gives back what it printed; a failure carries its output, so that
 * whoever sees it need not run it again.
 *
 * @param {string} program
 * @param {readonly string[]} args
 * @param {{cwd?: string, env?: NodeJS.ProcessEnv, input?: string, show?: boolean, talk?: boolean, mayFail?: boolean, apart?: boolean}} [how]
 *   `show` prints as it goes, on standard error, instead of collecting; `talk` prints what
 *   it says on standard error only; `mayFail` gives the exit code back; `apart` keeps a Ctrl-C at
 *   the terminal from it: it gets it once, from `stopRunning`
 * @returns {Promise<{code: number, text: string}>}
 */
export function run(program, args, how = {}) {
  const { cwd, env = process.env, input } = how;
  const { show = false, talk = false, mayFail = false, apart = false } = how;
  const output = show ? process.stderr : "pipe";
  const errors = show || talk ? process.stderr : "pipe";
  return new Promise((resolve, reject) => {
    const stdio = [input === undefined ? "ignore" : "pipe", output, errors];
    const child = spawn(program, args, { cwd, env, stdio, detached: apart });
    running.set(child, apart);
    let text = "";
    const collect = (chunk) => {
      text += chunk;
    };
    child.stdout?.on("data", collect);
    child.stderr?.on("data", collect);
    child.on("error", reject);
    child.on("close", (code, signal) => {
      running.delete(child);
      const ended = code ?? 128;
      if (ended === 0 || mayFail) return resolve({ code: ended, text });
      const end = signal ? `was stopped by ${signal}` : `ended with ${ended}`;
      reject(new Error(`${program} ${args[0] ?? ""} ${end}\n${text}`.trim()));
    });
    child.stdin?.end(input);
  });
}

/** Stops whatever `run` is waiting for: the person wants to leave. What does not end is ended. */
export function stopRunning(signal) {
  const asked = [...running];
  for (const [child] of asked) child.kill(signal);
  const end = () => {
    for (const [child, isLeader] of asked)
      if (running.has(child)) process.kill(isLeader ? -child.pid : child.pid, "SIGKILL");
  };
  setTimeout(end, PATIENCE_MS).unref();
}

/** Waits; for programs that say no word when they are ready. */
export function pause(ms) {
  return new Promise((resolve) => setTimeout(resolve, ms));
}

/** Waits for something, but no longer than `ms`: null when that is over first. */
export async function atMost(ms, promise) {
  let timer;
  const late = new Promise((resolve) => {
    timer = setTimeout(resolve, ms, null);
  });
  return Promise.race([promise, late]).finally(() => clearTimeout(timer));
}
