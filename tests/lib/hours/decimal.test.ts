import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { decimalDays } from "@/lib/hours/decimal";

const day = (direct: number, indirect = 0, rest = 0, unassigned = 0, meal = 0) => ({
  spanSeconds: direct + indirect + rest + unassigned + meal,
  attendanceSeconds: direct + indirect + rest + unassigned,
  directSeconds: direct,
  indirectSeconds: indirect,
  restSeconds: rest,
  mealSeconds: meal,
  unassignedSeconds: unassigned,
});

const seconds = fc.nat(50_000);
const hundredths = (text: string) => Math.round(Number(text) * 100);

describe("decimalDays", () => {
  test("gives the hundredths left over to the largest fractions, in days and in their parts", () => {
    // 3 × 12 s are a hundredth of an hour: one of the three equal days gets it, the first.
    expect(decimalDays([day(12), day(12), day(12)]).map(({ attended }) => attended)).toEqual([
      "0.01",
      "0.00",
      "0.00",
    ]);
    expect(decimalDays([day(3590, 20, 0, 0, 1800)])).toEqual([
      {
        attended: "1.00",
        direct: "1.00",
        indirect: "0.00",
        rest: "0.00",
        unassigned: "0.00",
        meal: "0.50",
      },
    ]);
  });

  test("has nothing to say of no days", () => {
    expect(decimalDays([])).toEqual([]);
  });

  test("for any days, parts add up to attended, and days to the range rounded once, half up", () => {
    const days = fc.array(fc.tuple(seconds, seconds, seconds, seconds, seconds), { maxLength: 14 });
    fc.assert(
      fc.property(days, (each) => {
        const sums = each.map((parts) => day(...parts));
        const written = decimalDays(sums);
        for (const { attended, direct, indirect, rest, unassigned } of written) {
          const parts = [direct, indirect, rest, unassigned].map(hundredths);
          expect(parts.reduce((a, b) => a + b, 0)).toBe(hundredths(attended));
        }
        const range = sums.reduce((all, { attendanceSeconds }) => all + attendanceSeconds, 0);
        const total = written.reduce((all, { attended }) => all + hundredths(attended), 0);
        expect(total).toBe(Math.floor((range + 18) / 36));
      }),
    );
  });
});
