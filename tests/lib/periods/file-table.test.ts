import { describe, expect, test } from "vitest";
import { fileTable } from "@/lib/periods/file-table";
import { payFileOf } from "@/lib/periods/frozen";
import { EARLIER, makeDay, makeFrozen, makeFrozenCard } from "@/tests/make/frozen";

describe("fileTable", () => {
  const frozen = makeFrozen([makeDay("2026-06-01", 36_000, { premiums: { night: 1800 } })], {
    cards: [makeFrozenCard({ payrollNumber: null })],
  });
  const change = { ...makeDay("2026-05-20", -3600), workerId: "w1", aboutId: EARLIER };
  const { header, rows } = fileTable(
    payFileOf({ ...frozen, days: [...frozen.days, { ...change, aboutFrom: "2026-05-17" }] }),
  );
  const cells = rows.map((row) =>
    Object.fromEntries(
      row.map((cell, at) => [header[at], "text" in cell ? cell.text : cell.hours]),
    ),
  );
  test("has a row a workday, a column a premium, and an empty cell where nothing is known", () => {
    expect(header.at(-1)).toBe("premium_night_hours");
    expect(cells[0]).toMatchObject({
      worker: "1042",
      payroll_number: "",
      line: "hours",
      period_from: "2026-05-31",
      workday: "2026-06-01",
      reference: "",
      paid_hours: "10.00",
      premium_night_hours: "0.50",
    });
  });
  test("an adjustment names the period and day that it changes", () => {
    expect(cells[1]).toMatchObject({
      line: "adjustment",
      period_from: "2026-05-17",
      workday: "2026-05-20",
      reference: "2026-05-17/2026-05-20",
      paid_hours: "-1.00",
      premium_night_hours: "0.00",
    });
  });
  test("every row is as long as the header", () => {
    expect(rows.every(({ length }) => length === header.length)).toBe(true);
  });
});
