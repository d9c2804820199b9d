import { warnAlways } from "@/lib/limits/any-policy";
import { warnCalifornia } from "@/lib/limits/california";
import { type WeekFacts, warnEuropean } from "@/lib/limits/european";
import type { Warning } from "@/lib/limits/shift-facts";
import type { BreakRules, PayPolicy } from "@/lib/pay/schema";
import { exactLength } from "@/lib/time/exact-length";
import { clockText } from "@/lib/time/format";
import { secondsOf } from "@/lib/time/stretches";
import type { ZoneClock } from "@/lib/time/zone-clock";
import type { BreakWarning } from "@/lib/timesheet/breaks";
import type { Timesheet } from "@/lib/timesheet/timesheet";

/**
 * Everything about a timesheet that someone should look at, by date; none of it blocks. Limits see
 * all the time given, warnings are shown for the days that `isIn` takes, each once.
 */
export function warningsOf(
  sheet: Timesheet,
  policy: PayPolicy,
  clock: ZoneClock,
  isIn: (date: string) => boolean,
): Warning[] {
  const found = [
    ...sheet.breakWarnings.map((one) => breakWarning(one, policy.breaks, clock.zone)),
    ...warnAlways(sheet.shifts),
    ...limitsOf(sheet, policy, clock),
  ].filter(({ date }) => isIn(date));
  const once = new Map(found.map((one) => [`${one.code} ${one.date} ${one.text}`, one]));
  return [...once.values(), ...roundingBias(sheet, isIn)].toSorted((a, b) =>
    a.date.localeCompare(b.date),
  );
}

function limitsOf(sheet: Timesheet, policy: PayPolicy, clock: ZoneClock): Warning[] {
  if (policy.limits === "us-california") return warnCalifornia(sheet.shifts);
  if (policy.limits === "eu-working-time") return warnEuropean(sheet.shifts, factsOf(sheet), clock);
  return [];
}

function factsOf({ worked, weeks }: Timesheet): WeekFacts[] {
  return [...weeks.values()]
    .map((week) => ({
      week,
      workedSeconds: secondsOf(worked.filter((piece) => piece.week === week.date)),
    }))
    .filter(({ workedSeconds }) => workedSeconds > 0)
    .toSorted((a, b) => a.week.start - b.week.start);
}

function breakWarning(
  { code, date, start, end }: BreakWarning & { date: string },
  rules: BreakRules,
  zone: string,
): Warning {
  const length = `${exactLength(end - start)} from ${clockText(start * 1000, zone)}`;
  const texts: Record<BreakWarning["code"], string> = {
    "rest-long": `A rest of ${length} is over the ${rules.restPaidUpToMinutes} min that are paid.`,
    "meal-short": `A meal of ${length} is under ${rules.mealUnpaidFromMinutes} min and paid whole.`,
    "meal-long": `A meal of ${length} is over ${rules.mealAtMostMinutes} min; ask what happened.`,
    "gap-short": `${length} off duty inside a shift are as short as a paid rest; ask what it was.`,
  };
  return { code, date, text: texts[code] };
}

/** The neutrality report: over time rounding must not take from the worker (29 CFR 785.48(b)). */
function roundingBias({ worked, paid }: Timesheet, isIn: (date: string) => boolean): Warning[] {
  const days = [...worked, ...paid].map(({ date }) => date).filter(isIn);
  const biasSeconds =
    secondsOf(paid.filter(({ date }) => isIn(date))) -
    secondsOf(worked.filter(({ date }) => isIn(date)));
  if (biasSeconds >= 0) return [];
  const date = days.toSorted().at(-1)!;
  const text = `Rounding took ${exactLength(-biasSeconds)} from the worker in this range; over time it must not favour the employer.`;
  return [{ code: "rounding-bias", date, text }];
}
