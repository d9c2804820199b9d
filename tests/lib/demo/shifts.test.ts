import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { calendarAt, TIME_ZONE } from "@/lib/demo/calendar";
import { cast } from "@/lib/demo/cast";
import { plannedShifts } from "@/lib/demo/shifts";
import { offsetMs } from "@/lib/time/zone";

const calendar = calendarAt(Date.parse("2026-05-14T16:20:00Z"));
const shifts = plannedShifts(calendar, cast);
const SECONDS_A_DAY = 86_400;

/** The clocks were put forward in the 24 hours before. */
const isAdvance = (at: number) =>
  offsetMs(at * 1000, TIME_ZONE) > offsetMs((at - SECONDS_A_DAY) * 1000, TIME_ZONE);

describe("plannedShifts", () => {
  test("for any minute of the history, at least two people are planned who come", () => {
    const first = calendar.startsAt + 7 * 3_600;
    fc.assert(
      fc.property(fc.integer({ min: first, max: calendar.endsAt + SECONDS_A_DAY }), (at) => {
        const isIn = shifts.filter(({ start, end, attends }) => attends && start <= at && at < end);
        expect(isIn.length).toBeGreaterThanOrEqual(2);
      }),
      { numRuns: 1_000 },
    );
  });

  test("nobody has two shifts at once, and eleven hours lie between them unless the clocks take one", () => {
    for (const { number } of cast) {
      const own = shifts.filter(({ worker }) => worker === number);
      for (const [at, shift] of own.slice(1).entries()) {
        expect(shift.start - own[at]!.end).toBeGreaterThanOrEqual(
          isAdvance(shift.start) ? 10.5 * 3_600 : 11 * 3_600,
        );
      }
    }
  });

  test("some have a week of holiday and some fall ill", () => {
    const absent = shifts.filter(({ attends }) => !attends).length / shifts.length;
    expect(absent).toBeGreaterThan(0.01);
    expect(absent).toBeLessThan(0.08);
    const ofDay = cast.filter(({ pattern }) => pattern === "day");
    const planned = ofDay.map(
      ({ number }) => shifts.filter((each) => each.worker === number && each.day >= 0).length,
    );
    expect(new Set(planned).size).toBe(2);
  });

  test("of a crew of two nobody is ever away", () => {
    const two = cast.filter(({ pattern }) => pattern === "weekend-night").slice(0, 2);
    const nights = plannedShifts(calendar, two);
    expect(nights.length).toBeGreaterThan(40);
    expect(nights.filter(({ attends }) => !attends)).toEqual([]);
  });

  test("are the same each time", () => {
    expect(plannedShifts(calendar, cast)).toEqual(shifts);
  });
});
