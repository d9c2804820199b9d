import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { type EarningReport, earnedSeconds } from "@/lib/standards/earned";

const count = (good: number, rework = 0, scrap = 0): EarningReport => ({
  event: `${good}-${rework}-${scrap}`,
  kind: "report",
  good,
  rework,
  scrap,
});
const seen = (good: number, rework = 0, scrap = 0): EarningReport => ({
  ...count(good, rework, scrap),
  kind: "inspect",
});
const standard = { setupSeconds: 600, runSeconds: 100 };
const earned = (reports: EarningReport[], quantity = 4) =>
  earnedSeconds(reports, { standard, quantity });

describe("earnedSeconds", () => {
  test.each([
    { because: "run by good pieces, and the setup with the first", of: [count(1)], is: [700] },
    { because: "the setup is earned once", of: [count(1), count(3)], is: [700, 300] },
    { because: "rework and scrap earn nothing", of: [count(0, 2, 1), count(1)], is: [0, 700] },
    {
      because: "a piece of rework earns when it becomes good",
      of: [count(3, 1), count(1)],
      is: [900, 100],
    },
    { because: "a piece earns an operation once", of: [count(3), count(3)], is: [900, 100] },
    { because: "an inspection earns pass or fail", of: [seen(2, 1, 1)], is: [1000] },
    { because: "a piece seen again earns nothing", of: [seen(2, 2), seen(2)], is: [1000, 0] },
    { because: "nothing counted earns nothing", of: [count(0)], is: [0] },
  ])("$because", ({ of, is }) => {
    const { byReport, seconds } = earned(of);
    expect(byReport.map((one) => one.setupSeconds + one.runSeconds)).toEqual(is);
    expect(seconds).toBe(is.reduce((a, b) => a + b, 0));
  });
  test("a lot of nothing earns nothing, not even its setup", () => {
    expect(earned([count(2)], 0).seconds).toBe(0);
  });
  test("without a standard nothing is earned, and it says so", () => {
    const none = earnedSeconds([count(4)], { standard: null, quantity: 4 });
    expect(none).toMatchObject({ hasStandard: false, seconds: 0 });
    expect(earned([]).hasStandard).toBe(true);
  });
  test("for any reports, no more is earned than the lot has", () => {
    const report = fc.record({
      event: fc.uuid(),
      kind: fc.constantFrom("report", "inspect"),
      good: fc.nat(5),
      rework: fc.nat(5),
      scrap: fc.nat(5),
    });
    fc.assert(
      fc.property(fc.array(report, { maxLength: 8 }), fc.nat(20), (reports, quantity) => {
        const { seconds } = earnedSeconds(reports, { standard, quantity });
        expect(seconds).toBeLessThanOrEqual(600 + 100 * quantity);
        expect(seconds).toBeGreaterThanOrEqual(0);
      }),
    );
  });
});
