import { createHash } from "node:crypto";
import {
  accessSync,
  chmodSync,
  constants,
  existsSync,
  lstatSync,
  mkdirSync,
  realpathSync,
  statSync,
} from "node:fs";
import path from "node:path";
import { fileURLToPath } from "node:url";
import { Stop } from "./say.mjs";

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
 * Where the cluster of a folder lives: inside it, or, where the database's user may not walk there
 * (a clone of root's under /root or another 0700 parent), in a place of its own under `elsewhere`.
 * It stays where it was made. Makes nothing: before PostgreSQL is installed it tells the same.
 *
 * @param {string} folder
 * @param {string} elsewhere
 */
export function clusterPlace(folder, elsewhere) {
  const sum = createHash("sha256").update(folder).digest("hex").slice(0, 12);
  const other = path.join(elsewhere, `bookmatch-${sum}`);
  const isMadeIn = (place) => existsSync(path.join(place, "cluster"));
  const isMadeElsewhere = isRoot && isMadeIn(other);
  if (!isRoot || isMadeIn(folder) || (!isMadeElsewhere && anybodyMayEnter(folder))) return folder;
  return other;
}

/** The same, and the folder is there. */
export function clusterFolder(folder, elsewhere) {
  makeFolder(folder);
  const place = clusterPlace(folder, elsewhere);
  makeFolder(place);
  if (place !== folder && (lstatSync(place).isSymbolicLink() || lstatSync(place).uid !== 0))
    throw new Stop(`${place} belongs to somebody else. Remove it, or set BOOKMATCH_DATA.`);
  return place;
}

/** A folder that is not there yet is made so that others may walk through. */
export function anybodyMayEnter(folder) {
  const isThere = existsSync(folder);
  const isOpen = !isThere || (statSync(folder).mode & 0o001) === 0o001;
  const parent = path.dirname(isThere ? realpathSync(folder) : folder);
  return isOpen && (parent === folder || anybodyMayEnter(parent));
}

/** Refuses a clone or a data folder that another user made: half of it could not be written. */
export function checkFolders() {
  for (const folder of [root, path.join(root, ".data"), dataFolder()])
    if (existsSync(folder) && !mayWrite(folder))
      throw new Stop(
        `${folder} is another user's. Do this as the one who made it, or in a clone of your own.`,
      );
}

function mayWrite(folder) {
  try {
    accessSync(folder, constants.W_OK);
    return true;
  } catch {
    return false; // it says no by throwing
  }
}
