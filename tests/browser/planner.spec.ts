import type { Page } from "@playwright/test";
import { expect, expectAccessible, test } from "@/tests/setup/browser";
import { enterOffice } from "@/tests/setup/office";

/** The date of today's production day as the page says it, and one some days away from it. */
async function dayAway(page: Page, days: number): Promise<string> {
  const today = await page.getByLabel("In force on").inputValue();
  const date = new Date(`${today}T12:00:00Z`);
  date.setUTCDate(date.getUTCDate() + days);
  return date.toISOString().slice(0, 10);
}

/** Drafts a change of the run time and looks at what it would do. */
async function draft(page: Page, change: { run: string; from: string; reason: string }) {
  await page.getByLabel("Run, min a piece").fill(change.run);
  await page.getByLabel("Takes effect").fill(change.from);
  await page.getByLabel("Because").fill(change.reason);
  await page.getByRole("button", { name: "See what it does" }).click();
}

/** What the weeks of the replay earned as it was, oldest first. */
async function wasByWeek(page: Page): Promise<number[]> {
  const cells = page.getByRole("region", { name: "Replay" }).locator("td[data-label='was']");
  await expect(cells).toHaveCount(4);
  return (await cells.allTextContents()).map((text) => Number(text) || 0);
}

const row = (page: Page) =>
  page.getByRole("table", { name: "Standards of Heron" }).getByRole("row", { name: /Carve neck/ });

test("a planner drafts a standard, sees the replay, and sets it for tomorrow: today keeps its own", async ({
  page,
  signIns,
}) => {
  await enterOffice(page, signIns, "planner");
  await page.getByRole("link", { name: "Standards" }).click();
  await page.getByLabel("Model").selectOption("Heron");
  await row(page).getByRole("link").click();
  await expect(page.getByRole("heading", { name: "Carve neck, Heron" })).toBeVisible();
  await expectAccessible(page);
  const old = await page.getByLabel("Run, min a piece").inputValue();
  const run = (Number(old) + 30).toFixed(1);
  const from = await dayAway(page, 1);
  await draft(page, { run, from, reason: "Five-piece neck, time study of the week" });
  await expect(page.getByText("Replay: the last four weeks")).toBeVisible();
  await expect(page.getByText(/efficiency on this operation/)).toBeVisible();
  await expect(page.getByText(/still to begin/)).toBeVisible();
  await expectAccessible(page);
  const before = await wasByWeek(page);
  await page.getByRole("button", { name: /^Set / }).click();
  await expect(page.getByRole("status").filter({ hasText: `${run} min from` })).toBeVisible();
  await expect(row(page)).toContainText(old);
  await expect(row(page)).toContainText("changes");
  await expect(page.getByText("Five-piece neck, time study of the week")).toBeVisible();
  await page.goto(`/standards?model=Heron&op=300&on=${from}`);
  await expect(row(page)).toContainText(run);
  await draft(page, { run: "500", from, reason: "To look at what was earned" });
  expect(await wasByWeek(page)).toEqual(before);
});

test("a standard for a day that is past moves what began since then, and nothing before", async ({
  page,
  signIns,
}) => {
  await enterOffice(page, signIns, "planner");
  await page.goto("/standards?model=Kestrel&op=300");
  const look = { run: "500", from: await dayAway(page, 1), reason: "To look at what was earned" };
  await draft(page, look);
  const before = await wasByWeek(page);
  await page.getByRole("link", { name: "Drop the draft" }).click();
  const old = Number(await page.getByLabel("Run, min a piece").inputValue());
  const past = { run: (old * 2).toFixed(1), from: await dayAway(page, -13), reason: "Two-piece" };
  await draft(page, past);
  await expect(page.getByText(/earned again/)).toBeVisible();
  await page.getByRole("button", { name: /^Set / }).click();
  await expect(page.getByRole("status").filter({ hasText: /^Set: / })).toBeVisible();
  await page.goto("/standards?model=Kestrel&op=300");
  await draft(page, look);
  const after = await wasByWeek(page);
  expect(after.slice(0, 2)).toEqual(before.slice(0, 2));
  expect(after[3]).toBeGreaterThan(before[3]!);
});

test("of two changes for one day the later counts and both stay; what cannot be is said plainly", async ({
  page,
  signIns,
}) => {
  await enterOffice(page, signIns, "planner");
  await page.goto("/standards?model=Wren&op=300");
  const from = await dayAway(page, 2);
  for (const run of ["70", "75"]) {
    await draft(page, { run, from, reason: `Study says ${run}` });
    await page.getByRole("button", { name: /^Set / }).click();
    await expect(page.getByText(`Study says ${run}`)).toBeVisible();
  }
  await expect(page.getByText(/replaced by a later entry/)).toHaveCount(1);
  await page.goto(`/standards?model=Wren&op=300&on=${from}`);
  await expect(
    page.getByRole("table", { name: "Standards of Wren" }).getByRole("row", { name: /Carve neck/ }),
  ).toContainText("75.0");
  for (const [change, words] of [
    [{ run: "0" }, "A standard of 0 earns nothing"],
    [{ run: "-5" }, "give 0 or more"],
    [{ from: "2001-01-01" }, "known here since"],
  ] as const) {
    await draft(page, { run: "80", from, reason: "Study", ...change });
    await expect(page.getByText(words)).toBeVisible();
    await expect(page.getByRole("button", { name: /^Set / })).toHaveCount(0);
  }
});

test("a lead sees standards and sets none", async ({ page, signIns }) => {
  await enterOffice(page, signIns, "lead");
  await page.goto("/standards?model=Heron&op=300");
  await expect(page.getByRole("heading", { name: "Carve neck, Heron" })).toBeVisible();
  await expect(page.getByRole("button", { name: "See what it does" })).toHaveCount(0);
});
