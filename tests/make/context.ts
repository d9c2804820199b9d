import type { BookingContext, ItemFacts, Window } from "@/lib/ledger/context";
import type { ReceivedRecord } from "@/lib/ledger/decide";
import { placeEvent } from "@/lib/ledger/place";
import type { ClockEvent, EventBody } from "@/lib/ledger/schema";
import { eventId, siteRules } from "@/tests/make/events";

/** 14 May 2026, 08:00 UTC: when batches of these tests are received. */
export const RECEIVED_MS = Date.UTC(2026, 4, 14, 8);

export const WORKER_ID = eventId(9001);
export const LEAD_ID = eventId(9002);
export const SESSION = eventId(8001);
export const LEAD_SESSION = eventId(8002);

/** A window of worker 1042 that nothing is in yet, around what is received. */
export function makeWindow(other: Partial<Window> = {}): Window {
  return {
    workerId: WORKER_ID,
    firstMs: RECEIVED_MS - 8 * 3_600_000,
    lastMs: RECEIVED_MS + 3_600_000,
    truncated: false,
    version: 3,
    asOfMs: null,
    homeCellId: "mill",
    events: [],
    planned: [],
    segments: [],
    shifts: [],
    reports: [],
    looseEnds: [],
    judged: [],
    earlier: [],
    seenMs: null,
    ...other,
  };
}

/** Ticket 26000017 at operation 010, a single Heron whose standard is 10 + 30 minutes. */
export function makeFacts(other: Partial<ItemFacts> = {}): ItemFacts {
  return {
    ticket: "26000017",
    operation: "010",
    quantity: 1,
    status: "open",
    dueOn: null,
    model: "Heron",
    options: [],
    name: "Mill work",
    cellId: "mill",
    shareBy: "standard",
    hazards: ["dust"],
    standards: [
      { seq: 1, option: null, effectiveFrom: "2026-01-01", setupSeconds: 600, runSeconds: 1800 },
    ],
    good: 0,
    scrap: 0,
    earlierScrap: 0,
    firstWorkMs: null,
    firstReportMs: null,
    booked: [],
    ...other,
  };
}

/** Worker 1042 and lead 2001 of the mill, both signed in on a kiosk of the mill. */
export function makeContext(other: Partial<BookingContext> = {}): BookingContext {
  const openedMs = RECEIVED_MS - 3 * 3_600_000;
  return {
    workers: [
      { id: WORKER_ID, number: "1042", homeCellId: "mill", held: [] },
      {
        id: LEAD_ID,
        number: "2001",
        homeCellId: "mill",
        held: [{ role: "lead", cells: ["mill"] }],
      },
    ],
    sessions: [
      { id: SESSION, workerId: WORKER_ID, openedMs },
      { id: LEAD_SESSION, workerId: LEAD_ID, openedMs },
    ],
    known: [],
    served: [{ cellId: "mill", fromMs: 0, position: 0 }],
    rules: [siteRules],
    windows: [makeWindow()],
    facts: [makeFacts()],
    next: [],
    ...other,
  };
}

/** An event of worker 1042, so many minutes before it is received. */
export function makeClockEvent(
  number: number,
  minutesAgo: number,
  body: EventBody,
  other: Partial<ClockEvent> = {},
): ClockEvent {
  return {
    id: eventId(number),
    v: 1,
    session: SESSION,
    worker: "1042",
    at: new Date(RECEIVED_MS - minutesAgo * 60_000).toISOString(),
    clock: { offsetMs: 0, uncertaintyMs: 10, boot: "b", monotonicMs: number, seq: number },
    ...body,
    ...other,
    // safe because a head and a body are an event
  } as ClockEvent;
}

/** A record as it was received; null makes one that cannot be read. */
export function makeRecord(
  event: ClockEvent | null,
  hash = `hash of ${event?.id}`,
): ReceivedRecord {
  const arrival = { receivedMs: RECEIVED_MS, deviceMs: RECEIVED_MS, boot: "b" };
  const placed = event && placeEvent(event, arrival);
  const clashId = eventId(7000);
  const readable = event && placed ? { event, placed } : null;
  const id = event?.id ?? clashId;
  const text = JSON.stringify(event);
  return { id, clashId, hash, text, receivedMs: RECEIVED_MS, readable };
}
