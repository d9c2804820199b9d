import { expect, expectAccessible, test } from "@/tests/setup/browser";
import { enterOffice, fillSignIn, signInAs } from "@/tests/setup/office";

test("a wrong password and an unknown e-mail get the same words", async ({ page, signIns }) => {
  const words = "E-mail and password do not belong together";
  const { email } = signIns.office.find(({ role }) => role === "planner")!;
  await signInAs(page, { email, password: "not the password of anyone" });
  await expect(page.getByRole("status")).toContainText(words);
  await expect(page.getByLabel("E-mail")).toHaveValue(email);
  await signInAs(page, { email: "nobody@larkmoor.example", password: "nor of nobody at all" });
  await expect(page.getByRole("status")).toContainText(words);
  await expectAccessible(page);
});

test("the office opens to nobody who is not signed in", async ({ page }) => {
  for (const path of ["/floor", "/tickets", "/people", "/kiosks", "/account"]) {
    await page.goto(path);
    await expect(page).toHaveURL(`/sign-in?to=${encodeURIComponent(path)}`);
  }
});

test("signing in leads on to the page that was asked for, and never off the site", async ({
  page,
  signIns,
}) => {
  const planner = signIns.office.find(({ role }) => role === "planner")!;
  await page.goto("/tickets?status=finished&model=Heron");
  await fillSignIn(page, planner);
  await expect(page).toHaveURL("/tickets?status=finished&model=Heron");
  await page.goto("/sign-in?to=/floor");
  await expect(page).toHaveURL("/floor");
  await page.context().clearCookies();
  await page.goto("/sign-in?to=https://elsewhere.example/tickets");
  await fillSignIn(page, planner);
  await expect(page).toHaveURL("/floor");
});

test("an admin adds a worker, whose PIN is shown once, and prints the badge", async ({
  page,
  signIns,
}) => {
  await enterOffice(page, signIns, "admin");
  await page.goto("/people");
  await expectAccessible(page);
  await page.getByRole("link", { name: "Add a worker" }).click();
  await page.getByLabel("Number", { exact: true }).fill(signIns.workers[0]!.worker);
  await page.getByLabel("Name").fill("Oda Brekke");
  await page.getByRole("button", { name: "Add and show the PIN" }).click();
  await expect(page.getByText("is someone else's number")).toBeVisible();
  await page.getByLabel("Number", { exact: true }).fill("7301");
  await page.getByRole("button", { name: "Add and show the PIN" }).click();
  const shown = page.getByRole("status").filter({ hasText: "PIN of Oda Brekke" });
  await expect(shown).toContainText(/\d{3} \d{3}/);
  await page.getByRole("link", { name: "Print the badge" }).click();
  await expect(page.getByRole("img", { name: "Bar code of badge 7301" })).toBeVisible();
  await page.goto("/people/7301");
  await expect(page.getByRole("heading", { name: "Oda Brekke" })).toBeVisible();
  await expect(page.getByText(/\d{3} \d{3}/)).toHaveCount(0);
});

test("an admin makes an account, which opens what its role may and nothing else", async ({
  page,
  browser,
  bookmatch,
  signIns,
}) => {
  await enterOffice(page, signIns, "admin");
  await page.goto("/people/accounts");
  await page.getByLabel("Name", { exact: true }).fill("Tove Lind");
  await page.getByLabel("E-mail", { exact: true }).fill("Tove.Lind@larkmoor.example");
  await page.getByLabel("planner").check();
  await page.getByRole("button", { name: "Add and show the password" }).click();
  const password = ((await page.locator(".desk-secret").textContent()) ?? "").trim();
  const theirs = await browser.newContext({ baseURL: bookmatch.url });
  const office = await theirs.newPage();
  await signInAs(office, { email: "tove.lind@larkmoor.example", password });
  await expect(office).toHaveURL(/\/floor$/);
  expect((await office.goto("/people"))!.status()).toBe(403);
  await expect(office.getByText("This page is not for your role")).toBeVisible();
  await theirs.close();
});

test("the last admin cannot be taken away", async ({ page, signIns }) => {
  await enterOffice(page, signIns, "admin");
  const { email } = signIns.office.find(({ role }) => role === "admin")!;
  await page.goto("/people/accounts");
  await page.getByRole("row", { name: email }).getByRole("link").click();
  await page.getByRole("button", { name: "Close the account" }).click();
  await expect(page.getByText("Someone must stay admin")).toBeVisible();
});

test("an admin makes a code for a tablet; it is shown with its end and a QR code", async ({
  page,
  signIns,
}) => {
  await enterOffice(page, signIns, "admin");
  await page.goto("/kiosks");
  await expectAccessible(page);
  await page.getByRole("link", { name: "Enrol a tablet" }).click();
  await page.getByLabel("Name of the tablet").fill("Neck, east wall");
  await page.getByLabel("Cell").selectOption({ label: "Neck" });
  await page.getByRole("button", { name: "Make a code" }).click();
  const shown = page.getByRole("status").filter({ hasText: "Code for Neck, east wall" });
  await expect(shown).toContainText(/[A-Z0-9]{4}-[A-Z0-9]{4}/);
  await expect(shown).toContainText(/It holds until \d\d:\d\d/);
  await expect(shown.getByRole("img")).toBeVisible();
});

test("signing out ends the session on the server too", async ({ page, context, signIns }) => {
  await enterOffice(page, signIns, "admin");
  const cookies = await context.cookies();
  await page.getByRole("button", { name: /menu$/ }).click();
  await page.getByRole("button", { name: "Sign out" }).click();
  await expect(page).toHaveURL(/\/sign-in$/);
  await context.addCookies(cookies);
  await page.goto("/people");
  await expect(page).toHaveURL("/sign-in?to=%2Fpeople");
});
