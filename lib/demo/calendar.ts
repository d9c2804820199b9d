import { Temporal } from "temporal-polyfill";

/** The zone of the invented town of Larkmoor. */
export const TIME_ZONE = "America/Chicago";

/** Whole weeks of history before the week in which the scenario is loaded. */
export const HISTORY_WEEKS = 8;
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
  /** The history's first second: a Monday's local midnight. */
  startsAt: number;
  /** The second at which the scenario is loaded: nothing happens after it. */
  endsAt: number;
  /** Index of the day in which `endsAt` lies. */
  today: number;
}

/** Lays out the calendar for an instant: `weeks` whole weeks and the current one up to now. */
export function calendarAt(nowMs: number, weeks = HISTORY_WEEKS): DemoCalendar {
  const zoned = Temporal.Instant.fromEpochMilliseconds(nowMs).toZonedDateTimeISO(TIME_ZONE);
  const date = zoned.toPlainDate();
  const first = date.subtract({ days: date.dayOfWeek - 1 + weeks * 7 });
  const today = weeks * 7 + date.dayOfWeek - 1;
  const length = WARM_UP_DAYS + today + 1 + PLANNED_DAYS;
  const days = Array.from({ length }, (_, at) => dayOf(first, at - WARM_UP_DAYS));
  return {
    days,
    startsAt: days[WARM_UP_DAYS]!.at(0),
    endsAt: Math.floor(nowMs / 1000),
    today,
  };
}

function dayOf(first: Temporal.PlainDate, index: number): DemoDay {
  const date = first.add({ days: index });
  return {
    index,
    date: date.toString(),
    weekday: date.dayOfWeek,
    at: (minutes) => {
      const day = date.add({ days: Math.floor(minutes / 1440) });
      const time = Temporal.PlainTime.from({
        hour: Math.floor((minutes % 1440) / 60),
        minute: minutes % 60,
      });
      return Math.floor(
        day.toPlainDateTime(time).toZonedDateTime(TIME_ZONE).epochMilliseconds / 1000,
      );
    },
  };
}
