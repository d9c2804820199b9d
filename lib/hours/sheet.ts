import { groupBy } from "@/lib/group";
import { sum } from "@/lib/sum";
import type { TimeSums } from "@/lib/timeline/day-sums";

/** Seconds of one sort that one worker spent on one production day. */
export interface HoursRow {
  worker: string;
  name: string;
  cell: string;
  date: string;
  activity: Activity;
  seconds: number;
  /** True where some of it still runs. */
  runs: boolean;
}

export type Activity =
  | "setup"
  | "run"
  | "rework"
  | "inspect"
  | "indirect"
  | "rest"
  | "meal"
  | "unassigned";

/** The hours of a day or a range by what they were, in seconds (LEDGER.md 4). */
export type HoursSums = Pick<
  TimeSums,
  | "spanSeconds"
  | "attendanceSeconds"
  | "directSeconds"
  | "indirectSeconds"
  | "restSeconds"
  | "mealSeconds"
  | "unassignedSeconds"
>;

export interface HoursDay {
  date: string;
  sums: HoursSums;
  runs: boolean;
}

/** One worker's hours in a range: the sums of the days are the sums of the range. */
export interface WorkerHours {
  worker: string;
  name: string;
  cell: string;
  /** Days with attendance, by date. */
  days: HoursDay[];
  sums: HoursSums;
  runs: boolean;
}

/**
 * Gathers rows into one entry a worker, in the order in which the workers come first. Attendance is
 * all but meals; direct is setup, run, rework and inspection.
 */
export function hoursSheet(rows: readonly HoursRow[]): WorkerHours[] {
  const byWorker = groupBy(rows, ({ worker }) => worker);
  return [...byWorker.values()].map((own) => {
    const { worker, name, cell } = own[0]!;
    const byDate = groupBy(own, ({ date }) => date);
    const days = [...byDate].map(([date, some]) => ({
      date,
      sums: sumsOf(some),
      runs: some.some(({ runs }) => runs),
    }));
    days.sort((a, b) => (a.date < b.date ? -1 : 1));
    return { worker, name, cell, days, sums: sumsOf(own), runs: own.some(({ runs }) => runs) };
  });
}

/** The sums of a list of workers, for the head of the page. */
export function totalHours(sheet: readonly WorkerHours[]): HoursSums {
  const total = (key: keyof HoursSums) => sum(sheet.map(({ sums }) => sums[key]));
  return {
    spanSeconds: total("spanSeconds"),
    attendanceSeconds: total("attendanceSeconds"),
    directSeconds: total("directSeconds"),
    indirectSeconds: total("indirectSeconds"),
    restSeconds: total("restSeconds"),
    mealSeconds: total("mealSeconds"),
    unassignedSeconds: total("unassignedSeconds"),
  };
}

const direct: readonly Activity[] = ["setup", "run", "rework", "inspect"];

function sumsOf(rows: readonly HoursRow[]): HoursSums {
  const of = (...activities: readonly Activity[]) =>
    sum(rows.flatMap(({ activity, seconds }) => (activities.includes(activity) ? [seconds] : [])));
  const spanSeconds = sum(rows.map(({ seconds }) => seconds));
  return {
    spanSeconds,
    attendanceSeconds: spanSeconds - of("meal"),
    directSeconds: of(...direct),
    indirectSeconds: of("indirect"),
    restSeconds: of("rest"),
    mealSeconds: of("meal"),
    unassignedSeconds: of("unassigned"),
  };
}
