import { randomBytes } from "node:crypto";
import {
  chownSync,
  existsSync,
  mkdirSync,
  readdirSync,
  readFileSync,
  renameSync,
  rmSync,
  statSync,
  writeFileSync,
} from "node:fs";
import path from "node:path";
import { isRoot } from "./place.mjs";
import { freePortFrom, portOf } from "./ports.mjs";
import { pause, run } from "./run.mjs";

const VERSIONS = "/usr/lib/postgresql";
/** The newest version is taken for a new cluster; an old one keeps the version it was made with. */
const newest = (versions) => versions.sort((a, b) => Number(b) - Number(a))[0];

/** Names the folder of PostgreSQL's programs of a version, or of the newest one; null if missing. */
export function findPrograms(version) {
  const versions = existsSync(VERSIONS) ? readdirSync(VERSIONS) : [];
  const usable = versions.filter((name) => existsSync(path.join(VERSIONS, name, "bin/initdb")));
  const chosen = version ? usable.find((name) => name === version) : newest(usable);
  return chosen ? path.join(VERSIONS, chosen, "bin") : null;
}

/**
 * A PostgreSQL cluster of the project's own in `<folder>/cluster`, on loopback only, with scram
 * passwords and in UTC. Root runs it as `postgres`: initdb and pg_ctl refuse root.
 *
 * @param {string} folder already made; `clusterFolder` chooses it
 * @param {{durable: boolean}} how `durable: false` is for throw-away test data only
 */
export function clusterIn(folder, { durable }) {
  const home = path.join(folder, "cluster");
  const secret = path.join(folder, "cluster-password");
  return {
    home,
    /** Makes the cluster if there is none, and starts it if it is down. */
    start: async () => {
      const isNew = !existsSync(path.join(home, "PG_VERSION"));
      if (isNew) await makeCluster({ folder, home, secret, durable });
      const password = readFileSync(secret, "utf8").trim();
      const running = await runningPort(home);
      if (running) return { port: running, password, isNew, wasUp: true };
      return { port: await startServer(folder, home), password, isNew, wasUp: false };
    },
    /** Gives the port of the running cluster, null when it is down. */
    port: () => runningPort(home),
    /** Tells cheaply whether the server's process runs; it may still be starting. */
    looksAlive: () => {
      const pid = pidOf(home);
      return pid !== null && existsSync(`/proc/${pid}`) && !isStranger(home);
    },
    /** Stops it cleanly: open work is rolled back, the data is written out. Down already: nothing. */
    stop: async () => {
      if (!existsSync(path.join(home, "PG_VERSION"))) return;
      await asDatabaseUser(home, "pg_ctl", ["-D", home, "-m", "fast", "-w", "-s", "stop"], true);
    },
  };
}

/** The version of the programs that belong to a cluster's data. */
function programsOf(home) {
  const versionFile = path.join(home, "PG_VERSION");
  const version = existsSync(versionFile) ? readFileSync(versionFile, "utf8").trim() : undefined;
  const programs = findPrograms(version);
  if (programs) return programs;
  throw new Error(
    version
      ? `The data in ${home} needs PostgreSQL ${version}: install postgresql-${version}.`
      : "PostgreSQL is missing: apt-get install -y --no-install-recommends postgresql",
  );
}

/**
 * As root: as the one to whom the data belongs, for new data as `postgres`. `cwd: /` because the
 * database's user may not be allowed into ours.
 */
async function asDatabaseUser(home, program, args, mayFail = false) {
  const file = path.join(programsOf(home), program);
  const env = { PATH: process.env.PATH, LC_ALL: "C.UTF-8", TZ: "UTC" };
  const how = { cwd: "/", env, mayFail };
  if (!isRoot) return run(file, args, how);
  return run("runuser", ["-u", await ownerOf(home), "--", file, ...args], how);
}

async function ownerOf(home) {
  if (!existsSync(home)) return "postgres";
  return (await run("id", ["-nu", String(statSync(home).uid)])).text.trim();
}

