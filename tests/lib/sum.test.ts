import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { sum } from "@/lib/sum";

describe("sum", () => {
  test("of nothing is 0", () => expect(sum([])).toBe(0));
  test("for any whole numbers, a sum of parts is the sum of all", () => {
    const numbers = fc.array(fc.integer());
    fc.assert(fc.property(numbers, numbers, (a, b) => sum([...a, ...b]) === sum(a) + sum(b)));
  });
});
