import path from "node:path";
import { root } from "./place.mjs";
import { run } from "./run.mjs";

/** How a TypeScript program of the project is run: server code, without a bundler. */
export const typeScript = ["--conditions=react-server", "--import", "tsx"];

/** Next's own program, for `build`, `start` and `dev`. */
export const next = path.join(root, "node_modules/next/dist/bin/next");

/**
 * Runs a TypeScript program of `scripts/` with an environment; it talks to the person on standard
 * error and gives its answer on standard output.
 *
 * @returns {Promise<{code: number, text: string}>}
 */
export function runScript(name, args, env, how = {}) {
  const file = path.join("scripts", name);
  return run(process.execPath, [...typeScript, file, ...args], { cwd: root, env, ...how });
}
