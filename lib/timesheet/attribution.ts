import type { PayPolicy } from "@/lib/pay/schema";
import { type Workweek, workdayIn } from "@/lib/time/workweek";
import type { Paid } from "@/lib/timesheet/breaks";

/** Paid time that lies in one workweek and counts for one of its workdays. */
export interface Piece extends Paid {
  /** Dates on which the workweek and the workday begin. */
  week: string;
  date: string;
}

type Attribution = PayPolicy["attribution"];

/** What decides where time counts. */
export interface Calendar {
  weekAt: (atSecond: number) => Workweek;
  attribution: Attribution;
}

/**
 * Cuts the paid time of a shift at workweeks and gives each piece its workday: the one in which it
 * lies (`calendar-day`, cut there too), or the one on which the shift started (`shift-start`); what
 * of such a shift reaches into the next workweek counts for that one's first workday.
 *
 * @param startsAt of the shift, rounded where the policy rounds
 */
export function attributed(paid: readonly Paid[], startsAt: number, calendar: Calendar): Piece[] {
  return paid.flatMap(({ start, end, rate }) => {
    const pieces: Piece[] = [];
    for (let at = start; at < end; at = pieces.at(-1)!.end) {
      const week = calendar.weekAt(at);
      const { date, until } = dayOf(at, startsAt, week, calendar.attribution);
      pieces.push({ start: at, end: Math.min(end, until), rate, week: week.date, date });
    }
    return pieces;
  });
}

/** The workday for which an instant of a shift counts. */
export function dateOf(atSecond: number, startsAt: number, calendar: Calendar): string {
  const week = calendar.weekAt(atSecond);
  return dayOf(atSecond, startsAt, week, calendar.attribution).date;
}

function dayOf(at: number, startsAt: number, week: Workweek, attribution: Attribution) {
  const isWhole = attribution === "shift-start";
  const { date, end } = workdayIn(week, isWhole ? startsAt : at);
  return { date, until: isWhole ? week.end : end };
}
