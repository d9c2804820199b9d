import { describe, expect, test } from "vitest";
import { workweeks } from "@/lib/time/workweek";
import { zoneClock } from "@/lib/time/zone-clock";
import { attributed, dateOf } from "@/lib/timesheet/attribution";

const zone = "America/New_York";
const at = (text: string) => Date.parse(`${text}-04:00`) / 1000;
const weekAt = workweeks({ startsOn: "monday", at: "00:00" }, zoneClock(zone));
const byDay = { weekAt, attribution: "calendar-day" as const };
const byShift = { weekAt, attribution: "shift-start" as const };

/** Saturday 13 June, 20:00, to Monday 15 June, 04:00. */
const start = at("2026-06-13T20:00:00");
const end = at("2026-06-15T04:00:00");
const hoursBy = (calendar: typeof byDay | typeof byShift) =>
  attributed([{ start, end, rate: "14" }], start, calendar).map((piece) => [
    piece.week,
    piece.date,
    (piece.end - piece.start) / 3600,
  ]);

describe("attributed", () => {
  test("by calendar day, time is cut at every workday", () => {
    expect(hoursBy(byDay)).toEqual([
      ["2026-06-08", "2026-06-13", 4],
      ["2026-06-08", "2026-06-14", 24],
      ["2026-06-15", "2026-06-15", 4],
    ]);
  });
  test("by shift start, only the workweek cuts; the rest is its first workday's", () => {
    expect(hoursBy(byShift)).toEqual([
      ["2026-06-08", "2026-06-13", 28],
      ["2026-06-15", "2026-06-15", 4],
    ]);
  });
});

describe("dateOf", () => {
  test("an instant counts for the day in which it lies, or for the shift's", () => {
    const sunday = at("2026-06-14T12:00:00");
    expect(dateOf(sunday, start, byDay)).toBe("2026-06-14");
    expect(dateOf(sunday, start, byShift)).toBe("2026-06-13");
    expect(dateOf(at("2026-06-15T01:00:00"), start, byShift)).toBe("2026-06-15");
  });
});
