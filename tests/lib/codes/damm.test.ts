import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { checkDigit, isChecked } from "@/lib/codes/damm";
import barcodes from "@/tests/checks/barcodes.json";

const published = barcodes.find(({ id }) => id === "damm") as unknown as {
  given: { values: string[] };
  expect: { check: string[] };
};
const digits = fc.stringMatching(/^\d{1,15}$/);

describe("checkDigit", () => {
  test("is the published one (Damm 2004, from memory: 572 takes 4)", () => {
    expect(published.given.values.map(checkDigit)).toEqual(published.expect.check);
  });
  test.each([
    ["2604817", "6"], // CALCULATIONS.md 7
    ["", "0"],
    ["0000", "0"],
  ])("of %j is %s", (text, check) => expect(checkDigit(text)).toBe(check));
});

describe("isChecked", () => {
  test("no digits and what is no digit are not right", () => {
    expect(isChecked("")).toBe(false);
    expect(isChecked("26O48176")).toBe(false);
  });
  test("for any digits, the check digit makes them right and no other one does", () => {
    fc.assert(
      fc.property(digits, (text) => {
        const right = [..."0123456789"].filter((digit) => isChecked(text + digit));
        expect(right).toEqual([checkDigit(text)]);
      }),
    );
  });
  test("for any right number, every single wrong digit is caught", () => {
    fc.assert(
      fc.property(digits, (text) => {
        const right = text + checkDigit(text);
        for (let at = 0; at < right.length; at++) {
          for (const digit of "0123456789") {
            const wrong = right.slice(0, at) + digit + right.slice(at + 1);
            expect(isChecked(wrong)).toBe(wrong === right);
          }
        }
      }),
    );
  });
  test("for any right number, every swap of two neighbours is caught", () => {
    fc.assert(
      fc.property(digits, (text) => {
        const right = text + checkDigit(text);
        for (let at = 0; at + 1 < right.length; at++) {
          const swap = right.slice(0, at) + right[at + 1] + right[at] + right.slice(at + 2);
          expect(isChecked(swap)).toBe(swap === right);
        }
      }),
    );
  });
});
