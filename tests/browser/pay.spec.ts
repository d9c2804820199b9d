import { createHash } from "node:crypto";
import type { APIRequestContext, Page } from "@playwright/test";
import { parse } from "csv-parse/sync";
import pg from "pg";
import { v7 as uuid } from "uuid";
import { TIME_ZONE } from "@/lib/demo/calendar";
import { office } from "@/lib/demo/office";
import { addDays } from "@/lib/time/site-day";
import { boundaryMs } from "@/lib/time/wall-time";
import { type TappedDay, tappedEvents, tapsOf } from "@/tests/make/taps";
import { expect, expectAccessible, picture, test } from "@/tests/setup/browser";
import type { Installation } from "@/tests/setup/installation";
import { signInAs } from "@/tests/setup/office";

/** Someone new, in the cell of the first lead: every tap of theirs is this test's own. */
const NEW = { number: "9001", name: "Perpetua Quill" };
const lead = office.find(({ cells }) => cells.length > 0)!;
const payroll = office.find(({ roles }) => roles.includes("payroll"))!;

const SIX = 6 * 60;
/** Minutes in and out on the ten working days; on the fifth the end was forgotten. */
const days = [510, 540, 600, 630, null, 510, 510, 615, 510, 480];

test.describe.configure({ mode: "serial" });

/** Adds the worker with the PIN of somebody whose PIN is known. */
async function addWorker({ ownerUrl }: Installation, cell: string, like: string): Promise<void> {
  const client = new pg.Client({ connectionString: ownerUrl });
  await client.connect();
  await client.query(
    `insert into workers (site_id, id, number, name, home_cell_id, pin_hash, pin_set_at)
     select w.site_id, $1, $2, $3, c.id, w.pin_hash, now()
     from workers w join cells c on c.site_id = w.site_id and c.name = $4
     where w.number = $5`,
    [uuid(), NEW.number, NEW.name, cell, like],
  );
  await client.end();
}

/** Hands the taps of a fortnight in, as a tablet that was away for so long. */
async function handIn(
  request: APIRequestContext,
  url: string,
  code: string,
  pin: string,
  tapped: TappedDay[],
) {
  const enrolled = await request.post(`${url}/api/kiosk/enrol`, { data: { code } });
  expect(enrolled.status()).toBe(200);
  const session = uuid();
  const who = { session, worker: NEW.number };
  const signedIn = await request.post(`${url}/api/kiosk/sign-in`, { data: { ...who, pin } });
  expect(signedIn.status()).toBe(200);
  const { token } = (await signedIn.json()) as { token: string };
  const events = tappedEvents(tapped.flatMap(tapsOf), who);
  const answer = await request.post(`${url}/api/kiosk/events`, {
    data: { events, deviceTime: new Date().toISOString() },
    headers: { authorization: `Bearer ${token}` },
  });
  const { results } = (await answer.json()) as { results: { verdict: string }[] };
  expect(new Set(results.map(({ verdict }) => verdict))).toEqual(new Set(["booked"]));
}

async function enter(page: Page, account: { email: string; password: string }): Promise<void> {
  await page.context().clearCookies();
  await signInAs(page, account);
  await page.waitForURL((url) => url.pathname !== "/sign-in");
}

/** Paid minutes of each day, once the forgotten end is known. */
let paidMinutes: number[] = [];
let period = { id: "", from: "", to: "" };
let key = "";

test("ten days of taps, one without an end, are handed in; the lead settles it and agrees", async ({
  page,
  bookmatch,
  signIns,
  playwright,
}) => {
  key = await bookmatch.command("key.ts", "--role", "payroll");
  const periods = await page.request.get("/api/v1/periods", {
    headers: { authorization: `Bearer ${key}` },
  });
  // two are open: the one that runs, and the one that waits to be closed
  period = ((await periods.json()) as { items: (typeof period)[] }).items[1]!;
  const like = signIns.workers[0]!;
  await addWorker(bookmatch, lead.cells[0]!, like.worker);
  const [code] = (await bookmatch.command("enrol.ts", "--cell", lead.cells[0]!)).split("\n");
  const tapped = days.map((length, at) => {
    // Monday to Friday of both weeks: the period begins on a Sunday
    const date = addDays(period.from, 1 + at + (at > 4 ? 2 : 0));
    const startMs = boundaryMs(`${date}T00:00`, TIME_ZONE);
    const meal = [SIX + 240, SIX + 270] as const;
    return { startMs, start: SIX, meal, end: length === null ? null : SIX + length };
  });
  const tablet = await playwright.request.newContext();
  await handIn(tablet, bookmatch.url, code!, like.pin, tapped);
  await tablet.dispose();

  await enter(page, lead);
  await page.goto("/ends");
  const row = page.getByRole("row", { name: new RegExp(`${NEW.name}.*no end tapped`) });
  await expect(row).toBeVisible();
  const settle = row.getByRole("link", { name: /^Settle/ });
  if (await settle.count()) await settle.click();
  const endAt = page.getByRole("button", { name: /^End at \d\d:\d\d/ }).first();
  const [, hour, minute] = /(\d\d):(\d\d)/.exec((await endAt.textContent())!)!;
  await endAt.click();
  await page.getByLabel("Reason").fill("asked at the bench");
  await endAt.click();
  await expect(row).toHaveCount(0);
  const told = Number(hour) * 60 + Number(minute) - SIX;
  // up to the last tap, which was the way back from the meal
  expect(told).toBe(270);
  paidMinutes = days.map((length) => (length ?? told) - 30);

  await page.goto(`/hours/agreement?period=${period.id}`);
  const card = page.getByLabel(`Agree to the card of ${NEW.name}`);
  await expect(card).toBeChecked();
  await page.getByRole("button", { name: "Agree to the ticked cards" }).click();
  await expect(card).toHaveCount(0);
});

