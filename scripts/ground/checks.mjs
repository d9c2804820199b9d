import path from "node:path";
import { root } from "./place.mjs";
import { next } from "./programs.mjs";
import { run } from "./run.mjs";
import { say } from "./say.mjs";

const bin = (name) => path.join(root, "node_modules/.bin", name);

/** What is checked without running the product, each with what to do when it fails. */
const checks = [
  {
    name: "format and lint",
    steps: [[bin("biome"), "check", "--error-on-warnings", "."]],
    repair: "npx biome check --write . puts most of it right",
  },
  {
    name: "types",
    steps: [
      [process.execPath, next, "typegen"],
      [bin("tsc"), "--noEmit"],
    ],
    repair: "see the lines above; npx tsc --noEmit shows them again",
  },
  {
    name: "dead code",
    steps: [[bin("knip")]],
    repair: "delete what nobody uses, or use it; npx knip shows it again",
  },
];

/** Runs every check, also after one that failed. */
export async function runChecks() {
  const failures = [];
  for (const { name, steps, repair } of checks) {
    const ok = await runSteps(steps);
    say(`${ok ? "  ok" : "FAIL"}  ${name}`);
    if (!ok) failures.push(`${name}: ${repair}`);
  }
  return { passed: checks.length - failures.length, failed: failures.length, failures };
}

async function runSteps(steps) {
  for (const [program, ...args] of steps) {
    const env = { ...process.env, NEXT_TELEMETRY_DISABLED: "1" };
    const { code, text } = await run(program, args, { cwd: root, env, mayFail: true });
    if (code === 0) continue;
    say(text);
    return false;
  }
  return true;
}
