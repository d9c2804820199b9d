import { groupBy } from "@/lib/group-by";
import type { Warning } from "@/lib/limits/shift-facts";
import type { PayAnswer } from "@/lib/pay/answer";
import { statedDay, totalsOf } from "@/lib/pay/day";
import { type Lifted, liftHours } from "@/lib/pay/overtime";
import { premiumStretches } from "@/lib/pay/premiums";
import { policyOf } from "@/lib/pay/presets";
import type { PayRequest } from "@/lib/pay/request";
import type { PayPolicy } from "@/lib/pay/schema";
import { warningsOf } from "@/lib/pay/warnings";
import { weekPay } from "@/lib/rates/week-pay";
import { instantMs } from "@/lib/time/instant";
import type { Stretch } from "@/lib/time/site-day";
import { overlapOf } from "@/lib/time/stretches";
import { type Workweek, workweekFrom } from "@/lib/time/workweek";
import { type ZoneClock, zoneClock } from "@/lib/time/zone-clock";
import { zonedText } from "@/lib/time/zoned-text";
import type { Span } from "@/lib/timesheet/shifts";
import { type Timesheet, timesheetOf } from "@/lib/timesheet/timesheet";

type PayWeek = PayAnswer["workweeks"][number];
type Extras = PayRequest["extras"];

/** Time to be stated under one policy. */
export interface StatedTime {
  clock: ZoneClock;
  policy: PayPolicy;
  spans: readonly Span[];
  extras?: Extras;
  /** Says whether a workday is asked for. */
  isIn: (date: string) => boolean;
  /** What counts at all: the rest belongs to another workweek, where the workweek itself changed. */
  within?: Stretch;
}

/** A workweek with the workdays asked for. */
export interface StatedWeek extends Pick<PayWeek, "days" | "totals" | "pay"> {
  week: Workweek;
}

/** All that a workweek's part of the statement is made from. */
interface Book extends Required<Pick<StatedTime, "clock" | "policy" | "extras" | "isIn">> {
  sheet: Timesheet;
  /** True where rates or extras were given. */
  isMoney: boolean;
}

/**
 * What a worker's time comes to under a pay policy, with the reason for every second
 * (CALCULATIONS.md 4). Workweeks that the range cuts are worked out whole and shown with the days
 * inside it; days and workweeks without time are left out, unless an extra names the workweek.
 */
export function payStatement(request: PayRequest): PayAnswer {
  const { from, to, extras } = request;
  const clock = zoneClock(request.timeZone);
  const policy = policyOf(request.policy);
  const isIn = (date: string) => date >= from && date < to;
  const stated = stateTime({ clock, policy, spans: request.spans.map(spanOf), extras, isIn });
  const workweeks = stated.weeks.map(({ week, ...rest }) => ({
    start: zonedText(week.start, clock.zone),
    end: zonedText(week.end, clock.zone),
    ...rest,
  }));
  const totals = totalsOf(
    workweeks.map((week) => week.totals),
    policy,
  );
  return { workweeks, totals, warnings: stated.warnings };
}

/** States time by workweek, and what should be looked at; `payStatement` says how. */
export function stateTime(asked: StatedTime): { weeks: StatedWeek[]; warnings: Warning[] } {
  const { clock, policy, spans, extras = [], isIn, within } = asked;
  const whole = timesheetOf(spans, policy, clock);
  const sheet = within ? cutTo(whole, within) : whole;
  const isMoney = extras.length > 0 || spans.some(({ rate }) => rate !== null);
  const book = { clock, policy, sheet, extras, isIn, isMoney };
  const weeks = weeksOf(book).map((week) => statedWeek(week, book));
  return { weeks, warnings: warningsOf(whole, policy, clock, isIn) };
}

function cutTo(sheet: Timesheet, within: Stretch): Timesheet {
  const cut = <T extends Stretch>(pieces: readonly T[]) =>
    pieces
      .map((piece) => ({ ...piece, ...overlapOf(piece, within) }))
      .filter(({ start, end }) => end > start);
  return { ...sheet, worked: cut(sheet.worked), paid: cut(sheet.paid), steps: cut(sheet.steps) };
}

function spanOf({ start, end, kind, rate }: PayRequest["spans"][number]): Span {
  // safe because the request's schema has read both
  const second = (text: string) => Math.floor(instantMs(text)! / 1000);
  return { start: second(start), end: second(end), kind, rate: rate ?? null };
}

/** The workweeks with time in the range or an extra, in order. */
function weeksOf({ sheet, policy, clock, extras, isIn }: Book): Workweek[] {
  const timed = [...sheet.worked, ...sheet.paid].filter(({ date }) => isIn(date));
  const starts = new Set([...timed.map(({ week }) => week), ...extras.map((one) => one.workweek)]);
  return [...starts]
    .toSorted()
    .map((date) => sheet.weeks.get(date) ?? workweekFrom(date, policy.workweek.at, clock));
}

function statedWeek(week: Workweek, book: Book): StatedWeek {
  const { sheet, policy, clock, isIn } = book;
  const ofWeek = (piece: { week: string }) => piece.week === week.date;
  const lifted = liftHours(sheet.paid.filter(ofWeek), week, policy.overtime);
  const liftedOn = groupBy(lifted, ({ date }) => date);
  const workedOn = groupBy(sheet.worked.filter(ofWeek), ({ date }) => date);
  const premiums = premiumsIn(week, policy, clock);
  const dates = week.days
    .map(({ date }) => date)
    .filter((date) => isIn(date) && (liftedOn.has(date) || workedOn.has(date)));
  const days = dates.map((date) => {
    const [worked, paid] = [workedOn.get(date) ?? [], liftedOn.get(date) ?? []];
    const steps = sheet.steps.filter((step) => step.date === date);
    return statedDay(date, { worked, lifted: paid, steps, premiums }, policy);
  });
  return {
    week,
    days,
    totals: totalsOf(days, policy),
    ...(book.isMoney ? { pay: payOf(week, lifted, book) } : {}),
  };
}

function premiumsIn(week: Workweek, policy: PayPolicy, clock: ZoneClock) {
  const byCode = groupBy(policy.premiums, ({ code }) => code);
  return new Map([...byCode].map(([code, group]) => [code, premiumStretches(group, week, clock)]));
}

function payOf(week: Workweek, lifted: readonly Lifted[], { policy, extras, isIn }: Book) {
  const time = lifted.map(({ start, end, rate, bucket, date }) => {
    return { seconds: end - start, rate, bucket, inRange: isIn(date) };
  });
  return weekPay({
    time,
    extras: extras.filter(({ workweek }) => workweek === week.date),
    paysExtras: isIn(week.days.at(-1)!.date),
    flatSum: policy.flatSum,
  });
}
