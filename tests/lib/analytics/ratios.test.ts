import { readFileSync } from "node:fs";
import fc from "fast-check";
import { describe, expect, test } from "vitest";
import {
  efficiency,
  efficiencyWithoutRework,
  productivity,
  utilization,
} from "@/lib/analytics/ratios";

const checks: { id: string; given: Record<string, number>; expect: Record<string, number> }[] =
  JSON.parse(readFileSync("tests/checks/kpi.json", "utf8"));
const check = (id: string) => checks.find((one) => one.id === id)!;
const hour = 3600;
const none = { noStandardSeconds: 0 };

describe("ratios", () => {
  test("productivity is efficiency × utilization (lab-identity)", () => {
    const { given, expect: wanted } = check("lab-identity");
    const earnedSeconds = given.earned_std_hours! * hour;
    const directSeconds = given.actual_direct_hours! * hour;
    const attendanceSeconds = given.paid_hours! * hour;
    const [e, u] = [
      efficiency({ earnedSeconds, directSeconds, ...none })!,
      utilization({ directSeconds, attendanceSeconds })!,
    ];
    expect(e).toBeCloseTo(wanted.efficiency!, 4);
    expect(u).toBeCloseTo(wanted.utilisation!, 4);
    expect(productivity({ earnedSeconds, attendanceSeconds })).toBeCloseTo(e * u, 10);
    expect(e * u).toBeCloseTo(wanted.productivity!, 4);
  });
  test("efficiency of several is the ratio of sums (lab-ratio-of-sums)", () => {
    expect(efficiency({ earnedSeconds: 20, directSeconds: 25, ...none })).toBe(
      check("lab-ratio-of-sums").expect.efficiency,
    );
  });
  test("utilization is ISO's worker efficiency (iso-worker-efficiency)", () => {
    const { given, expect: wanted } = check("iso-worker-efficiency");
    const time = { directSeconds: given.apwt_min! * 60, attendanceSeconds: given.apat_min! * 60 };
    expect(utilization(time)).toBeCloseTo(wanted.worker_efficiency!, 4);
  });
  test("rework is in the hours, and can be left out (lab-earned-good-only)", () => {
    const { given, expect: wanted } = check("lab-earned-good-only");
    const work = {
      earnedSeconds: given.std_hours_each! * (given.completed! - given.rejected!) * hour,
      directSeconds: (given.first_pass_hours! + given.rework_hours!) * hour,
      reworkSeconds: given.rework_hours! * hour,
      noStandardReworkSeconds: 0,
      ...none,
    };
    expect(efficiency(work)).toBe(wanted.efficiency);
    expect(efficiencyWithoutRework(work)).toBeCloseTo(27 / 31, 10);
  });
  test("time without a standard is left out, and its rework only once", () => {
    const work = {
      earnedSeconds: 80,
      directSeconds: 150,
      noStandardSeconds: 50,
      reworkSeconds: 30,
      noStandardReworkSeconds: 10,
    };
    expect(efficiency(work)).toBe(0.8);
    expect(efficiencyWithoutRework(work)).toBe(1);
  });
  test("nothing to divide by is null, not 0 and not without end (lab-zero-actual)", () => {
    expect(check("lab-zero-actual").expect.efficiency).toBeNull();
    expect(efficiency({ earnedSeconds: 10, directSeconds: 0, ...none })).toBeNull();
    expect(efficiency({ earnedSeconds: 0, directSeconds: 9, noStandardSeconds: 9 })).toBeNull();
    expect(utilization({ directSeconds: 0, attendanceSeconds: 0 })).toBeNull();
    expect(productivity({ earnedSeconds: 5, attendanceSeconds: 0 })).toBeNull();
  });
  test("for any seconds, a ratio is a number or null", () => {
    const seconds = fc.nat(10_000_000);
    fc.assert(
      fc.property(seconds, seconds, seconds, seconds, seconds, (a, b, c, d, e) => {
        const found = [
          efficiency({ earnedSeconds: a, directSeconds: b, noStandardSeconds: c }),
          efficiencyWithoutRework({
            earnedSeconds: a,
            directSeconds: b,
            noStandardSeconds: c,
            reworkSeconds: d,
            noStandardReworkSeconds: e,
          }),
          utilization({ directSeconds: a, attendanceSeconds: b }),
          productivity({ earnedSeconds: a, attendanceSeconds: b }),
        ];
        expect(found.every((one) => one === null || Number.isFinite(one))).toBe(true);
      }),
    );
  });
  test("refuses what is no number", () => {
    expect(() => utilization({ directSeconds: Number.NaN, attendanceSeconds: 1 })).toThrow(
      "finite seconds",
    );
  });
});
