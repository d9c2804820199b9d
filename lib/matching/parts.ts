import type { Activity } from "@/lib/ledger/schema";

/** Time of a cell that nobody knows, and work on a ticket whose model nobody knows. */
export const UNKNOWN = "00000000-0000-0000-0000-000000000000";

/** What was booked to, or earned by, a ticket operation on a production day in a cell. */
export interface BookedPart {
  operation: string;
  day: string;
  cell: string;
  /** `earned` is what its counts earned by standard; all else is time. */
  activity: Activity | "earned";
  seconds: number;
  /** Of `seconds`, what has no standard to be held against. */
  noStandardSeconds: number;
  /** Of the rework here, what another cell caused. */
  elsewhereSeconds: number;
  /** Good pieces counted; with `earned` only. */
  pieces: number;
  /** When the first second of it began, epoch milliseconds; null with `earned`. */
  firstMs: number | null;
}

/** A finished ticket operation's share of one cell, on the production day on which it was finished. */
export interface MatchedPart {
  operation: string;
  /** The event that opened it where it is a rework operation, else empty. */
  rework: string;
  day: string;
  cell: string;
  /** Pieces finished; in the operation's own cell only. */
  pieces: number;
  actualSeconds: number;
  reworkSeconds: number;
  /** Of the rework, what another cell caused. */
  elsewhereSeconds: number;
  /** Of `actualSeconds`, and of `reworkSeconds`, what has no standard to be held against. */
  noStandardSeconds: number;
  noStandardReworkSeconds: number;
  /** Shared among the cells by the time that each put in. */
  earnedSeconds: number;
  /** The same earning in the cells of its counts: what is moved between cells is the difference. */
  reportEarnedSeconds: number;
}

/** An unfinished ticket operation that took more already than its whole lot should. */
export interface OverPart {
  operation: string;
  cell: string;
  standardSeconds: number;
  actualSeconds: number;
}

/** All that a ticket gives to the comparison of standard and actual. */
export interface TicketParts {
  booked: BookedPart[];
  matched: MatchedPart[];
  over: OverPart[];
}
