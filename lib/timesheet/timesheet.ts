import { breaksOf, type ShiftFacts } from "@/lib/limits/shift-facts";
import type { PayPolicy } from "@/lib/pay/schema";
import { secondsOf } from "@/lib/time/stretches";
import { type Workweek, workweeks } from "@/lib/time/workweek";
import type { ZoneClock } from "@/lib/time/zone-clock";
import { attributed, type Calendar, dateOf, type Piece } from "@/lib/timesheet/attribution";
import { type BreakStep, type BreakWarning, judgeBreaks } from "@/lib/timesheet/breaks";
import { fitPaid, roundShift } from "@/lib/timesheet/rounding";
import { type PayShift, type Span, shiftsOf, tidySpans } from "@/lib/timesheet/shifts";

/** Something of a shift with the workday for which it counts. */
type Dated<T> = T & { date: string };

/** One worker's time, judged and given to its workdays, but not yet in buckets. */
export interface Timesheet {
  /** Paid time as tapped, and as rounded; both in order. */
  worked: Piece[];
  paid: Piece[];
  steps: Dated<BreakStep>[];
  breakWarnings: Dated<BreakWarning>[];
  shifts: ShiftFacts[];
  /** The workweeks that have paid time, by the date on which they begin. */
  weeks: Map<string, Workweek>;
}

/** Makes the timesheet of some spans: shifts, breaks, rounding, then the cut (CALCULATIONS.md 4). */
export function timesheetOf(
  spans: readonly Span[],
  policy: PayPolicy,
  clock: ZoneClock,
): Timesheet {
  const calendar = { weekAt: workweeks(policy.workweek, clock), attribution: policy.attribution };
  const shifts = shiftsOf(tidySpans(spans), policy.newShiftAfterMinutes);
  const parts = shifts.map((shift) => partOf(shift, policy, clock.zone, calendar));
  const worked = parts.flatMap((part) => part.worked);
  const paid = parts.flatMap((part) => part.paid);
  const starts = [...worked, ...paid].map(({ week, start }) => ({ week, start }));
  const weeks = new Map<string, Workweek>();
  for (const { week, start } of starts) {
    if (!weeks.has(week)) weeks.set(week, calendar.weekAt(start));
  }
  return {
    worked,
    paid,
    steps: parts.flatMap((part) => part.steps),
    breakWarnings: parts.flatMap((part) => part.breakWarnings),
    shifts: parts.map(({ facts }) => facts).filter(({ workedSeconds }) => workedSeconds > 0),
    weeks,
  };
}

function partOf(shift: PayShift, policy: PayPolicy, zone: string, calendar: Calendar) {
  const { paid, steps, warnings } = judgeBreaks(shift, policy.breaks);
  const rounded = roundShift(shift, policy.rounding, zone);
  const worked = attributed(paid, shift.start, calendar);
  const dated = <T extends { start: number }>(one: T): Dated<T> => ({
    ...one,
    date: dateOf(one.start, shift.start, calendar),
  });
  const facts: ShiftFacts = {
    start: shift.start,
    end: shift.end,
    date: dateOf(shift.start, shift.start, calendar),
    workedSeconds: secondsOf(worked),
    breaks: breaksOf(shift),
  };
  return {
    worked,
    paid: attributed(fitPaid(paid, shift, rounded), rounded.start, calendar),
    steps: steps.map(dated),
    breakWarnings: warnings.map(dated),
    facts,
  };
}
