import type { Page } from "@playwright/test";
import { badgeCode } from "@/lib/codes/badge-code";
import type { Messages } from "@/lib/messages/schema";
import type { Album } from "@/tests/pictures/album";
import type { Person } from "@/tests/pictures/desk";

/** A kiosk before a person who goes through it in one language. */
export interface Walk {
  page: Page;
  album: Album;
  language: "en" | "es";
  say: Messages;
}

/** The first button whose words begin so; a message's arguments match anything. */
export function button({ page }: Pick<Walk, "page">, message: string) {
  const name = message.replace(/[.?()]/g, "\\$&").replace(/\{[^}]*\}/g, ".*");
  return page.getByRole("button", { name: new RegExp(`^${name}`) }).first();
}

/** Touches the buttons of these words, one after the other. */
export async function press(walk: Walk, ...messages: string[]): Promise<void> {
  for (const message of messages) await button(walk, message).click();
}

export async function key({ page }: Pick<Walk, "page">, digits: string): Promise<void> {
  for (const digit of digits) await page.getByRole("button", { name: digit, exact: true }).click();
}

/** Reads a code as a scanner does, which is a keyboard that types fast and ends in Enter. */
export async function scan({ page }: Pick<Walk, "page">, text: string): Promise<void> {
  await page.evaluate((code) => {
    for (const each of [...code, "Enter"])
      document.body.dispatchEvent(new KeyboardEvent("keydown", { key: each, bubbles: true }));
  }, text);
}

/** From wherever the kiosk is to a person's own bench, in the language of the walk. */
export async function enter(walk: Walk, { worker, pin }: Person): Promise<void> {
  await toDoor(walk);
  await walk.page.locator(`button[lang=${walk.language}]`).click();
  await scan(walk, badgeCode(worker));
  const asksPin = walk.page.getByRole("button", { name: "7", exact: true });
  await asksPin.waitFor({ timeout: 2000 }).catch(() => undefined);
  if (await asksPin.isVisible()) await key(walk, pin);
  await walk.page.locator("header").waitFor();
}

/** The page as it comes up again: at the door. */
export async function toDoor({ page }: Walk): Promise<void> {
  await page.goto("/kiosk");
  await page.getByRole("button", { name: "7", exact: true }).waitFor();
}
