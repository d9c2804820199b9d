import type { Activity } from "@/lib/ledger/schema";
import type { StandardRow } from "@/lib/standards/in-force";
import type { JudgedTicket, TicketReport, TicketWork } from "@/lib/tickets/facts";
import { judge } from "@/lib/tickets/judge";
import { split } from "@/lib/timeline/split";

/** An operation of a ticket, with what the judge last kept of it; instants in epoch milliseconds. */
export interface BookedOperation {
  id: string;
  operation: string;
  name: string;
  stage: string;
  cellId: string;
  cell: string;
  hazards: string[];
  state: "waiting" | "ready" | "working" | "finished" | "closed";
  good: number;
  rework: number;
  scrap: number;
  openQuantity: number;
  actualSeconds: number;
  firstWorkMs: number | null;
  finishedMs: number | null;
  /** The base and the adders of the ticket's own options. */
  standards: StandardRow[];
}

/** One item's part of a segment; `weights` of the whole interval where it runs. */
export interface BookedWork {
  worker: string;
  number: string;
  name: string;
  operation: string;
  activity: Activity;
  startMs: number;
  endMs: number | null;
  seconds: number | null;
  item: number;
  cell: string | null;
  event: string;
  weights: number[] | null;
}

/** All that is booked to a ticket number, known or not, and what was last made of it. */
export interface TicketBook {
  ticket: string;
  known: {
    id: string;
    quantity: number;
    status: JudgedTicket["status"];
    finishedMs: number | null;
    dueOn: string | null;
    model: string;
    options: string[];
  } | null;
  operations: BookedOperation[];
  reports: TicketReport[];
  work: BookedWork[];
  looseEnds: { code: string; subject: string; worker: string; atMs: number; settled: boolean }[];
  /** Keys of the loose ends that were answered. */
  settled: string[];
}

/**
 * Judges all that is booked to a ticket. A number that is no ticket's has no operations, so that
 * everything booked to it asks.
 *
 * @param untilMs until when time that runs counts; null leaves it out, as what is kept must not
 *   depend on when it was made
 */
export function judgeBook(book: TicketBook, untilMs: number | null): JudgedTicket {
  const { known, operations, reports, settled } = book;
  const facts = {
    ticket: book.ticket,
    quantity: known?.quantity ?? 1,
    isCancelled: known?.status === "cancelled",
    operations: operations.map(({ operation, cellId }) => ({ operation, cell: cellId })),
  };
  const work = book.work.map((one) => workOf(one, untilMs));
  return judge(facts, reports, work, new Set(settled));
}

function workOf(one: BookedWork, untilMs: number | null): TicketWork {
  const { startMs, endMs } = one;
  return {
    operation: one.operation,
    worker: one.worker,
    activity: one.activity,
    start: startMs / 1000,
    end: endMs === null ? null : endMs / 1000,
    seconds: one.seconds ?? runningSeconds(one, untilMs),
    cell: one.cell,
    event: one.event,
  };
}

/** The fair share of an interval that runs, as if it ended at `untilMs`. */
function runningSeconds({ startMs, weights, item }: BookedWork, untilMs: number | null): number {
  if (untilMs === null || !weights || untilMs < startMs) return 0;
  return split(Math.floor((untilMs - startMs) / 1000), weights)[item] ?? 0;
}
