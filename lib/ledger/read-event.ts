import { type ClockEvent, clockEvent } from "@/lib/ledger/schema";
import { instantMs } from "@/lib/time/instant";

/** No clock in use shows an earlier instant; what says so cannot be placed in time. */
export const OLDEST_MS = Date.UTC(2000, 0, 1);

/**
 * Reads one record of a batch; null where it cannot be read, which is kept as `unreadable`.
 * Beyond the schema: text must be storable (no NUL, no half character; a note's are mended), an
 * inserted event must be a whole one of the same worker, and instants must lie after 1999.
 */
export function readEvent(raw: unknown): ClockEvent | null {
  const parsed = clockEvent.safeParse(withStorableNote(raw));
  const event = parsed.success ? withReadInsert(parsed.data) : null;
  return event && isStorable(event) && arePlaceable(event) ? event : null;
}

/** A note is free text, and half a character at its end is no reason to lose the act. */
function withStorableNote(raw: unknown): unknown {
  if (typeof raw !== "object" || raw === null || !("note" in raw)) return raw;
  if (typeof raw.note !== "string") return raw;
  return { ...raw, note: raw.note.replaceAll("\0", "").replace(/\p{Surrogate}/gu, "\uFFFD") };
}

/** PostgreSQL's text holds neither NUL nor half of a surrogate pair. */
function isStorable(value: unknown): boolean {
  if (typeof value === "string") return !/\0|\p{Surrogate}/u.test(value);
  if (typeof value !== "object" || value === null) return true;
  return Object.entries(value).every(([key, entry]) => isStorable(key) && isStorable(entry));
}

function arePlaceable(event: ClockEvent): boolean {
  const instants = [event.at, "to" in event && event.kind === "move" ? event.to : event.at];
  return instants.every((text) => (instantMs(text) ?? 0) >= OLDEST_MS);
}

/**
 * Reads the event inside an `insert`, so that everything later may trust it. Its note becomes the
 * note of the whole: free text has one place, from which it can be erased.
 */
function withReadInsert(event: ClockEvent): ClockEvent | null {
  if (event.kind !== "insert") return event;
  const inner = clockEvent.safeParse(event.event);
  if (!inner.success || inner.data.kind === "insert") return null;
  if (inner.data.worker !== event.worker || !arePlaceable(inner.data)) return null;
  const { note = event.note, ...inserted } = inner.data;
  return { ...event, event: inserted, ...(note === undefined ? {} : { note }) };
}
