import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { checkDigit, isChecked } from "@/lib/codes/damm";
import { nearestKnown, nearMisses } from "@/lib/codes/near-misses";

const right = fc.stringMatching(/^\d{7,12}$/).map((digits) => digits + checkDigit(digits));

describe("nearMisses", () => {
  test("a right number has none", () => expect(nearMisses("26048176")).toEqual([]));
  test("for any single wrong digit, what was meant is among them, at its place", () => {
    fc.assert(
      fc.property(right, fc.nat(), fc.integer({ min: 1, max: 9 }), (meant, where, shift) => {
        const at = where % meant.length;
        const wrong = String((Number(meant[at]) + shift) % 10);
        const misses = nearMisses(meant.slice(0, at) + wrong + meant.slice(at + 1));
        expect(misses).toContainEqual({ number: meant, at });
        expect(misses.every(({ number }) => isChecked(number))).toBe(true);
      }),
    );
  });
  test("for any swap of unlike neighbours, what was meant is among them, at its place", () => {
    fc.assert(
      fc.property(right, fc.nat(), (meant, where) => {
        const at = where % (meant.length - 1);
        fc.pre(meant[at] !== meant[at + 1]);
        const wrong = meant.slice(0, at) + meant[at + 1] + meant[at] + meant.slice(at + 2);
        expect(nearMisses(wrong)).toContainEqual({ number: meant, at });
      }),
    );
  });
});

describe("nearestKnown", () => {
  const known = ["26050001", "26048176", "26048190"];
  test.each([
    ["one digit wrong", "26048976", { number: "26048176", at: 5 }],
    ["two neighbours swapped", "26084176", { number: "26048176", at: 3 }],
    ["the last digit wrong", "26048170", { number: "26048176", at: 7 }],
    ["a digit lost", "2604816", { number: "26048176", at: 6 }],
    ["the last digit lost", "2604817", { number: "26048176", at: 7 }],
    ["a digit too many", "260481766", { number: "26048176", at: 8 }],
    ["two digits wrong", "26948976", null],
    ["nothing keyed", "", null],
    ["the number itself", "26048176", null],
  ])("with %s", (_, digits, nearest) => expect(nearestKnown(digits, known)).toEqual(nearest));
  test("takes the likelier of two, and a wrong digit before a lost one", () => {
    expect(nearestKnown("26048100", ["26048190", "26048109"])?.number).toBe("26048190");
    expect(nearestKnown("26048100", ["260481001", "26048190"])?.number).toBe("26048190");
  });
});
