import type { Page } from "@playwright/test";
import { cast } from "@/lib/demo/cast";
import { office } from "@/lib/demo/office";
import { expect, expectAccessible, picture, test } from "@/tests/setup/browser";
import { signInAs } from "@/tests/setup/office";

/** The worker of the demo who has an account, and the lead of the same cell. */
const member = office.find(({ roles }) => roles.includes("worker"))!;
const worker = cast.find(({ number }) => number === member.worker)!;
const leader = office.find(({ cells }) => cells.includes(worker.cell))!;

const phone = { width: 390, height: 844 };

async function enter(page: Page, account: { email: string; password: string }): Promise<void> {
  await page.context().clearCookies();
  await signInAs(page, account);
  await page.waitForURL((url) => url.pathname !== "/sign-in");
}

/** Opens the last day of the worker's that is well over, down to its taps; answers its address. */
async function openPastDay(page: Page): Promise<string> {
  const day = (ago: number) => new Date(Date.now() - ago * 86_400_000).toISOString().slice(0, 10);
  await page.goto(`/hours?worker=${worker.number}&from=${day(12)}&to=${day(3)}`);
  await page
    .getByRole("link", { name: /^Taps of/ })
    .last()
    .click();
  await expect(page).toHaveURL(/day=/);
  return page.url();
}

/** Answers the dialog about one record. */
async function correct(
  page: Page,
  record: RegExp,
  { time, reason, act }: { time?: string; reason: string; act: string },
): Promise<void> {
  await page.getByRole("button", { name: record }).last().click();
  const dialog = page.getByRole("dialog");
  if (time) await dialog.getByLabel("It was at").fill(time);
  await dialog.getByLabel("Reason").fill(reason);
  await dialog.getByRole("button", { name: act }).click();
  await expect(dialog).toBeHidden();
}

test("a lead puts a day right: takes a record out, settles the end, moves the start", async ({
  page,
}) => {
  await enter(page, leader);
  const address = await openPastDay(page);
  await correct(page, /^Correct: shift ended/, {
    reason: "tapped for somebody else",
    act: "Take it out",
  });
  await expect(page.getByText("taken out")).toBeVisible();

  await page.goto("/ends");
  await expectAccessible(page);
  const row = page.getByRole("row", { name: new RegExp(`${worker.name}.*no end tapped`) });
  await expect(row).toBeVisible();
  const settle = row.getByRole("link", { name: /^Settle/ });
  if (await settle.count()) await settle.click();
  await expect(page.getByText(/The last tap was at \d\d:\d\d/)).toBeVisible();
  await picture(page, "ends");
  await page
    .getByRole("button", { name: /^End at \d\d:\d\d/ })
    .last()
    .click();
  await expect(page.getByLabel("Reason")).toBeFocused(); // nothing without a reason
  await page.getByLabel("Reason").fill("asked at the bench");
  await page
    .getByRole("button", { name: /^End at \d\d:\d\d/ })
    .last()
    .click();
  await expect(row).toHaveCount(0);

  await page.goto(address);
  const day = new URL(address).searchParams.get("day")!;
  await correct(page, /^Correct: shift started/, {
    time: `${day}T05:40`,
    reason: "was in earlier",
    act: "Move it there",
  });
  await expect(page.getByText("moved to 05:40:00")).toBeVisible();
  await expectAccessible(page);
});

test("the worker reads on the phone who changed what, and why, and says what is wrong", async ({
  page,
}) => {
  await page.setViewportSize(phone);
  await enter(page, member);
  await expect(page).toHaveURL(/\/me$/);
  const changes = page.getByRole("region", { name: "Changes by others" });
  await expect(changes).toContainText("Moved shift started");
  await expect(changes).toContainText("was in earlier");
  await expect(changes).toContainText("Settled no end tapped");
  await expect(changes).toContainText(leader.name);
  await expectAccessible(page);
  await picture(page, "me");
  await page.emulateMedia({ colorScheme: "dark" });
  await expectAccessible(page);
  await page.emulateMedia({ colorScheme: "light" });

  await page.getByRole("button", { name: "Something is wrong" }).click();
  await page.getByLabel("Tell your lead").fill("I was at the spray booth until four");
  await page.getByRole("button", { name: "Send it" }).click();
  await expect(page.getByText("Your lead will look at it.")).toBeVisible();

  await page.getByRole("link", { name: "the week before" }).click();
  await expect(page).toHaveURL(/week=/);
  const agree = page.getByRole("button", { name: /(is|are) right$/ });
  await agree.click();
  await expect(agree).toHaveCount(0);
  await page.getByRole("listitem").getByRole("link").first().click();
  await expect(page).toHaveURL(/day=/);

  await page.getByRole("link", { name: "Show my badge" }).click();
  await expect(page.getByRole("img", { name: `QR code of badge ${worker.number}` })).toBeVisible();
  await expectAccessible(page);
  expect((await page.goto("/ends"))!.status()).toBe(403);
});

test("the lead reads what was called out, answers, and agrees to the cards", async ({ page }) => {
  await enter(page, leader);
  await page.goto("/ends?code=objection");
  const row = page.getByRole("row").filter({ hasText: worker.name });
  const settle = row.getByRole("link", { name: /^Settle/ });
  if (await settle.count()) await settle.click();
  await expect(page.getByText("I was at the spray booth until four")).toBeVisible();
  await page.getByLabel("Reason").fill("the taps say so");
  await page.getByRole("button", { name: "It stays as it was" }).click();
  await expect(row).toHaveCount(0);

  await page.goto("/hours/agreement");
  await expectAccessible(page);
  await page.getByRole("button", { name: "Agree to the ticked cards" }).click();
  await expect(page.getByRole("img", { name: "the lead agreed" }).first()).toBeVisible();
  await page.setViewportSize(phone);
  await expectAccessible(page);
});

test("a forgotten start is entered from the floor, by who leads there alone", async ({ page }) => {
  await enter(page, leader);
  await page.goto("/floor");
  await expectAccessible(page);
  const names = page.getByRole("button", { name: /: (end|start) the shift$/ });
  await expect(names.first()).toBeVisible();
  await names.first().click();
  const dialog = page.getByRole("dialog");
  await dialog.getByLabel(/^The shift/).fill("2099-01-01T06:00");
  await dialog.getByLabel("Reason").fill("no such day yet");
  await dialog.getByRole("button", { name: /the shift$/ }).click();
  await expect(dialog.getByRole("status")).toContainText("still to come");
  await dialog.getByRole("button", { name: "Leave it" }).click();
  await expect(dialog).toBeHidden();
});
