import type { ShiftFacts, Warning } from "@/lib/limits/shift-facts";
import { sum } from "@/lib/sum";
import { hoursAndMinutes } from "@/lib/time/format";
import { addDays, listDays, localDate, type Stretch } from "@/lib/time/site-day";
import { overlapOf } from "@/lib/time/stretches";
import type { Workweek } from "@/lib/time/workweek";
import type { ZoneClock } from "@/lib/time/zone-clock";

const HOUR = 3600;
const DAY = 24 * HOUR;

/** Working time of a workweek, before any rounding. */
export interface WeekFacts {
  week: Workweek;
  workedSeconds: number;
}

/** Articles 3 and 5: uninterrupted rest a day, and 24 hours more once a week. */
const DAILY_REST = 11 * HOUR;
const WEEKLY_REST = 24 * HOUR + DAILY_REST;
/** Article 6, over the reference period of article 16(b) in whole weeks. */
const AVERAGE_WEEK = 48 * HOUR;
const REFERENCE_WEEKS = 17;
/** Article 8; a week has six days for the average, as the weekly rest stays out of it (16(c)). */
const AVERAGE_NIGHT = 8 * HOUR;
const DAYS_A_WEEK = 6;
/** Article 2: who works three hours of the night is a night worker. */
const NIGHT_WORK = 3 * HOUR;
/** At least seven hours with midnight to five in them; this choice is common practice. */
const NIGHT = { from: "23:00", to: "06:00" };
/** Article 4. */
const BREAK_DUE = 6 * HOUR;

/**
 * The limits of Directive 2003/88/EC, as warnings. Weeks without work are absence and neutral.
 *
 * @param shifts in order
 * @param weeks those with work, in order
 */
export function warnEuropean(
  shifts: readonly ShiftFacts[],
  weeks: readonly WeekFacts[],
  clock: ZoneClock,
): Warning[] {
  const nights = shifts.filter((shift) => nightSeconds(shift, clock) >= NIGHT_WORK);
  return [
    ...shifts.flatMap((shift, index) => dailyRest(shift, shifts.slice(index + 1, index + 25))),
    ...shifts.flatMap(breakMissing),
    ...weeks.flatMap(({ week }) => weeklyRest(shifts, week)),
    ...weeks.flatMap((_, index) => averages(referencePeriod(weeks, index), shifts, nights)),
  ];
}

/** In the 24 hours from the start of each shift there are eleven without work. */
function dailyRest(shift: ShiftFacts, later: readonly ShiftFacts[]): Warning[] {
  const until = shift.start + DAY;
  const inside = later.filter(({ start }) => start < until);
  const starts = [...inside, { start: until, date: shift.date }];
  const ends = [shift, ...inside].map(({ end }) => end);
  const rests = starts.map(({ start, date }, index) => ({ date, seconds: start - ends[index]! }));
  const longest = rests.reduce((best, rest) => (rest.seconds > best.seconds ? rest : best));
  if (longest.seconds >= DAILY_REST) return [];
  const rested = hoursAndMinutes(Math.max(0, longest.seconds));
  const text = `The longest rest in 24 hours was ${rested}; it should be 11 hours.`;
  return [{ code: "daily-rest", date: longest.date, text }];
}

function breakMissing({ date, start, end, breaks }: ShiftFacts): Warning[] {
  if (breaks.length > 0 || end - start <= BREAK_DUE) return [];
  const text = `${hoursAndMinutes(end - start)} without a break; one is due after 6 hours.`;
  return [{ code: "break-missing", date, text }];
}

/** A rest counts whole for the workweek in which it begins; of an earlier one the part inside. */
function weeklyRest(shifts: readonly ShiftFacts[], week: Workweek): Warning[] {
  const ends = [Number.NEGATIVE_INFINITY, ...shifts.map(({ end }) => end)];
  const starts = [...shifts.map(({ start }) => start), Number.POSITIVE_INFINITY];
  const isRested = ends.some((from, index) => {
    const to = starts[index]!;
    if (from >= week.end || to <= week.start) return false;
    const seconds = from >= week.start ? to - from : Math.min(to, week.end) - week.start;
    return seconds >= WEEKLY_REST;
  });
  if (isRested) return [];
  const text = "No uninterrupted rest of 35 hours (24 and the daily 11) in this workweek.";
  return [{ code: "weekly-rest", date: lastDay(week), text }];
}

/** The weeks with work among the seventeen that end with the one at `index`. */
function referencePeriod(weeks: readonly WeekFacts[], index: number): WeekFacts[] {
  const from = addDays(weeks[index]!.week.date, -7 * (REFERENCE_WEEKS - 1));
  return weeks.slice(0, index + 1).filter(({ week }) => week.date >= from);
}

function averages(
  period: readonly WeekFacts[],
  shifts: readonly ShiftFacts[],
  nights: readonly ShiftFacts[],
): Warning[] {
  const { week } = period.at(-1)!;
  const isInside = ({ start }: Stretch) => start >= period[0]!.week.start && start < week.end;
  const worked = sum(period.map(({ workedSeconds }) => workedSeconds));
  const ofWeek = worked / period.length;
  const ofDay = ofWeek / DAYS_A_WEEK;
  const isNightWorker = 2 * nights.filter(isInside).length >= shifts.filter(isInside).length;
  const over = `over ${period.length} workweeks with work`;
  const date = lastDay(week);
  return [
    ...warnIf(ofWeek > AVERAGE_WEEK, "weekly-average", date, () => {
      return `On average ${hoursAndMinutes(ofWeek)} a week ${over}, more than 48 hours.`;
    }),
    ...warnIf(isNightWorker && ofDay > AVERAGE_NIGHT, "night-average", date, () => {
      return `Night work: on average ${hoursAndMinutes(ofDay)} a day ${over}, more than 8 hours.`;
    }),
  ];
}

function warnIf(isSo: boolean, code: string, date: string, text: () => string): Warning[] {
  return isSo ? [{ code, date, text: text() }] : [];
}

function nightSeconds({ start, end }: Stretch, clock: ZoneClock): number {
  const first = addDays(localDate(start * 1000, clock.zone), -1);
  const dates = listDays(first, addDays(localDate(end * 1000, clock.zone), 1));
  return sum(
    dates.map((date) => {
      const opens = clock.secondOf(date, NIGHT.from);
      const closes = clock.secondOf(addDays(date, 1), NIGHT.to);
      const night = overlapOf({ start, end }, { start: opens, end: closes });
      return Math.max(0, night.end - night.start);
    }),
  );
}

function lastDay({ days }: Workweek): string {
  return days.at(-1)!.date;
}
