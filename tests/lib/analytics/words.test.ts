import { describe, expect, test } from "vitest";
import {
  countOf,
  finePercentOf,
  hoursOf,
  minutesEach,
  percentOf,
  signedHours,
} from "@/lib/analytics/words";

describe("words", () => {
  test("hours have one decimal, thousands apart", () => {
    expect(hoursOf(4_412_640)).toBe("1,225.7");
    expect(hoursOf(0)).toBe("0.0");
  });
  test("what grew and shrank has a sign, what did neither none", () => {
    expect([signedHours(3600), signedHours(-3600), signedHours(-100)]).toEqual([
      "+1.0",
      "−1.0",
      "0.0",
    ]);
  });
  test("a ratio that is none is a dash, never NaN", () => {
    expect([percentOf(0.944), percentOf(0), percentOf(null)]).toEqual(["94 %", "0 %", "–"]);
    expect([finePercentOf(0.9531), finePercentOf(null)]).toEqual(["95.3 %", "–"]);
  });
  test("a piece takes minutes; without pieces nothing is said", () => {
    expect([minutesEach(3600, 4), minutesEach(3600, 0)]).toEqual(["15.0", ""]);
    expect(countOf(2071)).toBe("2,071");
  });
});
