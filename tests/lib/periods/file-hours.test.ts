import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { changeHours, sharedHours, summedHours } from "@/lib/periods/file-hours";
import { sum } from "@/lib/sum";
import { makeDay } from "@/tests/make/frozen";

const hundredths = (text: string) => Math.round(Number(text) * 100);
const figure = fc.nat(50_000);
const days = fc.array(
  fc
    .tuple(figure, figure, figure)
    .map(([regular, overtime, double]) => makeDay("2026-06-01", regular, { overtime, double })),
  { minLength: 1, maxLength: 14 },
);

describe("sharedHours", () => {
  test("rounds the period once: three times 20 minutes are one hour, not 0.99", () => {
    const paid = sharedHours([1200, 1200, 1200].map((each) => makeDay("2026-06-01", each)));
    expect(paid.map((day) => day.paid)).toEqual(["0.34", "0.33", "0.33"]);
  });
  test("ties go to double, then overtime, then regular", () => {
    const [day] = sharedHours([makeDay("2026-06-01", 18, { overtime: 18, double: 36 })]);
    expect(day).toMatchObject({ paid: "0.02", double: "0.01", overtime: "0.01", regular: "0.00" });
  });
  test("premiums stand beside and are rounded over the period", () => {
    const night = (seconds: number) =>
      makeDay("2026-06-01", 3600, { premiums: { night: seconds } });
    const found = sharedHours([night(1200), makeDay("2026-06-02", 3600), night(2400)]);
    expect(found.map(({ premiums }) => premiums.night)).toEqual(["0.33", "0.00", "0.67"]);
  });
  test("for any days, rows and columns add up, and the whole is rounded half up once", () => {
    fc.assert(
      fc.property(days, (each) => {
        const hours = sharedHours(each);
        for (const { paid, regular, overtime, double } of hours) {
          expect(hundredths(paid)).toBe(sum([regular, overtime, double].map(hundredths)));
        }
        const seconds = sum(each.map(({ paidSeconds }) => paidSeconds));
        expect(sum(hours.map(({ paid }) => hundredths(paid)))).toBe(
          Math.floor((seconds + 18) / 36),
        );
        hours.forEach(({ regular }, at) => {
          expect(Math.abs(hundredths(regular) * 36 - each[at]!.buckets.regular)).toBeLessThan(36);
        });
      }),
    );
  });
});

describe("changeHours", () => {
  test("keeps signs, rounds half away from 0, and adds up", () => {
    expect(changeHours(makeDay("2026-06-01", -18, { overtime: 54 }))).toMatchObject({
      regular: "-0.01",
      overtime: "0.02",
      paid: "0.01",
    });
    expect(changeHours(makeDay("2026-06-01", -3600, { overtime: 3600 })).paid).toBe("0.00");
  });
});

describe("summedHours", () => {
  test("sums what is written, with each premium that anyone has", () => {
    const night = makeDay("2026-06-01", 3600, { premiums: { night: 1800 } });
    const hours = [...sharedHours([night, night]), changeHours(makeDay("2026-06-01", -7200))];
    expect(summedHours(hours)).toMatchObject({ paid: "0.00", premiums: { night: "1.00" } });
    expect(summedHours([])).toMatchObject({ paid: "0.00", premiums: {} });
  });
});
