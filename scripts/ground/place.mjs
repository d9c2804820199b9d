import { createHash } from "node:crypto";
import { chmodSync, existsSync, lstatSync, mkdirSync } from "node:fs";
import path from "node:path";
import { fileURLToPath } from "node:url";
import { run } from "./run.mjs";

/** The folder of the clone. */
export const root = path.resolve(fileURLToPath(new URL("../..", import.meta.url)));

/** True for root, who may run everything but a database server. */
export const isRoot = process.getuid?.() === 0;

/** Where an installation keeps what must outlive it: `BOOKMATCH_DATA`, or `.data` in the clone. */
export function dataFolder() {
  return path.resolve(root, process.env.BOOKMATCH_DATA || ".data");
}

/** Makes a folder that others may walk through but not list. */
export function makeFolder(folder) {
  if (!existsSync(folder)) mkdirSync(folder, { recursive: true });
  if (lstatSync(folder).isSymbolicLink()) return folder;
  chmodSync(folder, 0o711);
  return folder;
}

/**
 * Where the cluster of a folder lives: inside it, or, where root's unprivileged helper may not walk
 * there (a clone under /root or another 0700 parent), in a place of its own under `elsewhere`.
 *
 * @param {string} folder
 * @param {string} elsewhere
 */
export async function clusterFolder(folder, elsewhere) {
  makeFolder(folder);
  const sum = createHash("sha256").update(folder).digest("hex").slice(0, 12);
  const other = path.join(elsewhere, `bookmatch-${sum}`);
  const isMadeThere = existsSync(path.join(other, "cluster")); // it stays where it was made
  if (!isRoot || (!isMadeThere && (await databaseUserMayEnter(folder)))) return folder;
  makeFolder(other);
  if (lstatSync(other).isSymbolicLink() || lstatSync(other).uid !== 0)
    throw new Error(`${other} belongs to somebody else. Remove it, or set BOOKMATCH_DATA.`);
  return other;
}

async function databaseUserMayEnter(folder) {
  const asPostgres = ["-u", "postgres", "--", "test", "-x", folder];
  return (await run("runuser", asPostgres, { cwd: "/", mayFail: true })).code === 0;
}
