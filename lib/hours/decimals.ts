import type { HourSums } from "@/lib/hours/sums";
import { sum } from "@/lib/sum";

/** The same sums in hundredths of an hour. */
export interface Hundredths {
  attended: number;
  direct: number;
  indirect: number;
  rest: number;
  unassigned: number;
  meal: number;
}

/** A worker's days and total in decimal hours that add up, down and across. */
export interface DecimalHours {
  days: Hundredths[];
  total: Hundredths;
}

const HUNDREDTH_SECONDS = 36;

/**
 * Rounds a worker's days to hundredths of an hour so that columns and rows add up (CALCULATIONS.md
 * 4): the attended total once, half up on exact seconds; the days by largest remainder to it; within
 * a day the parts by largest remainder to the day. A total of a part is the sum of its column. Meals
 * stand beside: their total half up, the days to it.
 */
export function decimalDays(days: readonly HourSums[]): DecimalHours {
  const attended = roundedParts(days.map(({ attendedSeconds }) => attendedSeconds));
  const meals = roundedParts(days.map(({ mealSeconds }) => mealSeconds));
  const rounded = days.map((day, at) => {
    const [direct, indirect, rest, unassigned] = share(attended[at]!, [
      day.directSeconds,
      day.indirectSeconds,
      day.restSeconds,
      day.unassignedSeconds,
    ]) as [number, number, number, number];
    return { attended: attended[at]!, direct, indirect, rest, unassigned, meal: meals[at]! };
  });
  return { days: rounded, total: addHundredths(rounded) };
}

/** Adds rounded sums up: a site's total is that of its people, as shown. */
export function addHundredths(all: readonly Hundredths[]): Hundredths {
  const column = (key: keyof Hundredths) => sum(all.map((each) => each[key]));
  return {
    attended: column("attended"),
    direct: column("direct"),
    indirect: column("indirect"),
    rest: column("rest"),
    unassigned: column("unassigned"),
    meal: column("meal"),
  };
}

/** Hundredths of an hour as text with two places: 4175 is "41.75". */
export function hoursText(hundredths: number): string {
  return `${Math.floor(hundredths / 100)}.${String(hundredths % 100).padStart(2, "0")}`;
}

function roundedParts(seconds: readonly number[]): number[] {
  const total = Math.floor((sum(seconds) + HUNDREDTH_SECONDS / 2) / HUNDREDTH_SECONDS);
  return share(total, seconds);
}

/** Largest remainder: each part its floor, what is left to the largest fractions, ties to the first. */
function share(total: number, seconds: readonly number[]): number[] {
  const parts = seconds.map((each) => Math.floor(each / HUNDREDTH_SECONDS));
  const byFraction = seconds.map((each, at) => ({ at, left: each % HUNDREDTH_SECONDS }));
  byFraction.sort((a, b) => b.left - a.left); // stable: ties keep the order of the parts
  for (const { at } of byFraction.slice(0, total - sum(parts))) parts[at]! += 1;
  return parts;
}
