import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { type ActivitySeconds, addHours, hourSums, NO_HOURS } from "@/lib/hours/sums";
import { sumWindow } from "@/lib/timeline/day-sums";
import type { Doing } from "@/lib/timeline/schema";

const activities = [
  "setup",
  "run",
  "rework",
  "inspect",
  "indirect",
  "meal",
  "rest",
  "unassigned",
] as const;

const rows = fc.array(
  fc.record({ activity: fc.constantFrom(...activities), seconds: fc.nat(50_000) }),
);

const doingOf = (activity: (typeof activities)[number]): Doing => {
  if (activity === "indirect") return { kind: "indirect", code: "cleaning" };
  if (activity === "meal" || activity === "rest" || activity === "unassigned") {
    return { kind: activity };
  }
  return { kind: "work", activity, items: [{ ticket: "1", operation: "1", weight: 1 }] };
};

/** The rows as segments, one after the other. */
function segmentsOf(all: readonly ActivitySeconds[]) {
  let at = 0;
  return all.map(({ activity, seconds }) => {
    const start = at;
    at += seconds;
    const rest = { cell: null, said: false, event: "e" };
    return { start, end: at, doing: doingOf(activity), ...rest };
  });
}

describe("hourSums", () => {
  test("attended is direct, indirect, rest and unassigned; a meal is not; rework is direct", () => {
    const sums = hourSums(activities.map((activity, at) => ({ activity, seconds: 10 ** at })));
    expect(sums).toEqual({
      attendedSeconds: 11_011_111,
      directSeconds: 1111,
      indirectSeconds: 10_000,
      restSeconds: 1_000_000,
      unassignedSeconds: 10_000_000,
      mealSeconds: 100_000,
    });
    expect(hourSums([])).toEqual(NO_HOURS);
  });

  test("for any time, it says what the timeline's own sums say", () => {
    fc.assert(
      fc.property(rows, (all) => {
        const segments = segmentsOf(all);
        const end = segments.at(-1)?.end ?? 0;
        const expected = sumWindow(segments, { start: 0, end: end + 1 }, end);
        const { attendedSeconds, ...parts } = hourSums(all);
        expect(attendedSeconds).toBe(expected.attendanceSeconds);
        expect(expected).toMatchObject(parts);
      }),
    );
  });
});

describe("addHours", () => {
  test("adds every column", () => {
    const one = hourSums([
      { activity: "run", seconds: 5 },
      { activity: "meal", seconds: 7 },
    ]);
    expect(addHours([one, one])).toMatchObject({ attendedSeconds: 10, mealSeconds: 14 });
    expect(addHours([])).toEqual(NO_HOURS);
  });
});
