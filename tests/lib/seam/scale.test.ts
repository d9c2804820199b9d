import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { seamScale } from "@/lib/seam/scale";

const pair = (standardSeconds: number | null, actualSeconds: number) => ({
  standardSeconds,
  actualSeconds,
});
const pairs = fc.array(
  fc.record({
    standardSeconds: fc.option(fc.integer({ min: 1, max: 100_000 })),
    actualSeconds: fc.nat(300_000),
  }),
  { minLength: 1, maxLength: 20 },
);

describe("seamScale", () => {
  test.each([
    { of: [pair(2880, 0)], is: 3840, because: "a third longer than the standard" },
    { of: [pair(2880, 3840)], is: 3840, because: "and filled by what just fits" },
    { of: [pair(2880, 3841)], is: 5760, because: "then twice as long" },
    { of: [pair(2880, 6000)], is: 8640, because: "then three times" },
    { of: [pair(2880, 99_000)], is: 8640, because: "a runaway is drawn off the scale" },
    { of: [pair(600, 700), pair(2880, 100)], is: 3840, because: "one scale for a whole list" },
    { of: [pair(null, 2400)], is: 3000, because: "no standard: room past the actual" },
    { of: [pair(null, 10)], is: 600, because: "ten minutes at least" },
    { of: [], is: 600, because: "an empty list still has a scale" },
  ])("is $is s: $because", ({ of, is }) => expect(seamScale(of)).toBe(is));

  test("for any list, every standard fits its leaf with room to spare", () => {
    fc.assert(
      fc.property(pairs, (list) => {
        const scale = seamScale(list);
        for (const { standardSeconds } of list) expect(standardSeconds ?? 0).toBeLessThan(scale);
      }),
    );
  });

  test("for any list, the scale is the same in any order", () => {
    fc.assert(
      fc.property(pairs, (list) => {
        expect(seamScale([...list].reverse())).toBe(seamScale(list));
      }),
    );
  });
});
