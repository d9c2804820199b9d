import { describe, expect, test } from "vitest";
import { trailOf } from "@/lib/pay/trail";

const rules = {
  restPaidUpToMinutes: 20,
  restLimitAnnounced: false,
  mealUnpaidFromMinutes: 30,
  mealAtMostMinutes: 75,
};
const piece = { start: 0, end: 1800, rate: null, week: "2026-06-07", date: "2026-06-13" };
const nothing = { steps: [], lifted: [], roundingSeconds: 0, premiums: {} };
const texts = (day: Partial<Parameters<typeof trailOf>[0]>) =>
  trailOf({ ...nothing, ...day }, rules).map(
    ({ rule, seconds, text }) => `${rule} ${seconds}: ${text}`,
  );

describe("trailOf", () => {
  test("a day without anything has no trail", () => expect(texts({})).toEqual([]));
  test.each([
    ["rest-paid", 900, "A rest of 15 min is paid; the limit is 20 min."],
    ["rest-paid", 1500, "A rest of 25 min is paid whole; the limit is 20 min."],
    ["rest-unpaid", 330, "5 min 30 s of a rest are beyond 20 min and unpaid."],
    ["meal-paid", 1200, "A meal of 20 min is under 30 min and paid whole."],
    ["meal-unpaid", 2700, "A meal of 45 min is unpaid."],
    ["off-duty", 3600, "1 h 00 min off duty inside the shift are unpaid."],
  ] as const)("%s of %i s", (rule, end, text) => {
    expect(texts({ steps: [{ rule, start: 0, end }] })).toEqual([`${rule} ${end}: ${text}`]);
  });
  test("rounding adds or takes", () => {
    expect(texts({ roundingSeconds: 300 })).toEqual([
      "rounding 300: Rounding the shift's start and end adds 5 min.",
    ]);
    expect(texts({ roundingSeconds: -45 })).toEqual([
      "rounding -45: Rounding the shift's start and end takes 45 s.",
    ]);
  });
  test("one step a rule, tier and bucket, in the order in which the day reached them", () => {
    const regular = {
      ...piece,
      bucket: "regular" as const,
      rule: "regular" as const,
      overHours: 0,
    };
    const weekly = {
      ...piece,
      bucket: "overtime" as const,
      rule: "weekly" as const,
      overHours: 40,
    };
    const seventh = { ...weekly, rule: "seventh-day" as const, overHours: 0 };
    expect(texts({ lifted: [regular, weekly, regular, seventh] })).toEqual([
      "regular 3600: 1 h 00 min within every limit: regular.",
      "weekly 1800: 30 min over 40 h of the workweek, lifted hours not counted: overtime.",
      "seventh-day 1800: 30 min over 0 h on the seventh day of a workweek with work on all seven: overtime.",
    ]);
  });
  test("premiums that hold are named", () => {
    expect(texts({ premiums: { night: 60, weekend: 0 } })).toEqual([
      "premium 60: 1 min carry the premium night, beside their bucket.",
    ]);
  });
});
