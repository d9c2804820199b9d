import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { secondsOf } from "@/lib/time/stretches";
import { type Span, shiftsOf, tidySpans } from "@/lib/timesheet/shifts";

const HOUR = 3600;
const span = (start: number, end: number, kind: Span["kind"] = "work", rate?: string): Span => {
  return { start, end, kind, rate: rate ?? null };
};

describe("tidySpans", () => {
  test("puts spans in order and drops those of no length", () => {
    expect(tidySpans([span(20, 30), span(5, 5, "rest"), span(0, 10)])).toEqual([
      span(0, 10),
      span(20, 30),
    ]);
  });
  test("two spans of a break that touch are one break; with work or a gap between they are two", () => {
    expect(tidySpans([span(0, 15, "rest"), span(15, 30, "rest")])).toEqual([span(0, 30, "rest")]);
    const apart = [span(0, 15, "meal"), span(15, 16), span(16, 30, "meal"), span(31, 40, "meal")];
    expect(tidySpans(apart)).toEqual(apart);
    const unlike = [span(0, 15, "meal"), span(15, 30, "rest")];
    expect(tidySpans(unlike)).toEqual(unlike);
  });
  test("a break takes the rate of the work before it, else after", () => {
    const spans = [
      span(0, 1, "rest"),
      span(1, 2, "work", "14"),
      span(2, 3, "rest"),
      span(3, 4, "work", "20"),
      span(4, 5, "meal"),
      span(5, 6, "rest", "9"),
    ];
    expect(tidySpans(spans).map(({ rate }) => rate)).toEqual(["14", "14", "14", "20", "20", "9"]);
    expect(tidySpans([span(0, 1), span(1, 2, "rest")]).map(({ rate }) => rate)).toEqual([
      null,
      null,
    ]);
  });
});

describe("shiftsOf", () => {
  test.each([
    ["a gap of 240 minutes", 4 * HOUR, 2],
    ["a gap of a second less", 4 * HOUR - 1, 1],
    ["no gap", 0, 1],
  ])("%s parts %i seconds into %i", (_, gap, count) => {
    const spans = [span(0, HOUR), span(HOUR + gap, 2 * HOUR + gap)];
    const shifts = shiftsOf(spans, 240);
    expect(shifts).toHaveLength(count);
    expect([shifts[0]!.start, shifts.at(-1)!.end]).toEqual([0, 2 * HOUR + gap]);
  });
  test("no spans are no shifts", () => expect(shiftsOf([], 240)).toEqual([]));
  test("for any spans, every second is in one shift, and shifts lie apart", () => {
    const lengths = fc.array(fc.tuple(fc.nat(9 * HOUR), fc.integer({ min: 1, max: 9 * HOUR })));
    fc.assert(
      fc.property(lengths, fc.integer({ min: 1, max: 600 }), (steps, minutes) => {
        let at = 0;
        const spans = steps.map(([gap, length]) => {
          const start = at + gap;
          at = start + length;
          return span(start, at);
        });
        const shifts = shiftsOf(spans, minutes);
        expect(secondsOf(shifts.flatMap((shift) => shift.spans))).toBe(secondsOf(spans));
        shifts.slice(1).forEach((shift, index) => {
          expect(shift.start - shifts[index]!.end).toBeGreaterThanOrEqual(minutes * 60);
        });
      }),
    );
  });
});
