import type { CardDay } from "@/lib/agreement/card";
import type { ChangeLine } from "@/lib/me/changes";
import { type MeDay, meDays, type OwnPart } from "@/lib/me/view";
import type { Dates, GovernedWeek } from "@/lib/policies/governed";
import { workerStatement } from "@/lib/policies/statement";
import { seamScale } from "@/lib/seam/scale";
import { sum } from "@/lib/sum";
import { clockText, dayText } from "@/lib/time/format";
import { addDays, localDate } from "@/lib/time/site-day";
import type { ZoneClock } from "@/lib/time/zone-clock";
import type { Span } from "@/lib/timesheet/shifts";

/** All that the own page was given. */
export interface OwnFacts {
  me: { number: string; name: string; cell: string };
  /** A date in the week that is shown. */
  asked: string;
  today: string;
  parts: readonly OwnPart[];
  planned: readonly { date: string; start: number; end: number }[];
  weeks: readonly GovernedWeek[];
  card: readonly CardDay[];
  spans: readonly Span[];
  period: (Dates & { isClosed: boolean }) | null;
  ends: readonly { subject: string; atMs: number }[];
  changes: readonly ChangeLine[];
  clock: ZoneClock;
  nowMs: number;
}

/** A question that only the worker can answer: when a shift ended. */
export interface OwnEnd {
  subject: string;
  day: string;
  lastTap: string;
  /** What the field for the time begins with. */
  proposed: string;
}

/** Tapped and paid time of a stretch of days, seconds. */
export interface OwnSums {
  plannedSeconds: number;
  tappedSeconds: number;
  paidSeconds: number;
}

/** The own week with its days, and the period that it lies in. */
export interface OwnWeek {
  me: OwnFacts["me"];
  week: Dates & OwnSums & { label: string; isNow: boolean; before: string; after: string | null };
  period: (Dates & OwnSums & { label: string; isClosed: boolean }) | null;
  days: MeDay[];
  scaleSeconds: number;
  ends: OwnEnd[];
  changes: readonly ChangeLine[];
}

/** Puts the own page together: the workweek of the asked date, its days, and its pay period. */
export function ownWeek(facts: OwnFacts): OwnWeek {
  const { me, asked, today, changes, card, weeks, planned, nowMs, clock } = facts;
  const timeZone = clock.zone;
  // safe because the weeks were asked for around the date
  const { week } = weeks.find((one) => one.week.days.some(({ date }) => date === asked))!;
  const dates = { from: week.date, to: addDays(week.days.at(-1)!.date, 1) };
  const paid = statedIn(facts, dates);
  const shown = { dates: week.days.map(({ date }) => date), card, parts: facts.parts, planned };
  const days = meDays({ ...shown, paid, timeZone, today, nowMs });
  const isNow = days.some(({ isToday }) => isToday);
  const pairs = days.map(({ plannedSeconds, tappedSeconds }) => ({
    standardSeconds: plannedSeconds,
    actualSeconds: tappedSeconds ?? 0,
  }));
  return {
    me,
    week: {
      ...dates,
      ...sumsIn(facts, dates),
      label: `${dayText(dates.from, "en-GB")} to ${dayText(addDays(dates.to, -1), "en-GB")}`,
      isNow,
      before: addDays(dates.from, -7),
      after: isNow ? null : dates.to,
    },
    period: facts.period && periodOf(facts, facts.period),
    days,
    scaleSeconds: seamScale(pairs),
    ends: facts.ends.map((end) => ownEnd(end, facts)),
    changes,
  };
}

function statedIn({ spans, weeks, clock }: OwnFacts, dates: Dates) {
  return workerStatement(spans, weeks, dates, clock).days;
}

/** Planned time counts up to today, so that a week in the middle compares like with like. */
function sumsIn(facts: OwnFacts, dates: Dates): OwnSums {
  const isIn = ({ date }: { date: string }) => date >= dates.from && date < dates.to;
  const soFar = facts.planned.filter((plan) => isIn(plan) && plan.start * 1000 < facts.nowMs);
  const lengths = soFar.map(({ start, end }) => Math.min(end, facts.nowMs / 1000) - start);
  return {
    plannedSeconds: Math.floor(sum(lengths)),
    tappedSeconds: sum(facts.card.filter(isIn).map(({ presentSeconds }) => presentSeconds)),
    paidSeconds: sum(statedIn(facts, dates).map(({ paidSeconds }) => paidSeconds)),
  };
}

function periodOf(facts: OwnFacts, { from, to, isClosed }: NonNullable<OwnFacts["period"]>) {
  const label = `${dayText(from, "en-GB")} to ${dayText(addDays(to, -1), "en-GB")}`;
  return { from, to, isClosed, label, ...sumsIn(facts, { from, to }) };
}

function ownEnd(
  { subject, atMs }: { subject: string; atMs: number },
  { clock: { zone }, planned, nowMs }: OwnFacts,
): OwnEnd {
  const plan = planned.findLast(({ start, end }) => start * 1000 <= atMs && end * 1000 > atMs);
  const proposedMs = Math.min(plan ? plan.end * 1000 : atMs, nowMs);
  return {
    subject,
    day: dayText(localDate(atMs, zone), "en-GB"),
    lastTap: clockText(atMs, zone),
    proposed: `${localDate(proposedMs, zone)}T${clockText(proposedMs, zone)}`,
  };
}
