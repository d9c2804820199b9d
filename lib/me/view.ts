import type { CardDay } from "@/lib/agreement/card";
import type { DayPart } from "@/lib/agreement/day-text";
import { showTicket } from "@/lib/codes/ticket-code";
import { groupBy } from "@/lib/group";
import { otherWorkWords } from "@/lib/ledger/other-work-words";
import type { StatedDay } from "@/lib/policies/statement";
import { sum } from "@/lib/sum";
import { clockText, dayText } from "@/lib/time/format";

/** A part of the own time, with what its operation is called. */
export interface OwnPart extends DayPart {
  operationName: string | null;
}

/** What is known of a week: its dates, and time, plan and pay of its days. */
export interface WeekFacts {
  dates: readonly string[];
  card: readonly CardDay[];
  parts: readonly OwnPart[];
  planned: readonly { date: string; start: number; end: number }[];
  paid: readonly StatedDay[];
  timeZone: string;
  today: string;
  nowMs: number;
}

/** What one had on the bench on a day. */
interface OwnWork {
  key: string;
  what: string;
  /** The ticket as people read it; null for other work. */
  ticket: string | null;
  seconds: number;
}

/** One day of the own week. */
export interface MeDay {
  date: string;
  label: string;
  isToday: boolean;
  plannedSeconds: number | null;
  /** From coming in to leaving; null where nothing was, or will be. */
  tappedSeconds: number | null;
  paidSeconds: number;
  /** "06:58 to 15:30", "since 06:57", or what is planned. */
  span: string;
  /** Why paid and tapped are what they are, a sentence a step. */
  trail: string[];
  work: OwnWork[];
  runs: boolean;
  /** What an agreement would name; null where there is none to give. */
  digest: string | null;
  isSigned: boolean;
  isSignedByLead: boolean;
  hasLapsed: boolean;
}

/** The own week, day by day. */
export function meDays(facts: WeekFacts): MeDay[] {
  return facts.dates.map((date) => meDay(date, facts));
}

function meDay(date: string, facts: WeekFacts): MeDay {
  const { card, planned, paid, timeZone, today } = facts;
  const day = card.find((one) => one.date === date);
  const plan = planned.find((one) => one.date === date);
  const stated = paid.filter((one) => one.date === date);
  const clock = (ms: number) => clockText(ms, timeZone);
  const planText = plan ? `${clock(plan.start * 1000)} to ${clock(plan.end * 1000)}` : "";
  return {
    date,
    label: dayText(date, "en-GB"),
    isToday: date === today,
    plannedSeconds: plan ? plan.end - plan.start : null,
    tappedSeconds: day?.presentSeconds ?? null,
    paidSeconds: sum(stated.map(({ paidSeconds }) => paidSeconds)),
    span: day ? spanText(day, clock) : date >= today ? planText : "",
    trail: stated.flatMap(({ trail }) => trail.map(({ text }) => text)),
    work: day ? workOf(day, facts) : [],
    runs: day?.runs ?? false,
    digest: day?.digest ?? null,
    isSigned: Boolean(day?.agreement?.worker),
    isSignedByLead: Boolean(day?.agreement?.lead),
    hasLapsed: day?.agreement?.hasLapsed ?? false,
  };
}

function spanText({ parts, startMs, endMs, runs }: CardDay, clock: (ms: number) => string): string {
  const from = clock(Math.max(startMs, parts[0]!.startMs)); // a day of a card has parts
  if (runs) return `since ${from}`;
  return `${from} to ${clock(Math.min(endMs, Math.max(...parts.map((part) => part.endMs ?? 0))))}`;
}

/** The own tickets and other work of a day, in the order in which they were first taken up. */
function workOf({ startMs, endMs }: CardDay, { parts, nowMs }: WeekFacts): OwnWork[] {
  const own = parts.filter(
    (part) => part.startMs >= startMs && part.startMs < endMs && !breaks.includes(part.activity),
  );
  const byWork = groupBy(own, (part) => part.code ?? `${part.ticket} ${part.operation}`);
  return [...byWork].map(([key, some]) => {
    const [first] = some as [OwnPart, ...OwnPart[]];
    const { ticket, operation, operationName, code } = first;
    return {
      key,
      what: code ? otherWorkWords(code) : (operationName ?? operation ?? "no operation"),
      ticket: ticket && showTicket(ticket),
      seconds: sum(some.map((part) => part.seconds ?? Math.floor((nowMs - part.startMs) / 1000))),
    };
  });
}

const breaks = ["meal", "rest", "unassigned"];
