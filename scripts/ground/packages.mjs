import { existsSync } from "node:fs";
import { isRoot } from "./place.mjs";
import { run } from "./run.mjs";
import { Stop, say } from "./say.mjs";

/**
 * Installs Debian packages, saying so first: as root, else through sudo.
 *
 * @param {readonly string[]} packages
 * @param {string} otherwise what a person can do who may not install
 * @throws Stop where neither works
 */
export async function installPackages(packages, otherwise) {
  const names = packages.join(" ");
  const byHand = `apt-get install -y --no-install-recommends ${names}`;
  if (!existsSync("/usr/bin/apt-get"))
    throw new Stop(`${names} is missing and this is no Debian. Install it, or ${otherwise}`);
  const before = isRoot ? [] : ["sudo"];
  if (!isRoot && !existsSync("/usr/bin/sudo"))
    throw new Stop(`${names} is missing. Ask an administrator to run: ${byHand}\nOr ${otherwise}`);
  say(`Installing ${names} from Debian${isRoot ? "" : ", with sudo"}: ${byHand}`);
  const aptGet = (...args) => {
    const [program, ...rest] = [...before, "env", "DEBIAN_FRONTEND=noninteractive", "apt-get"];
    return run(program, [...rest, "-q", ...args], { show: true, mayFail: true });
  };
  const install = ["install", "-y", "--no-install-recommends", ...packages];
  if ((await aptGet(...install)).code === 0) return;
  say("The package list may be old or missing: renewing it.");
  await aptGet("update");
  if ((await aptGet(...install)).code === 0) return;
  throw new Stop(`Installing ${names} did not work. Run as root: ${byHand}\nOr ${otherwise}`);
}
