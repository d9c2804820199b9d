import type { SeamSegment } from "@/lib/analytics/facts";
import type { SeamLine } from "@/lib/analytics/lines";

/** An operation that is open: its lines by model, option, week or ticket, and a ticket's segments. */
export interface Opened {
  lines: SeamLine[];
  /** Of the ticket that is open; empty where none is. */
  segments: SeamSegment[];
}

/** How many times larger an open line is drawn than the list that it is in: a whole number, 1 at least. */
export function loupeOf(listSeconds: number, openSeconds: number): number {
  return openSeconds > 0 ? Math.max(1, Math.floor(listSeconds / openSeconds)) : 1;
}
