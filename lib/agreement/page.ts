import type { CardDay } from "@/lib/agreement/card";
import { cardState, isSignedByWorker } from "@/lib/agreement/card-state";
import { spelledDay } from "@/lib/agreement/schema";
import { sum } from "@/lib/sum";

/** A worker's card as it was read. */
export interface CardRead {
  number: string;
  name: string;
  cell: string;
  days: readonly CardDay[];
  plannedSeconds: number | null;
  openEnds: number;
  isClosed: boolean;
}

/** A line of the page of cards. */
export interface CardLine {
  number: string;
  name: string;
  cell: string;
  plannedSeconds: number | null;
  presentSeconds: number;
  openEnds: number;
  state: "to look at" | "agreed" | "closed";
  isSignedByWorker: boolean;
  isSignedByLead: boolean;
  /** Dates of days that were changed after someone agreed to them. */
  lapsed: string[];
  /** How many days still run, so that they cannot be agreed to yet. */
  runningDays: number;
  /** What the lead's agreement would name, as a form sends it; empty where nothing is left. */
  toAgree: string[];
}

/** Gathers cards by state: what wants a look first, in the order of the workers' numbers. */
export function cardLines(cards: readonly CardRead[]): {
  toLookAt: CardLine[];
  agreed: CardLine[];
} {
  const lines = cards.map(lineOf);
  return {
    toLookAt: lines.filter(({ state }) => state === "to look at"),
    agreed: lines.filter(({ state }) => state !== "to look at"),
  };
}

function lineOf({
  number,
  name,
  cell,
  days,
  plannedSeconds,
  openEnds,
  isClosed,
}: CardRead): CardLine {
  const facts = { days, openEnds, isClosed };
  return {
    number,
    name,
    cell,
    plannedSeconds,
    presentSeconds: sum(days.map(({ presentSeconds }) => presentSeconds)),
    openEnds,
    state: cardState(facts),
    isSignedByWorker: isSignedByWorker(facts),
    isSignedByLead: days.length > 0 && days.every(({ agreement }) => agreement?.lead),
    lapsed: days.filter(({ agreement }) => agreement?.hasLapsed).map(({ date }) => date),
    runningDays: days.filter(({ digest }) => digest === null).length,
    toAgree: days.flatMap(({ date, digest, agreement }) =>
      digest === null || agreement?.lead || isClosed
        ? []
        : spelledDay({ worker: number, date, digest }),
    ),
  };
}
