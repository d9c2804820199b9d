import { buckets, type PayPolicy, type Tier } from "@/lib/pay/schema";

/** Says a policy's rules as short sentences, in the order in which they are applied. */
export function policyWords(policy: PayPolicy): string[] {
  const { workweek, overtime, premiums, limits } = policy;
  const tiers = [
    ...tierWords(overtime.daily, "a day"),
    ...tierWords(overtime.weekly, "a workweek"),
    ...tierWords(overtime.seventhDay, "on a seventh day"),
  ];
  return [
    `Workweek from ${day(workweek.startsOn)} ${workweek.at}; ${attributionWords(policy)}.`,
    roundingWords(policy),
    breakWords(policy),
    tiers.length > 0 ? `${tiers.join("; ")}.` : "All time is regular; nothing is overtime.",
    ...premiums.map(({ code, from = "00:00", to = "24:00", days, dates }) => {
      const when = days ? days.map(day).join(", ") : dates.length > 0 ? dates.join(", ") : "daily";
      return `Premium ${code} from ${from} to ${to}, ${when}.`;
    }),
    ...(limits === "none" ? [] : [`Warns by ${limits}.`]),
  ];
}

function attributionWords({ attribution }: PayPolicy): string {
  return attribution === "calendar-day"
    ? "each workday has the hours worked in it"
    : "a shift counts for the workday on which it started";
}

function roundingWords({ rounding }: PayPolicy): string {
  return rounding.mode === "none"
    ? "Paid to the second."
    : `Start and end of a shift to the nearest ${rounding.minutes} minutes.`;
}

function breakWords({ breaks }: PayPolicy): string {
  const { restPaidUpToMinutes, mealUnpaidFromMinutes, mealAtMostMinutes } = breaks;
  return `Rests paid up to ${restPaidUpToMinutes} min, meals unpaid from ${mealUnpaidFromMinutes} min, looked at over ${mealAtMostMinutes} min.`;
}

function tierWords(tiers: readonly Tier[], per: string): string[] {
  return tiers
    .toSorted((a, b) => a.overHours - b.overHours || at(a) - at(b))
    .map(({ overHours, bucket }) => `Over ${overHours} h ${per} ${bucket}`);
}

function at({ bucket }: Tier): number {
  return buckets.indexOf(bucket);
}

function day(weekday: string): string {
  return weekday[0]!.toUpperCase() + weekday.slice(1);
}
