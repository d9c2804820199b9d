import fc from "fast-check";
import { describe, expect, test } from "vitest";
import {
  added,
  decimalText,
  dividedBy,
  exact,
  exactOf,
  larger,
  notBelowZero,
  times,
} from "@/lib/rates/exact";

describe("exact arithmetic", () => {
  test("adds tenths without a float's error", () => {
    expect(decimalText(added(exactOf("0.1"), exactOf("0.2")), 2)).toBe("0.30");
    expect(decimalText(added(), 2)).toBe("0.00");
  });
  test("multiplies and divides without loss", () => {
    const third = dividedBy(exact(1), exact(3));
    expect(times(third, exact(3))).toEqual(exact(1));
    expect(exact(6, 4)).toEqual(exact(3, 2));
  });
  test("the larger of two, and never below zero", () => {
    expect(larger(exact(1, 2), exact(2, 3))).toEqual(exact(2, 3));
    expect(notBelowZero(exact(-1))).toEqual(exact(0));
    expect(notBelowZero(exact(1))).toEqual(exact(1));
  });
  test("for any cents, text and fraction are the same", () => {
    fc.assert(
      fc.property(fc.nat(), (cents) => {
        const text = `${Math.floor(cents / 100)}.${String(cents % 100).padStart(2, "0")}`;
        expect(decimalText(exactOf(text), 2)).toBe(text);
        expect(exactOf(text)).toEqual(exact(cents, 100));
      }),
    );
  });
});

describe("decimalText", () => {
  // half-up rounding against binary floats, FLSA2019-9 (tests/checks/overtime.json round-float-trap)
  test.each([
    ["8.575", 2, "8.58"],
    ["7.335", 2, "7.34"],
    ["1.005", 2, "1.01"],
    ["1.004999", 2, "1.00"],
    ["0.5", 0, "1"],
    ["12", 6, "12.000000"],
    ["0", 2, "0.00"],
  ])("%s to %i places is %s", (text, places, rounded) => {
    expect(decimalText(exactOf(text), places)).toBe(rounded);
  });
});

describe("refusals", () => {
  test.each([
    [() => exactOf("1e5"), "1e5 is no decimal"],
    [() => exactOf(""), "is no decimal"],
    [() => exact(1, 0), "denominator is positive"],
    [() => dividedBy(exact(1), exact(0)), "divisor is positive"],
    [() => decimalText(exact(-1), 2), "0 or more"],
  ])("%s", (run, why) => expect(run).toThrow(why));
});
