import { groupBy } from "@/lib/group-by";
import type { TrailStep } from "@/lib/pay/answer";
import { type PaidWorkday, sumFigures } from "@/lib/periods/adjust";
import type { FilePerson, FileTotals, PayFile } from "@/lib/periods/file";
import { changeHours, type HourTexts, sharedHours, summedHours } from "@/lib/periods/file-hours";

/** A card as it is frozen, and as the file names the person. */
export interface FrozenCard {
  workerId: string;
  number: string;
  name: string;
  cell: string;
  payrollNumber: string | null;
  /** Why it was closed with questions open; null where nothing was. */
  reason: string | null;
  openEnds: number;
  signedByWorker: boolean;
  signedByLead: boolean;
}

/** A workday as it is frozen; one that is about another period is an adjustment. */
export interface FrozenDay extends PaidWorkday {
  workerId: string;
  aboutId: string;
  trail: TrailStep[];
}

/** What a closing froze, with what the file says of it. */
export interface Frozen {
  site: string;
  period: { id: string; from: string; to: string };
  revision: number;
  closedAt: string;
  closedBy: string;
  digest: string;
  cards: readonly FrozenCard[];
  /** Each with the first date of the period that it is about. */
  days: readonly (Omit<FrozenDay, "trail"> & { aboutFrom: string })[];
}

/**
 * Writes what a closing froze as its file: each person's period rounded once, parts that add up,
 * adjustments with their reference, and beside it what the sums come to and who is missing.
 * People without hours or adjustments are not in the file but beside it.
 */
export function payFileOf(frozen: Frozen): PayFile {
  const { cards, days, period, ...head } = frozen;
  const byWorker = groupBy(days, ({ workerId }) => workerId);
  const people = cards.flatMap((card) => {
    const own = byWorker.get(card.workerId);
    return own ? [personOf(card, own, period.id)] : [];
  });
  return { layout: 1, ...head, period, people, totals: totalsBeside(cards, people, days) };
}

/** The sums and names that stand beside the file of a period, before there is one. */
export function totalsOfFile(
  periodId: string,
  cards: readonly FrozenCard[],
  days: readonly FrozenDay[],
): FileTotals {
  const dated = days.map((day) => ({ ...day, aboutFrom: "" }));
  const head = { site: "", revision: 1, closedAt: "", closedBy: "", digest: "" };
  const period = { id: periodId, from: "", to: "" };
  return payFileOf({ ...head, period, cards, days: dated }).totals;
}

type DatedDay = Frozen["days"][number];

function personOf(card: FrozenCard, all: readonly DatedDay[], periodId: string): FilePerson {
  const days = all.filter(({ aboutId }) => aboutId === periodId);
  const changes = all.filter(({ aboutId }) => aboutId !== periodId);
  const ownHours = sharedHours(days);
  const changedHours = changes.map(changeHours);
  return {
    worker: card.number,
    name: card.name,
    payrollNumber: card.payrollNumber,
    cell: card.cell,
    closedWithQuestions: card.reason,
    ...figuresOf(all, [...ownHours, ...changedHours]),
    days: days.map((day, at) => ({ ...dayOf(day), hours: ownHours[at]! })),
    adjustments: changes.map((day, at) => ({
      ...dayOf(day),
      hours: changedHours[at]!,
      period: day.aboutId,
      reference: `${day.aboutFrom}/${day.date}`,
    })),
  };
}

function dayOf({ workweek, date, policy, ...rest }: DatedDay) {
  const { workedSeconds, paidSeconds, buckets, premiums } = rest;
  return { workweek, date, policy, workedSeconds, paidSeconds, buckets, premiums };
}

function figuresOf(days: readonly DatedDay[], hours: readonly HourTexts[]) {
  return { ...sumFigures(days), hours: summedHours(hours) };
}

function totalsBeside(
  cards: readonly FrozenCard[],
  people: readonly FilePerson[],
  days: readonly DatedDay[],
): FileTotals {
  const paid = new Set(people.map(({ worker }) => worker));
  const hours = summedHours(people.map((person) => person.hours));
  return {
    ...sumFigures(days),
    hours,
    headcount: people.length,
    closedWithQuestions: cards.flatMap(({ number, name, reason }) =>
      reason === null ? [] : [{ worker: number, name, reason }],
    ),
    withoutHours: cards.flatMap(({ number, name }) =>
      paid.has(number) ? [] : [{ worker: number, name }],
    ),
  };
}
