import type { SegmentRow } from "@/lib/timeline/rows";
import type { Span } from "@/lib/timesheet/shifts";

/** What of a stretch of a shift pay needs. */
export type TimePart = Pick<SegmentRow, "startMs" | "endMs" | "item" | "activity">;

/**
 * Turns a worker's timeline into what is paid: meals and rests as they are, all else is work, on
 * tickets or not (29 CFR 785.11-.13). Stretches of one kind that touch are one span; what still runs
 * is cut at `untilMs`.
 *
 * @param parts in the order of time; of several items at once the first counts
 * @returns spans in epoch seconds, in order, without overlap
 */
export function spansOf(parts: readonly TimePart[], untilMs: number): Span[] {
  const spans: Span[] = [];
  for (const { startMs, endMs, item, activity } of parts) {
    const start = startMs / 1000;
    const end = Math.floor((endMs ?? Math.max(startMs, untilMs)) / 1000);
    if (item > 0 || end <= start) continue;
    const kind = activity === "meal" || activity === "rest" ? activity : "work";
    const last = spans.at(-1);
    if (last && last.kind === kind && last.end === start) last.end = end;
    else spans.push({ start, end, kind, rate: null });
  }
  return spans;
}
