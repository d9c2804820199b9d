import "server-only";
import { readdirSync, readFileSync } from "node:fs";
import path from "node:path";
import { inlineDigests } from "@/app/_server/content-policy";

/** Where the build leaves the pages that it has drawn. */
const PAGES = ".next/server/app";

let digests: ReadonlyMap<string, readonly string[]> | undefined;

/**
 * Gives, by path, the digests of the scripts inside each page that the build has drawn ahead: such a
 * page is the same for everybody and cannot carry a nonce. Read once; a build needs a new start.
 */
export function drawnAhead(): ReadonlyMap<string, readonly string[]> {
  digests ??= readDigests();
  return digests;
}

function readDigests() {
  const names = readdirSync(PAGES, { recursive: true, encoding: "utf8" });
  const pages = names.filter((name) => name.endsWith(".html"));
  return new Map(
    pages.map((name) => [
      `/${name.replace(/(^|\/)index\.html$|\.html$/, "")}`,
      inlineDigests(readFileSync(path.join(PAGES, name), "utf8")),
    ]),
  );
}
