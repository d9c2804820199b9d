import { describe, expect, test } from "vitest";
import { groupBy } from "@/lib/group-by";
import { warnEuropean } from "@/lib/limits/european";
import type { ShiftFacts } from "@/lib/limits/shift-facts";
import { addDays } from "@/lib/time/site-day";
import { workweeks } from "@/lib/time/workweek";
import { zoneClock } from "@/lib/time/zone-clock";
import { payCheck } from "@/tests/make/pay";
import { shiftOn } from "@/tests/make/shift-facts";

const zone = "Europe/Madrid";
const HOUR = 3600;

/** The warnings of some shifts as "code date". */
function found(shifts: readonly ShiftFacts[]): string[] {
  const weekAt = workweeks({ startsOn: "monday", at: "00:00" }, zoneClock(zone));
  const byWeek = groupBy(shifts, ({ start }) => weekAt(start).date);
  const weeks = [...byWeek.values()].map((group) => ({
    week: weekAt(group[0]!.start),
    workedSeconds: group.reduce((total, { workedSeconds }) => total + workedSeconds, 0),
  }));
  return warnEuropean(shifts, weeks, zoneClock(zone)).map(({ code, date }) => `${code} ${date}`);
}

const only = (code: string, shifts: readonly ShiftFacts[]) =>
  found(shifts).filter((warning) => warning.startsWith(code));

/** Weeks of five equal days from Monday 5 January 2026, with a break in each; 0 is a week off. */
function weeksOf(hours: readonly number[]): ShiftFacts[] {
  return hours.flatMap((total, week) =>
    total === 0
      ? []
      : Array.from({ length: 5 }, (_, day) => {
          const shift = shiftOn(addDays("2026-01-05", 7 * week + day), "08:00", "20:00");
          return { ...shift, workedSeconds: (total * HOUR) / 5 };
        }),
  );
}

describe("warnEuropean: daily rest (art. 3)", () => {
  const check = payCheck<unknown, { earliest_next_start: string }>("eu-daily-rest");
  const evening = shiftOn("2026-06-09", "14:30", "22:30");
  const earliest = check.expect.earliest_next_start.slice(11);
  test.each([
    ["08:00", ["daily-rest 2026-06-10"]],
    ["09:29", ["daily-rest 2026-06-10"]],
    [earliest, []],
  ])("after 22:30 a start at %s", (start, warnings) => {
    expect(only("daily-rest", [evening, shiftOn("2026-06-10", start, "16:00")])).toEqual(warnings);
  });
  test("a shift of more than 13 hours leaves no eleven in its 24", () => {
    expect(only("daily-rest", [shiftOn("2026-06-09", "08:00", "21:00")])).toEqual([]);
    expect(only("daily-rest", [shiftOn("2026-06-09", "08:00", "21:01")])).toEqual([
      "daily-rest 2026-06-09",
    ]);
  });
  test("in a day of two shifts the longest rest counts", () => {
    const split = [
      shiftOn("2026-06-09", "06:00", "10:00"),
      shiftOn("2026-06-09", "15:00", "19:00"),
    ];
    const next = (from: string) => shiftOn("2026-06-10", from, "10:00");
    expect(only("daily-rest", [...split, next("06:00")])).toEqual([]);
    expect(only("daily-rest", [...split, next("05:30")])).toContain("daily-rest 2026-06-10");
  });
});

describe("warnEuropean: breaks (art. 4)", () => {
  const check = payCheck<{ day_minutes: number[] }, { break_required: boolean[] }>(
    "eu-break-boundary",
  );
  test("one is due in a day of more than six hours", () => {
    const required = check.given.day_minutes.map((minutes) => {
      const end = `14:${String(minutes - 360).padStart(2, "0")}`;
      return only("break-missing", [shiftOn("2026-06-09", "08:00", end)]).length > 0;
    });
    expect(required).toEqual(check.expect.break_required);
  });
  test.each(["rest", "meal", "gap"] as const)("a %s is a break", (kind) => {
    const shift = shiftOn("2026-06-09", "08:00", "16:00", [["12:00", "12:15", kind]]);
    expect(only("break-missing", [shift])).toEqual([]);
  });
});

