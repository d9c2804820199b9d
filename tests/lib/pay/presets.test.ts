import { describe, expect, test } from "vitest";
import { policyOf } from "@/lib/pay/presets";
import { payPolicy } from "@/lib/pay/schema";

const same = {
  attribution: "calendar-day",
  newShiftAfterMinutes: 240,
  rounding: { mode: "none" },
  breaks: {
    restPaidUpToMinutes: 20,
    restLimitAnnounced: false,
    mealUnpaidFromMinutes: 30,
    mealAtMostMinutes: 75,
  },
  premiums: [],
};
const none = { daily: [], weekly: [], seventhDay: [] };
const forty = [{ overHours: 40, bucket: "overtime" }];

describe("policyOf (CALCULATIONS.md 4)", () => {
  test.each([
    ["us-federal", "sunday", { ...none, weekly: forty }, "all-hours", "none"],
    [
      "us-california",
      "sunday",
      {
        daily: [
          { overHours: 8, bucket: "overtime" },
          { overHours: 12, bucket: "double" },
        ],
        weekly: forty,
        seventhDay: [
          { overHours: 0, bucket: "overtime" },
          { overHours: 8, bucket: "double" },
        ],
      },
      "regular-hours",
      "us-california",
    ],
    ["eu-working-time", "monday", none, "all-hours", "eu-working-time"],
    ["straight", "monday", none, "all-hours", "none"],
  ] as const)("%s begins on %s", (name, startsOn, overtime, flatSum, limits) => {
    const workweek = { startsOn, at: "00:00" };
    expect(policyOf(name)).toEqual({ ...same, workweek, overtime, flatSum, limits });
  });
  test("a policy that leaves everything out is `straight`, and a policy is itself", () => {
    const policy = payPolicy.parse({});
    expect(policy).toEqual(policyOf("straight"));
    expect(policyOf(policy)).toBe(policy);
  });
});
