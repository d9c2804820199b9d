import type { ItemKey } from "@/lib/bench/schema";
import type { Bench, DaySums } from "@/lib/kiosks/schema";
import type { Activity } from "@/lib/ledger/schema";
import type { CountedReport, Doing, Segment } from "@/lib/timeline/schema";

/** A ticket operation on someone's bench with what the screen says of it. */
export interface ItemView extends ItemKey {
  /** The operation's name. */
  name: string;
  model: string;
  options: readonly string[];
  quantity: number;
  open: number;
  good: number;
  /** Setup and run of all pieces that are or will be good; null without a standard. */
  standardSeconds: number | null;
  setupSeconds: number | null;
  runSeconds: number | null;
  /** All time ever booked to it by anyone, until now. */
  actualSeconds: number;
  /** The part of each second now that goes to it, 0 to 1. */
  share: number;
}

/** What a worker's bench shows: the server's last word and the records kept here, folded as one. */
export interface BenchView {
  /** Whether there is any knowledge of this worker's day, from the server or from here. */
  isKnown: boolean;
  /** The open shift's start, epoch seconds; null where there is none. */
  shiftStart: number | null;
  /** What is being done now; null outside a shift. */
  doing: Doing | null;
  /** Since when, epoch seconds. */
  since: number | null;
  /** What is on the bench: being worked on, or waiting for the end of a break. */
  items: readonly ItemView[];
  activity: Activity | null;
  /** What a break interrupted. */
  resumes: Doing | null;
  /** The last work of this shift that is still open, to go back to. */
  previous: { activity: Activity; items: readonly ItemKey[] } | null;
  /** The event of the last work or other work of this shift, which `reassign` may move. */
  activityEvent: string | null;
  /** Counts made in this shift that stand, oldest first. */
  reports: readonly CountedReport[];
  /** The production day's segments, oldest first. */
  segments: readonly Segment[];
  today: DaySums;
  planned: { start: number; end: number } | null;
  /** `operation version` of every caution read in this shift. */
  cautionsRead: ReadonlySet<string>;
  changes: Bench["changes"];
  looseEnds: Bench["looseEnds"];
  next: Bench["next"];
}
