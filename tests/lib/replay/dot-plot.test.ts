import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { dotPlot } from "@/lib/replay/dot-plot";

describe("dotPlot", () => {
  test("lengths in one bin stand on each other, and the scale says minutes in round steps", () => {
    const { dots, marks, step } = dotPlot([3000, 3001, 6000], { lines: [4800] });
    expect(dots.map(({ height }) => height)).toEqual([0, 1, 0]);
    expect(dots[0]!.bin).toBe(dots[1]!.bin);
    expect(marks.map((seconds) => seconds / 60)).toEqual([0, 20, 40, 60, 80, 100]);
    expect(step).toBe(10);
  });

  test("for any lengths, every one is a dot within the picture", () => {
    const lengths = fc.array(fc.nat(400_000), { minLength: 1, maxLength: 200 });
    fc.assert(
      fc.property(lengths, fc.nat(400_000), (seconds, line) => {
        const { dots, step, scaleSeconds, binSeconds } = dotPlot(seconds, { lines: [line] });
        expect(dots).toHaveLength(seconds.length);
        for (const { bin, height } of dots) {
          expect((bin + 0.5) * binSeconds).toBeLessThan(scaleSeconds);
          expect(height * step).toBeLessThanOrEqual(76.001);
        }
      }),
    );
  });
});
