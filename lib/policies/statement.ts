import type { Warning } from "@/lib/limits/shift-facts";
import type { PayDay } from "@/lib/pay/answer";
import { buckets } from "@/lib/pay/schema";
import { type StatedTime, stateTime } from "@/lib/pay/statement";
import type { Dates, GovernedWeek } from "@/lib/policies/governed";
import { type PolicyVersion, policyLabel } from "@/lib/policies/in-force";
import { sum } from "@/lib/sum";
import type { ZoneClock } from "@/lib/time/zone-clock";
import type { Span } from "@/lib/timesheet/shifts";

/** A workday as it is paid; `workweek` and `date` together tell it from every other of the worker. */
export interface StatedDay extends PayDay {
  /** Date on which the workweek begins. */
  workweek: string;
  /** The policy version by its label. */
  policy: string;
}

/** What a worker is paid for in a range, and what should be looked at. */
export interface WorkerStatement {
  days: StatedDay[];
  warnings: Warning[];
}

/**
 * States a worker's time for the days of a range, each workweek whole and under the version that
 * governs it. Where two workweeks overlap because their start was changed, the time they share is
 * counted in the old one alone and in the new one alone, and the greater pay stands, the old one
 * where both are equal (29 CFR 778.302).
 *
 * @param spans all that is known around the workweeks, so that shifts and averages are whole
 * @param weeks from `governedWeeks`, of the same range
 */
export function workerStatement(
  spans: readonly Span[],
  weeks: readonly GovernedWeek[],
  { from, to }: Dates,
  clock: ZoneClock,
): WorkerStatement {
  const parts = runsOf(weeks).map((run) => stateRun(run, spans, clock));
  const isIn = ({ date }: { date: string }) => date >= from && date < to;
  return {
    days: parts.flatMap(({ days }) => days).filter(isIn),
    warnings: onceEach(parts.flatMap(({ warnings }) => warnings).filter(isIn)),
  };
}

/** Two workweeks that share days both warn of them. */
function onceEach(warnings: readonly Warning[]): Warning[] {
  return [...new Map(warnings.map((one) => [`${one.code} ${one.date} ${one.text}`, one])).values()];
}

/** Workweeks that are stated together: of one version, or two that share time. */
type Run = readonly GovernedWeek[];

function runsOf(weeks: readonly GovernedWeek[]): Run[] {
  const runs: GovernedWeek[][] = [];
  for (const week of weeks) {
    const run = runs.at(-1);
    const last = run?.at(-1);
    if (week.overlap && run && last) {
      // the old week leaves the run of its like, as it is counted both ways
      run.pop();
      if (run.length === 0) runs.pop();
      runs.push([last, week], []);
    } else if (week.overlap) {
      runs.push([week], []);
    } else if (run && (!last || policyLabel(last.version) === policyLabel(week.version))) {
      run.push(week);
    } else runs.push([week]);
  }
  return runs.filter((run) => run.length > 0);
}

function stateRun(run: Run, spans: readonly Span[], clock: ZoneClock): WorkerStatement {
  const [first, second] = run;
  // shared with a week that was changed itself: the time is counted there
  if (first?.overlap) {
    const within = { start: first.overlap.end, end: first.week.end };
    return stateWeeks(run, spans, clock, { within });
  }
  if (!first || !second?.overlap) return stateWeeks(run, spans, clock, {});
  const shared = second.overlap;
  const state = (week: GovernedWeek, within?: StatedTime["within"]) =>
    stateWeeks([week], spans, clock, within ? { within } : {});
  const inOld = [state(first), state(second, { start: shared.end, end: second.week.end })] as const;
  const inNew = [
    state(first, { start: first.week.start, end: shared.start }),
    state(second),
  ] as const;
  const best = weightOf(inNew) > weightOf(inOld) ? inNew : inOld;
  return {
    days: best.flatMap(({ days }) => days),
    warnings: best.flatMap(({ warnings }) => warnings),
  };
}

function stateWeeks(
  weeks: readonly GovernedWeek[],
  spans: readonly Span[],
  clock: ZoneClock,
  more: Pick<StatedTime, "within">,
): WorkerStatement {
  const [first] = weeks;
  if (!first) return { days: [], warnings: [] };
  const dates = new Set(weeks.flatMap(({ week }) => week.days.map(({ date }) => date)));
  const { policy } = first.version;
  const isIn = (date: string) => dates.has(date);
  const stated = stateTime({ clock, policy, spans, isIn, ...more });
  const starts = new Set(weeks.map(({ week }) => week.date));
  const days = stated.weeks
    .filter(({ week }) => starts.has(week.date))
    .flatMap(({ week, days: own }) => own.map((day) => statedDay(day, week.date, first.version)));
  return { days, warnings: stated.warnings };
}

function statedDay(day: PayDay, workweek: string, version: PolicyVersion): StatedDay {
  return { ...day, workweek, policy: policyLabel(version) };
}

/** What time weighs in pay at one rate: overtime one and a half, double two. */
const weights = { regular: 2, overtime: 3, double: 4 } as const;

function weightOf(statements: readonly WorkerStatement[]): number {
  const days = statements.flatMap((statement) => statement.days);
  return sum(days.flatMap((day) => buckets.map((bucket) => day.buckets[bucket] * weights[bucket])));
}
