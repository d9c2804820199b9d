import { existsSync, readFileSync, rmSync } from "node:fs";
import path from "node:path";
import { root } from "./place.mjs";
import { run } from "./run.mjs";

const again = { browser: "test:browser", pictures: "pictures" };

/** Runs Playwright's tests and counts from its own report. */
export async function runPlaywright(project, args, env) {
  const file = path.join(root, ".test/playwright.json");
  rmSync(file, { force: true });
  const playwright = path.join(root, "node_modules/@playwright/test/cli.js");
  const tests = ["test", `--project=${project}`, ...args];
  const { code } = await run(process.execPath, [playwright, ...tests], {
    cwd: root,
    env: { ...env, PLAYWRIGHT_JSON_OUTPUT_FILE: file },
    show: true,
    mayFail: true,
    apart: true,
  });
  if (!existsSync(file)) throw new Error("Playwright ended before it could report; see above");
  const { stats, suites, errors } = JSON.parse(readFileSync(file, "utf8"));
  const failures = suites.flatMap((suite) => failuresOf(suite, project));
  failures.push(...errors.map(({ message }) => `Playwright: ${message}`));
  if (code !== 0 && failures.length === 0) failures.push("Playwright: see above");
  return { passed: stats.expected, failed: failures.length, failures };
}

function failuresOf(suite, project) {
  const own = (suite.specs ?? [])
    .filter((spec) => !spec.ok)
    .map(
      (spec) =>
        `tests/${project}/${spec.file}: ${spec.title}\n      again: ` +
        `npm run ${again[project]} -- ${spec.file}:${spec.line}; its trace is in test-results/`,
    );
  return [...own, ...(suite.suites ?? []).flatMap((inner) => failuresOf(inner, project))];
}
