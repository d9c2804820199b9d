import { describe, expect, test } from "vitest";
import { cellLines, cellTotal } from "@/lib/analytics/cells";
import { makeWorkRow } from "@/tests/make/work";

const how = { basis: "matched", places: 2 } as const;
const time = { directSeconds: 60, reworkSeconds: 5, restSeconds: 10, mealSeconds: 30 };
const attended = { ...time, indirectSeconds: 20, unassignedSeconds: 10 };
const board = {
  cells: ["mill", "neck", "spray"].map((id) => ({ id, name: `The ${id}` })),
  attendance: ["mill", "neck"].map((cell) => ({ place: 0, cell, ...attended })),
};
const work = { directSeconds: 50, reworkSeconds: 10, reportEarnedSeconds: 48 };
const rows = [
  makeWorkRow("mill", { ...work, earnedSeconds: 40 }),
  makeWorkRow("mill", { earnedSeconds: 50, directSeconds: 60 }, { basis: "booked" }),
  makeWorkRow("mill", { earnedSeconds: 30, directSeconds: 20 }, { place: 1 }),
];

describe("cellLines", () => {
  test("cells with attendance or earning, in the order of the work", () => {
    expect(cellLines(rows, board, how).map(({ name }) => name)).toEqual(["The mill", "The neck"]);
  });
  test("attendance is direct + indirect + rest + unassigned, meals apart", () => {
    expect(cellLines(rows, board, how)[1]!.time).toMatchObject({
      attendanceSeconds: 100,
      mealSeconds: 30,
    });
  });
  test("efficiency of the chosen basis, with and without rework; the rest is booked", () => {
    const [mill] = cellLines(rows, board, how);
    expect(mill).toMatchObject({
      withoutRework: 1,
      utilization: 0.6,
      productivity: 0.5,
      line: { efficiency: 0.8, trend: [1.5] },
      between: { inProcessActualSeconds: 10, inProcessEarnedSeconds: 2, movedSeconds: 8 },
    });
    const [booked] = cellLines(rows, board, { ...how, basis: "booked" });
    expect(booked!.line.efficiency).toBeCloseTo(50 / 60);
    expect(booked).toMatchObject({ utilization: 0.6, productivity: 0.5 });
  });
  test("a cell without earning has no efficiency", () => {
    expect(cellLines(rows, board, how)[1]).toMatchObject({
      line: { efficiency: null, pair: null },
      withoutRework: null,
      productivity: 0,
    });
  });
});

describe("cellTotal", () => {
  test("is the ratio of sums", () => {
    const total = cellTotal(rows, cellLines(rows, board, how), how);
    expect(total).toMatchObject({
      name: "All cells",
      time: { attendanceSeconds: 200, directSeconds: 120 },
      utilization: 0.6,
      productivity: 0.25,
      line: { efficiency: 0.8, trend: [1.5] },
    });
  });
  test("of nothing is nothing", () => {
    const none = cellTotal([], [], how);
    expect(none).toMatchObject({ utilization: null, line: { efficiency: null, trend: [null] } });
  });
});
