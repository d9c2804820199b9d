import path from "node:path";
import AxeBuilder from "@axe-core/playwright";
import { type BrowserContext, test as base, chromium, expect, type Page } from "@playwright/test";
import { isRoot, root } from "@/scripts/ground/place.mjs";
import { type Shot, writeClip } from "@/tests/setup/camera";
import { type Installation, openInstallation, type SignIns } from "@/tests/setup/installation";

export { expect };

interface Fixtures {
  /** A server on demo data of this file's own; its tests run one after the other on it. */
  bookmatch: Installation;
  signIns: SignIns;
  /** Opens a browser whose camera sees these shots, over and over; it may use the camera. */
  withCamera: (shots: readonly Shot[]) => Promise<BrowserContext>;
  quiet: undefined;
}

let current: { file: string; installation: Installation } | undefined;

/** Playwright's `test` on a running Bookmatch; every page must keep its console clean. */
export const test = base.extend<Fixtures, { closing: undefined }>({
  closing: [
    // biome-ignore lint/correctness/noEmptyPattern: Playwright reads the names from the pattern
    async ({}, use) => {
      await use(undefined);
      await current?.installation.close();
    },
    { scope: "worker", auto: true },
  ],
  // biome-ignore lint/correctness/noEmptyPattern: Playwright reads the names from the pattern
  bookmatch: async ({}, use, { file }) => {
    if (current?.file !== file) {
      await current?.installation.close();
      const name = `browser_${path.basename(file).replace(/\W.*$/, "")}_${process.pid}`;
      current = { file, installation: await openInstallation(name) };
    }
    await use(current.installation);
  },
  baseURL: async ({ bookmatch }, use) => use(bookmatch.url),
  signIns: async ({ bookmatch }, use) => use(await bookmatch.signIns()),
  withCamera: async ({ bookmatch, viewport }, use, info) => {
    const opened: BrowserContext[] = [];
    await use(async (shots) => {
      const clip = info.outputPath(`camera-${opened.length}.y4m`);
      await writeClip(clip, shots);
      const browser = await chromium.launch({
        executablePath: "/usr/bin/chromium",
        args: [
          ...(isRoot ? ["--no-sandbox"] : []),
          "--use-fake-ui-for-media-stream",
          "--use-fake-device-for-media-stream",
          `--use-file-for-fake-video-capture=${clip}`,
        ],
      });
      const context = await browser.newContext({
        baseURL: bookmatch.url,
        viewport,
        permissions: ["camera"],
      });
      watch(context);
      opened.push(context);
      return context;
    });
    for (const context of opened) await context.browser()?.close();
  },
  quiet: [
    async ({ context }, use) => {
      noise.length = 0;
      watch(context);
      await use(undefined);
      expect(noise, "the console of every page stays clean").toEqual([]);
    },
    { auto: true },
  ],
});

const noise: string[] = [];

/** A request that was refused or found no server is the browser's to note, and no fault of a page. */
const EXPECTED = /^Failed to load resource/;

function watch(context: BrowserContext): void {
  context.on("console", (message) => {
    const isNoise = message.type() === "error" || message.type() === "warning";
    if (isNoise && !EXPECTED.test(message.text())) noise.push(message.text());
  });
  context.on("weberror", (error) => noise.push(String(error.error())));
}

/** Expects no fault that axe finds on the page as it is now. */
export async function expectAccessible(page: Page): Promise<void> {
  expect(await axeFaults(page)).toEqual([]);
}

/** What axe finds wrong with the page as it is now (WCAG 2.2 A and AA), in sentences. */
export async function axeFaults(page: Page): Promise<string[]> {
  const tags = ["wcag2a", "wcag2aa", "wcag21a", "wcag21aa", "wcag22aa"];
  const { violations } = await new AxeBuilder({ page }).withTags(tags).analyze();
  return violations.map(({ id, help, nodes }) => {
    const where = nodes.map(({ target }) => target.join(" ")).join(", ");
    return `${id}: ${help}: ${where}`;
  });
}

/** Keeps a picture for the README or a look; only when `BOOKMATCH_PICTURES` is set. */
export async function picture(page: Page, name: string): Promise<void> {
  if (!process.env.BOOKMATCH_PICTURES) return;
  await page.screenshot({ path: path.join(root, "screenshots", `${name}.png`) });
}
