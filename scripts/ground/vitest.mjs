import { existsSync, readFileSync, rmSync } from "node:fs";
import path from "node:path";
import { root } from "./place.mjs";
import { run } from "./run.mjs";

/** Runs Vitest and counts from its own report; a file that cannot be loaded counts as failed. */
export async function runVitest(args, env = process.env) {
  const file = path.join(root, ".test/vitest.json");
  rmSync(file, { force: true });
  const reporters = ["--reporter=default", "--reporter=json", `--outputFile.json=${file}`];
  const vitest = path.join(root, "node_modules/vitest/vitest.mjs");
  const { code } = await run(process.execPath, [vitest, "run", ...reporters, ...args], {
    cwd: root,
    env,
    show: true,
    mayFail: true,
    apart: true,
  });
  if (!existsSync(file)) throw new Error("vitest ended before it could report; see above");
  const { testResults, numPassedTests } = JSON.parse(readFileSync(file, "utf8"));
  const failures = testResults.flatMap(failuresOf);
  // a run that failed without a failed test: an error outside of all of them
  if (code !== 0 && failures.length === 0)
    failures.push("vitest: an error outside of a test; see above");
  return { passed: numPassedTests, failed: failures.length, failures };
}

function failuresOf({ name, status, message, assertionResults }) {
  const file = path.relative(root, name);
  const failed = assertionResults.filter((test) => test.status === "failed");
  const again = `npx vitest run ${file}`;
  if (status === "failed" && failed.length === 0)
    return [`${file}: ${message || "could not be loaded"}\n      again: ${again}`];
  return failed.map(
    ({ fullName, title }) => `${file}: ${fullName}\n      again: ${again} -t ${quote(title)}`,
  );
}

/** A name as the shell takes it literally; Vitest reads it as a pattern. */
function quote(title) {
  const literal = title.replace(/[.*+?^${}()|[\]\\]/g, "\\$&");
  return `'${literal.replaceAll("'", "'\\''")}'`;
}
