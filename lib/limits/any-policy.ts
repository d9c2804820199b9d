import type { ShiftFacts, Warning } from "@/lib/limits/shift-facts";
import { hoursAndMinutes } from "@/lib/time/format";
import { addDays } from "@/lib/time/site-day";

/** One day of rest in seven is the common rule; the seventh day in a row is worth a look. */
const CONSECUTIVE_DAYS = 6;
/** Common practice: past twelve hours the risk of accidents climbs. */
const SHIFT_SECONDS = 12 * 3600;

/** Warns of long shifts and of more than six days in a row, whatever the policy. */
export function warnAlways(shifts: readonly ShiftFacts[]): Warning[] {
  return [...shifts.flatMap(shiftLength), ...consecutiveDays(shifts)];
}

function shiftLength({ date, start, end }: ShiftFacts): Warning[] {
  if (end - start <= SHIFT_SECONDS) return [];
  const text = `The shift lasted ${hoursAndMinutes(end - start)}, more than 12 hours.`;
  return [{ code: "shift-length", date, text }];
}

/** One warning a run of days, on its seventh. */
function consecutiveDays(shifts: readonly ShiftFacts[]): Warning[] {
  const dates = [...new Set(shifts.map(({ date }) => date))].sort();
  let inRow = 0;
  return dates.flatMap((date, index) => {
    inRow = dates[index - 1] === addDays(date, -1) ? inRow + 1 : 1;
    if (inRow !== CONSECUTIVE_DAYS + 1) return [];
    const text = "This is the seventh day worked in a row, also across workweeks.";
    return [{ code: "consecutive-days", date, text }];
  });
}
