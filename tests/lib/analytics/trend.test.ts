import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { drawTrend } from "@/lib/analytics/trend";

const size = { width: 70, height: 10 };

describe("drawTrend", () => {
  test("the scale is its own, and always holds the target", () => {
    const { lines, targetY, last } = drawTrend([0.5, 1.5], size);
    expect(lines).toEqual([
      [
        { x: 0, y: 10 },
        { x: 70, y: 0 },
      ],
    ]);
    expect(targetY).toBe(5);
    expect(last).toEqual({ x: 70, y: 0 });
    expect(drawTrend([0.5, 0.6], size).targetY).toBe(0);
  });
  test("what hardly moves looks so", () => {
    const { lines } = drawTrend([1, 1.01], size);
    expect(Math.abs(lines[0]![0]!.y - lines[0]![1]!.y)).toBeCloseTo(0.5);
  });
  test("weeks without work are gaps", () => {
    const { lines, last } = drawTrend([1, null, 1, 1, null], size);
    expect(lines.map((line) => line.length)).toEqual([1, 2]);
    expect(last!.x).toBe(52.5);
  });
  test("nothing at all draws nothing", () => {
    expect(drawTrend([null, null], size)).toMatchObject({ lines: [], last: null });
    expect(drawTrend([], size).last).toBeNull();
    expect(drawTrend([1], size).last!.y).toBeCloseTo(5);
  });
  test("for any values, every point lies in the drawing", () => {
    const value = fc.option(fc.double({ min: 0, max: 50, noNaN: true }));
    fc.assert(
      fc.property(fc.array(value, { maxLength: 8 }), (values) => {
        const { lines, targetY } = drawTrend(values, size);
        for (const y of [targetY, ...lines.flat().map((point) => point.y)]) {
          expect(y).toBeGreaterThanOrEqual(-1e-9);
          expect(y).toBeLessThanOrEqual(size.height + 1e-9);
        }
      }),
    );
  });
});
