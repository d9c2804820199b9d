import { sum } from "@/lib/sum";
import { openRework, type Rework, reworkOf } from "@/lib/tickets/reworks";
import type { CountedReport } from "@/lib/timeline/schema";

/** What the reports of one ticket operation come to. */
interface Tally {
  /** Pieces that it has to do: the lot less what earlier operations lost. */
  quantity: number;
  /** Pieces still to be made good; rework is among them. */
  openQuantity: number;
  good: number;
  /** Pieces ever reported as rework. */
  rework: number;
  scrap: number;
  /** Whether the setup standard is earned: with the first good piece, or the first one inspected. */
  setupEarned: boolean;
  /** The instant of the report that brought the open pieces to none; epoch milliseconds. */
  finishedMs: number | null;
}

/** What all reports of a ticket come to. */
export interface TicketTally {
  /** One per operation of the routing, in its order. */
  operations: Tally[];
  /** In the order in which they were opened. */
  reworks: Rework[];
  /** When the last piece of the lot was lost; null while there is one. */
  scrappedMs: number | null;
  /** Reports that count more than there is, each once: their events. */
  overCounts: string[];
}

/**
 * Counts a ticket's reports through its routing (LEDGER.md 5). Counts are deltas. An operation is
 * finished at the report that brings its open pieces to none, be it its own or an earlier
 * operation's scrap; what is counted beyond the lot is kept. What is counted on a finished operation while pieces
 * of it are reworked is counted there.
 *
 * @param routing codes of the operations, in order
 * @param reports in order of time; those of operations that are not in the routing are left out
 */
export function tally(
  { quantity: lot, routing }: { quantity: number; routing: readonly string[] },
  reports: readonly CountedReport[],
): TicketTally {
  const operations = routing.map(() => emptyTally(lot));
  const reworks: Rework[] = [];
  const result: TicketTally = { operations, reworks, scrappedMs: null, overCounts: [] };
  const of = (code: string) => operations[routing.indexOf(code)];
  for (const report of reports) {
    const counted = of(report.operation);
    if (!counted) continue;
    const before = sum(operations.map(excess));
    const redone = openRework(reworks, report.operation);
    const opened = redone
      ? null
      : reworkOf(report, (code) => typeof of(code)?.finishedMs === "number");
    if (redone) addRework(redone, counted, report);
    else add(counted, report);
    if (opened) reworks.push(opened);
    flow(operations, lot, report.atMs);
    closeReworks(reworks, of, report.atMs);
    if (sum(operations.map(excess)) > before) result.overCounts.push(report.event);
    const lost = sum(operations.map(({ scrap }) => scrap));
    if (lost >= lot) result.scrappedMs ??= report.atMs;
  }
  return result;
}

function emptyTally(lot: number): Tally {
  return {
    quantity: lot,
    openQuantity: lot,
    good: 0,
    rework: 0,
    scrap: 0,
    setupEarned: false,
    finishedMs: null,
  };
}

function add(counted: Tally, { kind, good, rework, scrap }: CountedReport): void {
  counted.good += good;
  counted.rework += rework;
  counted.scrap += scrap;
  const seen = kind === "inspect" ? good + rework + scrap : good;
  counted.setupEarned ||= seen > 0;
}

/** A piece that is lost in its rework was good before; what is good again was counted already. */
function addRework(redone: Rework, counted: Tally, { event, good, scrap }: CountedReport): void {
  const room = redone.pieces - redone.done;
  const lost = Math.min(scrap, room, counted.good);
  counted.good += Math.max(0, good + scrap - room) - lost;
  counted.scrap += lost;
  redone.done += Math.min(room, good + scrap);
  redone.counts.push(event);
}

/** Closes what is done, and what the operation that found it has passed since. */
function closeReworks(
  reworks: readonly Rework[],
  of: (code: string) => Tally | undefined,
  atMs: number,
): void {
  for (const one of reworks) {
    const hasPassed = one.foundBy !== one.operation && of(one.foundBy)?.openQuantity === 0;
    if (one.done >= one.pieces || hasPassed) one.closedMs ??= atMs;
  }
}

/** Lets what earlier operations lost flow down the routing, and finishes what has nothing left. */
function flow(operations: Tally[], lot: number, atMs: number): void {
  let quantity = lot;
  for (const one of operations) {
    one.quantity = quantity;
    one.openQuantity = Math.max(0, quantity - one.good - one.scrap);
    if (one.openQuantity === 0 && quantity > 0) one.finishedMs ??= atMs;
    quantity = Math.max(0, quantity - one.scrap);
  }
}

function excess({ quantity, good, scrap }: Tally): number {
  return Math.max(0, good + scrap - quantity);
}
