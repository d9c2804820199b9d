import { parse } from "csv-parse/sync";
import { expect, expectAccessible, test } from "@/tests/setup/browser";
import { enterOffice } from "@/tests/setup/office";

const parts = ["direct_hours", "indirect_hours", "rest_hours", "unassigned_hours"];
const hundredths = (text: string | undefined) => Math.round(Number(text) * 100);

test("payroll opens a worker to days and a day to its taps", async ({ page, signIns }) => {
  await enterOffice(page, signIns, "payroll");
  await page.goto("/hours");
  await expectAccessible(page);
  await page
    .getByRole("link", { name: /^Days of/ })
    .first()
    .click();
  await expect(page).toHaveURL(/worker=/);
  await page
    .getByRole("link", { name: /^Taps of/ })
    .first()
    .click();
  await expect(page).toHaveURL(/day=/);
  await expect(page.getByText(/\d\d:\d\d/).first()).toBeVisible();
  await expectAccessible(page);
});

test("the file's decimal hours add up in every row", async ({ page, signIns }) => {
  await enterOffice(page, signIns, "payroll");
  await page.goto("/hours");
  const address = await page.getByRole("link", { name: "Save as CSV" }).getAttribute("href");
  const answer = await page.request.get(address!);
  expect(answer.headers()["content-type"]).toContain("text/csv");
  const text = await answer.text();
  expect(text).toMatch(/\r\n$/);
  const rows = parse(text, { columns: true, bom: true }) as Record<string, string>[];
  expect(rows.length).toBeGreaterThan(100);
  const wrong = rows.filter((row) => {
    const sum = parts.reduce((total, part) => total + hundredths(row[part]), 0);
    return sum !== hundredths(row.attended_hours);
  });
  expect(wrong).toEqual([]);
});

test("a worker sees the own hours, and nobody else's", async ({ page, signIns }) => {
  await enterOffice(page, signIns, "worker");
  await expect(page).toHaveURL(/\/me$/);
  await page.goto("/hours");
  await expect(page.getByText("Your hours")).toBeVisible();
  expect((await page.request.get("/hours/csv")).status()).toBe(403);
  expect((await page.goto("/people"))!.status()).toBe(403);
});
