import { describe, expect, test } from "vitest";
import type { AttendanceRow } from "@/lib/analytics/facts";
import {
  linesOf,
  noLine,
  operationLines,
  overSums,
  rangeLines,
  seamTotals,
} from "@/lib/analytics/lines";
import { makeWorkRow } from "@/tests/make/work";

const how = { basis: "matched", places: 3 } as const;
const rows = [
  makeWorkRow("010", { pieces: 2, earnedSeconds: 90, directSeconds: 100 }),
  makeWorkRow("010", { earnedSeconds: 50, directSeconds: 40 }, { place: 2 }),
  makeWorkRow("010", { earnedSeconds: 7, directSeconds: 70 }, { basis: "booked" }),
  makeWorkRow("020", { directSeconds: 60, noStandardSeconds: 60 }),
];

describe("linesOf", () => {
  test("of one basis, each with its weeks; a week without work is a gap", () => {
    const [first] = linesOf(rows, how);
    expect(first).toMatchObject({
      key: "010",
      pair: { standardSeconds: 90, actualSeconds: 100 },
      efficiency: 0.9,
      trend: [null, 1.25],
    });
    expect(linesOf(rows, { ...how, basis: "booked" })).toMatchObject([{ efficiency: 0.1 }]);
  });
  test("what has no standard has no pair, and no efficiency", () => {
    expect(linesOf(rows, how)[1]).toMatchObject({ pair: null, efficiency: null });
  });
  test("what is mixed compares only the time that has one", () => {
    const mixed = makeWorkRow("1", { earnedSeconds: 30, directSeconds: 50, noStandardSeconds: 10 });
    expect(linesOf([mixed], how)).toMatchObject([
      { pair: { standardSeconds: 30, actualSeconds: 40 }, efficiency: 0.75 },
    ]);
  });
});

describe("rangeLines", () => {
  test("one for each range with work in it, by its name", () => {
    const weeks = [makeWorkRow("", { directSeconds: 5 }, { place: 1 })];
    const lines = rangeLines(weeks, { basis: "matched", names: ["2026-05-04", "2026-05-11"] });
    expect(lines.map(({ key, work }) => [key, work.directSeconds])).toEqual([["2026-05-11", 5]]);
  });
});

describe("operationLines", () => {
  test("bring what the site knows of the operation", () => {
    const operations = [{ code: "010", name: "Plane", stage: "Timber", cell: "Mill" }];
    expect(
      operationLines(rows, { ...how, operations }).map(({ operation }) => operation?.name ?? null),
    ).toEqual(["Plane", null]);
  });
});

describe("seamTotals", () => {
  const attendance: AttendanceRow[] = [0, 1].map((place) => ({
    place,
    cell: "mill",
    directSeconds: 70,
    reworkSeconds: 0,
    indirectSeconds: 20,
    restSeconds: 6,
    unassignedSeconds: 4,
    mealSeconds: 50,
  }));
  test("utilization and productivity are booked figures, whichever basis is chosen", () => {
    for (const basis of ["matched", "booked"] as const) {
      expect(seamTotals(rows, { attendance }, { basis, isOfCells: true })).toMatchObject({
        attendanceSeconds: 100,
        indirectSeconds: 20,
        utilization: 0.7,
        productivity: 0.07,
        efficiency: basis === "matched" ? 0.9 : 0.1,
      });
    }
  });
  test("attendance is not held against a part of its cells' work", () => {
    const totals = seamTotals(rows, { attendance }, { basis: "matched", isOfCells: false });
    expect(totals).toMatchObject({ utilization: null, productivity: null, efficiency: 0.9 });
  });
  test("nothing at all has no ratio", () => {
    const none = seamTotals([], { attendance: [] }, { basis: "matched", isOfCells: true });
    expect(none).toMatchObject({ efficiency: null, utilization: null, productivity: null });
  });
  test("tells what lies between the bases", () => {
    const { between } = seamTotals(rows, { attendance }, { basis: "matched", isOfCells: true });
    expect(between.inProcessActualSeconds).toBe(70 - 160);
  });
});

describe("overSums", () => {
  test("a ticket counts once, however many of its operations are over", () => {
    const over = { ticket: "1", operation: "010", standardSeconds: 10, actualSeconds: 15 };
    const all = [over, { ...over, operation: "020" }, { ...over, ticket: "2" }];
    expect(overSums(all)).toEqual({ tickets: 2, seconds: 15 });
  });
});

describe("noLine", () => {
  test("is nothing, with a gap for every week", () => {
    expect(noLine("mill", 2)).toMatchObject({ pair: null, efficiency: null, trend: [null, null] });
  });
});
