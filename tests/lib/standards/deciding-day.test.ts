import { describe, expect, test } from "vitest";
import { decidingDay } from "@/lib/standards/deciding-day";
import { siteRules } from "@/tests/make/events";

const rules = [{ ...siteRules, timeZone: "UTC", productionDayStartsAtMinutes: 0 }];
const [monday, tuesday] = [Date.UTC(2026, 4, 11, 23, 59), Date.UTC(2026, 4, 12)];

describe("decidingDay", () => {
  test.each([
    { workMs: monday, countMs: tuesday, is: "2026-05-11", because: "the first work decides" },
    {
      workMs: tuesday,
      countMs: monday,
      is: "2026-05-12",
      because: "also where it was counted before",
    },
    { workMs: null, countMs: tuesday, is: "2026-05-12", because: "without work the count decides" },
    { workMs: null, countMs: null, is: null, because: "before both nothing is decided" },
  ])("$because", ({ is, ...first }) => {
    expect(decidingDay(first, rules)).toBe(is);
  });
  test("a night shift before the site's hour belongs to the day before", () => {
    const night = [{ ...rules[0]!, productionDayStartsAtMinutes: 360 }];
    expect(decidingDay({ workMs: tuesday, countMs: null }, night)).toBe("2026-05-11");
  });
});
