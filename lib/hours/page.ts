import type { HoursFilter } from "@/lib/hours/filter";
import {
  type Activity,
  type HoursDay,
  type HoursRow,
  type HoursSums,
  hoursSheet,
  totalHours,
  type WorkerHours,
} from "@/lib/hours/sheet";
import type { Tap } from "@/lib/hours/taps";
import type { Stretch, StripSpan } from "@/lib/seam/day-strip";
import { sum } from "@/lib/sum";

/** A stretch with one of its items, as the database has it. */
export interface StretchRow {
  start: number;
  end: number | null;
  item: number;
  activity: Activity;
  ticket: string | null;
  operation: string | null;
  code: string | null;
  seconds: number | null;
  cell: string | null;
  said: boolean;
  event: string;
}

/** All that the page was given. */
export interface HoursFacts {
  rows: readonly HoursRow[];
  planned: readonly { worker: string; date: string; start: number; end: number }[];
  ends: readonly { worker: string; count: number }[];
  /** Of the worker that is open, by time and item. */
  stretches: readonly StretchRow[];
  /** Of the day that is open. */
  taps: readonly Tap[];
}

/** A tap with the time that it began: what is behind a figure. */
export interface TapLine {
  tap: Tap;
  /** The stretches that it began, one an item, cut to the day. */
  began: readonly StretchRow[];
}

export interface OpenDay extends HoursDay {
  /** When the production day begins, in epoch seconds. */
  start: number;
  planned: StripSpan | null;
  /** One stretch an interval, cut to the day, for the strip. */
  stretches: readonly (Stretch & { activity: Activity })[];
  /** Empty where the day is not open. */
  taps: readonly TapLine[];
  isOpen: boolean;
}

export interface OpenWorker extends Omit<WorkerHours, "days"> {
  plannedSeconds: number | null;
  looseEnds: number;
  /** Null where the worker is not open. */
  days: readonly OpenDay[] | null;
}

export interface HoursPageView {
  workers: readonly OpenWorker[];
  total: HoursSums & { plannedSeconds: number; people: number };
}

/**
 * Puts the page together: a line for each worker, the one that is open with the days, the day that
 * is open with its taps. A plan without attendance on its day is in the worker's planned time too.
 */
export function hoursPage(
  facts: HoursFacts,
  {
    filter,
    days,
  }: {
    filter: Pick<HoursFilter, "worker" | "day">;
    days: readonly { date: string; start: number; end: number }[];
  },
): HoursPageView {
  const sheet = hoursSheet(facts.rows);
  const workers = sheet.map(({ days: own, ...worker }) => {
    const planned = facts.planned.filter((plan) => plan.worker === worker.worker);
    return {
      ...worker,
      plannedSeconds: planned.length > 0 ? sum(planned.map(({ start, end }) => end - start)) : null,
      looseEnds: facts.ends.find((end) => end.worker === worker.worker)?.count ?? 0,
      days:
        worker.worker === filter.worker
          ? own.map((day) => {
              const bounds = days.find(({ date }) => date === day.date)!;
              const plan = planned.find(({ date }) => date === day.date);
              return openDay(facts, day, { bounds, plan, isOpen: day.date === filter.day });
            })
          : null,
    };
  });
  const plannedSeconds = sum(workers.map((worker) => worker.plannedSeconds ?? 0));
  return { workers, total: { ...totalHours(sheet), plannedSeconds, people: workers.length } };
}

function openDay(
  { stretches, taps }: HoursFacts,
  day: HoursDay,
  {
    bounds,
    plan,
    isOpen,
  }: {
    bounds: { start: number; end: number };
    plan: { start: number; end: number } | undefined;
    isOpen: boolean;
  },
): OpenDay {
  const own = stretches.flatMap((row) => cutTo(row, bounds));
  return {
    ...day,
    start: bounds.start,
    isOpen,
    planned: plan ? { from: plan.start, to: plan.end } : null,
    stretches: own
      .filter(({ item }) => item === 0)
      .map(({ start, end, activity }) => ({
        start,
        end: end ?? bounds.end,
        activity,
        kind: stripKinds[activity],
      })),
    taps: isOpen
      ? taps.map((tap) => ({ tap, began: own.filter(({ event }) => event === tap.id) }))
      : [],
  };
}

/** Cuts a stretch to a day; an item's share of a cut interval is not known, so it is left out. */
function cutTo(row: StretchRow, { start, end }: { start: number; end: number }): StretchRow[] {
  const cut = {
    start: Math.max(row.start, start),
    end: row.end === null ? null : Math.min(row.end, end),
  };
  if (cut.start >= (cut.end ?? end)) return [];
  const isWhole = cut.start === row.start && cut.end === row.end;
  return [{ ...row, ...cut, seconds: isWhole ? row.seconds : null }];
}

/** How each sort of time is drawn on a day's strip. */
export const stripKinds: Record<Activity, Stretch["kind"]> = {
  setup: "work",
  run: "work",
  inspect: "work",
  rework: "rework",
  indirect: "other-work",
  rest: "rest",
  meal: "meal",
  unassigned: "unassigned",
};
