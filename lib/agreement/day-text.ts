import { canonicalJson } from "@/lib/ledger/canonical";
import type { SegmentRow } from "@/lib/timeline/rows";

/** What of a worker's time somebody agrees to: when, what it was, and what it was booked to. */
export type DayPart = Pick<
  SegmentRow,
  "startMs" | "endMs" | "item" | "activity" | "ticket" | "operation" | "code" | "seconds"
>;

/** The day that is agreed to: bounds in epoch milliseconds, and the pay policy in force. */
export interface AgreedDay {
  /** Site date on which the workday begins. */
  date: string;
  startMs: number;
  endMs: number;
  /** Name and version of the pay policy. */
  policy: string;
}

/**
 * Writes what an agreement is about as one text, whose SHA-256 is the day's digest (LEDGER.md 4): the
 * policy's version and every part that reaches into the workday, cut to it, by time and item. The
 * same time in any order has the same text; any change of when, what or whereto has another.
 *
 * @param parts of one worker, in any order; those that do not touch the day are left out
 * @returns null where there is nothing to agree to: no time, or some of it still runs
 */
export function dayText(parts: readonly DayPart[], day: AgreedDay): string | null {
  const own = parts.filter(
    ({ startMs, endMs }) => startMs < day.endMs && (endMs ?? day.endMs) > day.startMs,
  );
  if (own.length === 0 || own.some(({ endMs }) => endMs === null)) return null;
  const sorted = [...own].sort((a, b) => a.startMs - b.startMs || a.item - b.item);
  const lines = sorted.map((part) => [
    Math.max(part.startMs, day.startMs),
    Math.min(part.endMs ?? day.endMs, day.endMs),
    part.activity,
    part.ticket,
    part.operation,
    part.code,
    part.seconds,
  ]);
  return canonicalJson({ day: day.date, policy: day.policy, lines });
}
