import { describe, expect, test } from "vitest";
import { daySpans, hourMarks } from "@/lib/hours/day-spans";

const HOUR = 3600;
const DAY = 24 * HOUR;
const work = (start: number, end: number) => ({ start, end, kind: "work" as const });

describe("daySpans", () => {
  test("all days of a worker show the same hours, those around all of them", () => {
    const spans = daySpans([
      { start: 0, stretches: [work(6.5 * HOUR, 15 * HOUR)], planned: null },
      {
        start: DAY,
        stretches: [work(DAY + 8 * HOUR, DAY + 12 * HOUR)],
        planned: { from: DAY + 6 * HOUR, to: DAY + 16.5 * HOUR },
      },
      { start: 2 * DAY, stretches: [], planned: null },
    ]);
    expect(spans).toEqual([
      { from: 6 * HOUR, to: 17 * HOUR },
      { from: DAY + 6 * HOUR, to: DAY + 17 * HOUR },
      { from: 2 * DAY + 6 * HOUR, to: 2 * DAY + 17 * HOUR },
    ]);
  });

  test("days with nothing on them have an hour to draw nothing in", () => {
    expect(daySpans([{ start: DAY, stretches: [], planned: null }])).toEqual([
      { from: DAY, to: DAY + HOUR },
    ]);
    expect(daySpans([])).toEqual([]);
  });
});

describe("hourMarks", () => {
  test("marks every second hour of a shift, every fourth of a long day, both ends where they fit", () => {
    expect(hourMarks({ from: 6 * HOUR, to: 16 * HOUR }).map((mark) => mark / HOUR)).toEqual([
      6, 8, 10, 12, 14, 16,
    ]);
    expect(hourMarks({ from: 0, to: 23 * HOUR }).map((mark) => mark / HOUR)).toEqual([
      0, 4, 8, 12, 16, 20,
    ]);
  });
});
