import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { payStatement } from "@/lib/pay/statement";
import { governedWeeks } from "@/lib/policies/governed";
import type { PolicyBook } from "@/lib/policies/in-force";
import { workerStatement } from "@/lib/policies/statement";
import { sum } from "@/lib/sum";
import { zoneClock } from "@/lib/time/zone-clock";
import { localSpans, makePolicyBook, makeVersion, workedFrom, ZONE } from "@/tests/make/policies";

const clock = zoneClock(ZONE);
const june = { from: "2026-06-01", to: "2026-07-01" };

function stated(book: PolicyBook, spans: Parameters<typeof workerStatement>[0], dates = june) {
  return workerStatement(spans, governedWeeks(book, "w1", dates, clock), dates, clock);
}

const hours = (days: ReturnType<typeof stated>["days"]) => ({
  regular: sum(days.map(({ buckets }) => buckets.regular)) / 3600,
  overtime: sum(days.map(({ buckets }) => buckets.overtime)) / 3600,
});

describe("workerStatement", () => {
  test("is the statement of the calculator where one version governs all of it", () => {
    const spans = workedFrom("2026-06-07", [0, 9, 9, 9, 9, 9, 0, 0, 10]);
    const asked = spans.map(({ start, end, kind }) => {
      const text = (second: number) => new Date(second * 1000).toISOString();
      return { start: text(start), end: text(end), kind };
    });
    const answer = payStatement({
      timeZone: ZONE,
      ...june,
      policy: "us-federal",
      spans: asked,
      extras: [],
    });
    const { days, warnings } = stated(makePolicyBook(), spans);
    expect(days.map(({ workweek, policy, ...day }) => day)).toEqual(
      answer.workweeks.flatMap((week) => week.days),
    );
    expect(warnings).toEqual(answer.warnings);
    expect(days[0]).toMatchObject({ workweek: "2026-06-07", policy: "us-federal 1" });
  });
  test("a workweek that the range cuts is worked out whole, and its days are shown inside", () => {
    const spans = workedFrom("2026-06-07", [0, 10, 10, 10, 10, 10]);
    const { days } = stated(makePolicyBook(), spans, { from: "2026-06-12", to: "2026-06-20" });
    expect(days.map(({ date, buckets }) => [date, buckets.overtime / 3600])).toEqual([
      ["2026-06-12", 10],
    ]);
  });
  test("a new version pays its own workweeks only", () => {
    const daily = { daily: [{ overHours: 8, bucket: "overtime" as const }] };
    const book = makePolicyBook([
      makeVersion("2026-01-01"),
      makeVersion("2026-06-10", {
        version: 2,
        policy: { workweek: { startsOn: "sunday" }, overtime: daily },
      }),
    ]);
    const { days } = stated(book, workedFrom("2026-06-08", [10, 0, 0, 0, 0, 0, 0, 10]));
    expect(days.map(({ policy, buckets }) => [policy, buckets.overtime / 3600])).toEqual([
      ["us-federal 1", 0],
      ["us-federal 2", 2],
    ]);
  });
});

describe("workerStatement: a changed start of the workweek (29 CFR 778.301-.302)", () => {
  /** From Sunday to Friday: Friday 19 and Saturday 20 June lie in both. */
  const moved = makePolicyBook([
    makeVersion("2026-01-01"),
    makeVersion("2026-06-16", {
      version: 2,
      policy: {
        workweek: { startsOn: "friday" },
        overtime: { weekly: [{ overHours: 40, bucket: "overtime" }] },
      },
    }),
  ]);
  test("the shared days count in the old workweek where that pays more", () => {
    const { days } = stated(moved, workedFrom("2026-06-15", [10, 10, 10, 10, 10]));
    expect(hours(days)).toEqual({ regular: 40, overtime: 10 });
    expect(days.at(-1)).toMatchObject({ date: "2026-06-19", workweek: "2026-06-14" });
  });
  test("and in the new one where that pays more", () => {
    const spans = workedFrom("2026-06-19", [10, 0, 0, 10, 10, 10, 10]);
    const { days } = stated(moved, spans);
    expect(hours(days)).toEqual({ regular: 40, overtime: 10 });
    expect(days[0]).toMatchObject({ date: "2026-06-19", workweek: "2026-06-19" });
  });
  test("a range after the shared days pays by the same choice", () => {
    const spans = workedFrom("2026-06-19", [10, 0, 0, 10, 10, 10, 10]);
    const { days } = stated(moved, spans, { from: "2026-06-22", to: "2026-06-30" });
    expect(hours(days)).toEqual({ regular: 30, overtime: 10 });
  });
  test("for any work around the change, every second is paid once, in no less than either way", () => {
    const lengths = fc.array(fc.integer({ min: 0, max: 14 }), { minLength: 21, maxLength: 21 });
    fc.assert(
      fc.property(lengths, (each) => {
        const { days } = stated(moved, workedFrom("2026-06-08", each));
        expect(sum(days.map(({ paidSeconds }) => paidSeconds))).toBe(sum(each) * 3600);
        const old = sum(each.slice(6, 13));
        const late = sum(each.slice(11, 18));
        const atLeast = Math.max(
          Math.max(0, old - 40) + Math.max(0, sum(each.slice(13, 18)) - 40),
          Math.max(0, sum(each.slice(6, 11)) - 40) + Math.max(0, late - 40),
        );
        const others =
          Math.max(0, sum(each.slice(0, 6)) - 40) + Math.max(0, sum(each.slice(18)) - 40);
        expect(hours(days).overtime).toBe(atLeast + others);
      }),
    );
  });
  test("a shift over the changed boundary is cut where it is counted", () => {
    const spans = localSpans([["2026-06-18T20:00", "2026-06-19T04:00"]]);
    const { days } = stated(moved, spans);
    expect(days.map(({ date, paidSeconds }) => [date, paidSeconds / 3600])).toEqual([
      ["2026-06-18", 4],
      ["2026-06-19", 4],
    ]);
  });
});
