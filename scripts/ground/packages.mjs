import { existsSync } from "node:fs";
import { isRoot } from "./place.mjs";
import { run } from "./run.mjs";
import { Stop, say } from "./say.mjs";

/** What sudo ends with when it lets nobody through; apt-get's own failure is 100. */
const SUDO_REFUSED = 1;

/**
 * Installs Debian packages, saying so first: as root, else through sudo.
 *
 * @param {readonly string[]} packages
 * @param {string} [otherwise] what a person can do who may not install
 * @throws Stop where neither works
 */
export async function installPackages(packages, otherwise) {
  const names = packages.join(" ");
  const byHand = `apt-get install -y --no-install-recommends ${names}`;
  const wayOut = otherwise ? `\nOr ${otherwise}` : "";
  if (!existsSync("/usr/bin/apt-get"))
    throw new Stop(`This is no Debian, and these are missing: ${names}. Install them.${wayOut}`);
  const ask = `Missing: ${names}. Ask an administrator to run: ${byHand}${wayOut}`;
  if (!isRoot && !existsSync("/usr/bin/sudo")) throw new Stop(ask);
  say(`Installing ${names} from Debian${isRoot ? "" : ", with sudo"}: ${byHand}`);
  const first = await aptGet("install", "-y", "--no-install-recommends", ...packages);
  if (first === 0) return;
  if (!isRoot && first === SUDO_REFUSED) throw new Stop(`sudo does not let you. ${ask}`);
  say("The package list may be old or missing: renewing it.");
  await aptGet("update");
  if ((await aptGet("install", "-y", "--no-install-recommends", ...packages)) === 0) return;
  throw new Stop(`Installing ${names} did not work. Run as root: ${byHand}${wayOut}`);
}

async function aptGet(...args) {
  const aptGet = ["env", "DEBIAN_FRONTEND=noninteractive", "apt-get", "-q", ...args];
  const [program, ...rest] = isRoot ? aptGet : ["sudo", ...aptGet];
  return (await run(program, rest, { show: true, mayFail: true })).code;
}
