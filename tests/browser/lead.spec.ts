import { expect, expectAccessible, picture, test } from "@/tests/setup/browser";
import { enterOffice } from "@/tests/setup/office";

test("a lead sees who is on what, and opens a ticket to every segment behind it", async ({
  page,
  signIns,
}) => {
  await enterOffice(page, signIns, "lead");
  await expect(page).toHaveURL(/\/floor$/);
  await expect(page.getByText(/\d+ in/).first()).toBeVisible();
  await expectAccessible(page);
  await picture(page, "floor");
  await page.goto("/tickets");
  await expectAccessible(page);
  const ticket = page.getByRole("table").getByRole("link").first();
  const number = (await ticket.textContent()) ?? "";
  await ticket.click();
  await expect(page.getByRole("heading", { name: number })).toBeVisible();
  await expectAccessible(page);
  await picture(page, "ticket");
  await page
    .getByRole("link", { name: /^Who worked on/ })
    .first()
    .click();
  await expect(page).toHaveURL(/open=/);
  await expect(page.locator("tr[data-line]").first()).toContainText(/\d\d:\d\d/);
  await page.getByRole("link", { name: "Print" }).click();
  await expect(page.getByRole("img", { name: `QR code of ticket ${number}` })).toBeVisible();
});

test("filters stand in the address, and a number finds its ticket", async ({ page, signIns }) => {
  await enterOffice(page, signIns, "lead");
  await page.goto("/tickets");
  const first = page.getByRole("table").getByRole("link").first();
  const number = (await first.textContent()) ?? "";
  await page.getByLabel("Part of a ticket's or order's number").fill(number);
  await page.getByRole("button", { name: "Find" }).click();
  await expect(page).toHaveURL(/q=/);
  await expect(page.getByRole("table").getByRole("link")).toHaveText([number]);
  await page.goto("/tickets?q=no-such-number");
  await expect(page.getByText("No ticket here has")).toBeVisible();
});

test("a lead sees the own cells' people only, and gives one a new PIN", async ({
  page,
  signIns,
}) => {
  await enterOffice(page, signIns, "lead");
  await page.goto("/people");
  const cells = await page
    .getByRole("cell")
    .evaluateAll((found) =>
      found.filter((each) => each.matches("[data-book]:nth-child(3)")).map((c) => c.textContent),
    );
  const own = new Set(cells);
  expect(own.size).toBeGreaterThan(0);
  const stranger = signIns.workers.find(({ cell }) => !own.has(cell))!;
  expect((await page.goto(`/people/${stranger.worker}`))!.status()).toBe(404);
  const mine = signIns.workers.find(({ cell }) => own.has(cell))!;
  await page.goto(`/people/${mine.worker}`);
  await page.getByRole("button", { name: "Give a new PIN" }).click();
  await expect(page.getByRole("status")).toContainText(/\d{3} \d{3}/);
  await expect(page.getByRole("button", { name: "Keep the changes" })).toHaveCount(0);
  expect((await page.goto("/kiosks"))!.status()).toBe(403);
});

test("the floor stays when the server is away, and says as of when it is", async ({
  page,
  context,
  signIns,
}) => {
  await enterOffice(page, signIns, "lead");
  await expect(page.getByText(/\d+ in/).first()).toBeVisible();
  await context.route("**/api/floor", (route) => route.abort());
  await expect(page.getByText(/as of \d\d:\d\d/)).toBeVisible({ timeout: 30_000 });
  await expect(page.getByText(/\d+ in/).first()).toBeVisible();
});
