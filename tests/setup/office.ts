import type { Page } from "@playwright/test";
import type { SignIns } from "@/tests/setup/installation";

/** Signs in to the office by the form, as whoever holds this role in the demo. */
export async function enterOffice(page: Page, signIns: SignIns, role: string): Promise<void> {
  const account = signIns.office.find((each) => each.role === role)!;
  await signInAs(page, account);
  await page.waitForURL((url) => url.pathname !== "/sign-in");
}

/** Fills the door's form in and sends it. */
export async function signInAs(
  page: Page,
  { email, password }: { email: string; password: string },
): Promise<void> {
  await page.goto("/sign-in");
  await page.getByLabel("E-mail").fill(email);
  await page.getByLabel("Password").fill(password);
  await page.getByRole("button", { name: "Sign in" }).click();
}
