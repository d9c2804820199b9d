import type { Activity } from "@/lib/ledger/schema";

/** An operation by its code, as the site has it. */
export interface SeamOperation {
  code: string;
  name: string;
  stage: string;
  cell: string;
}

/** What the attendance of a cell was made of in a range, known by its place; whole seconds. */
export interface AttendanceRow {
  place: number;
  /** Id of the cell. */
  cell: string;
  directSeconds: number;
  reworkSeconds: number;
  indirectSeconds: number;
  restSeconds: number;
  unassignedSeconds: number;
  mealSeconds: number;
}

/** An unfinished ticket operation past the standard of its whole lot. */
export interface OverRow {
  ticket: string;
  operation: string;
  standardSeconds: number;
  actualSeconds: number;
}

/** What stands beside the sums of work, as of the same moment. */
export interface SeamBoard {
  /** Those that the asker may see, in the order of the work. */
  cells: { id: string; name: string }[];
  models: string[];
  operations: SeamOperation[];
  attendance: AttendanceRow[];
  /** The farthest over first. */
  over: OverRow[];
  /** Records that are not summed yet, and since when; null: none. */
  waiting: { marks: number; sinceMs: number | null };
}

/** A stretch of somebody's time on a ticket operation; whose it was is not said. */
export interface SeamSegment {
  startMs: number;
  /** Null while it runs. */
  endMs: number | null;
  activity: Activity;
  seconds: number | null;
  cell: string | null;
}
