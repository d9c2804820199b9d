import { readFileSync } from "node:fs";
import path from "node:path";
import { gzipSync } from "node:zlib";
import { root } from "@/scripts/ground/place.mjs";

/** What a tablet loads before it paints the door stays below this; kB of 1000 bytes. */
const BUDGET_KB = 200;

/** Tells how heavy the scripts are that the kiosk's page names, compressed as they are sent. */
export function kioskWeight(): string {
  const page = readFileSync(path.join(root, ".next/server/app/kiosk.html"), "utf8");
  const scripts = [...page.matchAll(/<script[^>]*>/g)]
    .map(([tag]) => tag)
    .filter((tag) => !/nomodule/i.test(tag))
    .flatMap((tag) => /src="\/_next\/([^"?]+)/.exec(tag)?.[1] ?? []);
  const bytes = [...new Set(scripts)].map(
    (name) => gzipSync(readFileSync(path.join(root, ".next", name))).length,
  );
  const kilobytes = bytes.reduce((total, each) => total + each, 0) / 1000;
  return `First scripts of /kiosk: ${kilobytes.toFixed(1)} kB compressed (budget ${BUDGET_KB}).\n`;
}
