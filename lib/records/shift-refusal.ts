import { isPresence } from "@/lib/acts/act";
import { effectiveEvents } from "@/lib/acts/effective";
import type { Window } from "@/lib/ledger/context";

/** No shift is longer (LEDGER.md 1). */
const LONGEST_MS = 36 * 3_600_000;

/**
 * Says why a start or an end of a shift cannot be entered at an instant, as a sentence; null where it
 * can. A start inside a shift would change nothing, and an end before a later tap would part that tap
 * from its shift: both are put right by moving or taking out what stands there.
 *
 * @param clock writes an instant as the site's clock shows it
 */
export function shiftRefusal(
  { shifts, events }: Pick<Window, "shifts" | "events">,
  { deed, atMs }: { deed: "shift-start" | "shift-end"; atMs: number },
  clock: (atMs: number) => string,
): string | null {
  const around = shifts.find(
    ({ startMs, endMs, provisional }) =>
      startMs <= atMs &&
      (endMs === null || provisional || endMs > atMs) &&
      atMs - startMs < LONGEST_MS,
  );
  if (deed === "shift-start") {
    const isIn = around && (around.endMs === null || around.endMs > atMs);
    return isIn ? `In since ${clock(around.startMs)} already. Move that start instead.` : null;
  }
  if (!around) return "No shift runs at that time. Enter its start first.";
  if (around.endMs !== null && !around.provisional)
    return `That shift ended at ${clock(around.endMs)}. Move that end instead.`;
  const later = effectiveEvents(events).acts.find(
    (act) =>
      isPresence(act) &&
      act.atMs > atMs &&
      act.atMs < (around.endMs ?? around.startMs + LONGEST_MS),
  );
  return later ? `There is a tap at ${clock(later.atMs)} after that. Look at the day first.` : null;
}
