import { describe, expect, test } from "vitest";
import { knownSince } from "@/lib/replay/known-since";
import { siteRules } from "@/tests/make/events";

const rules = [{ ...siteRules, timeZone: "America/Chicago", productionDayStartsAtMinutes: 0 }];
const createdAt = new Date("2026-05-14T02:00:00Z");

describe("knownSince", () => {
  test("is the site's own day on which it was put on file", () => {
    expect(knownSince({ createdAt, firstStandardOn: null }, rules)).toBe("2026-05-13");
  });
  test("is the first standard's day where that is earlier, never where it is later", () => {
    expect(knownSince({ createdAt, firstStandardOn: "2026-01-05" }, rules)).toBe("2026-01-05");
    expect(knownSince({ createdAt, firstStandardOn: "2026-06-01" }, rules)).toBe("2026-05-13");
  });
});
