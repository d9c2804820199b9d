import { expect, test } from "vitest";
import { zoneClock } from "@/lib/time/zone-clock";

test("zoneClock finds a boundary, and the same one again", () => {
  const { zone, secondOf } = zoneClock("America/New_York");
  const skipped = Date.parse("2026-03-08T07:00:00Z") / 1000;
  expect(zone).toBe("America/New_York");
  expect([secondOf("2026-03-08", "02:30"), secondOf("2026-03-08", "02:30")]).toEqual([
    skipped,
    skipped,
  ]);
  expect(secondOf("2026-03-08", "03:30")).toBe(skipped + 1800);
});
