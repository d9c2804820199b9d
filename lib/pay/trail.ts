import { groupBy } from "@/lib/group-by";
import type { TrailStep } from "@/lib/pay/answer";
import type { Lifted } from "@/lib/pay/overtime";
import type { BreakRules } from "@/lib/pay/schema";
import { exactLength } from "@/lib/time/exact-length";
import { secondsOf } from "@/lib/time/stretches";
import type { BreakStep } from "@/lib/timesheet/breaks";

/** What the trail of a day is written from. */
export interface DaySteps {
  steps: readonly BreakStep[];
  lifted: readonly Lifted[];
  /** Paid less worked. */
  roundingSeconds: number;
  premiums: Readonly<Record<string, number>>;
}

/**
 * Writes why a day's seconds are what they are: its breaks, rounding, then the buckets in the order
 * in which the day reached them, then premiums. The bucket steps sum to the day's paid seconds.
 */
export function trailOf(day: DaySteps, rules: BreakRules): TrailStep[] {
  const { roundingSeconds, premiums } = day;
  return [
    ...day.steps.map((step) => breakStep(step, rules)),
    ...(roundingSeconds === 0 ? [] : [roundingStep(roundingSeconds)]),
    ...liftSteps(day.lifted),
    ...Object.entries(premiums)
      .filter(([, seconds]) => seconds > 0)
      .map(([code, seconds]) => ({
        rule: "premium",
        seconds,
        text: `${exactLength(seconds)} carry the premium ${code}, beside their bucket.`,
      })),
  ];
}

function breakStep({ rule, start, end }: BreakStep, rules: BreakRules): TrailStep {
  const seconds = end - start;
  const length = exactLength(seconds);
  const { restPaidUpToMinutes, mealUnpaidFromMinutes } = rules;
  const paidWhole = seconds > restPaidUpToMinutes * 60 ? "paid whole" : "paid";
  const texts: Record<BreakStep["rule"], string> = {
    "rest-paid": `A rest of ${length} is ${paidWhole}; the limit is ${restPaidUpToMinutes} min.`,
    "rest-unpaid": `${length} of a rest are beyond ${restPaidUpToMinutes} min and unpaid.`,
    "meal-paid": `A meal of ${length} is under ${mealUnpaidFromMinutes} min and paid whole.`,
    "meal-unpaid": `A meal of ${length} is unpaid.`,
    "off-duty": `${length} off duty inside the shift are unpaid.`,
  };
  return { rule, seconds, text: texts[rule] };
}

function roundingStep(seconds: number): TrailStep {
  const length = exactLength(Math.abs(seconds));
  const text = `Rounding the shift's start and end ${seconds > 0 ? "adds" : "takes"} ${length}.`;
  return { rule: "rounding", seconds, text };
}

/** One step for each rule, tier and bucket. */
function liftSteps(lifted: readonly Lifted[]): TrailStep[] {
  const groups = groupBy(lifted, ({ rule, bucket, overHours }) =>
    [rule, bucket, overHours].join(" "),
  );
  return [...groups.values()].map((group) => {
    const { rule, bucket, overHours } = group[0]!;
    const seconds = secondsOf(group);
    const length = exactLength(seconds);
    const texts: Record<Lifted["rule"], string> = {
      regular: `${length} within every limit: regular.`,
      daily: `${length} over ${overHours} h of the workday: ${bucket}.`,
      "seventh-day": `${length} over ${overHours} h on the seventh day of a workweek with work on all seven: ${bucket}.`,
      weekly: `${length} over ${overHours} h of the workweek, lifted hours not counted: ${bucket}.`,
    };
    return { rule, seconds, text: texts[rule] };
  });
}
