import type { CountedReport, Folded, LooseEnd, Segment, Shift } from "@/lib/timeline/schema";
import { split } from "@/lib/timeline/split";

/** One item's part of an interval, as it is kept; instants are epoch milliseconds. */
export interface SegmentRow {
  startMs: number;
  item: number;
  endMs: number | null;
  activity: "setup" | "run" | "rework" | "inspect" | "indirect" | "meal" | "rest" | "unassigned";
  ticket: string | null;
  operation: string | null;
  code: string | null;
  weight: number | null;
  /** The item's fair share in whole seconds; null while the interval runs. */
  seconds: number | null;
  cellId: string | null;
  said: boolean;
  eventId: string;
}

export interface ShiftRow {
  startMs: number;
  endMs: number | null;
  startEventId: string;
  endEventId: string | null;
  provisional: boolean;
  cellId: string | null;
}

export interface ReportRow extends Omit<CountedReport, "event" | "cell"> {
  id: string;
  cellId: string | null;
}

export interface LooseEndRow {
  code: string;
  subject: string;
  atMs: number;
  settled: boolean;
}

/** What is kept of one worker's window: a rebuild makes the very same rows. */
export interface DerivedRows {
  segments: readonly SegmentRow[];
  shifts: readonly ShiftRow[];
  reports: readonly ReportRow[];
  looseEnds: readonly LooseEndRow[];
}

/** Turns what the fold found into the rows that are kept, where `isKept` says so of their instant. */
export function derivedRows(folded: Folded, isKept: (atMs: number) => boolean): DerivedRows {
  return {
    segments: folded.segments.flatMap(segmentRows).filter(({ startMs }) => isKept(startMs)),
    shifts: folded.shifts.map(shiftRow).filter(({ startMs }) => isKept(startMs)),
    reports: folded.reports.map(reportRow).filter(({ atMs }) => isKept(atMs)),
    looseEnds: folded.looseEnds.map(looseEndRow).filter(({ atMs }) => isKept(atMs)),
  };
}

function segmentRows({ start, end, doing, cell, said, event }: Segment): SegmentRow[] {
  const row: SegmentRow = {
    startMs: start * 1000,
    item: 0,
    endMs: end === null ? null : end * 1000,
    activity: doing.kind === "work" ? doing.activity : doing.kind,
    ticket: null,
    operation: null,
    code: doing.kind === "indirect" ? doing.code : null,
    weight: null,
    seconds: end === null ? null : end - start,
    cellId: cell,
    said,
    eventId: event,
  };
  if (doing.kind !== "work") return [row];
  const weights = doing.items.map(({ weight }) => weight);
  const shares = end === null ? null : split(end - start, weights);
  return doing.items.map((item, place) => ({
    ...row,
    ...item,
    item: place,
    seconds: shares?.[place] ?? null,
  }));
}

function shiftRow({ start, end, startEvent, endEvent, provisional, cell }: Shift): ShiftRow {
  return {
    startMs: start * 1000,
    endMs: end === null ? null : end * 1000,
    startEventId: startEvent,
    endEventId: endEvent,
    provisional,
    cellId: cell,
  };
}

function reportRow({ event, cell, ...report }: CountedReport): ReportRow {
  return { ...report, id: event, cellId: cell };
}

function looseEndRow({ code, subject, at, settled }: LooseEnd): LooseEndRow {
  return { code, subject, atMs: at * 1000, settled };
}
