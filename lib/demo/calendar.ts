import { addDays, localDate } from "@/lib/time/site-day";
import { boundaryMs } from "@/lib/time/wall-time";

/** The zone of the invented town of Larkmoor. */
export const TIME_ZONE = "America/Chicago";

/** Whole weeks of history before the week in which the scenario is loaded. */
const HISTORY_WEEKS = 8;
/** The factory runs unrecorded for so long before, so that every cell has work on the first day. */
const WARM_UP_DAYS = 21;
/** Shifts are planned so far ahead. */
const PLANNED_DAYS = 14;

/** A local day; `at` gives the epoch second of so many minutes after its midnight. */
export interface DemoDay {
  /** 0 is the first day of the history, a Monday; negative before it. */
  index: number;
  date: string;
  /** 1 Monday to 7 Sunday. */
  weekday: number;
  at(minutes: number): number;
}

/** The days of the scenario, laid out backwards from the instant at which it is loaded. */
export interface DemoCalendar {
  days: readonly DemoDay[];
  /** The history's first day, a Monday. */
  startsOn: string;
  /** Its first second: the local midnight. */
  startsAt: number;
  /** The second at which the scenario is loaded: nothing happens after it. */
  endsAt: number;
  /** Index of the day in which `endsAt` lies. */
  today: number;
}

/** Lays out the calendar for an instant: `weeks` whole weeks and the current one up to now. */
export function calendarAt(nowMs: number, weeks = HISTORY_WEEKS): DemoCalendar {
  const date = localDate(nowMs, TIME_ZONE);
  const today = weeks * 7 + weekdayOf(date) - 1;
  const first = addDays(date, -today);
  const length = WARM_UP_DAYS + today + 1 + PLANNED_DAYS;
  const days = Array.from({ length }, (_, at) => dayOf(first, at - WARM_UP_DAYS));
  return {
    days,
    startsOn: first,
    startsAt: days[WARM_UP_DAYS]!.at(0),
    endsAt: Math.floor(nowMs / 1000),
    today,
  };
}

function dayOf(first: string, index: number): DemoDay {
  const date = addDays(first, index);
  return {
    index,
    date,
    weekday: weekdayOf(date),
    at(minutes) {
      const day = addDays(date, Math.floor(minutes / MINUTES_A_DAY));
      const time = clockTime(minutes % MINUTES_A_DAY);
      return Math.floor(boundaryMs(`${day}T${time}`, TIME_ZONE) / 1000);
    },
  };
}

const MINUTES_A_DAY = 1_440;

/** 1 Monday to 7 Sunday: a date's weekday is the same in every zone. */
function weekdayOf(date: string): number {
  return new Date(`${date}T00:00:00Z`).getUTCDay() || 7;
}

function clockTime(minutes: number): string {
  const two = (value: number) => String(value).padStart(2, "0");
  return `${two(Math.floor(minutes / 60))}:${two(minutes % 60)}`;
}
