/** A session holds until its worker's shift ends, 16 hours at most (LEDGER.md 9). */
export const SESSION_MAX_MS = 16 * 3_600_000;
/** An undo or an agreement may come this much after the shift's end. */
const GRACE_MS = 10_000;

/** A stretch of attendance that somebody ended, in epoch seconds. */
interface EndedShift {
  end: number;
}

/**
 * Says whether a session was over at an instant: 16 hours after it was opened, or once a shift of
 * its worker had ended since. `undo` and `confirm` hold ten seconds longer. A lead who enters for
 * others needs no shift: pass none.
 */
export function isSessionOver(
  openedMs: number,
  act: { atMs: number; kind: string },
  ended: readonly EndedShift[],
): boolean {
  if (act.atMs > openedMs + SESSION_MAX_MS) return true;
  const graceMs = act.kind === "undo" || act.kind === "confirm" ? GRACE_MS : 0;
  return ended.some(({ end }) => {
    const endMs = end * 1000;
    return endMs > openedMs && act.atMs >= endMs + 1000 + graceMs;
  });
}
