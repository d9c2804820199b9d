import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { boundaryMs, wallInstants } from "@/lib/time/wall-time";
import { utcMs, wallClock } from "@/lib/time/zone";
import { timeCheck, timeChecks } from "./checks";

type Local = { tz: string; local: string };
const twice = timeCheck<Local, { earlier: string; later: string }>("ambiguous-ny");
const gap = timeCheck<Local, { compatible_or_later: string; earlier: string }>("gap-ny");
const temporal = timeCheck<Local, { earlier: string; later: string }>("temporal-gap");
const shifts = timeChecks<
  { tz: string; in: string; out: string },
  { elapsed_hours: number; wall_clock_hours: number }
>("shift-");
const days = timeCheck<{ tz: string; dates: string[] }, { hours: number[] }>("day-length-ny");
const week = timeCheck<{ tz: string; week_from: string; week_to: string }, { hours: number }>(
  "week-length",
);
const plusDay = timeCheck<{ tz: string; start: string }, { plus_P1D: string; plus_PT24H: string }>(
  "iso-duration",
);

const HOUR_MS = 3_600_000;
const hours = (fromMs: number, toMs: number) => (toMs - fromMs) / HOUR_MS;

describe("wallInstants", () => {
  test(`a time that comes twice has two instants (${twice.source})`, () => {
    expect(wallInstants(twice.given.local, twice.given.tz)).toEqual({
      times: 2,
      earlierMs: Date.parse(twice.expect.earlier),
      laterMs: Date.parse(twice.expect.later),
    });
  });
  test(`a time that the clocks skip has none (${gap.source})`, () => {
    expect(wallInstants(gap.given.local, gap.given.tz)).toEqual({
      times: 0,
      earlierMs: Date.parse(gap.expect.earlier),
      laterMs: Date.parse(gap.expect.compatible_or_later),
    });
  });
  test(`a skipped time moves by the length of the gap (${temporal.source})`, () => {
    const { earlierMs, laterMs } = wallInstants(temporal.given.local, temporal.given.tz);
    expect(earlierMs).toBe(Date.parse(temporal.expect.earlier));
    expect(laterMs).toBe(Date.parse(temporal.expect.later));
  });
  test.each(shifts)(
    "$id lasts $expect.elapsed_hours h ($source)",
    ({ given, expect: expected }) => {
      const start = wallInstants(given.in, given.tz).earlierMs;
      const end = wallInstants(given.out, given.tz).earlierMs;
      expect(hours(start, end)).toBe(expected.elapsed_hours);
    },
  );
  test(`the same time on the next day is not 24 hours later (${plusDay.source})`, () => {
    const start = wallInstants(plusDay.given.start, plusDay.given.tz).earlierMs;
    const nextDay = wallInstants("2026-03-08T12:00", plusDay.given.tz).earlierMs;
    expect(nextDay).toBe(Date.parse(plusDay.expect.plus_P1D));
    expect(start + 24 * HOUR_MS).toBe(Date.parse(plusDay.expect.plus_PT24H));
  });
  test("a corrected zone has no second 01:30 on the night that it gave up", () => {
    expect(wallInstants("2026-11-01T01:30", "America/Vancouver").times).toBe(1);
  });
  test("for any instant and zone, the clock's reading leads back to it", () => {
    const zone = fc.constantFrom(
      "America/New_York",
      "Australia/Lord_Howe",
      "Africa/Casablanca",
      "America/Vancouver",
      "Asia/Kathmandu",
    );
    const start = Date.parse("2024-01-01T00:00:00Z");
    fc.assert(
      fc.property(zone, fc.integer({ min: 0, max: 4 * 366 * 24 * 4 }), (tz, quarters) => {
        const at = start + (quarters * HOUR_MS) / 4;
        const { times, earlierMs, laterMs } = wallInstants(wallClock(at, tz).toString(), tz);
        expect(times).toBeGreaterThan(0);
        expect([earlierMs, laterMs]).toContain(at);
      }),
    );
  });
  test("refuses what is no local time", () => {
    expect(() => wallInstants("half past six", "UTC")).toThrow("half past six");
  });
});

describe("boundaryMs", () => {
  test.each(days.given.dates.map((date, i) => ({ date, long: days.expect.hours[i] })))(
    `$date is $long h long in New York (${days.source})`,
    ({ date, long }) => {
      const next = new Date(Date.parse(date) + 24 * HOUR_MS).toISOString().slice(0, 10);
      const [from, to] = [date, next].map((day) => boundaryMs(`${day}T00:00`, days.given.tz));
      expect(hours(from!, to!)).toBe(long);
    },
  );
  test(`a week with the change is $hours h long (${week.source})`, () => {
    const { week_from, week_to, tz } = week.given;
    const [from, to] = [week_from, week_to].map((day) => boundaryMs(`${day}T00:00`, tz));
    expect(hours(from!, to!)).toBe(week.expect.hours);
  });
  test.each([
    ["one that is skipped is the first instant after the gap", "2026-03-08T02:30", "07:00:00"],
    ["also at the gap's first minute", "2026-03-08T02:00", "07:00:00"],
    ["the gap's last minute is in it", "2026-03-08T02:59", "07:00:00"],
    ["the minute after the gap stands", "2026-03-08T03:00", "07:00:00"],
    ["the minute before the gap stands", "2026-03-08T01:59", "06:59:00"],
  ])("%s", (_, local, utc) => {
    const at = new Date(boundaryMs(local, "America/New_York")).toISOString();
    expect(at).toBe(`2026-03-08T${utc}.000Z`);
  });
  test("one that comes twice is the earlier", () => {
    expect(boundaryMs("2026-11-01T01:30", "America/New_York")).toBe(
      Date.parse("2026-11-01T05:30:00Z"),
    );
  });
  test("a midnight that the clocks skip is the first instant of the day", () => {
    // Beirut puts its clocks forward at midnight (IANA tz database): 29 March 2026 begins at 01:00.
    const start = boundaryMs("2026-03-29T00:00", "Asia/Beirut");
    expect(wallClock(start, "Asia/Beirut").toString()).toBe("2026-03-29T01:00:00");
    expect(utcMs(wallClock(start - 1, "Asia/Beirut"))).toBe(Date.parse("2026-03-28T23:59:59.999Z"));
  });
});
