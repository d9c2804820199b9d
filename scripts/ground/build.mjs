import { createHash } from "node:crypto";
import { existsSync, readdirSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import path from "node:path";
import { root } from "./place.mjs";
import { run } from "./run.mjs";
import { Stop, say } from "./say.mjs";
import { actionKey } from "./secrets.mjs";

const stamp = path.join(root, ".next/bookmatch-build");
const folders = ["app", "components", "db", "kiosk", "lib", "public"];
const files =
  /^(package-lock\.json|tsconfig\.json|(next|postcss|tailwind)\.config\.\w+|proxy\.ts|instrumentation\.ts)$/;

/** What a build depends on: every source file, the lock, this Node, the key of the actions. */
function sourceDigest() {
  const walk = (folder) =>
    readdirSync(path.join(root, folder), { withFileTypes: true })
      .flatMap((entry) => {
        const name = path.join(folder, entry.name);
        return entry.isDirectory() ? walk(name) : [name];
      })
      .sort();
  const sources = folders.filter((folder) => existsSync(path.join(root, folder))).flatMap(walk);
  const configs = readdirSync(root).filter((name) => files.test(name));
  const digest = createHash("sha256").update(process.version).update(actionKey());
  for (const name of [...sources, ...configs.sort()])
    digest.update(`\n${name}\n`).update(readFileSync(path.join(root, name)));
  return digest.digest("hex");
}

/** Tells whether the production build is that of the sources as they are. */
export function isBuildCurrent() {
  return existsSync(stamp) && readFileSync(stamp, "utf8") === sourceDigest();
}

/** Makes the production build unless it is current; one that was interrupted is made again. */
export async function build() {
  if (isBuildCurrent()) return;
  say("Building (about a minute) …");
  rmSync(stamp, { force: true });
  const digest = sourceDigest();
  const env = {
    ...process.env,
    NODE_ENV: "production",
    NEXT_TELEMETRY_DISABLED: "1",
    NEXT_SERVER_ACTIONS_ENCRYPTION_KEY: actionKey(),
  };
  const next = path.join(root, "node_modules/next/dist/bin/next");
  const { code } = await run(process.execPath, [next, "build"], {
    cwd: root,
    env,
    show: true,
    mayFail: true,
  });
  if (code !== 0) throw new Stop("The build did not work; its reason stands above.");
  writeFileSync(stamp, digest);
}
