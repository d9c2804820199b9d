import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { addHundredths, decimalDays, hoursText } from "@/lib/hours/decimals";
import { type HourSums, hourSums } from "@/lib/hours/sums";
import { sum } from "@/lib/sum";

const day = (direct: number, indirect = 0, rest = 0, unassigned = 0, meal = 0): HourSums =>
  hourSums([
    { activity: "run", seconds: direct },
    { activity: "indirect", seconds: indirect },
    { activity: "rest", seconds: rest },
    { activity: "unassigned", seconds: unassigned },
    { activity: "meal", seconds: meal },
  ]);

const seconds = fc.nat(40_000);
const days = fc.array(
  fc.tuple(seconds, seconds, seconds, seconds, seconds).map((parts) => day(...parts)),
  { maxLength: 31 },
);

describe("decimalDays", () => {
  test("thirds of an hour that a plain rounding would lose", () => {
    const { days: rounded, total } = decimalDays([day(1200), day(1200), day(1200)]);
    expect(rounded.map(({ attended }) => attended)).toEqual([34, 33, 33]);
    expect(total.attended).toBe(100);
  });

  test("the total is half up on exact seconds, also where the days are not", () => {
    expect(decimalDays([day(17)]).total.attended).toBe(0);
    expect(decimalDays([day(18)]).total.attended).toBe(1);
    expect(decimalDays([day(9), day(9)]).total.attended).toBe(1);
  });

  test("for any days, rows and columns add up and nothing is off by a hundredth", () => {
    fc.assert(
      fc.property(days, (all) => {
        const { days: rounded, total } = decimalDays(all);
        const exact = sum(all.map(({ attendedSeconds }) => attendedSeconds));
        expect(total.attended).toBe(Math.floor(exact / 36 + 0.5));
        expect(sum(rounded.map(({ attended }) => attended))).toBe(total.attended);
        for (const [at, each] of rounded.entries()) {
          const parts = [each.direct, each.indirect, each.rest, each.unassigned];
          expect(sum(parts)).toBe(each.attended);
          expect(Math.abs(each.attended * 36 - all[at]!.attendedSeconds)).toBeLessThan(36);
          expect(Math.abs(each.direct * 36 - all[at]!.directSeconds)).toBeLessThan(36);
          expect(Math.abs(each.meal * 36 - all[at]!.mealSeconds)).toBeLessThan(36);
        }
      }),
    );
  });

  test("for any day, what was nothing stays nothing", () => {
    fc.assert(
      fc.property(seconds, seconds, (direct, rest) => {
        const [rounded] = decimalDays([day(direct, 0, rest)]).days;
        expect(rounded).toMatchObject({ indirect: 0, unassigned: 0, meal: 0 });
      }),
    );
  });
});

describe("addHundredths", () => {
  test("a site's total is that of its people, as shown", () => {
    const one = decimalDays([day(3600, 36, 0, 0, 1800)]).total;
    expect(addHundredths([one, one])).toEqual({
      attended: 202,
      direct: 200,
      indirect: 2,
      rest: 0,
      unassigned: 0,
      meal: 100,
    });
  });
});

describe("hoursText", () => {
  test.each([
    [0, "0.00"],
    [5, "0.05"],
    [4175, "41.75"],
    [120_000, "1200.00"],
  ])("%i is %s", (hundredths, text) => expect(hoursText(hundredths)).toBe(text));
});
