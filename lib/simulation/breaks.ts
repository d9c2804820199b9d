import type { Random } from "@/lib/demo/random";
import type { DemoShift } from "@/lib/demo/shifts";

/** A break that someone will clock: from an epoch second on, for so long. */
export interface PlannedBreak {
  at: number;
  seconds: number;
  kind: "meal" | "rest";
}

/** Hours into the shift at which the bell rings; the long weekend shifts have a second meal. */
const bells = { short: [2, 6.2], long: [2.1, 6.9] };
const meals = { short: [4], long: [4.4, 9.2] };
const LONG_SHIFT_HOURS = 10;

/** Short rests by the bell need not be clocked: the first mostly is, the second now and then. */
const CLOCKED = [0.7, 0.2];
/** Few meals run over the site's limit of 75 minutes. */
const MEAL_OVER = 0.003;

/** Plans the breaks that someone clocks in a shift, in order; cells go to their meals in turns. */
export function breaksOf({ start, end }: DemoShift, random: Random): PlannedBreak[] {
  const length = end - start > LONG_SHIFT_HOURS * 3_600 ? "long" : "short";
  const rests = bells[length]
    .filter((_, at) => random.chance(CLOCKED[at] ?? 0))
    .map((hours) => ({ hours, seconds: restSeconds(random), kind: "rest" as const }));
  const eaten = meals[length].map((hours) => ({
    hours,
    seconds: mealSeconds(random),
    kind: "meal" as const,
  }));
  return [...rests, ...eaten]
    .map(({ hours, seconds, kind }) => ({ at: bell(start, hours, random), seconds, kind }))
    .sort((a, b) => a.at - b.at);
}

function bell(start: number, hours: number, random: Random): number {
  return start + Math.round(hours * 3_600) + random.whole(-35, 35) * 60 + random.whole(0, 59);
}

function restSeconds(random: Random): number {
  return random.chance(0.05) ? random.whole(930, 1_170) : random.whole(520, 830);
}

function mealSeconds(random: Random): number {
  return random.chance(MEAL_OVER) ? random.whole(4_620, 5_400) : random.whole(1_800, 2_150);
}
