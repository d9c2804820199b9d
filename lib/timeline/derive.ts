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

/** The tickets whose time or counts a derivation changes; each once. */
export function ticketsTouched({ segments, reports }: Derived): string[] {
  const rows = [...segments.gone, ...segments.changed, ...reports.gone, ...reports.changed];
  return [...new Set(rows.flatMap(({ ticket }) => ticket ?? []))];
}
