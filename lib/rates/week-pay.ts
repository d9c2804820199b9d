import {
  added,
  decimalText,
  dividedBy,
  type Exact,
  exact,
  exactOf,
  notBelowZero,
  times,
} from "@/lib/rates/exact";
import { flatSumPremium, overtimePremium, regularRate } from "@/lib/rates/regular-rate";

/** An amount beside the hours of a workweek (29 CFR 778.202-.224). */
export interface Extra {
  kind: "ordinary" | "flat-sum" | "creditable" | "excluded";
  /** A decimal text. */
  amount: string;
}

/** Seconds at one rate in one bucket; `inRange` says whether they are paid in this period. */
export interface RatedTime {
  seconds: number;
  rate: string | null;
  bucket: "regular" | "overtime" | "double";
  inRange: boolean;
}

export interface WeekFacts {
  /** All paid time of the workweek. */
  time: readonly RatedTime[];
  extras: readonly Extra[];
  /** True where the workweek's last day is in the range: then the extras belong to it. */
  paysExtras: boolean;
  flatSum: "all-hours" | "regular-hours";
}

/** What a workweek pays, as decimal texts; `total` is the sum of the three amounts as shown. */
export interface WeekPay {
  straightTime: string;
  extras: string;
  regularRate: string | null;
  overtimePremium: string;
  total: string;
}

/**
 * The pay of a workweek for its days in the range, at the whole week's rate (CALCULATIONS.md 4).
 * Amounts are rounded half up to cents once, at the end; the rate is exact to six places. Where a
 * range cuts the workweek, creditable amounts lessen the premium of both parts alike, so that the
 * parts sum to the whole.
 */
export function weekPay(facts: WeekFacts): WeekPay {
  const inRange = facts.time.filter((time) => time.inRange);
  const straightTime = straightOf(inRange);
  const extras = facts.paysExtras ? amountOf(facts.extras, kinds) : exact(0);
  const premium = premiumIn(facts, inRange);
  const cents = [straightTime, extras, premium].map((amount) => decimalText(amount, 2));
  const rate = fullRate(facts);
  return {
    straightTime: cents[0]!,
    extras: cents[1]!,
    regularRate: rate && decimalText(rate, 6),
    overtimePremium: cents[2]!,
    total: decimalText(added(...cents.map(exactOf)), 2),
  };
}

const kinds: readonly Extra["kind"][] = ["ordinary", "flat-sum", "creditable", "excluded"];

/** The premium of the days in the range, less its part of what is set against it; never below 0. */
function premiumIn(facts: WeekFacts, inRange: readonly RatedTime[]): Exact {
  const whole = grossPremium(facts, facts.time);
  if (whole.numerator === 0n) return whole;
  const credit = times(exact(-1), amountOf(facts.extras, ["creditable"]));
  const due = notBelowZero(added(whole, credit));
  return times(grossPremium(facts, inRange), dividedBy(due, whole));
}

function grossPremium(facts: WeekFacts, time: readonly RatedTime[]): Exact {
  const hours = { overtime: hoursOf(time, "overtime"), double: hoursOf(time, "double") };
  const { rate, flatRate } = ratesOf(facts);
  return added(overtimePremium(rate, hours), flatSumPremium(flatRate, hours));
}

/** The regular rate that a statement shows, a flat sum's part included; null without hours. */
function fullRate(facts: WeekFacts): Exact | null {
  const { rate, flatRate } = ratesOf(facts);
  return hoursOf(facts.time).numerator > 0n ? added(rate, flatRate) : null;
}

/** The rate over all hours, and beside it that of flat sums over the regular hours (else 0). */
function ratesOf({ time, extras, flatSum }: WeekFacts): { rate: Exact; flatRate: Exact } {
  const regularHours = hoursOf(time, "regular");
  const isApart = flatSum === "regular-hours" && regularHours.numerator > 0n;
  const inRate = amountOf(extras, isApart ? ["ordinary"] : ["ordinary", "flat-sum"]);
  const rate = regularRate(added(straightOf(time), inRate), hoursOf(time)) ?? exact(0);
  const flatRate = isApart ? dividedBy(amountOf(extras, ["flat-sum"]), regularHours) : exact(0);
  return { rate, flatRate };
}

function straightOf(time: readonly RatedTime[]): Exact {
  const parts = time.map(({ seconds, rate }) => times(exactOf(rate ?? "0"), exact(seconds)));
  return times(added(...parts), exact(1, 3600));
}

function hoursOf(time: readonly RatedTime[], bucket?: RatedTime["bucket"]): Exact {
  const wanted = time.filter((one) => bucket === undefined || one.bucket === bucket);
  return exact(
    wanted.reduce((total, { seconds }) => total + seconds, 0),
    3600,
  );
}

function amountOf(extras: readonly Extra[], wanted: readonly Extra["kind"][]): Exact {
  const amounts = extras.filter(({ kind }) => wanted.includes(kind));
  return added(...amounts.map(({ amount }) => exactOf(amount)));
}
