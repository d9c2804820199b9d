import type { HoursSums } from "@/lib/hours/sheet";
import { sum } from "@/lib/sum";
import { hoursText, roundedHundredths, shareHundredths } from "@/lib/time/format";

/** The hours of a day as texts with two decimals; the parts add up to `attended`. */
export interface DecimalDay {
  attended: string;
  direct: string;
  indirect: string;
  rest: string;
  unassigned: string;
  /** Beside attendance, so it adds up to nothing here. */
  meal: string;
}

/**
 * Writes the days of one worker as decimal hours that add up both ways (CALCULATIONS.md 4): the
 * attendance of the range is rounded once, half up; the days share it by largest remainder, and in
 * each day direct, indirect, rest and unassigned share the day's. Meals are shared alike.
 */
export function decimalDays(days: readonly HoursSums[]): DecimalDay[] {
  const attended = shared(days.map(({ attendanceSeconds }) => attendanceSeconds));
  const meals = shared(days.map(({ mealSeconds }) => mealSeconds));
  return days.map((day, index) => {
    const parts = [day.directSeconds, day.indirectSeconds, day.restSeconds, day.unassignedSeconds];
    const [direct, indirect, rest, unassigned] = shareHundredths(attended[index]!, parts).map(
      hoursText,
    ) as [string, string, string, string];
    return {
      attended: hoursText(attended[index]!),
      direct,
      indirect,
      rest,
      unassigned,
      meal: hoursText(meals[index]!),
    };
  });
}

function shared(parts: readonly number[]): number[] {
  return shareHundredths(roundedHundredths(sum(parts)), parts);
}
