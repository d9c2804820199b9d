import type { Window } from "@/lib/ledger/context";
import { type Difference, difference } from "@/lib/timeline/difference";
import { fold } from "@/lib/timeline/fold";
import {
  derivedRows,
  type LooseEndRow,
  type ReportRow,
  type SegmentRow,
  type ShiftRow,
} from "@/lib/timeline/rows";
import type { Folded, LedgerEvent, SiteRules } from "@/lib/timeline/schema";

/** What a window's events make of a worker's time, and what of it is not kept yet. */
export interface Derived {
  folded: Folded;
  asOfMs: number;
  segments: Difference<SegmentRow>;
  shifts: Difference<ShiftRow>;
  reports: Difference<ReportRow>;
  looseEnds: Difference<LooseEndRow>;
}

/**
 * Derives a window again, with the events that are to be added to it, as of an instant: never before
 * the one at which it was derived last, so that a rebuild at the recorded instant changes nothing.
 * What the fold says of time outside the window is left out: it saw only a part of that.
 */
export function deriveWindow(
  window: Window,
  added: readonly LedgerEvent[],
  { rules, asOfMs }: { rules: readonly SiteRules[]; asOfMs: number },
): Derived {
  const facts = {
    rules,
    planned: window.planned.map(({ startMs, endMs }) => ({
      start: Math.floor(startMs / 1000),
      end: Math.floor(endMs / 1000),
    })),
    homeCell: window.homeCellId,
  };
  const latestMs = Math.max(window.asOfMs ?? 0, asOfMs);
  const folded = fold([...window.events, ...added], facts, latestMs);
  const rows = derivedRows(folded, (atMs) => isInWindow(window, atMs));
  return {
    folded,
    asOfMs: latestMs,
    segments: difference(window.segments, rows.segments, (row) => `${row.startMs} ${row.item}`),
    shifts: difference(window.shifts, rows.shifts, (row) => String(row.startMs)),
    reports: difference(window.reports, rows.reports, (row) => row.id),
    looseEnds: difference(window.looseEnds, rows.looseEnds, (row) => `${row.code} ${row.subject}`),
  };
}

/** Says whether an instant, or the second that it was floored to, lies in a window. */
export function isInWindow(
  { firstMs, lastMs }: Pick<Window, "firstMs" | "lastMs">,
  atMs: number,
): boolean {
  return atMs >= Math.floor(firstMs / 1000) * 1000 && atMs <= lastMs;
}

/**
 * The tickets whose time or counts a derivation changes; each once.
 *
 * @param before the segments that were kept: one may be another ticket's now
 */
export function ticketsTouched(
  { segments, reports }: Pick<Derived, "segments" | "reports">,
  before: readonly SegmentRow[],
): string[] {
  const rows = [
    ...segments.gone,
    ...rowsBefore(segments, before),
    ...segments.changed,
    ...reports.gone,
    ...reports.changed,
  ];
  return [...new Set(rows.flatMap(({ ticket }) => ticket ?? []))];
}

/** What was kept of the intervals that change. */
function rowsBefore({ changed }: Derived["segments"], before: readonly SegmentRow[]): SegmentRow[] {
  const starts = new Set(changed.map(({ startMs }) => startMs));
  return before.filter(({ startMs }) => starts.has(startMs));
}

/** Time in a cell whose sums a derivation changes; epoch milliseconds. */
export interface TouchedTime {
  startMs: number;
  endMs: number;
  cell: string | null;
}

/**
 * The time whose sums by cell a derivation changes, one stretch a cell around all of it; what runs
 * is in no sum yet.
 *
 * @param before the segments that were kept
 */
export function timeTouched(
  { segments }: Pick<Derived, "segments">,
  before: readonly SegmentRow[],
): TouchedTime[] {
  const touched = new Map<string | null, TouchedTime>();
  const rows = [...segments.gone, ...rowsBefore(segments, before), ...segments.changed];
  for (const { startMs, endMs, cellId: cell } of rows) {
    if (endMs === null) continue;
    const one = touched.get(cell);
    touched.set(cell, {
      startMs: Math.min(startMs, one?.startMs ?? startMs),
      endMs: Math.max(endMs, one?.endMs ?? endMs),
      cell,
    });
  }
  return [...touched.values()];
}
