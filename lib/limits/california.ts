import type { ShiftFacts, Warning } from "@/lib/limits/shift-facts";
import { hoursAndMinutes } from "@/lib/time/format";

const HOUR = 3600;
const MEAL_SECONDS = 30 * 60;
const REST_SECONDS = 10 * 60;

/**
 * California's meals and rests (Labor Code 226.7 and 512; Brinker v. Superior Court, 2012): the
 * first meal of 30 minutes begins by the end of the fifth hour of a shift with more than five hours
 * of work, the second by the end of the tenth of one with more than ten; ten minutes' rest for every
 * four hours or the major part of them, none under three and a half. The first lapse of each sort on
 * a workday proposes one premium hour at the regular rate, which a person confirms.
 */
export function warnCalifornia(shifts: readonly ShiftFacts[]): Warning[] {
  const proposed = new Set<string>();
  return shifts.flatMap((shift) => {
    const lapses = [...mealLapses(shift), ...restLapses(shift)];
    return lapses.map(({ code, sort, text }) => {
      const key = `${sort} ${shift.date}`;
      const isFirst = !proposed.has(key);
      proposed.add(key);
      const proposal = ` One ${sort} premium hour at the regular rate is proposed.`;
      return { code, date: shift.date, text: isFirst ? text + proposal : text };
    });
  });
}

interface Lapse {
  code: "meal-late" | "meal-missing" | "rest-missing";
  sort: "meal" | "rest";
  text: string;
}

const meals = [
  { after: 5, waivableTo: 6, which: "first", hour: "fifth", waiver: "by consent" },
  {
    after: 10,
    waivableTo: 12,
    which: "second",
    hour: "tenth",
    waiver: "by consent, if the first was taken",
  },
] as const;

function mealLapses(shift: ShiftFacts): Lapse[] {
  const taken = shift.breaks.filter(
    ({ kind, start, end }) => kind !== "rest" && end - start >= MEAL_SECONDS,
  );
  return meals.flatMap(({ after, waivableTo, which, hour, waiver }, index): Lapse[] => {
    if (shift.workedSeconds <= after * HOUR) return [];
    const meal = taken[index];
    if (meal && meal.start <= shift.start + after * HOUR) return [];
    const isWaivable = shift.workedSeconds <= waivableTo * HOUR;
    const waived = isWaivable ? ` It may have been waived ${waiver}.` : "";
    const [code, what] = meal
      ? ([
          "meal-late",
          `began ${hoursAndMinutes(meal.start - shift.start)} into the shift`,
        ] as const)
      : (["meal-missing", "is missing"] as const);
    const text = `The ${which} meal of 30 minutes ${what}; it is due by the end of the ${hour} hour.`;
    return [{ code, sort: "meal", text: text + waived }];
  });
}

function restLapses({ workedSeconds, breaks }: ShiftFacts): Lapse[] {
  const due = restsDue(workedSeconds);
  const taken = breaks.filter(
    ({ kind, start, end }) => kind === "rest" && end - start >= REST_SECONDS,
  ).length;
  if (taken >= due) return [];
  const text = `${taken} of ${due} rests of ten minutes were clocked.`;
  return [{ code: "rest-missing", sort: "rest", text }];
}

/** One per four hours; a rest of more than two hours counts as four. */
function restsDue(workedSeconds: number): number {
  if (workedSeconds < 3.5 * HOUR) return 0;
  const [fours, left] = [Math.floor(workedSeconds / (4 * HOUR)), workedSeconds % (4 * HOUR)];
  return fours + (left > 2 * HOUR ? 1 : 0);
}
