import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { sum } from "@/lib/sum";
import { split } from "@/lib/timeline/split";

const seconds = fc.nat(14 * 86_400);
const weights = fc.array(fc.nat(100_000), { minLength: 1, maxLength: 12 });

describe("split", () => {
  test.each([
    { parts: [4, 3, 3], of: 10, over: [1, 1, 1], because: "ties go to the earlier item" },
    {
      parts: [5, 5],
      of: 10,
      over: [51, 49],
      because: "the larger fraction wins, not the larger weight",
    },
    { parts: [5, 5], of: 10, over: [0, 0], because: "no weight left means equal shares" },
    { parts: [0, 10], of: 10, over: [0, 7], because: "an item that weighs nothing gets nothing" },
  ])("$of s over $over is $parts: $because", ({ of, over, parts }) => {
    expect(split(of, over)).toEqual(parts);
  });
  test("for any weights, every second of the whole is in exactly one part", () => {
    fc.assert(
      fc.property(seconds, weights, (s, w) => {
        expect(split(s, w)).toHaveLength(w.length);
        expect(sum(split(s, w))).toBe(s);
      }),
    );
  });
  test("for any weights, no part is a whole second away from its exact share", () => {
    fc.assert(
      fc.property(seconds, weights, (s, w) => {
        const total = sum(w);
        split(s, w).forEach((part, item) => {
          const exact = total === 0 ? s / w.length : (s * w[item]!) / total;
          expect(Math.abs(part - exact)).toBeLessThan(1);
        });
      }),
    );
  });
  test.each([
    [-1, [1], "whole"],
    [1, [0.5], "whole"],
    [1, [], "one item"],
    [2 ** 52, [4], "too large"],
  ])("refuses %j over %j", (s, w, why) => expect(() => split(s, w)).toThrow(why));
});
