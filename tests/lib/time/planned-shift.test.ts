import { describe, expect, test } from "vitest";
import { plannedShift } from "@/lib/time/planned-shift";

const hours = (on: string, from: string, to: string, zone: string) => {
  const { start, end } = plannedShift({ on, from, to }, zone);
  return (end - start) / 3600;
};

describe("plannedShift", () => {
  test("a day shift begins and ends on its date", () => {
    expect(
      plannedShift({ on: "2026-06-09", from: "07:00", to: "15:30" }, "America/New_York"),
    ).toEqual({
      start: Date.parse("2026-06-09T07:00:00-04:00") / 1000,
      end: Date.parse("2026-06-09T15:30:00-04:00") / 1000,
    });
  });
  // Lengths of local shifts: IANA tz database, tests/checks/time.json
  test.each([
    ["2026-03-07", 7],
    ["2026-06-09", 8],
    ["2026-10-31", 9],
  ])("a night shift that begins on %s lasts %i hours", (on, long) => {
    expect(hours(on, "22:00", "06:00", "America/New_York")).toBe(long);
  });
  test("an end at the hour of the start is a day later", () => {
    expect(hours("2026-06-09", "06:00", "06:00", "America/New_York")).toBe(24);
  });
});
