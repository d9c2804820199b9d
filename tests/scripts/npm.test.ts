import { spawnSync } from "node:child_process";
import { copyFileSync, mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { afterAll, describe, expect, test } from "vitest";
import { root } from "@/scripts/ground/place.mjs";

const folder = mkdtempSync(path.join(tmpdir(), "bookmatch-npm-"));
afterAll(() => rmSync(folder, { recursive: true }));

describe(".npmrc", () => {
  test.each([0, 1])("leaves standard output to a script that ends with %i", (status) => {
    copyFileSync(path.join(root, ".npmrc"), path.join(folder, ".npmrc"));
    const scripts = { say: `node -e "console.log('the answer'); process.exit(${status})"` };
    writeFileSync(path.join(folder, "package.json"), JSON.stringify({ name: "a", scripts }));
    const ended = spawnSync("npm", ["run", "say"], { cwd: folder, encoding: "utf8" });
    expect({ out: ended.stdout, status: ended.status }).toEqual({ out: "the answer\n", status });
  });
});
