import type { Page } from "@playwright/test";
import type { SignIns } from "@/tests/setup/installation";

type Account = Pick<SignIns["office"][number], "email" | "password">;

/** Signs in to the office by the form, as whoever holds this role in the demo. */
export async function enterOffice(page: Page, signIns: SignIns, role: string): Promise<void> {
  const account = signIns.office.find((each) => each.role === role)!;
  await signInAs(page, account);
  await page.waitForURL((url) => url.pathname !== "/sign-in");
}

/** Goes to the office's door, fills its form in and sends it. */
export async function signInAs(page: Page, account: Account): Promise<void> {
  await page.goto("/sign-in");
  await fillSignIn(page, account);
}

/** Fills the form of the door in, where the page stands at it, and sends it. */
export async function fillSignIn(page: Page, { email, password }: Account): Promise<void> {
  await page.getByLabel("E-mail").fill(email);
  await page.getByLabel("Password").fill(password);
  await page.getByRole("button", { name: "Sign in" }).click();
}
