import { type DayPart, dayText } from "@/lib/agreement/day-text";
import { agreementOf, type Confirmed, type DayAgreement } from "@/lib/agreement/signatures";
import { policyOf } from "@/lib/pay/presets";
import { type Dates, type GovernedWeek, governedWeeks } from "@/lib/policies/governed";
import { type PolicyBook, policyLabel } from "@/lib/policies/in-force";
import { sum } from "@/lib/sum";
import type { Workday } from "@/lib/time/workweek";
import type { ZoneClock } from "@/lib/time/zone-clock";
import type { Span } from "@/lib/timesheet/shifts";

/** A workday of a worker's card: its time, and who has agreed to it. */
export interface CardDay {
  date: string;
  startMs: number;
  endMs: number;
  /** The parts that reach into it, by time, whole. */
  parts: readonly DayPart[];
  /** From coming in to leaving, meals too: what is planned is counted in the same way. */
  presentSeconds: number;
  runs: boolean;
  /** What an agreement to it names; null where there is nothing to agree to, or some still runs. */
  digest: string | null;
  agreement: DayAgreement | null;
}

/** What a card is made from: one worker's time and agreements, in any order. */
export interface CardSource {
  parts: readonly DayPart[];
  confirms: readonly Confirmed[];
}

/** How days are cut and hashed. */
export interface CardRules {
  weeks: readonly GovernedWeek[];
  range: Dates;
  /** The SHA-256 of a text, in hex. */
  digestOf: (text: string) => string;
  nowMs: number;
}

/** The workdays of a range that have time on them, in order, with their agreements (LEDGER.md 4). */
export function cardDays(
  source: CardSource,
  { weeks, range, digestOf, nowMs }: CardRules,
): CardDay[] {
  const days = weeks.flatMap(({ week, version }) =>
    week.days.map((day) => ({ ...day, policy: policyLabel(version) })),
  );
  const byDate = new Map(days.map((day) => [day.date, day]));
  return [...byDate.values()]
    .filter(({ date }) => date >= range.from && date < range.to)
    .flatMap((day) => {
      const made = cardDay(source, day, digestOf, nowMs);
      return made.parts.length > 0 ? [made] : [];
    });
}

function cardDay(
  { parts, confirms }: CardSource,
  { date, start, end, policy }: Workday & { policy: string },
  digestOf: (text: string) => string,
  nowMs: number,
): CardDay {
  const [startMs, endMs] = [start * 1000, end * 1000];
  const own = parts
    .filter((part) => part.startMs < endMs && (part.endMs ?? nowMs) > startMs)
    .toSorted((a, b) => a.startMs - b.startMs || a.item - b.item);
  const text = dayText(own, { date, startMs, endMs, policy });
  const digest = text === null ? null : digestOf(text);
  const present = own.filter(({ item }) => item === 0);
  return {
    date,
    startMs,
    endMs,
    parts: own,
    presentSeconds: Math.floor(
      sum(
        present.map(
          (part) => Math.min(part.endMs ?? nowMs, endMs) - Math.max(part.startMs, startMs),
        ),
      ) / 1000,
    ),
    runs: own.some((part) => part.endMs === null),
    digest,
    agreement: digest === null ? null : agreementOf(confirms, { date, digest }),
  };
}

/**
 * The workweeks of a worker in a range; a site that has not chosen a policy yet counts hours alone,
 * by calendar days from Monday, as the preset `straight` does.
 */
export function weeksOf(
  book: PolicyBook,
  workerId: string,
  range: Dates,
  clock: ZoneClock,
): GovernedWeek[] {
  const chosen = governedWeeks(book, workerId, range, clock);
  return chosen.length > 0 ? chosen : governedWeeks(straight, workerId, range, clock);
}

const SINCE = "2000-01-01";
const straight: PolicyBook = {
  versions: [{ name: "straight", version: 0, effectiveOn: SINCE, policy: policyOf("straight") }],
  choices: [{ worker: null, policy: "straight", effectiveOn: SINCE }],
};

/** A worker's time as pay reads it: everything attended but rests and meals is work. */
export function paySpans(parts: readonly DayPart[], nowMs: number): Span[] {
  return parts
    .filter(({ item, startMs, endMs }) => item === 0 && (endMs ?? nowMs) > startMs)
    .map(({ startMs, endMs, activity }) => ({
      start: startMs / 1000,
      end: Math.floor((endMs ?? nowMs) / 1000),
      kind: activity === "rest" || activity === "meal" ? activity : "work",
      rate: null,
    }));
}

const DAY_MS = 86_400_000;

/** Instants that hold every workday of a range of dates, at whatever hour the policy begins them. */
export function windowOf({ from, to }: Dates, clock: ZoneClock): { fromMs: number; toMs: number } {
  return {
    fromMs: clock.secondOf(from, "00:00") * 1000 - DAY_MS,
    toMs: clock.secondOf(to, "00:00") * 1000 + DAY_MS,
  };
}
