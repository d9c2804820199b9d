import { describe, expect, test } from "vitest";
import { statedDay, totalsOf } from "@/lib/pay/day";
import { payPolicy } from "@/lib/pay/schema";

const policy = payPolicy.parse({ premiums: [{ code: "night", from: "22:00", to: "06:00" }] });
const piece = { start: 0, end: 3600, rate: null, week: "2026-06-07", date: "2026-06-09" };
const regular = { bucket: "regular" as const, rule: "regular" as const, overHours: 0 };

describe("statedDay", () => {
  test("sums a day by bucket and premium, beside what was worked", () => {
    const lifted = [
      { ...piece, ...regular },
      {
        ...piece,
        start: 3600,
        end: 5400,
        bucket: "double" as const,
        rule: "daily" as const,
        overHours: 1,
      },
    ];
    const premiums = new Map([["night", [{ start: 1800, end: 4500 }]]]);
    const day = statedDay(
      "2026-06-09",
      { worked: [{ ...piece, end: 5000 }], lifted, steps: [], premiums },
      policy,
    );
    expect(day).toMatchObject({
      date: "2026-06-09",
      workedSeconds: 5000,
      paidSeconds: 5400,
      buckets: { regular: 3600, overtime: 0, double: 1800 },
      premiums: { night: 2700 },
    });
    expect(day.trail.map(({ rule, seconds }) => [rule, seconds])).toEqual([
      ["rounding", 400],
      ["regular", 3600],
      ["daily", 1800],
      ["premium", 2700],
    ]);
  });
});

describe("totalsOf", () => {
  test("sums parts, and names every premium also where there is no part", () => {
    const part = {
      paidSeconds: 10,
      buckets: { regular: 7, overtime: 2, double: 1 },
      premiums: { night: 4 },
    };
    expect(totalsOf([part, part], policy)).toEqual({
      paidSeconds: 20,
      buckets: { regular: 14, overtime: 4, double: 2 },
      premiums: { night: 8 },
    });
    expect(totalsOf([], policy).premiums).toEqual({ night: 0 });
  });
});