/** Made beside its place and renamed when complete, so that a half-made cluster is never started. */
async function makeCluster({ folder, home, secret, durable }) {
  const making = path.join(folder, "cluster-making");
  rmSync(making, { recursive: true, force: true });
  rmSync(home, { recursive: true, force: true });
  mkdirSync(making, { mode: 0o700 });
  const password = randomBytes(24).toString("base64url");
  writeFileSync(secret, `${password}\n`, { mode: 0o600 });
  const passwordFile = path.join(making, "password");
  writeFileSync(passwordFile, `${password}\n`, { mode: 0o600 });
  if (isRoot) await giveToDatabaseUser([making, passwordFile]);
  const made = path.join(making, "cluster");
  const access = ["-U", "postgres", `--pwfile=${passwordFile}`, "-A", "scram-sha-256"];
  const text = ["-E", "UTF8", "--locale=C.UTF-8"];
  await asDatabaseUser(made, "initdb", ["-D", made, ...access, ...text]);
  writeFileSync(path.join(made, "postgresql.conf"), settings(durable), { flag: "a" });
  renameSync(made, home);
  rmSync(making, { recursive: true, force: true });
}

async function giveToDatabaseUser(paths) {
  const id = async (flag) => Number((await run("id", [flag, "postgres"])).text);
  const [user, group] = [await id("-u"), await id("-g")];
  for (const each of paths) chownSync(each, user, group);
}

function settings(durable) {
  const lines = [
    "listen_addresses = '127.0.0.1'",
    "unix_socket_directories = ''",
    "timezone = 'UTC'",
    "log_timezone = 'UTC'",
    "max_connections = 100",
    "shared_buffers = 256MB",
    "logging_collector = on",
    "log_filename = 'postgres-%a.log'", // a week of logs, then each day's file is begun again
    "log_truncate_on_rotation = on",
  ];
  const throwAway = ["fsync = off", "synchronous_commit = off", "full_page_writes = off"];
  return `\n${[...lines, ...(durable ? [] : throwAway)].join("\n")}\n`;
}

/** After a `kill -9` the first tries can meet the dying server: shared memory, children, its port. */
async function startServer(folder, home) {
  const portFile = path.join(folder, "cluster-port");
  const wished = existsSync(portFile) ? Number(readFileSync(portFile, "utf8")) : portOf(folder);
  let problem = "";
  for (let attempt = 0; attempt < 10; attempt += 1) {
    forgetStranger(home);
    const port = await freePortFrom(wished);
    const log = path.join(home, "start.log");
    const args = ["-D", home, "-w", "-t", "120", "-s", "-l", log, "-o", `-p ${port}`, "start"];
    const started = await asDatabaseUser(home, "pg_ctl", args, true);
    const running = await runningPort(home);
    if (running) {
      writeFileSync(portFile, `${running}\n`);
      return running;
    }
    problem = `${started.text}\n${existsSync(log) ? readFileSync(log, "utf8").slice(-2000) : ""}`;
    await pause(500);
  }
  throw new Error(`PostgreSQL did not start in ${home}.\n${problem.trim()}`);
}

/** Asks both: `pg_ctl status` can still say up for a moment after the server was killed. */
async function runningPort(home) {
  const pidFile = path.join(home, "postmaster.pid");
  if (!existsSync(pidFile) || isStranger(home)) return null;
  const port = Number(readFileSync(pidFile, "utf8").split("\n")[3]);
  if (!port) return null;
  const status = await asDatabaseUser(home, "pg_ctl", ["-D", home, "status"], true);
  if (status.code !== 0) return null;
  const asked = ["-q", "-h", "127.0.0.1", "-p", String(port)];
  return (await asDatabaseUser(home, "pg_isready", asked, true)).code === 0 ? port : null;
}

/** A file left by a machine that went down may name a number that another process has now. */
function forgetStranger(home) {
  if (isStranger(home)) rmSync(path.join(home, "postmaster.pid"), { force: true });
}

function pidOf(home) {
  const pidFile = path.join(home, "postmaster.pid");
  return existsSync(pidFile) ? Number.parseInt(readFileSync(pidFile, "utf8"), 10) : null;
}

function isStranger(home) {
  const pid = pidOf(home);
  if (pid === null || !existsSync(`/proc/${pid}`)) return false;
  try {
    const [at, own] = [statSync(`/proc/${pid}/cwd`), statSync(home)];
    return at.ino !== own.ino || at.dev !== own.dev;
  } catch (error) {
    // another user's process, which we may not look at, is a stranger; one just gone is none
    return error.code === "EACCES" && statSync(`/proc/${pid}`).uid !== statSync(home).uid;
  }
}
