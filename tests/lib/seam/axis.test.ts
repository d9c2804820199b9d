import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { axisMarks, axisUnit } from "@/lib/seam/axis";

describe("axisMarks", () => {
  test.each([
    { scale: 64, marks: [20, 40, 60] },
    { scale: 20, marks: [5, 10, 15, 20] },
    { scale: 25, marks: [10, 20] },
    { scale: 240, marks: [60, 120, 180, 240] },
    { scale: 1, marks: [1] },
  ])("marks a leaf of $scale min at $marks", ({ scale, marks }) => {
    expect(axisMarks(scale * 60).map((seconds) => seconds / 60)).toEqual(marks);
  });

  test("for any scale from a minute up, one to four marks stand on the leaf, equally far apart", () => {
    fc.assert(
      fc.property(fc.integer({ min: 60, max: 40_000_000 }), (scale) => {
        const marks = axisMarks(scale);
        expect(marks.length).toBeGreaterThanOrEqual(1);
        expect(marks.length).toBeLessThanOrEqual(4);
        expect(marks.at(-1)).toBeLessThanOrEqual(scale);
        marks.forEach((mark, at) => {
          expect(mark).toBe(marks[0]! * (at + 1));
        });
      }),
    );
  });

  test("a scale under a minute has none", () => expect(axisMarks(59)).toEqual([]));
});

describe("axisUnit", () => {
  test.each([
    [[1200, 2400, 3600], "min"],
    [[3600, 7200], "h"],
    [[3600], "min"],
    [[1800, 7200], "min"],
    [[], "min"],
  ] as const)("of %j is %s", (marks, unit) => expect(axisUnit(marks)).toBe(unit));
});
