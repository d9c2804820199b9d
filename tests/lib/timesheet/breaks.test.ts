import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { secondsOf } from "@/lib/time/stretches";
import { judgeBreaks } from "@/lib/timesheet/breaks";
import type { Span } from "@/lib/timesheet/shifts";

const MINUTE = 60;
const rules = {
  restPaidUpToMinutes: 20,
  restLimitAnnounced: false,
  mealUnpaidFromMinutes: 30,
  mealAtMostMinutes: 75,
};

/** A shift of an hour's work, a break of so many seconds, an hour's work. */
function judged(kind: "rest" | "meal" | "gap", seconds: number, more: Partial<typeof rules> = {}) {
  const work = { kind: "work" as const, rate: null };
  const [breakStart, breakEnd] = [3600, 3600 + seconds];
  const spans: Span[] = [
    { ...work, start: 0, end: breakStart },
    ...(kind === "gap" ? [] : [{ kind, rate: null, start: breakStart, end: breakEnd }]),
    { ...work, start: breakEnd, end: breakEnd + 3600 },
  ];
  const shift = { start: 0, end: breakEnd + 3600, spans };
  const { paid, steps, warnings } = judgeBreaks(shift, { ...rules, ...more });
  return {
    paidSeconds: secondsOf(paid) - 2 * 3600,
    steps: steps.map(({ rule, start, end }) => [rule, end - start]),
    warnings: warnings.map(({ code }) => code),
  };
}

describe("judgeBreaks: rests (29 CFR 785.18)", () => {
  test.each([
    [20 * MINUTE, 20 * MINUTE, []],
    [20 * MINUTE + 1, 20 * MINUTE + 1, ["rest-long"]],
    [30 * MINUTE - 1, 30 * MINUTE - 1, ["rest-long"]],
    [30 * MINUTE, 20 * MINUTE, ["rest-long"]],
    [50 * MINUTE, 20 * MINUTE, ["rest-long"]],
  ])("one of %i s is paid %i s", (length, paidSeconds, warnings) => {
    expect(judged("rest", length)).toMatchObject({ paidSeconds, warnings });
  });
  test("where the limit was announced, the excess is unpaid at once", () => {
    expect(judged("rest", 25 * MINUTE, { restLimitAnnounced: true })).toEqual({
      paidSeconds: 20 * MINUTE,
      steps: [
        ["rest-paid", 20 * MINUTE],
        ["rest-unpaid", 5 * MINUTE],
      ],
      warnings: ["rest-long"],
    });
  });
  test("a policy that pays no rest pays none that was announced", () => {
    const none = { restPaidUpToMinutes: 0, restLimitAnnounced: true };
    expect(judged("rest", 5 * MINUTE, none)).toMatchObject({
      paidSeconds: 0,
      steps: [["rest-unpaid", 300]],
    });
  });
});

describe("judgeBreaks: meals (29 CFR 785.19)", () => {
  test.each([
    // Donohue v. AMN (Cal. 2021): 23 minutes are 23, never rounded to 30
    [23 * MINUTE, 23 * MINUTE, "meal-paid", ["meal-short"]],
    [30 * MINUTE - 1, 30 * MINUTE - 1, "meal-paid", ["meal-short"]],
    [30 * MINUTE, 0, "meal-unpaid", []],
    [75 * MINUTE, 0, "meal-unpaid", []],
    [75 * MINUTE + 1, 0, "meal-unpaid", ["meal-long"]],
  ])("one of %i s is paid %i s", (length, paidSeconds, rule, warnings) => {
    expect(judged("meal", length)).toEqual({ paidSeconds, steps: [[rule, length]], warnings });
  });
});

describe("judgeBreaks: gaps", () => {
  test.each([
    [20 * MINUTE, ["gap-short"]],
    [20 * MINUTE + 1, []],
  ])("one of %i s is off duty and unpaid", (length, warnings) => {
    expect(judged("gap", length)).toEqual({
      paidSeconds: 0,
      steps: [["off-duty", length]],
      warnings,
    });
  });
});

describe("judgeBreaks", () => {
  test("for any shift, paid time and unpaid steps make up every second once", () => {
    const kinds = fc.constantFrom<Span["kind"]>("work", "rest", "meal");
    const parts = fc.array(fc.tuple(kinds, fc.integer({ min: 1, max: 7200 }), fc.nat(3600)), {
      minLength: 1,
    });
    fc.assert(
      fc.property(parts, fc.boolean(), (drawn, restLimitAnnounced) => {
        let at = 0;
        const spans = drawn.map(([kind, length, gap]) => {
          const start = at;
          at = start + length + gap;
          return { kind, rate: null, start, end: start + length };
        });
        const shift = { start: 0, end: spans.at(-1)!.end, spans };
        const { paid, steps } = judgeBreaks(shift, { ...rules, restLimitAnnounced });
        const unpaid = steps.filter(({ rule }) => !rule.endsWith("-paid"));
        const all = [...paid, ...unpaid].toSorted((a, b) => a.start - b.start);
        expect(all.map(({ start }) => start)).toEqual(
          [0, ...all.map(({ end }) => end)].slice(0, -1),
        );
        expect(all.at(-1)!.end).toBe(shift.end);
      }),
    );
  });
});
