import type { DayPart } from "@/lib/agreement/day-text";
import { type PaidFigures, sumFigures } from "@/lib/periods/adjust";
import type { Card, CardDay, CardWorker } from "@/lib/periods/card";
import { changeHours, type HourTexts, sharedHours, summedHours } from "@/lib/periods/file-hours";
import type { FrozenCard } from "@/lib/periods/frozen";
import type { Stretch } from "@/lib/seam/day-strip";

/** One worker's line of the page of cards. */
export interface CardLine {
  worker: CardWorker;
  state: "to look at" | "agreed" | "closed";
  plannedSeconds: number | null;
  tappedSeconds: number;
  hours: HourTexts;
  /** What wants a look, in words; empty where nothing does. */
  toLookAt: string;
  signedByWorker: boolean;
  signedByLead: boolean;
}

/** Both leaves of the page's foot: what was agreed to, and what the file has. */
export interface Reconciliation {
  people: readonly [number, number];
  lines: readonly { name: string; book: string; day: string; isMatched: boolean }[];
}

/** A line of an open period's page. */
export function lineOfCard(card: Card, plannedSeconds: number | null): CardLine {
  const days = statedOf(card);
  const { worker, state, signedByWorker, signedByLead } = card;
  return {
    worker,
    state,
    plannedSeconds,
    tappedSeconds: sumFigures(days).workedSeconds,
    hours: summedHours(sharedHours(days)),
    toLookAt: state === "to look at" ? wantsLook(card) : (card.warnings[0]?.text ?? ""),
    signedByWorker,
    signedByLead,
  };
}

/** A line of a closed period's page: as it was frozen, adjustments of earlier ones included. */
export function lineOfFrozen(
  card: FrozenCard,
  days: readonly PaidFigures[],
  { plannedSeconds, changes }: { plannedSeconds: number | null; changes: readonly PaidFigures[] },
): CardLine {
  const { workerId: id, number, name, cell, payrollNumber, reason } = card;
  return {
    worker: { id, number, name, cell, payrollNumber },
    state: "closed",
    plannedSeconds,
    tappedSeconds: sumFigures([...days, ...changes]).workedSeconds,
    hours: summedHours([...sharedHours(days), ...changes.map(changeHours)]),
    toLookAt: reason === null ? "" : `closed with a question: ${reason}`,
    signedByWorker: card.signedByWorker,
    signedByLead: card.signedByLead,
  };
}

/** Sums two lists of lines against each other, as the foot of the page shows them. */
export function reconcile(book: readonly CardLine[], day: readonly CardLine[]): Reconciliation {
  const [left, right] = [book, day].map((lines) => summedHours(lines.map(({ hours }) => hours)));
  const paid = (lines: readonly CardLine[]) =>
    lines.filter(({ hours }) => Number(hours.paid) !== 0 || Number(hours.worked) !== 0).length;
  const rows = [
    ["regular", left!.regular, right!.regular],
    ["overtime", left!.overtime, right!.overtime],
    ["double", left!.double, right!.double],
    ...Object.keys(right!.premiums).map((code) => [
      `${code} premium`,
      left!.premiums[code] ?? "0.00",
      right!.premiums[code]!,
    ]),
    ["hours in all", left!.paid, right!.paid],
  ] as const;
  return {
    people: [paid(book), paid(day)],
    lines: rows.map(([name, one, other]) => ({
      name: name!,
      book: one!,
      day: other!,
      isMatched: one === other,
    })),
  };
}

/** The cards that nothing stands in the way of: what the book's leaf of the foot sums. */
export function linesAgreed(lines: readonly CardLine[]): CardLine[] {
  return lines.filter(({ state }) => state !== "to look at");
}

/** The parts of a worker's time on a workday, cut to it, as its strip draws them. */
export function dayStretches(
  parts: readonly DayPart[],
  { startMs, endMs }: Pick<CardDay, "startMs" | "endMs">,
  nowMs: number,
): Stretch[] {
  return parts
    .filter(({ item }) => item === 0)
    .map((part) => ({
      start: Math.max(part.startMs, startMs) / 1000,
      end: Math.min(part.endMs ?? nowMs, endMs) / 1000,
      kind: kinds[part.activity],
    }))
    .filter(({ start, end }) => end > start);
}

/** The stated days of a card, in order. */
export function statedOf({ days }: Card) {
  return days.flatMap(({ stated }) => stated);
}

function wantsLook({ ends, days, signedByLead }: Card): string {
  if (ends.length > 0) return `${ends.length} to settle`;
  if (days.some(({ agreement }) => agreement === null)) return "still at work";
  if (days.some(({ agreement }) => agreement?.hasLapsed)) return "changed since it was agreed to";
  return signedByLead ? "" : "waits for the lead";
}

const kinds: Record<DayPart["activity"], Stretch["kind"]> = {
  setup: "work",
  run: "work",
  inspect: "work",
  rework: "rework",
  indirect: "other-work",
  rest: "rest",
  meal: "meal",
  unassigned: "unassigned",
};
