import type { Clock } from "@/lib/ledger/schema";

/** Where the tablet's two clocks come from: wall time, and time that only goes forward. */
export interface Clocks {
  wallMs(): number;
  monotonicMs(): number;
}

/** One round trip to the server's clock. */
export interface RoundTrip {
  sentMonotonicMs: number;
  gotMonotonicMs: number;
  gotWallMs: number;
  serverMs: number;
}

/** The instant of an act as the kiosk best knows it, and how it knows. */
interface Stamp {
  atMs: number;
  clock: Omit<Clock, "seq">;
}

export interface KioskClock {
  /** Takes a round trip in; keeps it where it knows the server's time better than the last. */
  measured(trip: RoundTrip): void;
  /** The best guess at the server's time now; the tablet's own before any measurement. */
  nowMs(): number;
  /** Stamps an act that happens now. */
  stamp(): Stamp;
}

/** What server and tablet were at one moment, and how far the guess may be off. */
interface Anchor {
  wallMs: number;
  monotonicMs: number;
  serverMs: number;
  uncertaintyMs: number;
}

/** A quartz clock drifts up to 100 parts in a million (common practice for tablets). */
const DRIFT_PER_MS = 100 / 1_000_000;

/**
 * Makes the kiosk's clock for one run of the page (`boot`). The server's clock is the clock; the
 * tablet only carries it on between measurements, on the clock that a change of the tablet's time
 * cannot move. Where wall time has run ahead of it the tablet slept or was set: the wall is then
 * followed, and the difference is owned up to as uncertainty.
 */
export function makeClock(clocks: Clocks, boot: string): KioskClock {
  let anchor: Anchor | null = null;
  const guess = () => (anchor ? guessFrom(anchor, clocks) : null);
  return {
    measured(trip) {
      const fresh = anchorOf(trip);
      const held = guess();
      if (!held || fresh.uncertaintyMs <= held.uncertaintyMs) anchor = fresh;
    },
    nowMs: () => Math.round(guess()?.atMs ?? clocks.wallMs()),
    stamp() {
      const [wallMs, monotonicMs, held] = [clocks.wallMs(), clocks.monotonicMs(), guess()];
      const atMs = Math.round(held?.atMs ?? wallMs);
      return {
        atMs,
        clock: {
          offsetMs: held ? Math.round(atMs - wallMs) : null,
          uncertaintyMs: held ? Math.ceil(held.uncertaintyMs) : null,
          boot,
          monotonicMs: Math.max(0, monotonicMs),
        },
      };
    },
  };
}

/** The server's answer was true somewhere within the round trip: the middle, give or take half. */
function anchorOf({ sentMonotonicMs, gotMonotonicMs, gotWallMs, serverMs }: RoundTrip): Anchor {
  const halfMs = Math.max(0, gotMonotonicMs - sentMonotonicMs) / 2;
  return {
    wallMs: gotWallMs,
    monotonicMs: gotMonotonicMs,
    serverMs: serverMs + halfMs,
    uncertaintyMs: halfMs + 1,
  };
}

function guessFrom(anchor: Anchor, clocks: Clocks): { atMs: number; uncertaintyMs: number } {
  const steadyMs = clocks.monotonicMs() - anchor.monotonicMs;
  const wallMs = clocks.wallMs() - anchor.wallMs;
  const aheadMs = Math.max(0, wallMs - steadyMs);
  const jumpMs = aheadMs > JUMP_MS ? aheadMs : 0;
  return {
    atMs: anchor.serverMs + steadyMs + jumpMs,
    uncertaintyMs: anchor.uncertaintyMs + steadyMs * DRIFT_PER_MS + jumpMs,
  };
}

/** Less than this between the two clocks is drift, more is a sleep or a changed clock. */
const JUMP_MS = 2000;
