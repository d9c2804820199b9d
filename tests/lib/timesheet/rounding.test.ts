import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { offsetMs } from "@/lib/time/zone";
import { zonedText } from "@/lib/time/zoned-text";
import { fitPaid, roundShift } from "@/lib/timesheet/rounding";
import { payCheck } from "@/tests/make/pay";

const zone = "America/New_York";
const at = (text: string) => Date.parse(text) / 1000;
const nearest = (minutes: 5 | 6 | 10 | 15) => ({ mode: "nearest" as const, minutes });

describe("roundShift", () => {
  const check = payCheck<{ punches: string[] }, { rounded: string[] }>("round-quarter-7-8");
  test(`rounds by quarters (${check.source})`, () => {
    const rounded = check.given.punches.map((time) => {
      const start = at(`2026-06-09T${time}:00-04:00`);
      const { start: moved } = roundShift({ start, end: start }, nearest(15), zone);
      return zonedText(moved, zone).slice(11, 16);
    });
    expect(rounded).toEqual(check.expect.rounded);
  });
  test("the middle goes up, on exact seconds", () => {
    const [before, middle] = [at("2026-06-09T07:07:29-04:00"), at("2026-06-09T07:07:30-04:00")];
    const { start, end } = roundShift({ start: before, end: middle }, nearest(15), zone);
    expect(zonedText(start, zone)).toContain("T07:00:00");
    expect(zonedText(end, zone)).toContain("T07:15:00");
  });
  test("it is the local clock that is rounded", () => {
    const start = at("2026-06-09T07:03:00+05:45");
    const moved = roundShift({ start, end: start }, nearest(10), "Asia/Kathmandu").start;
    expect(zonedText(moved, "Asia/Kathmandu")).toBe("2026-06-09T07:00:00+05:45");
  });
  test("a start just before the clocks change is rounded by the minutes that pass", () => {
    const start = at("2026-03-08T01:55:00-05:00");
    const moved = roundShift({ start, end: start }, nearest(15), zone).start;
    expect(zonedText(moved, zone)).toBe("2026-03-08T03:00:00-04:00");
  });
  test("nothing moves where the policy does not round", () => {
    const shift = { start: 1, end: 2 };
    expect(roundShift(shift, { mode: "none" }, zone)).toEqual(shift);
  });
  test("for any shift, each end moves by at most half a step, to a whole step", () => {
    const seconds = fc.integer({
      min: at("2026-01-01T00:00:00Z"),
      max: at("2027-01-01T00:00:00Z"),
    });
    fc.assert(
      fc.property(seconds, fc.constantFrom(5, 6, 10, 15), (start, minutes) => {
        // safe because the four are those that a policy may name
        const moved = roundShift({ start, end: start }, nearest(minutes as 5), zone).start;
        expect(Math.abs(moved - start)).toBeLessThanOrEqual(minutes * 30);
        expect((moved + offsetMs(start * 1000, zone) / 1000) % (minutes * 60)).toBe(0);
      }),
    );
  });
});

describe("fitPaid", () => {
  const paid = [
    { start: 10, end: 20, rate: "14" },
    { start: 30, end: 40, rate: "20" },
  ];
  const real = { start: 10, end: 40 };
  test("what rounding adds is paid at the rate beside it", () => {
    expect(fitPaid(paid, real, { start: 5, end: 45 })).toEqual([
      { start: 5, end: 10, rate: "14" },
      ...paid,
      { start: 40, end: 45, rate: "20" },
    ]);
  });
  test("what it takes is cut off, breaks untouched", () => {
    expect(fitPaid(paid, real, { start: 12, end: 35 })).toEqual([
      { start: 12, end: 20, rate: "14" },
      { start: 30, end: 35, rate: "20" },
    ]);
    expect(fitPaid(paid, real, { start: 25, end: 40 })).toEqual([paid[1]]);
  });
  test("a shift that is rounded away pays nothing, and neither does one without paid time", () => {
    expect(fitPaid(paid, real, { start: 15, end: 15 })).toEqual([]);
    expect(fitPaid([], real, { start: 0, end: 60 })).toEqual([]);
  });
});
