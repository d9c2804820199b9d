import { describe, expect, test } from "vitest";
import { type Extra, type RatedTime, type WeekFacts, weekPay } from "@/lib/rates/week-pay";
import { payCheck } from "@/tests/make/pay";

type Figures = Record<string, number>;
const HOUR = 3600;

/** Hours at a rate, the last `overtime` and before them `double` of the week's in their buckets. */
function week(
  hours: number,
  rate: number | string,
  over: { overtime?: number; double?: number } = {},
) {
  const { overtime = 0, double = 0 } = over;
  const time = (bucket: RatedTime["bucket"], length: number): RatedTime => {
    return { seconds: length * HOUR, rate: String(rate), bucket, inRange: true };
  };
  return [
    time("regular", hours - overtime - double),
    time("overtime", overtime),
    time("double", double),
  ].filter(({ seconds }) => seconds > 0);
}

const paid = (time: readonly RatedTime[], extras: Extra[] = [], more: Partial<WeekFacts> = {}) =>
  weekPay({ time, extras, paysExtras: true, flatSum: "all-hours", ...more });
const ordinary = (amount: number): Extra => ({ kind: "ordinary", amount: String(amount) });

describe("weekPay: federal (checks)", () => {
  test("one rate (29 CFR 778.110(a))", () => {
    const { expect: expected } = payCheck<Figures, Figures>("flsa-110a");
    expect(Number(paid(week(46, 12, { overtime: 6 })).total)).toBe(expected.pay);
  });
  test("a production bonus is in the rate (29 CFR 778.110(b))", () => {
    const { given, expect: expected } = payCheck<Figures, Figures>("flsa-110b");
    const pay = paid(week(46, 12, { overtime: 6 }), [ordinary(given.production_bonus!)]);
    expect(pay).toEqual({
      straightTime: "552.00",
      extras: "46.00",
      regularRate: "13.000000",
      overtimePremium: "39.00",
      total: "637.00",
    });
    expect(Number(pay.total)).toBe(expected.pay);
  });
  test("two rates weigh by their hours (29 CFR 778.115)", () => {
    const { expect: expected } = payCheck<Figures, Figures>("flsa-115-weighted-a");
    const time = [...week(10, 10), ...week(40, 20, { overtime: 10 })];
    const pay = paid(time);
    expect(Number(pay.regularRate)).toBe(expected.regular_rate);
    expect(Number(pay.total)).toBe(expected.pay);
  });
  test("two rates whose mean has no end (DLSE example)", () => {
    const { expect: expected } = payCheck<Figures, Figures>("flsa-115-weighted-b");
    const pay = paid([...week(32, "11.00"), ...week(10, "9.00", { overtime: 2 })]);
    expect(pay.regularRate).toBe("10.523810");
    expect(Number(pay.overtimePremium)).toBe(expected.flsa_overtime_premium);
    expect(Number(pay.total)).toBe(expected.flsa_pay);
  });
  test("a bonus of one week (29 CFR 778.208-209)", () => {
    const { given, expect: expected } = payCheck<Figures, Figures>("flsa-bonus-50");
    const pay = paid(week(50, 12, { overtime: 10 }), [ordinary(given.bonus!)]);
    expect(Number(pay.regularRate)).toBe(expected.regular_rate);
    expect(Number(pay.total)).toBe(expected.pay);
  });
  test("a creditable premium is set against overtime (29 CFR 778.205)", () => {
    const { expect: expected } = payCheck<Figures, Figures>("flsa-205-premium-credit");
    const credit: Extra = { kind: "creditable", amount: String(expected.creditable_premium) };
    const pay = paid(week(56, 12, { overtime: 16 }), [credit]);
    expect(pay.regularRate).toBe("12.000000");
    expect(Number(pay.overtimePremium)).toBe(expected.further_due);
    expect(Number(pay.total)).toBe(expected.contract_pay);
  });
  test("one above the premium never takes pay away", () => {
    const pay = paid(week(41, 12, { overtime: 1 }), [{ kind: "creditable", amount: "50" }]);
    expect(pay).toMatchObject({ overtimePremium: "0.00", total: "542.00" });
  });
  test("a night differential is in the rate (29 CFR 778.207(b))", () => {
    const { expect: expected } = payCheck<Figures, Figures>("flsa-207b-shift-diff");
    const pay = paid(week(44, 15, { overtime: 4 }));
    expect(Number(pay.regularRate)).toBe(expected.regular_rate);
    expect(Number(pay.total)).toBe(expected.pay);
  });
  test("pay for a task beyond its hours is in the rate (29 CFR 778.207(b))", () => {
    const { expect: expected } = payCheck<Figures, Figures>("flsa-207b-task-pay");
    const pay = paid(week(42, 10, { overtime: 2 }), [ordinary(140)]);
    expect(Number(pay.regularRate)).toBeCloseTo(expected.regular_rate!, 4);
    expect(Number(pay.total)).toBe(expected.pay);
  });
  test("a paid holiday is in the total only (29 CFR 778.218-219)", () => {
    const { expect: expected } = payCheck<Figures, Figures>("flsa-leave-not-worked");
    const pay = paid(week(36, 12), [{ kind: "excluded", amount: "96.00" }]);
    expect(pay.regularRate).toBe("12.000000");
    expect(Number(pay.total)).toBe(expected.pay);
  });
});

