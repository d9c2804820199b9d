import { no, ok, type Result } from "@/lib/result";
import { addDays, listDays } from "@/lib/time/site-day";

/** Production days, `past` is the first one after them. */
export interface DaySpan {
  first: string;
  past: string;
}

/** A look goes back a year and a day at most, so that a year can be compared with its like. */
const DAYS_MAX = 366;
const DAYS_USUAL = 28;
const WEEK = 7;
const TREND_WEEKS = 8;

/**
 * The days that a page's filter means, both ends said as people say them: what is not said is four
 * weeks up to today, ends the wrong way round are turned, too long a range keeps its last days.
 *
 * @param today the site's production day
 */
export function spanOf({ from, to }: { from: string; to: string }, today: string): DaySpan {
  const last = to || (from > today ? from : today);
  const first = from || addDays(last, 1 - DAYS_USUAL);
  const [start, end] = first <= last ? [first, last] : [last, first];
  const isTooLong = start < addDays(end, 1 - DAYS_MAX);
  return { first: isTooLong ? addDays(end, 1 - DAYS_MAX) : start, past: addDays(end, 1) };
}

/**
 * The days that a request for figures means: `to` is exclusive, without it up to and with today,
 * without `from` the four weeks before it.
 *
 * @returns `invalid` for an empty range, or one of more than 366 days
 */
export function decideSpan(
  { from, to }: { from?: string | undefined; to?: string | undefined },
  today: string,
): Result<DaySpan> {
  const past = to ?? addDays(today, 1);
  const first = from ?? addDays(past, -DAYS_USUAL);
  if (first >= past) return refused("Give a `to` after `from`: it is exclusive.");
  if (past > addDays(first, DAYS_MAX)) return refused(`Ask for at most ${DAYS_MAX} days at once.`);
  return ok({ first, past });
}

function refused(message: string) {
  return no("invalid", message, { errors: [{ path: "to", message }] });
}

/** The eight weeks of seven days that end where a range ends, the oldest first. */
export function trendWeeks({ past }: DaySpan): DaySpan[] {
  return Array.from({ length: TREND_WEEKS }, (_, week) => ({
    first: addDays(past, (week - TREND_WEEKS) * WEEK),
    past: addDays(past, (week + 1 - TREND_WEEKS) * WEEK),
  }));
}

/** The weeks from Monday that a range touches, cut to it; in order. */
export function weeksOf({ first, past }: DaySpan): DaySpan[] {
  const days = listDays(first, past);
  const starts = days.filter((day) => day === first || isMonday(day));
  return starts.map((start, at) => ({ first: start, past: starts[at + 1] ?? past }));
}

/** 5 January 1970 was a Monday. */
const A_MONDAY = Date.UTC(1970, 0, 5);
const DAY_MS = 86_400_000;

function isMonday(day: string): boolean {
  return ((Date.parse(day) - A_MONDAY) / DAY_MS) % WEEK === 0;
}
