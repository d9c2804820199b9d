import { describe, expect, test } from "vitest";
import { added, decimalText, type Exact, exact, exactOf, times } from "@/lib/rates/exact";
import {
  fluctuatingPay,
  guaranteedPay,
  overtimePremium,
  regularRate,
  salaryPay,
  salaryRate,
  weeklySalary,
} from "@/lib/rates/regular-rate";
import { payCheck } from "@/tests/make/pay";

type Figures = Record<string, number>;
const money = (number: number) => exactOf(String(number));
const cents = (amount: Exact | null) => (amount ? Number(decimalText(amount, 2)) : null);
const none = exact(0);

describe("regularRate and overtimePremium", () => {
  test("piece work: over all hours, and only half is added (29 CFR 778.111(a))", () => {
    const { given, expect: expected } = payCheck<Figures, Figures>("flsa-111a");
    const waiting = times(money(given.waiting_hours!), money(given.waiting_rate!));
    const pay = added(money(given.piece_earnings!), waiting);
    const rate = regularRate(pay, money(expected.hours!))!;
    const premium = overtimePremium(rate, {
      overtime: money(expected.overtime_hours!),
      double: none,
    });
    expect(cents(rate)).toBe(expected.regular_rate);
    expect(cents(premium)).toBe(expected.overtime_premium);
    expect(cents(added(pay, premium))).toBe(expected.pay);
  });
  test("a guarantee tops the earnings up before overtime (29 CFR 778.111(b))", () => {
    const { given, expect: expected } = payCheck<Figures, Figures>("flsa-111b");
    const hours = money(given.productive_hours!);
    const pay = guaranteedPay(money(given.piece_earnings!), money(given.guaranteed_hourly!), hours);
    const rate = regularRate(pay, hours)!;
    const premium = overtimePremium(rate, { overtime: exact(6), double: none });
    expect(cents(pay)).toBe(expected.straight_time);
    expect(cents(rate)).toBe(expected.regular_rate);
    expect(cents(added(pay, premium))).toBe(expected.pay);
  });
  test("earnings above the guarantee stay as they are", () => {
    expect(guaranteedPay(exact(600), exact(11), exact(46))).toEqual(exact(600));
  });
  test("without hours there is no rate", () => expect(regularRate(exact(5), none)).toBeNull());
  test("a double hour adds the whole rate", () => {
    expect(overtimePremium(exact(10), { overtime: exact(2), double: exact(3) })).toEqual(exact(40));
  });
});

describe("salaries", () => {
  test("hours between those covered and 40 are paid at the rate (29 CFR 778.113(a))", () => {
    const { given, expect: expected } = payCheck<Figures, Figures>("flsa-113a");
    const [weekly, covers] = [money(given.weekly_salary!), money(given.salary_covers_hours!)];
    expect(cents(salaryRate(weekly, covers))).toBe(expected.regular_rate);
    expect(cents(salaryPay(weekly, covers, money(given.hours!)))).toBe(expected.pay);
  });
  test("full precision, not a rate rounded first (29 CFR 778.322)", () => {
    const { given, expect: expected } = payCheck<Figures, Figures>("flsa-322");
    const [weekly, covers] = [money(given.weekly_salary!), money(given.salary_covers_hours!)];
    const pay = salaryPay(weekly, covers, money(given.hours!));
    expect(Number(decimalText(pay, 6))).toBeCloseTo(expected.pay_unrounded!, 6);
  });
  test("a salary is paid whole for a short week", () => {
    expect(salaryPay(exact(700), exact(35), exact(20))).toEqual(exact(700));
  });
  test("a month is not four weeks (29 CFR 778.113(b))", () => {
    const { given, expect: expected } = payCheck<Figures, Figures>("flsa-113b-monthly");
    const weekly = weeklySalary(money(given.monthly_salary!), 12);
    expect(cents(weekly)).toBe(expected.weekly_from_monthly);
    expect(cents(weeklySalary(money(given.semimonthly_salary!), 24))).toBe(
      expected.weekly_from_semimonthly,
    );
    expect(cents(salaryRate(weekly, money(given.week_hours!)))).toBe(expected.regular_rate);
  });
  test("in California it covers 40 hours (Labor Code 515(d))", () => {
    const { given, expect: expected } = payCheck<Figures, Figures>("ca-salary-rate");
    const weekly = weeklySalary(money(given.monthly_salary!), 12);
    expect(Number(decimalText(weekly, 4))).toBe(expected.weekly);
    expect(Number(decimalText(salaryRate(weekly, exact(40)), 4))).toBe(expected.regular_rate);
  });
  test("a fluctuating workweek divides by the hours worked (29 CFR 778.114)", () => {
    const { given, expect: expected } = payCheck<
      { weekly_salary: number; weeks_hours: number[] },
      { regular_rates_cents: number[]; pay_unrounded_rate: number[] }
    >("flsa-114-fww");
    const weekly = money(given.weekly_salary);
    const hours = given.weeks_hours.map(money);
    expect(hours.map((one) => cents(regularRate(weekly, one)))).toEqual(
      expected.regular_rates_cents,
    );
    expect(hours.map((one) => cents(fluctuatingPay(weekly, one)))).toEqual(
      expected.pay_unrounded_rate,
    );
    expect(fluctuatingPay(weekly, none)).toEqual(weekly);
  });
});
