import path from "node:path";
import { isBuildCurrent } from "./build.mjs";
import { findPrograms } from "./cluster.mjs";
import { findClusterPlace, usesGivenServer } from "./installation.mjs";
import { areModulesCurrent } from "./modules.mjs";
import { root } from "./place.mjs";
import { isFree } from "./ports.mjs";
import { Stop, say } from "./say.mjs";

const DEFAULT_PORT = 3000;
const OLDEST_NODE = [20, 19];

/** Refuses a Node that is too old for the packages. */
export function checkNode() {
  const [major, minor] = process.versions.node.split(".").map(Number);
  if (major > OLDEST_NODE[0] || (major === OLDEST_NODE[0] && minor >= OLDEST_NODE[1])) return;
  throw new Stop(`Node ${OLDEST_NODE.join(".")} or newer is needed; this is ${process.version}.`);
}

/** Says where to listen: `HOST` and `PORT`; a port that nobody asked for may be the next free one. */
export async function chooseAddress() {
  const host = process.env.HOST || "127.0.0.1";
  const asked = process.env.PORT;
  const port = asked ? Number(asked) : DEFAULT_PORT;
  if (!Number.isInteger(port) || port < 1 || port > 65_535)
    throw new Stop(`PORT is "${asked}": give a number from 1 to 65535.`);
  if (await isFree(port, host)) return { host, port };
  if (asked)
    throw new Stop(
      `Port ${port} on ${host} cannot be listened on: another program has it, it may not be\n` +
        "yours to use, or this machine has no such address. Choose others with PORT and HOST.",
    );
  for (let other = port + 1; other < port + 100; other += 1) {
    if (!(await isFree(other, host))) continue;
    say(`Another program has port ${port}: using ${other}. PORT chooses one.`);
    return { host, port: other };
  }
  throw new Stop(`No port from ${port} to ${port + 99} is free on ${host}. Choose one with PORT.`);
}

/** Says what a start is about to do, before it does it. */
export function sayPlan({ host, port }) {
  const needsServer = !usesGivenServer && !findPrograms();
  const place = shownPlace(findClusterPlace());
  const modules = !areModulesCurrent();
  const steps = [
    needsServer && "install PostgreSQL from Debian, which is missing",
    modules && "install the locked npm packages",
    (modules || !isBuildCurrent()) && "make the production build",
    usesGivenServer
      ? "use the database server that DATABASE_URL names"
      : `start a database server of its own, for this machine only; its data: ${place}`,
    `serve on http://${host}:${port}`,
  ];
  say(
    `Bookmatch is going to:\n${steps
      .filter(Boolean)
      .map((step) => `  · ${step}`)
      .join("\n")}`,
  );
}

/** Within the clone as seen from there, elsewhere in full. */
function shownPlace(folder) {
  const within = path.relative(root, folder);
  return within.startsWith("..") ? folder : within;
}
