import { parse } from "csv-parse/sync";
import { describe, expect, test } from "vitest";
import { hoursCsv } from "@/lib/hours/csv";
import { hoursSheet } from "@/lib/hours/sheet";

const of = { worker: "1042", name: "=1+1, Ilo", cell: "Mill", date: "2026-05-14", runs: false };

describe("hoursCsv", () => {
  test("writes a row a worker and day, RFC 4180, with text that no spreadsheet runs", () => {
    const file = hoursCsv(
      hoursSheet([
        { ...of, activity: "run", seconds: 7200 },
        { ...of, activity: "meal", seconds: 1800 },
      ]),
    );
    expect(file.endsWith("\r\n")).toBe(true);
    expect(parse(file, { bom: true, columns: true })).toEqual([
      {
        worker: "1042",
        name: "'=1+1, Ilo",
        cell: "Mill",
        date: "2026-05-14",
        attended_hours: "2.00",
        direct_hours: "2.00",
        indirect_hours: "0.00",
        rest_hours: "0.00",
        unassigned_hours: "0.00",
        meal_hours: "0.50",
      },
    ]);
  });

  test("is the head alone where nobody was in", () => {
    expect(hoursCsv([]).trim().split("\r\n")).toHaveLength(1);
  });
});
