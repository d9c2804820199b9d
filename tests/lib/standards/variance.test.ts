import { readFileSync } from "node:fs";
import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { labourVariance, varianceHours } from "@/lib/standards/variance";

interface Check {
  id: string;
  source: string;
  given: Record<string, number>;
  expect: { efficiency_variance: number; rate_variance: number; total: number };
}
const checks: Check[] = JSON.parse(readFileSync("tests/checks/kpi.json", "utf8"));
const published = checks.filter(({ id }) => id.startsWith("var-") && id !== "var-mix-yield");

describe("labourVariance", () => {
  test("the published examples are there", () => expect(published).toHaveLength(5));
  test.each(published)("$id: $source", ({ given, expect: wanted }) => {
    const units = (given.units ?? 0) * (given.std_min_each ?? 0) * 60;
    const hours = given.standard_hours ?? units / 3600;
    const variance = labourVariance({
      actualSeconds: given.actual_hours! * 3600,
      standardSeconds: hours * 3600,
      actualCost: given.actual_cost ?? given.actual_hours! * given.actual_rate!,
      standardRate: given.standard_rate!,
    });
    expect(variance.efficiency).toBeCloseTo(wanted.efficiency_variance, 6);
    expect(variance.rate).toBeCloseTo(wanted.rate_variance, 6);
    expect(variance.total).toBeCloseTo(wanted.total, 6);
  });
  test("hours too many are above 0, hours spared below", () => {
    expect(varianceHours({ actualSeconds: 5400, standardSeconds: 3600 })).toBe(0.5);
    expect(varianceHours({ actualSeconds: 1800, standardSeconds: 3600 })).toBe(-0.5);
  });
  test("for any labour, both parts sum to what it cost beyond its standard", () => {
    const figure = fc.integer({ min: 0, max: 1_000_000 });
    fc.assert(
      fc.property(figure, figure, figure, fc.nat(200), (actual, standard, cost, rate) => {
        const variance = labourVariance({
          actualSeconds: actual,
          standardSeconds: standard,
          actualCost: cost,
          standardRate: rate,
        });
        expect(variance.total).toBeCloseTo(cost - (standard / 3600) * rate, 3);
      }),
    );
  });
  test("refuses figures that are none", () => {
    const labour = { actualSeconds: 1, standardSeconds: 1, actualCost: 1, standardRate: 1 };
    expect(() => labourVariance({ ...labour, actualCost: -1 })).toThrow("0 or more");
    expect(() => labourVariance({ ...labour, standardRate: Number.NaN })).toThrow("0 or more");
  });
});
