import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { groupBy } from "@/lib/group-by";
import { liftHours } from "@/lib/pay/overtime";
import { policyOf } from "@/lib/pay/presets";
import type { PayPolicy, Tier } from "@/lib/pay/schema";
import { secondsOf } from "@/lib/time/stretches";
import { workweekFrom } from "@/lib/time/workweek";
import { zoneClock } from "@/lib/time/zone-clock";

const HOUR = 3600;
const week = workweekFrom("2026-06-07", "00:00", zoneClock("America/Los_Angeles"));
const california = policyOf("us-california").overtime;

/** One piece a day with so many seconds; none where it is 0. */
function pieces(seconds: readonly number[]) {
  return week.days.flatMap(({ date, start }, day) => {
    const length = seconds[day] ?? 0;
    return length > 0 ? [{ start, end: start + length, rate: null, week: week.date, date }] : [];
  });
}

/** Hours as "rule bucket", in the order in which they came. */
function lifted(hours: readonly number[], overtime: Partial<PayPolicy["overtime"]>) {
  const none = { daily: [], weekly: [], seventhDay: [] };
  const parts = liftHours(pieces(hours.map((one) => one * HOUR)), week, { ...none, ...overtime });
  const groups = groupBy(parts, ({ rule, bucket }) => `${rule} ${bucket}`);
  return Object.fromEntries([...groups].map(([key, group]) => [key, secondsOf(group) / HOUR]));
}

const tier = (overHours: number, bucket: Tier["bucket"]): Tier => ({ overHours, bucket });

describe("liftHours", () => {
  test("weekly overtime falls on the last of what no daily rule lifted", () => {
    const parts = liftHours(pieces(Array(6).fill(9 * HOUR)), week, california);
    const weekly = parts.filter(({ rule }) => rule === "weekly");
    expect(new Set(weekly.map(({ date }) => date))).toEqual(new Set(["2026-06-12"]));
    expect(secondsOf(weekly)).toBe(8 * HOUR);
  });
  test("the seventh day needs work on all seven", () => {
    expect(lifted([8, 8, 8, 8, 8, 8, 8], california)).toEqual({
      "regular regular": 40,
      "weekly overtime": 8,
      "seventh-day overtime": 8,
    });
    expect(lifted([0, 8, 8, 8, 8, 8, 8], california)).toEqual({
      "regular regular": 40,
      "weekly overtime": 8,
    });
  });
  test("a seventh day of 14 hours is double from the eighth on", () => {
    expect(lifted([1, 1, 1, 1, 1, 1, 14], california)).toEqual({
      "regular regular": 6,
      "seventh-day overtime": 8,
      "seventh-day double": 4,
      "daily double": 2,
    });
  });
  test("where two rules meet, the higher bucket wins", () => {
    const rules = { daily: [tier(8, "overtime")], weekly: [tier(10, "double")] };
    expect(lifted([8, 4], rules)).toEqual({
      "regular regular": 10,
      "weekly double": 2,
    });
    expect(lifted([10, 10], rules)).toEqual({
      "regular regular": 10,
      "daily overtime": 2,
      "weekly double": 8,
    });
  });
  test("tiers may come in any order, and parts of an hour", () => {
    const rules = { daily: [tier(10, "double"), tier(7.5, "overtime")] };
    expect(lifted([11], rules)).toEqual({
      "regular regular": 7.5,
      "daily overtime": 2.5,
      "daily double": 1,
    });
  });
  test("without tiers all is regular, without time there is nothing", () => {
    expect(lifted([24, 24], {})).toEqual({ "regular regular": 48 });
    expect(lifted([], california)).toEqual({});
  });

  const days = fc.array(fc.integer({ min: 0, max: 24 * HOUR }), { minLength: 7, maxLength: 7 });
  const tiers = fc.array(
    fc.record({
      overHours: fc.integer({ min: 0, max: 60 }),
      bucket: fc.constantFrom<Tier["bucket"]>("overtime", "double"),
    }),
    { maxLength: 3 },
  );
  test("for any week and tiers, every second is in one bucket, in order", () => {
    fc.assert(
      fc.property(days, tiers, tiers, tiers, (seconds, daily, weekly, seventhDay) => {
        const given = pieces(seconds);
        const parts = liftHours(given, week, { daily, weekly, seventhDay });
        expect(secondsOf(parts)).toBe(secondsOf(given));
        parts.forEach(({ start, end }, index) => {
          expect(end).toBeGreaterThan(start);
          expect(start).toBeGreaterThanOrEqual(parts[index - 1]?.end ?? 0);
        });
      }),
    );
  });
  test("for any week in California, regular time is at most 8 hours a day and 40 a week", () => {
    fc.assert(
      fc.property(days, (seconds) => {
        const parts = liftHours(pieces(seconds), week, california);
        const regular = parts.filter(({ bucket }) => bucket === "regular");
        expect(secondsOf(regular)).toBeLessThanOrEqual(40 * HOUR);
        for (const [date, group] of groupBy(parts, (part) => part.date)) {
          const ofDay = regular.filter((part) => part.date === date);
          expect(secondsOf(ofDay)).toBeLessThanOrEqual(Math.min(8 * HOUR, secondsOf(group)));
        }
        // the greater of daily and weekly excess, never their sum (Monzon v. Schaefer, 1990)
        const all = seconds.reduce((total, one) => total + one, 0);
        const dailyExcess = seconds.reduce((total, one) => total + Math.max(0, one - 8 * HOUR), 0);
        const isSeventh = seconds.every((one) => one > 0);
        if (isSeventh) return;
        expect(all - secondsOf(regular)).toBe(Math.max(dailyExcess, all - 40 * HOUR, 0));
      }),
    );
  });
});
