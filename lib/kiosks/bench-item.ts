import type { BenchItem } from "@/lib/kiosks/schema";
import type { BookingContext, ItemFacts, Window } from "@/lib/ledger/context";
import { openPieces, standardOf } from "@/lib/ledger/weigh";
import { sum } from "@/lib/sum";
import { shareOf } from "@/lib/timeline/day-sums";
import { isInWindow } from "@/lib/timeline/derive";
import type { Folded, WorkItem } from "@/lib/timeline/schema";

/** A worker's window and what the fold makes of it, with what else is known at that moment. */
export interface BenchSource {
  window: Window;
  folded: Folded;
  context: Pick<BookingContext, "rules" | "facts" | "next">;
  atMs: number;
}

/** The ticket operations that a worker is on, also in a break from them; may be empty. */
export function itemsOn({ standing }: Folded): readonly WorkItem[] {
  return standing?.doing.kind === "work" ? standing.doing.items : [];
}

/** What a bench says of a ticket operation that its worker is on, also of an unknown one. */
export function benchItem(item: WorkItem, source: BenchSource): BenchItem {
  const { ticket, operation, weight } = item;
  const found = source.context.facts.find((facts) => isSame(facts, item));
  if (!found) return { ...NOTHING_KNOWN, ticket, operation, weight, name: operation };
  const facts = withOwnCounts(found, source);
  const standard = standardOf(facts, source.context.rules, source.atMs);
  return {
    ticket,
    operation,
    weight,
    model: facts.model,
    options: facts.options,
    name: facts.name,
    quantity: facts.quantity,
    openQuantity: openPieces(facts),
    good: facts.good,
    setupSeconds: standard?.setupSeconds ?? null,
    runSeconds: standard?.runSeconds ?? null,
    bookedSeconds: bookedBefore(facts, source),
    hazards: facts.hazards,
  };
}

const NOTHING_KNOWN = {
  model: "",
  options: [],
  quantity: 0,
  openQuantity: 0,
  good: 0,
  setupSeconds: null,
  runSeconds: null,
  bookedSeconds: 0,
  hazards: [],
};

/** Facts are of the moment before the batch: its worker's counts are put in place of the old ones. */
function withOwnCounts(facts: ItemFacts, { window, folded }: BenchSource): ItemFacts {
  const before = window.reports.filter((report) => isSame(report, facts));
  const now = folded.reports.filter(
    (report) => isSame(report, facts) && isInWindow(window, report.atMs),
  );
  const change = (count: "good" | "scrap") =>
    sum(now.map((report) => report[count])) - sum(before.map((report) => report[count]));
  return { ...facts, good: facts.good + change("good"), scrap: facts.scrap + change("scrap") };
}

/**
 * All time booked to an item before the worker's present stretch on it, in whole seconds: others'
 * as of the instant, one's own as the fold has it now.
 */
function bookedBefore(facts: ItemFacts, { window, folded, atMs }: BenchSource): number {
  const others = facts.booked
    .filter(({ workerId }) => workerId !== window.workerId)
    .map(({ seconds, sinceMs, weight, total }) => {
      const runningSeconds = sinceMs === null ? 0 : Math.max(0, atMs - sinceMs) / 1000;
      return seconds + Math.floor((runningSeconds * (weight ?? 1)) / (total || 1));
    });
  const kept = facts.booked.find(({ workerId }) => workerId === window.workerId)?.seconds ?? 0;
  const replaced = window.segments.filter((row) => isSame(row, facts));
  const own = folded.segments
    .filter(({ start, end }) => end !== null && isInWindow(window, start * 1000))
    .filter(({ start }) => start < (folded.standing?.since ?? Number.POSITIVE_INFINITY))
    .flatMap((segment) => shareOf(segment, segment.end ?? segment.start))
    .filter((share) => isSame(share, facts));
  const ownBefore = kept - sum(replaced.map(({ seconds }) => seconds ?? 0));
  return Math.max(0, sum(others) + ownBefore + sum(own.map(({ seconds }) => seconds)));
}

/** A ticket operation by name; null for time that belongs to none. */
interface Pair {
  ticket: string | null;
  operation: string | null;
}

/** Says whether two names are of the same ticket operation. */
export function isSame(one: Pair, other: Pair): boolean {
  return one.ticket === other.ticket && one.operation === other.operation;
}
