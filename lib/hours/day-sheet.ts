import { groupBy } from "@/lib/group";
import type { HourSums } from "@/lib/hours/sums";
import { hourSums } from "@/lib/hours/sums";
import { type Tap, tapWords } from "@/lib/hours/tap-words";
import { otherWorkWords } from "@/lib/ledger/other-work-words";
import type { StretchKind, Stretch as StripStretch } from "@/lib/seam/day-strip";
import type { DayRule, Stretch } from "@/lib/time/site-day";
import { dayBounds } from "@/lib/time/site-day";
import type { SegmentRow } from "@/lib/timeline/rows";
import { split } from "@/lib/timeline/split";

/** A segment's row with the words that a person knows its work by. */
export interface NamedSegment extends Omit<SegmentRow, "cellId"> {
  operationName: string | null;
  cell: string | null;
}

/** A share of an interval: a ticket operation someone was on, and for how long. */
export interface ShareLine {
  ticket: string;
  operation: string;
  name: string;
  seconds: number;
}

/** A line of a day: a stretch of time, or a record that began none. Instants in epoch seconds. */
export interface DayLine {
  key: string;
  at: number;
  /** The end of the stretch within the day; null for a record that began none. */
  until: number | null;
  runs: boolean;
  what: string;
  shares: ShareLine[];
  /** The record behind it; null where the system set it (a planned end). */
  tap: Tap | null;
  /** Taken back or taken out by a later record. */
  isVoid: boolean;
}

/** A production day of one worker, down to the taps. */
export interface DaySheet {
  date: string;
  sums: HourSums;
  planned: Stretch | null;
  strip: StripStretch[];
  lines: DayLine[];
}

export interface DayFacts {
  segments: readonly NamedSegment[];
  taps: readonly Tap[];
  /** Planned shifts by the date for which they were planned. */
  planned: ReadonlyMap<string, Stretch>;
  rules: readonly DayRule[];
  /** Epoch seconds: where a segment that runs is cut. */
  now: number;
}

/** An interval with all its items, cut to a day. */
interface Interval {
  rows: NamedSegment[];
  start: number;
  end: number;
  runs: boolean;
}

/**
 * Lays a worker's days open: sums, strip and lines all come from the same segments, cut to the day,
 * so a figure is the sum of the lines under it. Records that began no segment stand between them.
 */
export function daySheets(dates: readonly string[], facts: DayFacts): DaySheet[] {
  const intervals = [...groupBy(facts.segments, ({ startMs }) => startMs).values()];
  return dates.map((date) => {
    const bounds = dayBounds(date, facts.rules);
    const cut = intervals.flatMap((rows) => cutTo(rows, bounds, facts.now));
    return {
      date,
      sums: hourSums(
        cut.map(({ rows, start, end }) => ({ activity: rows[0]!.activity, seconds: end - start })),
      ),
      planned: facts.planned.get(date) ?? null,
      strip: cut.map(({ rows, start, end }) => ({ start, end, kind: kindOf(rows[0]!) })),
      lines: linesOf(cut, tapsOf(facts.taps, bounds), facts.taps),
    };
  });
}

function cutTo(rows: NamedSegment[], day: Stretch, now: number): Interval[] {
  const { startMs, endMs } = rows[0]!;
  const start = Math.max(startMs / 1000, day.start);
  const end = Math.min(endMs === null ? now : endMs / 1000, day.end);
  return end > start ? [{ rows, start, end, runs: endMs === null && end === now }] : [];
}

function tapsOf(taps: readonly Tap[], { start, end }: Stretch): Tap[] {
  return taps.filter(({ atMs }) => atMs !== null && atMs >= start * 1000 && atMs < end * 1000);
}

function linesOf(intervals: readonly Interval[], own: readonly Tap[], all: readonly Tap[]) {
  const byId = new Map(all.map((tap) => [tap.id, tap]));
  const began = new Set(intervals.map(({ rows }) => rows[0]!.eventId));
  const gone = new Set(
    all.flatMap(({ kind, body }) => (kind === "undo" || kind === "void" ? [body.event] : [])),
  );
  const stretches = intervals.map((interval) => stretchLine(interval, byId));
  const others = own
    .filter(({ id }) => !began.has(id))
    .map((tap) => recordLine(tap, gone.has(tap.id)));
  return [...stretches, ...others].sort((a, b) => a.at - b.at);
}

function stretchLine(interval: Interval, taps: ReadonlyMap<string, Tap>): DayLine {
  const { rows, start, end, runs } = interval;
  const first = rows[0]!;
  return {
    key: `${first.eventId} ${start}`,
    at: start,
    until: end,
    runs,
    what: wordsOf(first),
    shares: sharesOf(rows, end - start),
    tap: taps.get(first.eventId) ?? null,
    isVoid: false,
  };
}

function recordLine(tap: Tap, isVoid: boolean): DayLine {
  const at = Math.floor((tap.atMs ?? 0) / 1000);
  const line = { key: tap.id, at, until: null, runs: false, shares: [], tap, isVoid };
  return { ...line, what: tapWords(tap) };
}

/** The items' shares of what the day has of the interval. */
function sharesOf(rows: readonly NamedSegment[], seconds: number): ShareLine[] {
  const items = rows.flatMap(({ ticket, operation, operationName, weight }) =>
    ticket && operation ? [{ ticket, operation, name: operationName ?? operation, weight }] : [],
  );
  if (items.length === 0) return [];
  const shares = split(
    seconds,
    items.map(({ weight }) => weight ?? 0),
  );
  return items.map(({ weight, ...item }, at) => ({ ...item, seconds: shares[at]! }));
}

function wordsOf({ activity, code }: NamedSegment): string {
  switch (activity) {
    case "run":
      return "Work";
    case "setup":
      return "Setup";
    case "rework":
      return "Rework";
    case "inspect":
      return "Inspection";
    case "indirect":
      return `Other work, ${otherWorkWords(code)}`;
    case "meal":
      return "Meal";
    case "rest":
      return "Rest";
    case "unassigned":
      return "On nothing";
  }
}

function kindOf({ activity }: NamedSegment): StretchKind {
  if (activity === "indirect") return "other-work";
  if (activity === "run" || activity === "setup" || activity === "inspect") return "work";
  return activity;
}
