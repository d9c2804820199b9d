import path from "node:path";
import type { Page } from "@playwright/test";
import { root } from "@/scripts/ground/place.mjs";
import { axeFaults } from "@/tests/setup/browser";
import { type Least, screenFaults } from "@/tests/setup/screen-faults";

/** The sizes in which a room's screens are looked at, and what is too small there. */
export interface Format {
  room: string;
  sizes: Record<string, { width: number; height: number }>;
  least: Least;
}

/** Pictures of a room's screens, and what was found wrong while they were taken. */
export interface Album {
  /** Takes the screen in every size, light and dark; `readme` also names a picture of the README. */
  shot(page: Page, name: string, options?: { readme?: string }): Promise<void>;
  faults: string[];
}

const themes = ["light", "dark"] as const;

/** Opens an album; its pictures go to `screenshots/<room>`, which is kept out of the repository. */
export function openAlbum({ room, sizes, least }: Format): Album {
  const faults: string[] = [];
  const looks = Object.entries(sizes).flatMap(([size, px]) =>
    themes.map((theme) => ({ size, px, theme })),
  );
  return {
    faults,
    async shot(page, name, { readme } = {}) {
      const stay = await page.evaluateHandle(stayHere);
      for (const { size, px, theme } of looks) {
        await page.setViewportSize(px);
        await page.emulateMedia({ colorScheme: theme, reducedMotion: "reduce" });
        await page.screenshot({ path: file(`screenshots/${room}/${name}-${size}-${theme}.png`) });
        const isFirst = size === looks[0]?.size && theme === looks[0].theme;
        if (readme && isFirst) await page.screenshot({ path: file(`docs/${readme}.png`) });
        const found = [...(await screenFaults(page, least)), ...(await axeFaults(page))];
        faults.push(...found.map((fault) => `${name}, ${size}, ${theme}: ${fault}`));
      }
      await stay.evaluate((timer) => clearInterval(timer));
    },
  };
}

const file = (name: string) => path.join(root, name);

/** Touches on nothing, in the page: a kiosk's screen stays while somebody stands before it. */
function stayHere() {
  const touch = () => window.dispatchEvent(new PointerEvent("pointerdown"));
  touch();
  return setInterval(touch, 500);
}
