import type { Shift } from "@/lib/timeline/schema";

/** A session holds until its worker's shift ends, 16 hours at most (LEDGER.md 9). */
const SESSION_MAX_MS = 16 * 3_600_000;
/** An undo or an agreement may come this much after the shift's end. */
const GRACE_MS = 10_000;

interface Session {
  openedMs: number;
  /** Where it was ended by hand: a new PIN, a person who left. */
  endedMs?: number | null;
}

/**
 * Says whether a session was over at an instant: 16 hours after it was opened, once it was ended by
 * hand, or once somebody had ended a shift of its worker since it was opened. `undo` and `confirm`
 * hold ten seconds longer. A lead who enters for others needs no shift: pass none.
 */
export function isSessionOver(
  { openedMs, endedMs = null }: Session,
  act: { atMs: number; kind: string },
  shifts: readonly Pick<Shift, "end" | "endEvent">[],
): boolean {
  if (act.atMs > Math.min(openedMs + SESSION_MAX_MS, endedMs ?? Number.POSITIVE_INFINITY)) {
    return true;
  }
  const graceMs = act.kind === "undo" || act.kind === "confirm" ? GRACE_MS : 0;
  return shifts.some(({ end, endEvent }) => {
    if (end === null || endEvent === null || end * 1000 <= openedMs) return false;
    return act.atMs >= (end + 1) * 1000 + graceMs;
  });
}