describe("weekPay: flat sums", () => {
  const { given, expect: expected } = payCheck<Figures, Figures>("ca-flat-bonus");
  const time = week(48, given.rate!, { overtime: given.overtime_hours! });
  const bonus: Extra = { kind: "flat-sum", amount: String(given.flat_attendance_bonus) };
  test("federal: over all hours", () => {
    const pay = paid(time, [bonus]);
    expect(Number(pay.regularRate)).toBe(expected.flsa_regular_rate);
    expect(Number(pay.total)).toBe(expected.flsa_pay);
  });
  test("California: over the regular hours, one and a half times (Alvarado v. Dart, 2018)", () => {
    const pay = paid(time, [bonus], { flatSum: "regular-hours" });
    expect(pay.overtimePremium).toBe("57.00");
    expect(pay.regularRate).toBe("12.750000");
    expect(Number(pay.total)).toBe(expected.california_pay);
  });
  test("California: twice for double hours", () => {
    const double = week(50, 12, { overtime: 8, double: 2 });
    // 8 × 6 + 2 × 12, and 0.75 × (8 × 1.5 + 2 × 2)
    expect(paid(double, [bonus], { flatSum: "regular-hours" }).overtimePremium).toBe("84.00");
  });
  test("without regular hours they are spread over all", () => {
    const pay = paid(week(8, 12, { overtime: 8 }), [bonus], { flatSum: "regular-hours" });
    expect(pay).toMatchObject({ regularRate: "15.750000", overtimePremium: "63.00" });
  });
});

describe("weekPay: edges", () => {
  test("no hours: no rate, the extras alone", () => {
    expect(paid([], [ordinary(46)])).toEqual({
      straightTime: "0.00",
      extras: "46.00",
      regularRate: null,
      overtimePremium: "0.00",
      total: "46.00",
    });
  });
  test("cents are rounded half up once, and the total is the sum of what is shown", () => {
    const second: RatedTime = { seconds: 1, rate: "18.00", bucket: "regular", inRange: true };
    expect(paid([second])).toMatchObject({ straightTime: "0.01", total: "0.01" });
    const pay = paid(week(41, "10.333", { overtime: 1 }), [ordinary(0.005)]);
    const sum = [pay.straightTime, pay.extras, pay.overtimePremium].map(Number);
    expect(Number(pay.total)).toBeCloseTo(
      sum.reduce((a, b) => a + b),
      10,
    );
  });
  test("a cut workweek is paid in parts that sum to the whole, credit and all", () => {
    const extras: Extra[] = [ordinary(46), { kind: "creditable", amount: "20" }];
    const time = [...week(30, 12), ...week(20, 12, { overtime: 16 })];
    const first = time.map((one, index) => ({ ...one, inRange: index < 2 }));
    const second = time.map((one, index) => ({ ...one, inRange: index >= 2 }));
    const parts = [paid(first, extras, { paysExtras: false }), paid(second, extras)];
    const whole = paid(time, extras);
    expect(parts.map(({ regularRate }) => regularRate)).toEqual(Array(2).fill(whole.regularRate));
    expect(Number(parts[0]!.total) + Number(parts[1]!.total)).toBeCloseTo(Number(whole.total), 1);
    expect(parts[0]!.extras).toBe("0.00");
  });
});
