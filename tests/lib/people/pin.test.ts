import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { drawPin, isTrivialPin } from "@/lib/people/pin";
import security from "@/tests/checks/security.json";

describe("isTrivialPin", () => {
  test.each([
    ["000000", "one digit"],
    ["414144", "two digits"],
    ["123456", "a run up"],
    ["890123", "a run that passes nine"],
    ["654321", "a run down"],
    ["482482", "a block said again"],
    ["448822", "pairs"],
    ["483384", "a mirror"],
    ["147369", "two lines of the pad"],
    ["198473", "a year in front"],
    ["732031", "a year behind"],
  ])("%s is trivial: %s", (pin) => expect(isTrivialPin(pin)).toBe(true));

  test.each(["271828", "147360", "482483", "123457", "448823", "214873", "183492"])(
    "%s is not",
    (pin) => expect(isTrivialPin(pin)).toBe(false),
  );

  test("the worker's own number may not be part of it, a short one may", () => {
    expect(isTrivialPin("710425", "1042")).toBe(true);
    expect(isTrivialPin("710425", "1043")).toBe(false);
    expect(isTrivialPin("710425", "42")).toBe(false);
  });

  test("fewer than one PIN in twenty is refused, so that guessing stays hard", () => {
    const all = Array.from({ length: 1_000_000 }, (_, n) => String(n).padStart(6, "0"));
    expect(all.filter((pin) => isTrivialPin(pin)).length).toBeLessThan(50_000);
  });
});

describe("drawPin", () => {
  const rule = security.find(({ id }) => id === "pin-63b-3-random")!.expect as {
    min_length: number;
  };

  test("for any source, the PIN has six digits (NIST SP 800-63B) and is not trivial", () => {
    fc.assert(
      fc.property(fc.array(fc.nat(999_999), { minLength: 1 }), fc.nat(99_999), (drawn, number) => {
        const source = [...drawn, 271_828, 902_417, 583_016];
        const pin = drawPin(() => source.shift()!, String(number));
        expect(pin).toMatch(/^\d+$/);
        expect(pin).toHaveLength(rule.min_length);
        expect(isTrivialPin(pin, String(number))).toBe(false);
      }),
    );
  });

  test("a trivial draw is thrown away and drawn again", () => {
    const source = [123_456, 7, 271_828];
    expect(drawPin(() => source.shift()!, "1042")).toBe("271828");
  });
});
