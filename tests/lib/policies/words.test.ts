import { describe, expect, test } from "vitest";
import { policyOf } from "@/lib/pay/presets";
import { payPolicy } from "@/lib/pay/schema";
import { policyWords } from "@/lib/policies/words";

describe("policyWords", () => {
  test("says the federal rules", () => {
    expect(policyWords(policyOf("us-federal"))).toEqual([
      "Workweek from Sunday 00:00; each workday has the hours worked in it.",
      "Paid to the second.",
      "Rests paid up to 20 min, meals unpaid from 30 min, looked at over 75 min.",
      "Over 40 h a workweek overtime.",
    ]);
  });
  test("names every tier of California, the lower first, and whose limits warn", () => {
    const words = policyWords(policyOf("us-california"));
    expect(words).toContain(
      "Over 8 h a day overtime; Over 12 h a day double; Over 40 h a workweek overtime; Over 0 h on a seventh day overtime; Over 8 h on a seventh day double.",
    );
    expect(words.at(-1)).toBe("Warns by us-california.");
  });
  test("a policy without tiers says that nothing is overtime", () => {
    expect(policyWords(policyOf("straight"))).toContain(
      "All time is regular; nothing is overtime.",
    );
  });
  test("says rounding, shifts and premiums", () => {
    const policy = payPolicy.parse({
      attribution: "shift-start",
      rounding: { mode: "nearest", minutes: 15 },
      premiums: [
        { code: "night", from: "22:00", to: "06:00", days: ["monday"] },
        { code: "holiday", dates: ["2026-12-25"] },
        { code: "always" },
      ],
    });
    expect(policyWords(policy)).toEqual(
      expect.arrayContaining([
        "Workweek from Monday 00:00; a shift counts for the workday on which it started.",
        "Start and end of a shift to the nearest 15 minutes.",
        "Premium night from 22:00 to 06:00, Monday.",
        "Premium holiday from 00:00 to 24:00, 2026-12-25.",
        "Premium always from 00:00 to 24:00, daily.",
      ]),
    );
  });
});
