import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { minutesText, secondsOfMinutes } from "@/lib/standards/minutes";

describe("minutesText", () => {
  test.each([
    [0, "0.0"],
    [4920, "82.0"],
    [366, "6.1"],
    [90, "1.5"],
    [100, "1.67"],
  ])("writes %i seconds as %s", (seconds, text) => expect(minutesText(seconds)).toBe(text));
});

describe("secondsOfMinutes", () => {
  test.each([
    ["82", 4920],
    [" 82.5 ", 4950],
    ["82,5", 4950],
    ["1.67", 100],
    ["0", 0],
    ["-3", -180],
  ])("reads %s as %i seconds", (text, seconds) => expect(secondsOfMinutes(text)).toBe(seconds));

  test.each([[""], ["."], ["12.5.1"], ["1e3"], ["twelve"], ["12 min"], ["1234567"]])(
    "takes %s for no number of minutes",
    (text) => expect(secondsOfMinutes(text)).toBeNull(),
  );

  test("for any whole seconds, what is written reads back the same", () => {
    fc.assert(
      fc.property(fc.nat(360_000), (seconds) => {
        expect(secondsOfMinutes(minutesText(seconds))).toBe(seconds);
      }),
    );
  });
});
