import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { instantMs } from "@/lib/time/instant";
import { weekdayOf, workdayIn, workweekFrom, workweekStart, workweeks } from "@/lib/time/workweek";
import { zoneClock } from "@/lib/time/zone-clock";
import { timeCheck } from "./checks";

const HOUR = 3600;
const second = (text: string) => instantMs(text)! / 1000;

describe("workweekStart", () => {
  const check = timeCheck<{ dates: string[] }, { sunday_start: string[]; monday_start: string[] }>(
    "workweek-start",
  );
  test(`finds the date on which the workweek began (${check.source})`, () => {
    const starts = (day: "sunday" | "monday") =>
      check.given.dates.map((date) => workweekStart(date, day));
    expect(starts("sunday")).toEqual(check.expect.sunday_start);
    expect(starts("monday")).toEqual(check.expect.monday_start);
  });
});

describe("weekdayOf", () => {
  test("1 January 1970 was a Thursday", () => expect(weekdayOf("1970-01-01")).toBe("thursday"));
});

describe("workweekFrom", () => {
  const check = timeCheck<{ tz: string; week_from: string }, { hours: number }>("week-length");
  test.each([
    ["America/New_York", "2026-06-07", 168],
    ["America/New_York", "2026-03-08", 167],
    ["America/New_York", "2026-11-01", 169],
    [check.given.tz, check.given.week_from, check.expect.hours],
    ["Europe/Madrid", "2026-10-19", 169],
  ])("%s from %s lasts %i hours (29 CFR 778.105: seven days of 24 hours)", (zone, date, hours) => {
    const { start, end, days } = workweekFrom(date, "00:00", zoneClock(zone));
    expect((end - start) / HOUR).toBe(hours);
    expect(days).toHaveLength(7);
  });
  test("a boundary that the clocks skip is the instant after the gap", () => {
    const { start } = workweekFrom("2026-03-08", "02:30", zoneClock("America/New_York"));
    expect(start).toBe(second("2026-03-08T07:00:00Z"));
  });
  test("a boundary that comes twice is the earlier", () => {
    const { start } = workweekFrom("2026-11-01", "01:30", zoneClock("America/New_York"));
    expect(start).toBe(second("2026-11-01T05:30:00Z"));
  });
  test("a date that the calendar skipped is a day of no length", () => {
    const week = workweekFrom("2011-12-26", "00:00", zoneClock("Pacific/Apia"));
    expect(week.days.map(({ start, end }) => (end - start) / HOUR)).toEqual([
      24, 24, 24, 24, 0, 24, 24,
    ]);
    const after = week.days[5]!;
    expect(workdayIn(week, after.start).date).toBe("2011-12-31");
  });
});

describe("workweeks", () => {
  const monday = { startsOn: "monday", at: "06:00" } as const;
  test("a workweek begins at its hour, not at midnight", () => {
    const weekAt = workweeks(monday, zoneClock("America/New_York"));
    expect(weekAt(second("2026-06-15T09:59:59Z")).date).toBe("2026-06-08");
    expect(weekAt(second("2026-06-15T10:00:00Z")).date).toBe("2026-06-15");
  });
  test("for any instant, the workweek and the workday hold it, and days follow without a gap", () => {
    const zones = ["America/New_York", "Australia/Lord_Howe", "Asia/Seoul", "Pacific/Apia"];
    fc.assert(
      fc.property(
        fc.constantFrom(...zones),
        fc.integer({ min: 0, max: second("2099-01-01T00:00:00Z") }),
        fc.integer({ min: 0, max: 1439 }),
        (zone, at, minute) => {
          const [hours, minutes] = [Math.floor(minute / 60), minute % 60];
          const time = [hours, minutes].map((one) => String(one).padStart(2, "0")).join(":");
          const week = workweeks({ startsOn: "wednesday", at: time }, zoneClock(zone))(at);
          const day = workdayIn(week, at);
          expect(weekdayOf(week.date)).toBe("wednesday");
          expect(week.start <= at && at < week.end).toBe(true);
          expect(day.start <= at && at < day.end).toBe(true);
          week.days.forEach(({ start, end }, index) => {
            expect(start).toBe(week.days[index - 1]?.end ?? week.start);
            expect(end).toBeGreaterThanOrEqual(start);
          });
        },
      ),
    );
  });
});
