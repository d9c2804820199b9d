import type { Activity, EventBody, LooseEndCode } from "@/lib/ledger/schema";

/**
 * One event of one worker as the fold reads it: parsed, corrected, with everything that was
 * resolved when it was booked (LEDGER.md 2 and 5). Instants are epoch milliseconds.
 */
export interface LedgerEvent {
  id: string;
  /** The instant it counts at: the tablet's best guess, or what the server made of it. */
  atMs: number;
  /** Order within one kiosk when instants are equal. */
  seq: number;
  /** The kiosk it was tapped on; null for the office, a phone or a job. */
  kiosk: string | null;
  session: string;
  /** The cell that the act belongs to, resolved at booking; null where the act has none. */
  cell: string | null;
  /** The worker number of the lead who entered it for the worker; null if it was the worker. */
  by: string | null;
  /** When the server got it; null while it waits in the kiosk. */
  receivedMs: number | null;
  /** Fair-split weights in whole seconds, one per item of `body.items`, fixed at booking. */
  weights: readonly number[];
  /** Questions that booking itself found (`session-late`, `clock-unmeasured`). */
  questions: readonly LooseEndCode[];
  body: EventBody;
}

/** One ticket operation in an interval with its weight in whole seconds. */
export interface WorkItem {
  ticket: string;
  operation: string;
  weight: number;
}

/** What a worker does in an interval. */
export type Doing =
  | { kind: "work"; activity: Activity; items: readonly WorkItem[] }
  | { kind: "indirect"; code: string }
  | { kind: "meal" }
  | { kind: "rest" }
  | { kind: "unassigned" };

/**
 * A stretch of a shift in which one thing was done: half-open `[start, end)` in epoch seconds;
 * `end` is null while it runs. Segments of a shift partition it, without gap or overlap.
 */
export interface Segment {
  start: number;
  end: number | null;
  doing: Doing;
  /** LEDGER.md 4: the act's cell; for breaks and unassigned time that of the act before. */
  cell: string | null;
  /** True where the start was said (`since`), not tapped. */
  said: boolean;
  /** The event that began it. */
  event: string;
}

/** A stretch of attendance as the fold found it, epoch seconds; `end` is null while it runs. */
export interface Shift {
  start: number;
  end: number | null;
  startEvent: string;
  endEvent: string | null;
  /** True where nobody ended it and the planned end stands in (loose end `no-shift-end`). */
  provisional: boolean;
  cell: string | null;
}

/** A count that stands after undo, void and move. */
export interface CountedReport {
  event: string;
  kind: "report" | "inspect";
  atMs: number;
  ticket: string;
  operation: string;
  good: number;
  rework: number;
  scrap: number;
  stop: boolean;
  causedBy: string | null;
  defects: readonly string[];
  cell: string | null;
}

/** A record or a gap that a person must settle; `(code, subject)` is its key. */
export interface LooseEnd {
  code: LooseEndCode;
  /** The id of the event that it hangs on. */
  subject: string;
  /** Where it lies in time, epoch seconds. */
  at: number;
  /** True where it needs nobody any more (`already-in` from a kiosk that was offline). */
  settled: boolean;
}

/** What holds at a site from an instant on (LEDGER.md 2: everything is effective-dated). */
export interface SiteRules {
  fromMs: number;
  timeZone: string;
  /** Minutes after local midnight at which a production day begins. */
  productionDayStartsAtMinutes: number;
  shiftLimitSeconds: number;
  sinceLimitSeconds: number;
  restMaxSeconds: number;
  mealMaxSeconds: number;
  /** `rest-short`: less time than this between two shifts, in seconds. */
  restBetweenShiftsSeconds: number;
}

/** What the fold must know of the worker besides the events. Planned shifts are in epoch seconds. */
export interface FoldFacts {
  /** Sorted by `fromMs`; the first covers everything before it too. */
  rules: readonly SiteRules[];
  planned: readonly { start: number; end: number }[];
  homeCell: string | null;
}

/** Where a worker stands after the last event: what runs, and the break that interrupts it. */
export interface Standing {
  shift: Shift;
  /** What is being done or, in a break, what the break interrupted; never a meal or a rest. */
  doing: Exclude<Doing, { kind: "meal" | "rest" }>;
  /** Where its present stretch began, epoch seconds; in a break, where its last one did. */
  since: number;
  said: boolean;
  /** The event from which it is done: what `reassign` names. */
  event: string;
  break: { kind: "meal" | "rest"; since: number; event: string } | null;
}

/** All that follows from one worker's events in a window. */
export interface Folded {
  segments: readonly Segment[];
  shifts: readonly Shift[];
  looseEnds: readonly LooseEnd[];
  reports: readonly CountedReport[];
  /** Null where no shift is open. */
  standing: Standing | null;
}
