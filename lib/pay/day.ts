import type { PayDay, PayTotals } from "@/lib/pay/answer";
import type { Lifted } from "@/lib/pay/overtime";
import { secondsIn } from "@/lib/pay/premiums";
import type { Bucket, PayPolicy } from "@/lib/pay/schema";
import { trailOf } from "@/lib/pay/trail";
import { sum } from "@/lib/sum";
import type { Stretch } from "@/lib/time/site-day";
import { secondsOf } from "@/lib/time/stretches";
import type { Piece } from "@/lib/timesheet/attribution";
import type { BreakStep } from "@/lib/timesheet/breaks";

/** What counts for one workday. */
export interface DayTime {
  /** As tapped. */
  worked: readonly Piece[];
  /** As rounded, in buckets. */
  lifted: readonly Lifted[];
  steps: readonly BreakStep[];
  /** Where each premium of the policy holds, by its code. */
  premiums: ReadonlyMap<string, readonly Stretch[]>;
}

/** States one workday: its seconds by bucket and premium, and why. */
export function statedDay(date: string, time: DayTime, policy: PayPolicy): PayDay {
  const { worked, lifted, steps } = time;
  const [workedSeconds, paidSeconds] = [secondsOf(worked), secondsOf(lifted)];
  const premiums = Object.fromEntries(
    [...time.premiums].map(([code, stretches]) => [code, secondsIn(lifted, stretches)]),
  );
  const roundingSeconds = paidSeconds - workedSeconds;
  return {
    date,
    workedSeconds,
    paidSeconds,
    buckets: byBucket((bucket) => secondsOf(lifted.filter((one) => one.bucket === bucket))),
    premiums,
    trail: trailOf({ steps, lifted, roundingSeconds, premiums }, policy.breaks),
  };
}

/** Sums days, or workweeks, by bucket and premium; every premium of the policy is named. */
export function totalsOf(parts: readonly PayTotals[], { premiums }: PayPolicy): PayTotals {
  return {
    paidSeconds: sum(parts.map(({ paidSeconds }) => paidSeconds)),
    buckets: byBucket((bucket) => sum(parts.map((part) => part.buckets[bucket]))),
    premiums: Object.fromEntries(
      premiums.map(({ code }) => [code, sum(parts.map((part) => part.premiums[code] ?? 0))]),
    ),
  };
}

function byBucket(secondsFor: (bucket: Bucket) => number): Record<Bucket, number> {
  return {
    regular: secondsFor("regular"),
    overtime: secondsFor("overtime"),
    double: secondsFor("double"),
  };
}
