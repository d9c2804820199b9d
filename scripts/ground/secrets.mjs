import { randomBytes } from "node:crypto";
import { existsSync, readFileSync, renameSync, writeFileSync } from "node:fs";
import path from "node:path";
import { makeFolder, root } from "./place.mjs";

/** What an installation needs. */
const ofInstallation = {
  /** Seals the office's cookies. */
  session: () => randomBytes(32).toString("base64url"),
  /** Of the login that owns the database, and of the one that the app uses. */
  owner: () => randomBytes(24).toString("base64url"),
  app: () => randomBytes(24).toString("base64url"),
  /** Ends the name of the app's login, so that two installations on one server have their own. */
  suffix: () => randomBytes(4).toString("hex"),
};

/** What a clone's builds need. */
const ofBuild = {
  /** Next seals with it what a form's action carries; fixed, so that open pages outlive a build. */
  action: () => randomBytes(32).toString("base64"),
};

/**
 * The secrets of an installation, made once and kept in its data folder.
 *
 * @param {string} folder
 * @returns {Record<keyof typeof ofInstallation, string>}
 */
export function secretsIn(folder) {
  return keptSecrets(path.join(folder, "secrets.json"), ofInstallation);
}

/** The key of the clone's builds: in the clone, wherever its installations keep their data. */
export function actionKey() {
  return keptSecrets(path.join(root, ".data/build-secrets.json"), ofBuild).action;
}

/** Readable by their owner alone. A missing one is added: a later version can ask for more. */
function keptSecrets(file, make) {
  makeFolder(path.dirname(file));
  const kept = existsSync(file) ? JSON.parse(readFileSync(file, "utf8")) : {};
  const missing = Object.keys(make).filter((name) => !kept[name]);
  if (missing.length === 0) return kept;
  for (const name of missing) kept[name] = make[name]();
  // written beside and renamed: a machine that stops here leaves the old file or the new one
  writeFileSync(`${file}.new`, `${JSON.stringify(kept, null, 2)}\n`, { mode: 0o600 });
  renameSync(`${file}.new`, file);
  return kept;
}
