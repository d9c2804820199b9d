import type { KioskState, Screen } from "@/lib/bench/schema";

/** How long a screen stays without a touch (DESIGN.md, Kiosk): the rest are our own choice. */
const seconds = {
  quick: 1.5,
  done: 4,
  bench: 20,
  card: 120,
  /** Choosing, showing a ticket, counting: hands may be busy between touches. */
  busy: 60,
} as const;

const stays: Record<Screen["at"], keyof typeof seconds | null> = {
  loading: null,
  enrol: null,
  door: "bench",
  pin: "bench",
  "start-shift": "bench",
  bench: "bench",
  scan: "busy",
  "cell-tickets": "busy",
  offer: "busy",
  refused: "card",
  caution: "card",
  "pick-item": "busy",
  // work goes on beside it: it stays, and asks for a badge after a while
  sheet: null,
  "skip-step": "busy",
  "stop-here": "busy",
  "other-sheets": "busy",
  "hand-over": "busy",
  handed: "card",
  count: "busy",
  cause: "busy",
  scrap: "card",
  break: "bench",
  "other-work": "bench",
  hours: "busy",
  "pick-report": "busy",
  "end-open-work": "card",
  done: "done",
};

/** A stretch of time in which a screen goes out, epoch milliseconds. */
export interface Stay {
  fromMs: number;
  untilMs: number;
}

/**
 * From when until when the present screen stays if nobody touches it; null for one that stays. A
 * door where nothing was keyed, and a screen that waits for the disk or the server, stay.
 */
export function stayOf({ screen, touchedMs, saving, finding }: KioskState): Stay | null {
  const isIdleDoor = screen.at === "door" && !screen.digits && !screen.says;
  const isWaiting = saving || finding || (screen.at === "pin" && screen.busy);
  const kind = screen.at === "done" && screen.quick ? "quick" : stays[screen.at];
  if (!kind || isIdleDoor || isWaiting) return null;
  return { fromMs: touchedMs, untilMs: touchedMs + seconds[kind] * 1000 };
}
