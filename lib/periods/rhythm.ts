import { addDays, listDays } from "@/lib/time/site-day";

/** How a site parts its time: a first day, and so many days from each on. */
export interface Rhythm {
  startsOn: string;
  days: number;
}

/** Workdays from `from` up to, not including, `to`. */
export interface PeriodDates {
  from: string;
  to: string;
}

/** The most periods that are opened at once: a site that begins years back goes on the next time. */
const AT_ONCE = 60;

/**
 * The periods that are still to be opened so that `today` has one: each begins where the last ended,
 * the first where the rhythm does. Where the rhythm changed, the last period of the old one is
 * followed by one that is as long as the new one says, or shorter, up to the new first day.
 *
 * @param lastTo the end of the latest period there is; null before the first
 */
export function duePeriods(rhythm: Rhythm, lastTo: string | null, today: string): PeriodDates[] {
  const due: PeriodDates[] = [];
  let from = lastTo ?? rhythm.startsOn;
  while (from <= today && due.length < AT_ONCE) {
    const to = endOf(from, rhythm);
    due.push({ from, to });
    from = to;
  }
  return due;
}

function endOf(from: string, { startsOn, days }: Rhythm): string {
  if (from < startsOn) {
    const whole = addDays(from, days);
    return whole < startsOn ? whole : startsOn;
  }
  const since = listDays(startsOn, from).length % days;
  return addDays(from, days - since);
}
