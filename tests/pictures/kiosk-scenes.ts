import { did, type Person } from "@/tests/pictures/desk";
import { button, enter, key, press, scan, toDoor, type Walk } from "@/tests/pictures/kiosk-walk";

/** A ticket's operation with its standards, as an event names it. */
export interface Job {
  ticket: string;
  operation: string;
}

/** The door and the PIN: at rest, half keyed, and refused. */
export async function door(walk: Walk, { worker, pin }: Person): Promise<void> {
  const { page, album, say, language } = walk;
  await toDoor(walk);
  await page.locator(`button[lang=${language}]`).click();
  await album.shot(page, "02-door", { readme: "door" });
  await key(walk, worker);
  await album.shot(page, "03-door-keyed");
  await press(walk, say.door.next);
  await key(walk, "12");
  await album.shot(page, "04-pin");
  await key(walk, pin.startsWith("1299") ? "8888" : "9999");
  await page.getByText(say.pin.wrong).waitFor();
  await album.shot(page, "05-pin-wrong");
  await key(walk, pin);
  await button(walk, say.shift.start).waitFor();
  await album.shot(page, "06-start-shift");
  await press(walk, say.shift.start);
  await page.getByText(say.done["shift-start"]).waitFor();
  await album.shot(page, "07-done-start");
  await toDoor(walk);
}

/** A ticket is looked for: shown, misread, missing, picked, offered, refused, begun. */
export async function choosing(
  walk: Walk,
  who: Person,
  { jobs, elsewhere, taken }: { jobs: readonly Job[]; elsewhere: string; taken: string | null },
): Promise<void> {
  const { page, album, say } = walk;
  const number = jobs[0]?.ticket ?? "";
  await enter(walk, who);
  await album.shot(page, "08-bench-idle");
  await press(walk, say.bench.scan);
  await page.waitForTimeout(700);
  await album.shot(page, "09-scan");
  await key(walk, number.slice(0, -1) + String((Number(number.at(-1)) + 1) % 10));
  await press(walk, say.scan.find);
  await page.getByText(say.scan.check).waitFor();
  await album.shot(page, "10-scan-misread");
  await scan(walk, "T9999999");
  await page.getByText(say.scan.form).waitFor();
  await album.shot(page, "11-scan-form");
  await enter(walk, who);
  await press(walk, say.bench.scan, say.scan.noTicket);
  await album.shot(page, "12-cell-tickets");
  await scan(walk, `T${elsewhere}`);
  await button(walk, say.refused.another).waitFor();
  await album.shot(page, "13-refused-elsewhere");
  if (taken) {
    await scan(walk, `T${taken}`);
    await page.waitForTimeout(800);
    await album.shot(page, "14-taken");
  }
  await scan(walk, `T${number}`);
  await button(walk, say.pick.run).waitFor();
  await album.shot(page, "15-offer");
  await press(walk, say.pick.run);
  const card = button(walk, say.caution.start);
  await card.or(button(walk, say.done.bench)).waitFor();
  if (await card.isVisible()) {
    await album.shot(page, "16-caution");
    await card.click();
  }
  await button(walk, say.done.bench).waitFor();
  await album.shot(page, "17-done-work");
  await enter(walk, who);
  await scan(walk, `T${number}`);
  await press(walk, say.pick.run);
  await album.shot(page, "18-refused-on-bench");
}

/** A bench as it stands after some acts, under its own name. */
export async function bench(walk: Walk, who: Person, name: string, readme?: string): Promise<void> {
  await enter(walk, who);
  await walk.album.shot(walk.page, name, readme ? { readme } : {});
}

/** The pieces are counted: as they are, with one for rework, with one for scrap. */
export async function counting(walk: Walk, who: Person): Promise<void> {
  const { page, album, say } = walk;
  await enter(walk, who);
  await press(walk, say.bench.done);
  await album.shot(page, "30-count");
  await button(walk, say.count.key.replace(/\{what\}/, say.count.good)).click();
  await album.shot(page, "31-count-keyed");
  await key(walk, "1");
  await press(walk, say.count.set);
  await press(walk, say.count.more.replace(/\{what\}/, say.count.rework));
  await press(walk, say.count.more.replace(/\{what\}/, say.count.scrap));
  await album.shot(page, "32-count-bad");
  await page.getByRole("main").getByRole("button").last().click();
  await album.shot(page, "33-cause");
  await page.getByRole("button", { name: new RegExp(`${say.cause.here}$`) }).click();
  await album.shot(page, "34-scrap");
  await press(walk, say.scrap.yes);
  await button(walk, say.done.bench).waitFor();
  await album.shot(page, "35-done-counted");
}

