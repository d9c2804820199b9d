import { createHash } from "node:crypto";
import { canonicalJson } from "@/lib/ledger/canonical";
import type { ReceivedRecord } from "@/lib/ledger/decide";
import { type Arrival, placeEvent } from "@/lib/ledger/place";
import { readEvent } from "@/lib/ledger/read-event";

/** How a batch came. */
interface Receipt {
  kioskId: string;
  receivedMs: number;
  /** What the tablet's own clock then showed. */
  deviceMs: number;
  /** When each record came, where they did not come at once. */
  arrivals?: readonly number[] | undefined;
}

/**
 * Reads the records of a batch one by one, so that a bad one costs no other, and gives each what
 * identifies it. What cannot be read gets an id made of its kiosk and bytes (LEDGER.md 1).
 */
export function receiveRecords(
  raw: readonly unknown[],
  { kioskId, deviceMs, ...came }: Receipt,
): ReceivedRecord[] {
  const events = raw.map(readEvent);
  // the newest record was made in the run of the kiosk that now sends, as far as can be told
  const boot = events.findLast((event) => event !== null)?.clock.boot ?? null;
  return raw.map((record, place) => {
    const event = events[place] ?? null;
    const receivedMs = came.arrivals?.[place] ?? came.receivedMs;
    const arrival: Arrival = { receivedMs, deviceMs, boot };
    const placed = event && placeEvent(event, arrival);
    const text = canonicalJson(record);
    const hash = createHash("sha256").update(text).digest("hex");
    const clashId = idFrom(`${kioskId} ${hash}`);
    const readable = event && placed ? { event, placed } : null;
    const id = readable ? readable.event.id : clashId;
    return { id, clashId, hash, text, receivedMs, readable };
  });
}

/** A version 8 UUID (RFC 9562) whose bits are a hash: the same bytes give the same id. */
export function idFrom(text: string): string {
  const hex = createHash("sha256").update(text).digest("hex");
  const variant = ((Number.parseInt(hex.charAt(16), 16) & 0x3) | 0x8).toString(16);
  return [
    hex.slice(0, 8),
    hex.slice(8, 12),
    `8${hex.slice(13, 16)}`,
    `${variant}${hex.slice(17, 20)}`,
    hex.slice(20, 32),
  ].join("-");
}
