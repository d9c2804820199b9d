import path from "node:path";
import { root } from "./place.mjs";
import { run } from "./run.mjs";

/** How a TypeScript program of the project is run: server code, without a bundler. */
const typeScript = ["--conditions=react-server", "--import", "tsx"];

/** Next's own program, for `build`, `start` and `dev`. */
export const next = path.join(root, "node_modules/next/dist/bin/next");

/**
 * Runs a TypeScript program with an environment; it talks to the person on standard error and gives
 * its answer on standard output.
 *
 * @returns {Promise<{code: number, text: string}>}
 */
export function runProgram(file, args, env, how = {}) {
  return run(process.execPath, [...typeScript, file, ...args], { cwd: root, env, ...how });
}

/** The same, for a program of `scripts/` by its file name. */
export function runScript(name, args, env, how = {}) {
  return runProgram(path.join("scripts", name), args, env, how);
}
