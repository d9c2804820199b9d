import type { KioskState } from "@/lib/bench/schema";

/** A kiosk before it knows anything. */
export const firstState: KioskState = {
  nowMs: 0,
  touchedMs: 0,
  screen: { at: "loading" },
  device: null,
  cell: null,
  tickets: {},
  language: null,
  link: { is: "connected", sinceMs: 0 },
  pending: [],
  sessions: {},
  benches: {},
  visit: null,
  saving: null,
  notKept: false,
  finding: null,
  undo: null,
};
