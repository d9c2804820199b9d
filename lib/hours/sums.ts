import { activity } from "@/lib/ledger/schema";

/** What someone's time was, in whole seconds: attended = direct + indirect + rest + unassigned. */
export interface HourSums {
  attendedSeconds: number;
  directSeconds: number;
  indirectSeconds: number;
  restSeconds: number;
  unassignedSeconds: number;
  /** Meals, which are not attended. */
  mealSeconds: number;
}

export const NO_HOURS: HourSums = {
  attendedSeconds: 0,
  directSeconds: 0,
  indirectSeconds: 0,
  restSeconds: 0,
  unassignedSeconds: 0,
  mealSeconds: 0,
};

/** Seconds of one worker by what they were, as the database sums them. */
export interface ActivitySeconds {
  activity: "setup" | "run" | "rework" | "inspect" | "indirect" | "meal" | "rest" | "unassigned";
  seconds: number;
}

/** Gathers seconds by activity into the sums of LEDGER.md 4: rework is part of direct. */
export function hourSums(rows: readonly ActivitySeconds[]): HourSums {
  const sums = { ...NO_HOURS };
  for (const { activity: doing, seconds } of rows) {
    const isWork = activity.safeParse(doing).success;
    const key = isWork ? "direct" : (doing as "indirect" | "meal" | "rest" | "unassigned");
    sums[`${key}Seconds`] += seconds;
    if (doing !== "meal") sums.attendedSeconds += seconds;
  }
  return sums;
}

/** Adds sums up. */
export function addHours(all: readonly HourSums[]): HourSums {
  const total = { ...NO_HOURS };
  for (const sums of all) {
    for (const key of Object.keys(total) as (keyof HourSums)[]) total[key] += sums[key];
  }
  return total;
}
