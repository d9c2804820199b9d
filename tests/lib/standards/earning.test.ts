import { describe, expect, test } from "vitest";
import { type EarningOperation, operationEarning } from "@/lib/standards/earning";
import { siteRules } from "@/tests/make/events";

const rules = [{ ...siteRules, timeZone: "UTC", productionDayStartsAtMinutes: 0 }];
const at = (day: number) => Date.UTC(2026, 4, day, 9);
const row = {
  seq: 1,
  option: null,
  effectiveFrom: "2026-01-01",
  setupSeconds: 600,
  runSeconds: 60,
};
const count = (day: number, good = 1) => {
  const event = `count-${day}`;
  return { event, kind: "report" as const, good, rework: 0, scrap: 0, atMs: at(day) };
};
const make = (other: Partial<EarningOperation<ReturnType<typeof count>>>) => ({
  quantity: 2,
  firstWorkMs: at(11),
  reports: [count(12), count(13)],
  standards: [row],
  options: [],
  setupEarned: "first-good" as const,
  ...other,
});
const seconds = (other: Parameters<typeof make>[0]) =>
  operationEarning(make(other), rules).reports.map((one) => one.seconds);

describe("operationEarning", () => {
  test("each count earns run for its pieces, the first one the setup too", () => {
    expect(seconds({})).toEqual([660, 60]);
  });
  test("one standard for the whole of it: that of its first work, however late it is counted", () => {
    const changed = [row, { ...row, seq: 2, effectiveFrom: "2026-05-12", runSeconds: 100 }];
    expect(seconds({ standards: changed })).toEqual([660, 60]);
    expect(seconds({ standards: changed, firstWorkMs: at(12) })).toEqual([700, 100]);
    expect(seconds({ standards: changed, firstWorkMs: null })).toEqual([700, 100]);
  });
  test("a drafted row for the day of its first work moves all of it", () => {
    const drafted = [row, { ...row, seq: 9, effectiveFrom: "2026-05-11", runSeconds: 30 }];
    expect(operationEarning(make({ standards: drafted }), rules).seconds).toBe(660);
  });
  test("adders of its options are added", () => {
    const adder = { ...row, seq: 2, option: "sunburst", setupSeconds: 0, runSeconds: 40 };
    expect(seconds({ standards: [row, adder], options: ["sunburst"] })).toEqual([700, 100]);
  });
  test("a setup that is earned when booked is not earned by a count", () => {
    const earned = operationEarning(make({ setupEarned: "when-booked" }), rules);
    expect(earned.seconds).toBe(120);
    expect(earned.standard).toEqual({ setupSeconds: 600, runSeconds: 60 });
  });
  test("without a standard, and before it is begun, it has none and earns nothing", () => {
    expect(operationEarning(make({ standards: [] }), rules)).toMatchObject({
      standard: null,
      seconds: 0,
    });
    expect(operationEarning(make({ firstWorkMs: null, reports: [] }), rules).standard).toBeNull();
  });
});
