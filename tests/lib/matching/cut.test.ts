import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { cutByDay } from "@/lib/matching/cut";
import { sum } from "@/lib/sum";
import { split } from "@/lib/timeline/split";
import { siteRules } from "@/tests/make/events";

const rules = [{ ...siteRules, timeZone: "America/Chicago", productionDayStartsAtMinutes: 0 }];
/** Midnight in Chicago before Thu 14 May 2026. */
const MIDNIGHT = Date.UTC(2026, 4, 14, 5) / 1000;

describe("cutByDay", () => {
  test("an interval within a day is not cut", () => {
    const interval = { start: MIDNIGHT, end: MIDNIGHT + 60 };
    expect(cutByDay(interval, { shares: [60], item: 0 }, rules)).toEqual([
      { day: "2026-05-14", seconds: 60 },
    ]);
  });
  test("over midnight each day has its own seconds, shared as the whole is", () => {
    const interval = { start: MIDNIGHT - 10, end: MIDNIGHT + 20 };
    const parts = (item: number) => cutByDay(interval, { shares: [20, 10], item }, rules);
    expect(parts(0)).toEqual([
      { day: "2026-05-13", seconds: 7 },
      { day: "2026-05-14", seconds: 13 },
    ]);
    expect(parts(1)).toEqual([
      { day: "2026-05-13", seconds: 3 },
      { day: "2026-05-14", seconds: 7 },
    ]);
  });
  test("over the night on which clocks go back a day has 25 hours", () => {
    const start = Date.UTC(2026, 10, 1, 5) / 1000;
    const interval = { start, end: start + 26 * 3600 };
    expect(cutByDay(interval, { shares: [26 * 3600], item: 0 }, rules)).toEqual([
      { day: "2026-11-01", seconds: 25 * 3600 },
      { day: "2026-11-02", seconds: 3600 },
    ]);
  });
  test("for any items, days sum to each item's share and items to each day's length", () => {
    const lengths = fc.tuple(fc.nat(90_000), fc.integer({ min: 1, max: 200_000 }));
    const weights = fc.array(fc.nat(1000), { minLength: 1, maxLength: 6 });
    fc.assert(
      fc.property(lengths, weights, ([before, length], some) => {
        const interval = { start: MIDNIGHT - before, end: MIDNIGHT - before + length };
        const shares = split(length, some);
        const cuts = shares.map((_, item) => cutByDay(interval, { shares, item }, rules));
        expect(cuts.map((parts) => sum(parts.map(({ seconds }) => seconds)))).toEqual(shares);
        const onDay = (day: string) =>
          sum(cuts.flat().map((part) => (part.day === day ? part.seconds : 0)));
        const first = Math.min(length, Math.max(0, Math.min(before, 86_400)));
        expect(before > 86_400 || onDay("2026-05-13") === first).toBe(true);
        expect(cuts.flat().every(({ seconds }) => seconds > 0)).toBe(true);
      }),
    );
  });
});
