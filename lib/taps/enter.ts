import type { KioskState, PinReason, Screen } from "@/lib/bench/schema";
import type { Input, Step, Tap } from "@/lib/taps/inputs";
import { type Look, record, refuse, show, still, toBench, toDoor } from "@/lib/taps/moves";

const NUMBER_DIGITS_MAX = 8;
/** PINs are six digits (LEDGER.md 9): the sixth hands it in, which saves forty people a touch. */
const PIN_DIGITS = 6;

type At<K extends Screen["at"]> = Extract<Screen, { at: K }>;

/** Taps at the door: a worker's number is keyed, a language is chosen. */
export function atDoor(state: KioskState, screen: At<"door">, tap: Tap): Step {
  const digits = screen.digits;
  switch (tap.on) {
    case "digit":
      if (digits.length >= NUMBER_DIGITS_MAX) return still(state);
      return show(state, { ...screen, digits: digits + tap.digit, says: null });
    case "rub-out":
      return show(state, { ...screen, digits: digits.slice(0, -1), says: null });
    case "submit":
      return digits ? askPin(state, digits, { for: "enter" }) : still(state);
    case "show-enrol":
      return show(state, { at: "enrol", says: null, busy: false, isDone: false });
    case "language":
      return still({ ...state, language: tap.language });
    default:
      return still(state);
  }
}

/** Asks a worker for the PIN. */
export function askPin(state: KioskState, worker: string, reason: PinReason): Step {
  const asked = { digits: "", says: null, busy: false, waitUntilMs: null };
  return show(state, { at: "pin", worker, reason, ...asked });
}

/** Taps while the PIN is keyed. */
export function atPin(state: KioskState, screen: At<"pin">, tap: Tap, look: Look): Step {
  if (tap.on === "back" || tap.on === "leave") {
    return screen.reason.for === "enter" ? toDoor(state) : toBench(state, look);
  }
  if (screen.busy || screen.waitUntilMs !== null) return still(state);
  switch (tap.on) {
    case "digit": {
      const keyed = { ...screen, digits: screen.digits + tap.digit, says: null };
      return keyed.digits.length >= PIN_DIGITS ? handInPin(state, keyed) : show(state, keyed);
    }
    case "rub-out":
      return show(state, { ...screen, digits: screen.digits.slice(0, -1), says: null });
    case "submit":
      return screen.digits ? handInPin(state, screen) : still(state);
    default:
      return still(state);
  }
}

function handInPin(state: KioskState, screen: At<"pin">): Step {
  const { worker, digits: pin } = screen;
  return show(state, { ...screen, busy: true }, { do: "sign-in", worker, pin });
}

/** A badge at the reader: it opens its session again, or asks for the PIN (LEDGER.md 9). */
export function showBadge(state: KioskState, worker: string, look: Look): Step {
  const isLocked = state.screen.at === "sheet" && state.screen.isLocked;
  if (state.visit?.worker === worker && state.screen.at !== "done" && !isLocked) {
    return still(state);
  }
  if (!state.sessions[worker]) {
    return askPin({ ...state, visit: null }, worker, { for: "enter" });
  }
  const visit = { worker, saidIn: false };
  return toBench({ ...state, visit }, look, { do: "fetch-bench", worker });
}

/** The PIN was right, or will be checked when the server is back: on with what it was asked for. */
export function signedIn(
  state: KioskState,
  { session, bench }: Extract<Input, { on: "signed-in" }>,
  look: Look,
): Step {
  const { worker } = session;
  const known: KioskState = {
    ...state,
    sessions: { ...state.sessions, [worker]: session },
    benches: bench ? { ...state.benches, [worker]: bench } : state.benches,
  };
  const { screen } = state;
  if (screen.at !== "pin" || screen.worker !== worker || !screen.busy) return still(known);
  switch (screen.reason.for) {
    case "enter":
      return toBench({ ...known, visit: { worker, saidIn: false } }, look);
    case "end-shift":
      return record(known, { what: "shift-end" }, { kind: "shift-end" });
    case "reassign": {
      const { purpose } = screen.reason;
      return show(known, { at: "scan", purpose, digits: "", says: null, seen: null });
    }
  }
}

/** The PIN was not taken: the same words whatever was wrong, and how long to wait. */
export function signInRefused(
  state: KioskState,
  { worker, says, waitSeconds }: Extract<Input, { on: "sign-in-refused" }>,
): Step {
  const { screen } = state;
  if (screen.at !== "pin" || screen.worker !== worker) return still(state);
  const waitUntilMs = waitSeconds === null ? null : state.nowMs + waitSeconds * 1000;
  return refuse(state, { ...screen, digits: "", busy: false, says, waitUntilMs });
}

/** Taps where no shift is open. */
export function atStartShift(state: KioskState, tap: Tap): Step {
  switch (tap.on) {
    case "start-shift":
      return record(state, { what: "shift-start" }, { kind: "shift-start" });
    case "say-in":
      if (!state.visit) return toDoor(state);
      return show({ ...state, visit: { ...state.visit, saidIn: true } }, { at: "bench" });
    case "leave":
    case "back":
      return toDoor(state);
    default:
      return still(state);
  }
}

/** Taps where this browser is no kiosk yet. */
export function atEnrol(state: KioskState, screen: At<"enrol">, tap: Tap): Step {
  if (tap.on !== "enrol" || screen.busy) return still(state);
  return show(state, { ...screen, busy: true, says: null }, { do: "enrol", code: tap.code });
}
