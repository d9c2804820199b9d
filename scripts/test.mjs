import { existsSync } from "node:fs";
import path from "node:path";
import { build, isBuildCurrent } from "./ground/build.mjs";
import { runChecks } from "./ground/checks.mjs";
import { findPrograms } from "./ground/cluster.mjs";
import { runningRecord } from "./ground/installation.mjs";
import { personLeaves } from "./ground/leave.mjs";
import { installModules } from "./ground/modules.mjs";
import { installPackages } from "./ground/packages.mjs";
import { checkFolders, root } from "./ground/place.mjs";
import { checkNode } from "./ground/plan.mjs";
import { runPlaywright } from "./ground/playwright.mjs";
import { isAlive } from "./ground/process-record.mjs";
import { runProgram } from "./ground/programs.mjs";
import { main, Stop } from "./ground/say.mjs";
import { newTally, report, stage } from "./ground/stages.mjs";
import { startTestServer } from "./ground/test-data.mjs";
import { runVitest } from "./ground/vitest.mjs";

const one = { passed: 1, failed: 0, failures: [] };
const none = { passed: 0, failed: 0, failures: [] };
const [mode = "all", ...args] = process.argv.slice(2);

/**
 * `npm test`: installs what the tests need, then checks, tests, builds, and drives the build in a
 * browser. `browser [spec]` does only the last two, `pictures [spec]` too, taking every screen into
 * `screenshots/` and the README's into `docs/`; `deep` the laws with many more cases.
 */
await main(async () => {
  checkNode();
  checkFolders();
  const leaving = personLeaves("SIGINT");
  const tally = newTally(leaving);
  const isInstalled = await stage(tally, "install", install);
  if (!isInstalled) return report(tally);
  const data = await startTestServer();
  try {
    if (mode === "all") await stage(tally, "check", runChecks);
    if (mode === "all") await stage(tally, "unit and database tests", () => runVitest(args));
    if (mode === "deep") await stage(tally, "laws with many cases", () => runVitest(args, deep()));
    if (mode !== "deep") await buildAndDrive(tally, data.server);
  } finally {
    if (!data.wasUp) await data.stop();
  }
  return report(tally);
});

async function install() {
  const packages = [
    ...(findPrograms() ? [] : ["postgresql"]),
    ...(existsSync("/usr/bin/chromium") ? [] : ["chromium"]),
  ];
  if (packages.length > 0) await installPackages(packages);
  await installModules();
  return none;
}

/** The build and the demo data need each other's time only: both are made at once. */
async function buildAndDrive(tally, server) {
  let seeded = "";
  const isReady = await stage(tally, "build, and demo data", async () => {
    if (isAlive(runningRecord().read()?.supervisor) && !isBuildCurrent())
      throw new Stop("Bookmatch runs from this folder; a new build would break it: npm stop");
    const [made] = await Promise.all([makeSeeded(), build()]);
    seeded = made;
    return one;
  });
  if (!isReady) return;
  const env = { ...process.env, BOOKMATCH_TEST_SERVER: server, BOOKMATCH_SEEDED: seeded };
  const project = mode === "pictures" ? "pictures" : "browser";
  const chosen = mode === "all" ? [] : args;
  await stage(tally, `${project} tests`, () => runPlaywright(project, chosen, env));
}

async function makeSeeded() {
  const file = path.join(root, "tests/setup/seeded.ts");
  return (await runProgram(file, [], process.env, { talk: true })).text.trim();
}

function deep() {
  return { ...process.env, BOOKMATCH_DEEP: "1" };
}
