import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { badgeCode, carrierCode } from "@/lib/codes/badge-code";
import { readCode } from "@/lib/codes/read-code";

describe("badgeCode and carrierCode", () => {
  test("carry a letter, the number and its check digit (572 takes 4, Damm 2004)", () => {
    expect(badgeCode("572")).toBe("W5724");
    expect(carrierCode("572")).toBe("C5724");
  });
  test("for any number, reading gives it back without the check digit", () => {
    fc.assert(
      fc.property(fc.stringMatching(/^\d{1,8}$/), (number) => {
        expect(readCode(badgeCode(number))).toEqual({ valid: true, kind: "badge", number });
        expect(readCode(carrierCode(number))).toEqual({ valid: true, kind: "carrier", number });
      }),
    );
  });
});
