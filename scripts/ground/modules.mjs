import { createHash } from "node:crypto";
import { existsSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import path from "node:path";
import { root } from "./place.mjs";
import { run } from "./run.mjs";
import { Stop, say } from "./say.mjs";

const stamp = path.join(root, "node_modules/.bookmatch-lock");

function lockDigest() {
  const lock = readFileSync(path.join(root, "package-lock.json"));
  return createHash("sha256").update(lock).update(process.version).digest("hex");
}

/** Tells whether what is installed is what the lock file says, for this Node. */
export function areModulesCurrent() {
  return existsSync(stamp) && readFileSync(stamp, "utf8") === lockDigest();
}

/** Installs the locked packages unless they are there; an interrupted install is done again. */
export async function installModules() {
  if (areModulesCurrent()) return;
  say("Installing the locked npm packages (about a minute) …");
  rmSync(stamp, { force: true });
  const quiet = ["--no-audit", "--no-fund", "--loglevel=error", "--json=false"];
  const args = ["ci", "--include=dev", ...quiet];
  const { code } = await run("npm", args, { cwd: root, show: true, mayFail: true });
  if (code !== 0) throw new Stop("npm ci did not work; its reason stands above. Then start again.");
  writeFileSync(stamp, lockDigest());
}
