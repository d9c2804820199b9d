import { spawn } from "node:child_process";

/**
 * Runs a program to its end and gives back what it printed; a failure carries its output, so that
 * whoever sees it need not run it again.
 *
 * @param {string} program
 * @param {readonly string[]} args
 * @param {{cwd?: string, env?: NodeJS.ProcessEnv, input?: string, show?: boolean, mayFail?: boolean}} [how]
 *   `show` prints as it goes instead of collecting; `mayFail` gives the exit code back
 * @returns {Promise<{code: number, text: string}>}
 */
export function run(program, args, how = {}) {
  const { cwd, env = process.env, input, show = false, mayFail = false } = how;
  const stdout = show ? "inherit" : "pipe";
  return new Promise((resolve, reject) => {
    const stdio = [input === undefined ? "ignore" : "pipe", stdout, stdout];
    const child = spawn(program, args, { cwd, env, stdio });
    let text = "";
    const collect = (chunk) => {
      text += chunk;
    };
    child.stdout?.on("data", collect);
    child.stderr?.on("data", collect);
    child.on("error", reject);
    child.on("close", (code, signal) => {
      const ended = code ?? 128;
      if (ended === 0 || mayFail) return resolve({ code: ended, text });
      const end = signal ? `was stopped by ${signal}` : `ended with ${ended}`;
      reject(new Error(`${program} ${args[0] ?? ""} ${end}\n${text}`.trim()));
    });
    child.stdin?.end(input);
  });
}

/** Waits; for programs that say no word when they are ready. */
export function pause(ms) {
  return new Promise((resolve) => setTimeout(resolve, ms));
}
