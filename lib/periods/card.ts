import { type CardState, cardState, isSignedByWorker } from "@/lib/agreement/card-state";
import { type AgreedDay, type DayPart, dayText } from "@/lib/agreement/day-text";
import {
  agreementOf,
  type Confirmed,
  type DayAgreement,
  readAgreement,
} from "@/lib/agreement/signatures";
import { groupBy } from "@/lib/group";
import type { Warning } from "@/lib/limits/shift-facts";
import { spansOf } from "@/lib/periods/spans";
import type { Dates, GovernedWeek } from "@/lib/policies/governed";
import { policyLabel } from "@/lib/policies/in-force";
import { type StatedDay, workerStatement } from "@/lib/policies/statement";
import type { ZoneClock } from "@/lib/time/zone-clock";

/** Someone who has a card, as the office and the file name them. */
export interface CardWorker {
  id: string;
  number: string;
  name: string;
  cell: string;
  payrollNumber: string | null;
}

/** What of a worker's ledger a card is made from. */
export interface WorkerTime {
  worker: CardWorker;
  /** Around the period, in the order of time; inside it with every item. */
  parts: readonly DayPart[];
  confirms: readonly Confirmed[];
  /** Loose ends that bear on pay and that nobody has settled. */
  ends: readonly { code: string; atMs: number }[];
}

/** One workday of a card with time on it. */
export interface CardDay {
  date: string;
  startMs: number;
  endMs: number;
  /** Null while some of it runs. */
  agreement: DayAgreement | null;
  /** The stated day, two where the workweek itself was changed on it. */
  stated: StatedDay[];
}

/** A worker's card of a period. */
export interface Card {
  worker: CardWorker;
  days: CardDay[];
  warnings: Warning[];
  ends: readonly { code: string; atMs: number }[];
  state: CardState;
  signedByWorker: boolean;
  signedByLead: boolean;
}

/** What all cards of a period share. */
export interface CardRules {
  dates: Dates;
  clock: ZoneClock;
  weeksOf: (workerId: string) => readonly GovernedWeek[];
  /** SHA-256 in hex. */
  digestOf: (text: string) => string;
  nowMs: number;
  isClosed: boolean;
}

/**
 * Makes a worker's card: what the period pays, day by day, who has agreed to each day as it is now,
 * and what is left to settle. Days without time are left out.
 */
export function cardOf(time: WorkerTime, rules: CardRules): Card {
  const { worker, parts, confirms } = time;
  const weeks = rules.weeksOf(worker.id);
  const spans = spansOf(parts, rules.nowMs);
  const stated = workerStatement(spans, weeks, rules.dates, rules.clock);
  const bounds = workdays(weeks, rules.dates);
  const statedOn = groupBy(stated.days, ({ date }) => date);
  const confirmsOn = groupBy(confirms, ({ subject }) => readAgreement(subject)?.date);
  const days = bounds.flatMap(({ policy, ...day }) => {
    const own = parts.filter(
      ({ startMs, endMs }) => startMs < day.endMs && (endMs ?? rules.nowMs) > day.startMs,
    );
    const paid = statedOn.get(day.date) ?? [];
    if (own.length === 0 && paid.length === 0) return [];
    const about = confirmsOn.get(day.date) ?? [];
    return [
      { ...day, agreement: agreementTo(own, { ...day, policy }, about, rules), stated: paid },
    ];
  });
  const [first, last] = [bounds[0], bounds.at(-1)];
  const ends = time.ends.filter(({ atMs }) => {
    return first && last && atMs >= first.startMs && atMs < last.endMs;
  });
  const facts = { days, openEnds: ends.length, isClosed: rules.isClosed };
  return {
    worker,
    days,
    warnings: stated.warnings,
    ends,
    state: cardState(facts),
    signedByWorker: isSignedByWorker(facts),
    signedByLead: days.length > 0 && days.every(({ agreement }) => agreement?.lead),
  };
}

/** Null while some of the day runs. Where nobody agreed to it, no digest is worked out. */
function agreementTo(
  parts: readonly DayPart[],
  day: AgreedDay,
  about: readonly Confirmed[],
  { digestOf }: CardRules,
): DayAgreement | null {
  const { date } = day;
  if (parts.some(({ endMs }) => endMs === null)) return null;
  if (about.length === 0) return agreementOf([], { date, digest: "" });
  const text = dayText(parts, day);
  return text === null ? null : agreementOf(about, { date, digest: digestOf(text) });
}

/** Every workday of the range once, with the policy that governs it; in a changed one the later. */
function workdays(weeks: readonly GovernedWeek[], { from, to }: Dates) {
  const days = weeks.flatMap(({ week, version }) =>
    week.days.map(({ date, start, end }) => ({
      date,
      startMs: start * 1000,
      endMs: end * 1000,
      policy: policyLabel(version),
    })),
  );
  const byDate = new Map(days.map((day) => [day.date, day]));
  return [...byDate.values()].filter(({ date }) => date >= from && date < to);
}
