import { describe, expect, test } from "vitest";
import { correctedOffset, writtenOffsetMs, zoneCorrections } from "@/lib/time/corrections";

const HOUR_MS = 3_600_000;

describe("correctedOffset", () => {
  test("holds from its instant on, and not a millisecond before", () => {
    for (const { zones, fromMs, offset } of zoneCorrections) {
      expect(correctedOffset(fromMs, zones[0])).toBe(offset);
      expect(correctedOffset(fromMs - 1, zones[0])).toBeNull();
    }
  });
  test("knows older names of a zone, in any case of their letters", () => {
    const winter = Date.parse("2027-01-15T12:00:00Z");
    expect(correctedOffset(winter, "canada/pacific")).toBe("-07:00");
  });
  test("leaves every other zone alone", () => {
    expect(correctedOffset(Date.parse("2027-01-15T12:00:00Z"), "America/New_York")).toBeNull();
  });
});

describe("writtenOffsetMs", () => {
  test.each([
    ["-07:00", -7 * HOUR_MS],
    ["+00:00", 0],
    ["+05:30", 5.5 * HOUR_MS],
    ["-03:30", -3.5 * HOUR_MS],
  ])("%s is %i ms", (offset, ms) => expect(writtenOffsetMs(offset)).toBe(ms));
});