test("payroll reads why, closes the period by name where something is open, and saves the file", async ({
  page,
}) => {
  await enter(page, payroll);
  await page.goto(`/hours/cards?period=${period.id}`);
  await expectAccessible(page);
  await page.getByRole("link", { name: `Card of ${NEW.name}` }).click();
  await expect(page).toHaveURL(/worker=9001/);
  await expect(page.getByText("A meal of 30 min is unpaid.").first()).toBeVisible();
  await expect(page.getByText(/over 40 h of the workweek/).first()).toBeVisible();
  await expectAccessible(page);
  await picture(page, "cards");
  await page.emulateMedia({ colorScheme: "dark" });
  await expectAccessible(page);
  await page.emulateMedia({ colorScheme: "light" });

  const close = page.getByRole("button", { name: "Close the period" });
  const names = page.getByRole("group", { name: /^Close by name/ }).getByRole("checkbox");
  if ((await names.count()) > 0) {
    await close.click();
    await expect(
      page.getByRole("status").filter({ hasText: "Look at what is marked." }),
    ).toBeVisible();
    // one by one they are too many for a test; the first shows that a person can
    await names.first().check();
    await names.evaluateAll((boxes) => {
      for (const box of boxes.slice(1)) if (box instanceof HTMLElement) box.click();
    });
    await page.getByLabel("Why it is closed all the same").fill("the bank closes at noon");
  }
  await close.click();
  await expect(page.getByRole("link", { name: "Save as CSV" })).toBeVisible();
  await expect(page.getByText(`closed by ${payroll.name}`)).toBeVisible();
  await expectAccessible(page);
  await picture(page, "closed");
});

test("the file's hours are those of the taps, its bytes are the same for ever", async ({
  page,
}) => {
  await enter(page, payroll);
  const headers = { authorization: `Bearer ${key}` };
  const address = `/api/v1/periods/${period.id}/export?format=csv`;
  const [first, second] = [
    await page.request.get(address, { headers }),
    await page.request.get(`/hours/cards/file?period=${period.id}&format=csv`),
  ];
  const bytes = await first.body();
  expect(bytes.equals(await second.body())).toBe(true);
  const digest = createHash("sha256").update(bytes).digest("base64");
  expect(first.headers().digest).toBe(`sha-256=${digest}`);

  const rows = parse(bytes, { columns: true, bom: true }) as Record<string, string>[];
  const own = rows.filter(({ worker }) => worker === NEW.number);
  const hours = (name: string) => own.map((row) => Number(row[name]));
  expect(hours("paid_hours")).toEqual(paidMinutes.map((minutes) => minutes / 60));
  const weeks = [paidMinutes.slice(0, 5), paidMinutes.slice(5)].map((week) =>
    week.reduce((sum, minutes) => sum + minutes, 0),
  );
  const overtime = weeks.reduce((sum, minutes) => sum + Math.max(0, minutes - 2400), 0);
  const total = (name: string) => hours(name).reduce((sum, each) => sum + each, 0);
  expect(total("overtime_hours")).toBeCloseTo(overtime / 60, 6);
  expect(total("regular_hours")).toBeCloseTo((weeks[0]! + weeks[1]! - overtime) / 60, 6);

  const json = await page.request.get(address.replace("csv", "json"), { headers });
  const { totals } = (await json.json()) as {
    totals: { hours: { paid: string }; headcount: number };
  };
  const inAll = rows.reduce((sum, row) => sum + Math.round(Number(row.paid_hours) * 100), 0);
  expect(Math.round(Number(totals.hours.paid) * 100)).toBe(inAll);
  expect(totals.headcount).toBe(new Set(rows.map(({ worker }) => worker)).size);
});

test("a correction after the close leaves the file as it is, and waits for the open period", async ({
  page,
}) => {
  await enter(page, lead);
  const monday = addDays(period.from, 8);
  await page.goto(`/hours?worker=${NEW.number}&from=${monday}&to=${monday}&day=${monday}`);
  await page.getByRole("button", { name: /^Correct: shift started/ }).click();
  const dialog = page.getByRole("dialog");
  await dialog.getByLabel("It was at").fill(`${monday}T05:30`);
  await dialog.getByLabel("Reason").fill("was in earlier");
  await dialog.getByRole("button", { name: "Move it there" }).click();
  await expect(dialog).toBeHidden();

  await enter(page, payroll);
  await page.goto(`/hours/cards?period=${period.id}`);
  await expect(page.getByText(/corrected since: paid with the open period/)).toBeVisible();
  await expect(page.getByText("differs").first()).toBeVisible();
  await page.goto("/hours/cards");
  await expect(page.getByText(/with \d+ corrections? of closed days/)).toBeVisible();
});

test("nobody else closes, saves files or sets policies", async ({ page }) => {
  await enter(page, lead);
  await page.goto(`/hours/cards?period=${period.id}`);
  await expect(page.getByRole("button", { name: "Close the period" })).toHaveCount(0);
  const file = await page.request.get(`/hours/cards/file?period=${period.id}&format=csv`);
  expect(file.status()).toBe(403);
  expect((await page.goto("/hours/policies"))!.status()).toBe(403);
});
