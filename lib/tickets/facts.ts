import type { Activity } from "@/lib/ledger/schema";
import type { Rework } from "@/lib/tickets/reworks";
import type { CountedReport, LooseEnd } from "@/lib/timeline/schema";

/** What is known of a ticket beforehand. */
export interface TicketFacts {
  ticket: string;
  /** Pieces of the lot; 1 for a single instrument. */
  quantity: number;
  isCancelled: boolean;
  /** The routing, in order, with the cell that does each operation; none for a ticket nobody knows. */
  operations: readonly { operation: string; cell: string }[];
}

/** A count of the ticket, with who made it (worker's number or id, whichever the caller uses). */
export interface TicketReport extends CountedReport {
  worker: string;
}

/** One item's part of a segment of somebody's time on the ticket. */
export interface TicketWork {
  operation: string;
  worker: string;
  activity: Activity;
  /** Half-open, epoch seconds; null while it runs. */
  start: number;
  end: number | null;
  /** Its fair share, of what runs until the moment that is asked for. */
  seconds: number;
  cell: string | null;
  event: string;
}

/** Where an operation of a ticket stands; *working*: somebody has begun, not: somebody is on it. */
export type OperationState = "waiting" | "ready" | "working" | "finished" | "closed";

/** An operation of a ticket with all that was booked to it. */
export interface JudgedOperation {
  operation: string;
  cell: string;
  state: OperationState;
  /** An operation before it in the routing is not finished. */
  predecessorOpen: boolean;
  quantity: number;
  openQuantity: number;
  good: number;
  rework: number;
  scrap: number;
  setupEarned: boolean;
  /** All time booked to it, by anybody; rework is part of it, its rework operations are not. */
  actualSeconds: number;
  reworkSeconds: number;
  /** Its first setup, run or inspect second decides its standard; epoch milliseconds. */
  firstWorkMs: number | null;
  finishedMs: number | null;
}

/** A rework operation with the time that was booked while it was open. */
export interface JudgedRework extends Rework {
  actualSeconds: number;
}

/** A loose end of a ticket, with whose record it hangs on. */
export interface JudgeEnd extends LooseEnd {
  worker: string;
}

/** A ticket with all that follows from its reports and its time. */
export interface JudgedTicket {
  status: "open" | "finished" | "scrapped" | "cancelled";
  /** When it was finished or scrapped; epoch milliseconds. */
  endedMs: number | null;
  /** In the order of the routing. */
  operations: JudgedOperation[];
  /** Pieces that failed after their operation was finished, in the order in which they failed. */
  reworks: JudgedRework[];
  looseEnds: JudgeEnd[];
}
