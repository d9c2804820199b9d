import { OLDEST_MS } from "@/lib/ledger/read-event";
import type { ClockEvent, EventBody } from "@/lib/ledger/schema";
import { instantMs } from "@/lib/time/instant";

/** When a batch came, and what the tablet's own clock then showed. */
export interface Arrival {
  receivedMs: number;
  deviceMs: number;
  /** The run of the kiosk in which the tablet's clock was read. */
  boot: string | null;
}

/** Where an event lies in time (LEDGER.md 2); kept on its row and never recomputed. */
export interface Placed {
  atMs: number;
  /** As the tablet's own clock had it. */
  rawMs: number;
  uncertaintyMs: number;
  /** False where nobody knows how far off the tablet was: `clock-unmeasured`. */
  isMeasured: boolean;
  /** True where it lies after its own arrival, beyond what clocks excuse. */
  isFuture: boolean;
}

/** What a measured clock may be off beyond its own uncertainty. */
const FUTURE_SLACK_MS = 120_000;
const NEWEST_MS = Date.UTC(10_000, 0, 1);
/** A tablet that slept owns up to hours of uncertainty: more than this excuses no future act. */
const UNCERTAINTY_MAX_MS = 3_600_000;

/**
 * Places an event in time: its corrected instant where the kiosk had measured its clock, else from
 * the tablet's clock at arrival within one run of the kiosk, else as it says. Null where that is
 * before 2000 or past 9999, which no clock in use shows.
 */
export function placeEvent(event: ClockEvent, arrival: Arrival): Placed | null {
  const sentMs = instantMs(event.at) ?? 0;
  const { offsetMs, boot } = event.clock;
  const isSameRun = boot === arrival.boot;
  const lagMs = isSameRun ? arrival.receivedMs - arrival.deviceMs : 0;
  const atMs = offsetMs === null ? sentMs + lagMs : sentMs;
  const rawMs = sentMs - (offsetMs ?? 0);
  if (!isShown(atMs)) return null;
  const uncertaintyMs = Math.min(event.clock.uncertaintyMs ?? 0, UNCERTAINTY_MAX_MS);
  return {
    atMs,
    rawMs: isShown(rawMs) ? rawMs : atMs,
    uncertaintyMs,
    isMeasured: offsetMs !== null || isSameRun,
    isFuture: isAhead(event, { atMs, uncertaintyMs, receivedMs: arrival.receivedMs }),
  };
}

/** Says whether an event, or what it makes count, lies after its arrival beyond what clocks excuse. */
export function isAhead(
  event: EventBody,
  { atMs, uncertaintyMs, receivedMs }: { atMs: number; uncertaintyMs: number; receivedMs: number },
): boolean {
  return Math.max(atMs, effectMs(event) ?? atMs) > receivedMs + uncertaintyMs + FUTURE_SLACK_MS;
}

/** An answer such as `end-at:2026-05-14T16:00:00Z` says when. */
function toldMs(answer: string): number | null {
  const told = instantMs(answer.slice(answer.indexOf(":") + 1));
  return told !== null && isShown(told) ? told : null;
}

function isShown(instant: number): boolean {
  return instant >= OLDEST_MS && instant < NEWEST_MS;
}

/**
 * The instant at which a correction makes something count: a move's `to`, an inserted event's own,
 * the end that an answer tells; null for everything else.
 */
export function effectMs(event: EventBody): number | null {
  if (event.kind === "move") return instantMs(event.to);
  if (event.kind === "settle") return toldMs(event.answer);
  // safe because an inserted event was read as a whole one
  if (event.kind === "insert") return instantMs((event.event as ClockEvent).at);
  return null;
}
