import { en } from "@/lib/messages/en";
import { es } from "@/lib/messages/es";
import { openAlbum } from "@/tests/pictures/album";
import { enrol, findPeopleOut, readyHere, ticketElsewhere } from "@/tests/pictures/desk";
import {
  before,
  bench,
  choosing,
  counting,
  door,
  ending,
  pauses,
  sixTickets,
  throttled,
} from "@/tests/pictures/kiosk-scenes";
import type { Walk } from "@/tests/pictures/kiosk-walk";
import { expect, test } from "@/tests/setup/browser";

/** A tablet's two ways up; 20 mm for a finger, 20 px for the eye at arm's length (DESIGN.md). */
const tablet = {
  sizes: { wide: { width: 1280, height: 800 }, tall: { width: 800, height: 1280 } },
  least: { text: 20, target: 112, floor: 76 },
};

for (const [language, say] of Object.entries({ en, es })) {
  test(`every screen of the kiosk can be read and touched: ${language}`, async ({
    bookmatch,
    signIns,
    withCamera,
  }) => {
    test.setTimeout(1_200_000);
    const context = await withCamera([{ see: "nothing", seconds: 2 }]);
    const page = await context.newPage();
    const album = openAlbum({ ...tablet, room: `kiosk-${language}` });
    const walk: Walk = { page, album, language: language as Walk["language"], say };
    await page.goto("/kiosk");
    await page.locator("#enrol-code").waitFor();
    await album.shot(page, "01-enrol");
    const cell = await enrol(page, bookmatch, "Neck");
    const jobs = readyHere(cell);
    const [starts, under, over, setup, several] = await findPeopleOut(page, signIns, 5);
    if (!starts || !under || !over || !setup || !several) throw new Error("Too few are out.");
    await before(walk, { under, over, setup, several }, jobs.slice(2));
    await door(walk, starts);
    const elsewhere = await ticketElsewhere(bookmatch, "Neck");
    const taken = cell.tickets.find((ticket) =>
      ticket.operations.some(({ here, workers }) => here && workers.length > 0),
    );
    await choosing(walk, starts, { jobs, elsewhere, taken: taken?.ticket ?? null });
    await bench(walk, under, "20-bench-under", "bench");
    await bench(walk, over, "21-bench-over");
    await bench(walk, setup, "22-bench-setup");
    await bench(walk, several, "25-bench-two");
    await sixTickets(walk, several, jobs.slice(0, 6));
    await counting(walk, under);
    await pauses(walk, under);
    await ending(walk, over);
    await throttled(walk);
    expect(album.faults).toEqual([]);
  });
}