/** Breaks, other work, a person's own hours and what can be put right there. */
export async function pauses(walk: Walk, who: Person): Promise<void> {
  const { page, album, say } = walk;
  await enter(walk, who);
  await press(walk, say.bench.otherWork);
  await album.shot(page, "40-other-work");
  await press(walk, say.other.cleaning);
  await album.shot(page, "41-done-other-work");
  await enter(walk, who);
  await album.shot(page, "42-bench-other-work");
  await press(walk, say.bench.break);
  await album.shot(page, "43-break");
  await press(walk, say.breaks.rest);
  await button(walk, say.done.bench).waitFor();
  await enter(walk, who);
  await album.shot(page, "44-bench-break");
  await press(walk, say.bench.hours);
  await page.getByText(say.hours.title).waitFor();
  await album.shot(page, "45-hours");
  const wrongCount = button(walk, say.hours.wrongCount);
  if (await wrongCount.isEnabled()) {
    await wrongCount.click();
    await album.shot(page, "46-which-count");
  }
}

/** The shift ends, also with work open. */
export async function ending(walk: Walk, who: Person): Promise<void> {
  const { page, album, say } = walk;
  await enter(walk, who);
  await press(walk, say.bench.endShift);
  await album.shot(page, "50-end-open-work");
  await press(walk, say.end.end);
  await album.shot(page, "51-pin-end");
  await key(walk, who.pin);
  await page.getByText(say.done["shift-end"]).waitFor();
  await album.shot(page, "52-done-end");
  await toDoor(walk);
  await album.shot(page, "53-door-undo");
}

/** The PIN keyed wrong until it must wait. */
export async function throttled(walk: Walk): Promise<void> {
  const { page, album, say } = walk;
  await toDoor(walk);
  await page.locator(`button[lang=${walk.language}]`).click();
  await key(walk, "9998");
  await press(walk, say.door.next);
  const pad = page.getByRole("button", { name: "7", exact: true });
  for (let tries = 0; tries < 12; tries += 1) {
    await pad.waitFor();
    await key(walk, "135790");
    await page.getByRole("heading", { level: 1 }).filter({ hasText: /./ }).waitFor();
    await page.waitForTimeout(300);
    if (/\d/.test((await page.getByRole("heading", { level: 1 }).textContent()) ?? "")) break;
  }
  await album.shot(page, "54-pin-throttled");
}

/** What several people did before the pictures are taken. */
export async function before(
  walk: Walk,
  people: Record<"under" | "over" | "setup" | "several", Person>,
  jobs: readonly (Job & { standardMinutes: number; hasSetup: boolean })[],
): Promise<void> {
  const { page } = walk;
  const item = ({ ticket, operation }: Job) => ({ ticket, operation });
  const byLength = jobs.toSorted((a, b) => a.standardMinutes - b.standardMinutes);
  const short = byLength[0];
  const long = byLength.at(-1);
  const toSetUp = jobs.find((job) => job.hasSetup && job !== short && job !== long) ?? short;
  if (!short || !long || !toSetUp) throw new Error("Too few tickets wait in the cell.");
  const start = { kind: "shift-start" } as const;
  const rest = { kind: "break-start", break: "rest" } as const;
  const back = { kind: "break-end", break: "rest" } as const;
  const past = Math.round(short.standardMinutes * 1.3);
  const within = Math.min(150, Math.round(long.standardMinutes * 0.6));
  await did(page, people.under, [
    [within + 60, start],
    [within + 55, { kind: "indirect", code: "meeting" }],
    [within, { kind: "work", activity: "run", items: [item(long)] }],
    [within * 0.6, rest],
    [within * 0.6 - 9, back],
  ]);
  await did(page, people.over, [
    [past + 30, start],
    [past, { kind: "work", activity: "run", items: [item(short)] }],
  ]);
  await did(page, people.setup, [
    [60, start],
    [12, { kind: "work", activity: "setup", items: [item(toSetUp)] }],
  ]);
  const others = jobs.filter((job) => ![short, long, toSetUp].includes(job)).slice(0, 6);
  await did(page, people.several, [
    [80, start],
    [50, { kind: "work", activity: "run", items: others.slice(0, 2).map(item) }],
  ]);
}

/** Four more tickets join the two on a bench. */
export async function sixTickets(walk: Walk, who: Person, jobs: readonly Job[]): Promise<void> {
  const items = jobs.map(({ ticket, operation }) => ({ ticket, operation }));
  await did(walk.page, who, [[4, { kind: "work", activity: "run", items }]]);
  await bench(walk, who, "26-bench-six");
  await press(walk, walk.say.bench.done);
  await walk.album.shot(walk.page, "27-which-done");
}
