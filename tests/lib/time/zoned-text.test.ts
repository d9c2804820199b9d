import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { instantMs } from "@/lib/time/instant";
import { zonedText } from "@/lib/time/zoned-text";

describe("zonedText", () => {
  test.each([
    ["America/Los_Angeles", "2026-03-08T09:59:59Z", "2026-03-08T01:59:59-08:00"],
    ["America/Los_Angeles", "2026-03-08T10:00:00Z", "2026-03-08T03:00:00-07:00"],
    ["Asia/Kathmandu", "2026-03-08T00:00:00Z", "2026-03-08T05:45:00+05:45"],
    ["America/St_Johns", "2026-01-01T00:00:00Z", "2025-12-31T20:30:00-03:30"],
    ["UTC", "2026-03-08T00:00:00Z", "2026-03-08T00:00:00+00:00"],
  ])("in %s, %s is %s", (zone, instant, text) => {
    expect(zonedText(instantMs(instant)! / 1000, zone)).toBe(text);
  });
  test("for any instant, reading the text gives it back", () => {
    const seconds = fc.integer({ min: Date.UTC(1973, 0) / 1000, max: Date.UTC(2199, 0) / 1000 });
    fc.assert(
      fc.property(seconds, fc.constantFrom("Europe/Madrid", "Australia/Lord_Howe"), (at, zone) => {
        expect(instantMs(zonedText(at, zone))).toBe(at * 1000);
      }),
    );
  });
});
