import { createHash } from "node:crypto";
import { readdirSync, readFileSync, writeFileSync } from "node:fs";
import path from "node:path";
import { root } from "./place.mjs";

const INLINE = /<script(?![^>]*\ssrc=)[^>]*>([\s\S]*?)<\/script>/g;

/**
 * Lists, after a build, the digests of the scripts inside every page that was drawn ahead: such a
 * page is the same for everyone and cannot carry a nonce, so `proxy.ts` allows exactly these.
 */
export function collectInlineScripts() {
  const app = path.join(root, ".next/server/app");
  const pages = readdirSync(app, { recursive: true }).filter((name) => name.endsWith(".html"));
  const hashes = Object.fromEntries(
    pages.sort().map((name) => {
      const html = readFileSync(path.join(app, name), "utf8");
      const route = `/${name.replace(/(^|\/)index\.html$|\.html$/, "")}`;
      return [route, digestsOf(html)];
    }),
  );
  writeFileSync(path.join(root, ".next/inline-scripts.json"), JSON.stringify(hashes, null, 2));
}

function digestsOf(html) {
  const digests = [...html.matchAll(INLINE)].map(
    ([, text]) => `sha256-${createHash("sha256").update(text).digest("base64")}`,
  );
  return [...new Set(digests)];
}
