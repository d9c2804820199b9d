import type { PaidFigures } from "@/lib/periods/adjust";
import { sum } from "@/lib/sum";
import { hoursText, roundedHundredths, shareHundredths } from "@/lib/time/format";

/** Decimal hours with two places, as texts; `paid` is regular + overtime + double. */
export interface HourTexts {
  worked: string;
  paid: string;
  regular: string;
  overtime: string;
  double: string;
  premiums: Record<string, string>;
}

/**
 * The days of one worker's period as decimal hours that add up both ways (CALCULATIONS.md 4): the
 * paid total is rounded once, half up; double, overtime and regular share it by largest remainder,
 * ties in that order, and the days share each of them. What was worked and each premium is rounded
 * once over the period too, and shared among the days.
 *
 * @param days figures of 0 or more, all of one worker and period
 */
export function sharedHours(days: readonly PaidFigures[]): HourTexts[] {
  const bySort = (sort: "double" | "overtime" | "regular") =>
    days.map(({ buckets }) => buckets[sort]);
  const sorts = [bySort("double"), bySort("overtime"), bySort("regular")] as const;
  const paid = roundedHundredths(sum(days.map(({ paidSeconds }) => paidSeconds)));
  const totals = shareHundredths(paid, sorts.map(sum));
  const [double, overtime, regular] = sorts.map((own, at) => shareHundredths(totals[at]!, own));
  const worked = sharedOnce(days.map(({ workedSeconds }) => workedSeconds));
  const codes = [...new Set(days.flatMap(({ premiums }) => Object.keys(premiums)))];
  const premiums = codes.map((code) => [
    code,
    sharedOnce(days.map((day) => day.premiums[code] ?? 0)),
  ]) as [string, number[]][];
  return days.map((_, at) => ({
    worked: hoursText(worked[at]!),
    paid: hoursText(double![at]! + overtime![at]! + regular![at]!),
    regular: hoursText(regular![at]!),
    overtime: hoursText(overtime![at]!),
    double: hoursText(double![at]!),
    premiums: Object.fromEntries(premiums.map(([code, parts]) => [code, hoursText(parts[at]!)])),
  }));
}

/** A change of a workday as decimal hours with signs; each bucket is rounded by itself, half away from 0. */
export function changeHours({ workedSeconds, buckets, premiums }: PaidFigures): HourTexts {
  const [double, overtime, regular] = [buckets.double, buckets.overtime, buckets.regular].map(
    signedHundredths,
  ) as [number, number, number];
  return {
    worked: signedText(signedHundredths(workedSeconds)),
    paid: signedText(double + overtime + regular),
    regular: signedText(regular),
    overtime: signedText(overtime),
    double: signedText(double),
    premiums: Object.fromEntries(
      Object.entries(premiums).map(([code, seconds]) => [
        code,
        signedText(signedHundredths(seconds)),
      ]),
    ),
  };
}

/** Sums decimal hours as they are written, so that a column's sum is what stands beneath it. */
export function summedHours(hours: readonly HourTexts[]): HourTexts {
  const total = (of: (one: HourTexts) => string | undefined) =>
    signedText(sum(hours.map((one) => hundredthsOf(of(one) ?? "0"))));
  const codes = [...new Set(hours.flatMap(({ premiums }) => Object.keys(premiums)))].sort();
  return {
    worked: total(({ worked }) => worked),
    paid: total(({ paid }) => paid),
    regular: total(({ regular }) => regular),
    overtime: total(({ overtime }) => overtime),
    double: total(({ double }) => double),
    premiums: Object.fromEntries(
      codes.map((code) => [code, total(({ premiums }) => premiums[code])]),
    ),
  };
}

function sharedOnce(parts: readonly number[]): number[] {
  return shareHundredths(roundedHundredths(sum(parts)), parts);
}

function signedHundredths(seconds: number): number {
  return seconds < 0 ? -roundedHundredths(-seconds) : roundedHundredths(seconds);
}

function signedText(hundredths: number): string {
  return hundredths < 0 ? `-${hoursText(-hundredths)}` : hoursText(hundredths);
}

function hundredthsOf(text: string): number {
  return Math.round(Number(text) * 100);
}
