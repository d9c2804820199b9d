import { describe, expect, test } from "vitest";
import { writeCsv } from "@/lib/csv/write";
import { cardsOf } from "@/lib/hours/cards";
import { hoursFile } from "@/lib/hours/file";

const row = (date: string, activity: "run" | "meal" | "rest", seconds: number) => ({
  number: "1042",
  name: "=Ilo, Varn",
  cell: "Neck",
  date,
  activity,
  seconds,
});

describe("hoursFile", () => {
  const cards = cardsOf([
    row("2026-05-13", "run", 1200),
    row("2026-05-13", "meal", 1800),
    row("2026-05-14", "run", 1200),
    row("2026-05-14", "rest", 1200),
  ]);
  const [head, first, second, end] = writeCsv(hoursFile(cards)).split("\r\n");

  test("a row a worker and day: hours that add up, seconds that are exact", () => {
    expect(head).toMatch(/^\ufeffworker,name,home_cell,date,attended_hours,direct_hours/);
    expect(first).toContain("2026-05-13,0.33,0.33,0.00,0.00,0.00,0.50,1200,1200,0,0,0,1800");
    expect(second).toContain("2026-05-14,0.67,0.34,0.00,0.33,0.00,0.00,2400,1200,0,1200,0,0");
    expect(end).toBe("");
  });

  test("a name that a spreadsheet would run is made harmless, one with a comma is quoted", () => {
    expect(first).toMatch(/^1042,"'=Ilo, Varn",Neck,/);
  });

  test("someone without time has no row", () => {
    const none = { ...row("2026-05-13", "run", 0), date: null, activity: null };
    expect(hoursFile(cardsOf([none])).rows).toEqual([]);
  });
});
