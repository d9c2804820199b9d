import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { sum } from "@/lib/sum";
import { shareOf, sumDays, sumWindow } from "@/lib/timeline/day-sums";
import type { Doing, Segment, WorkItem } from "@/lib/timeline/schema";

const rules = [{ fromMs: 0, timeZone: "UTC", productionDayStartsAtMinutes: 0 }];
const item = (ticket: string, weight: number): WorkItem => ({ ticket, operation: "120", weight });
const run: Doing = { kind: "work", activity: "run", items: [item("26048176", 1)] };

function segment(start: number, end: number | null, doing: Doing): Segment {
  return { start, end, doing, cell: "mill", said: false, event: "one" };
}

const shift = [
  segment(0, 600, { kind: "unassigned" }),
  segment(600, 4000, run),
  segment(4000, 4900, { kind: "rest" }),
  segment(4900, 8000, { kind: "work", activity: "rework", items: [item("26048176", 1)] }),
  segment(8000, 9800, { kind: "meal" }),
  segment(9800, 10_000, { kind: "indirect", code: "cleaning" }),
  segment(10_000, null, { kind: "work", activity: "setup", items: [item("26048176", 1)] }),
];

describe("sumWindow", () => {
  test("tells what a shift was made of, and cuts what runs at now", () => {
    expect(sumWindow(shift, { start: 0, end: 86_400 }, 10_050)).toEqual({
      spanSeconds: 10_050,
      attendanceSeconds: 8250,
      directSeconds: 6550,
      setupSeconds: 50,
      runSeconds: 3400,
      reworkSeconds: 3100,
      inspectSeconds: 0,
      indirectSeconds: 200,
      restSeconds: 900,
      mealSeconds: 1800,
      unassignedSeconds: 600,
    });
  });
  test("cuts at both bounds of the window", () => {
    const sums = sumWindow(shift, { start: 500, end: 700 }, 10_050);
    expect([sums.unassignedSeconds, sums.runSeconds, sums.spanSeconds]).toEqual([100, 100, 200]);
  });
  test("a segment that begins after now counts nothing", () => {
    expect(sumWindow(shift.slice(-1), { start: 0, end: 86_400 }, 9000).spanSeconds).toBe(0);
  });
  test("a window that ends before now ends what runs too", () => {
    expect(sumWindow(shift.slice(-1), { start: 0, end: 10_020 }, 20_000).setupSeconds).toBe(20);
  });
});

describe("sumDays", () => {
  test("a segment over midnight gives each day its own seconds", () => {
    const days = sumDays([segment(86_000, 86_500, run)], rules, 0);
    expect([...days].map(([date, sums]) => [date, sums.runSeconds])).toEqual([
      ["1970-01-01", 400],
      ["1970-01-02", 100],
    ]);
  });
  test("days come by date, whatever the order of the segments", () => {
    const [late, early] = [segment(260_000, 260_100, run), segment(10, 20, { kind: "meal" })];
    expect([...sumDays([late, early], rules, 0).keys()]).toEqual(["1970-01-01", "1970-01-04"]);
  });
  test("what runs counts until now, over midnight too", () => {
    const days = sumDays([segment(86_000, null, run)], rules, 86_500);
    expect(days.get("1970-01-02")?.attendanceSeconds).toBe(100);
  });
  test("nothing attended is no day", () => {
    expect(sumDays([], rules, 0).size).toBe(0);
  });
  test("for any segments, the days sum to the whole and its parts to attendance", () => {
    const doing = fc.constantFrom<Doing>(
      run,
      { kind: "rest" },
      { kind: "meal" },
      { kind: "unassigned" },
      { kind: "indirect", code: "meeting" },
    );
    const lengths = fc.array(fc.tuple(fc.integer({ min: 1, max: 200_000 }), doing), {
      minLength: 1,
      maxLength: 8,
    });
    fc.assert(
      fc.property(lengths, (list) => {
        let at = 0;
        const segments = list.map(([seconds, what]) => {
          at += seconds;
          return segment(at - seconds, at, what);
        });
        const days = [...sumDays(segments, rules, at).values()];
        expect(sum(days.map(({ spanSeconds }) => spanSeconds))).toBe(at);
        for (const day of days) {
          const { directSeconds, indirectSeconds, restSeconds, unassignedSeconds } = day;
          const parts = directSeconds + indirectSeconds + restSeconds + unassignedSeconds;
          expect(parts).toBe(day.attendanceSeconds);
          expect(day.attendanceSeconds + day.mealSeconds).toBe(day.spanSeconds);
        }
      }),
    );
  });
});

describe("shareOf", () => {
  const two: Doing = { ...run, items: [item("26048176", 300), item("26048184", 100)] };
  test("shares an interval by the weights that were booked with it", () => {
    expect(shareOf(segment(0, 101, two), 0).map(({ seconds }) => seconds)).toEqual([76, 25]);
  });
  test("shares what runs until now", () => {
    expect(shareOf(segment(0, null, two), 40).map(({ seconds }) => seconds)).toEqual([30, 10]);
    expect(shareOf(segment(50, null, two), 40).map(({ seconds }) => seconds)).toEqual([0, 0]);
  });
  test("time without a ticket has no shares", () => {
    expect(shareOf(segment(0, 100, { kind: "rest" }), 0)).toEqual([]);
  });
});