describe("warnEuropean: weekly rest (art. 5)", () => {
  const days = (first: string, count: number, to = "16:00") =>
    Array.from({ length: count }, (_, day) => shiftOn(addDays(first, day), "08:00", to));
  test("six days with 40 hours after them are enough, seven are not", () => {
    expect(only("weekly-rest", [...days("2026-06-08", 6), ...days("2026-06-15", 1)])).toEqual([]);
    expect(only("weekly-rest", [...days("2026-06-08", 7), ...days("2026-06-15", 1)])).toEqual([
      "weekly-rest 2026-06-14",
    ]);
  });
  test("35 hours are enough, a minute less is not", () => {
    const monday = shiftOn("2026-06-15", "07:00", "15:00");
    const saturday = (to: string) => [...days("2026-06-08", 5), shiftOn("2026-06-13", "08:00", to)];
    expect(only("weekly-rest", [...saturday("20:00"), monday])).toEqual([]);
    expect(only("weekly-rest", [...saturday("20:01"), monday])).toEqual(["weekly-rest 2026-06-14"]);
  });
  test("a rest that began in the week before counts as far as it lies in this one", () => {
    const later = [...days("2026-06-17", 5), ...days("2026-06-22", 1)];
    expect(only("weekly-rest", [...days("2026-06-08", 5), ...later])).toEqual([]);
  });
});

describe("warnEuropean: the weekly average (art. 6 and 16)", () => {
  test("40 hours and 12 more in ten of 17 weeks are within 48 (UK guidance, example 1)", () => {
    const { given } = payCheck<Record<string, number>, unknown>("uk-wtr-17w-ex1");
    const { weeks, standard_week: standard, overtime_per_week: more } = given;
    const hours = Array.from({ length: weeks! }, (_, week) => standard! + (week >= 7 ? more! : 0));
    expect(only("weekly-average", weeksOf(hours))).toEqual([]);
  });
  test("leave is neutral, not nought (art. 16(b))", () => {
    const { given } = payCheck<Record<string, number>, unknown>("eu-average-leave-neutral");
    const hours = Array.from({ length: given.weeks! }, (_, week) =>
      week < given.annual_leave_weeks! ? 0 : given.hours_each!,
    );
    expect(only("weekly-average", weeksOf(hours)).at(-1)).toBe("weekly-average 2026-05-03");
  });
  test("exactly 48 is within, and the eighteenth week back is out", () => {
    expect(only("weekly-average", weeksOf(Array(17).fill(48)))).toEqual([]);
    const once = [60, ...Array(17).fill(48)];
    expect(only("weekly-average", weeksOf(once))).toHaveLength(17);
    expect(only("weekly-average", weeksOf(once)).at(-1)).toBe("weekly-average 2026-05-03");
  });
});

describe("warnEuropean: night work (art. 8)", () => {
  const nights = (from: string, to: string, count: number) =>
    Array.from({ length: count }, (_, day) =>
      shiftOn(addDays("2026-06-08", day), from, to, [["02:00", "02:20", "rest"]]),
    );
  test("more than eight hours a day on average, of six days a week", () => {
    expect(only("night-average", nights("22:00", "07:36", 5))).toEqual([]);
    expect(only("night-average", nights("22:00", "07:37", 5))).toEqual([
      "night-average 2026-06-14",
    ]);
  });
  test("who works less than three hours of most nights is no night worker", () => {
    expect(only("night-average", nights("15:00", "01:59", 5))).toEqual([]);
    expect(only("night-average", nights("15:00", "02:00", 5))).toHaveLength(1);
  });
});
