import type { Device, KioskState, Link } from "@/lib/bench/schema";
import { stayOf } from "@/lib/bench/time-out";
import { readCode } from "@/lib/codes/read-code";
import type { KioskCell } from "@/lib/kiosks/schema";
import {
  askReassign,
  atBench,
  atBreak,
  atEndOpenWork,
  atHours,
  atOtherWork,
  atPickReport,
} from "@/lib/taps/acts";
import {
  atCaution,
  atOffer,
  atRefused,
  atScan,
  findTicket,
  readTicket,
  ticketFound,
  ticketMissing,
} from "@/lib/taps/choose";
import {
  askPin,
  atDoor,
  atEnrol,
  atPin,
  atStartShift,
  showBadge,
  signedIn,
  signInRefused,
} from "@/lib/taps/enter";
import { atDone, notRecorded, recorded, settled, undoLast } from "@/lib/taps/finish";
import type { Input, Step, Tap } from "@/lib/taps/inputs";
import { type Look, refuse, show, still, toDoor } from "@/lib/taps/moves";
import { atCause, atCount, atPickItem, atScrap } from "@/lib/taps/report";
import {
  atHanded,
  atHandOver,
  atOtherSheets,
  atSheet,
  atSkipStep,
  atStopHere,
  goOn,
  showSheet,
  watched,
} from "@/lib/taps/sheet";

/**
 * What becomes of the kiosk when something happens at an instant: the next state, and what is to be
 * done in the world. Pure: `look` folds a worker's records into a bench. While an act is being
 * written down every tap is let pass, so that a double tap is one act.
 */
export function step(before: KioskState, input: Input, nowMs: number, look: Look): Step {
  const state: KioskState = { ...before, nowMs };
  switch (input.on) {
    case "started":
      return started(state, input);
    case "tick":
      return tick(state);
    case "touch":
      return still({ ...state, touchedMs: nowMs });
    case "scan":
      return state.saving ? still(state) : scanned(touched(state), input.text, look);
    case "cell":
      return still(withCell(state, input.cell));
    case "link":
      return still(withLink(state, input.is));
    case "device":
      return still({ ...state, device: input.device });
    case "enrolled":
      return enrolledAs(state, input.device);
    case "enrol-refused":
      return refuse(state, { at: "enrol", says: input.says, busy: false, isDone: false });
    case "signed-in":
      return signedIn(touched(state), input, look);
    case "sign-in-refused":
      return signInRefused(touched(state), input);
    case "bench":
      return still({ ...state, benches: { ...state.benches, [input.worker]: input.bench } });
    case "session-over":
      return sessionOver(state, input.worker);
    case "ticket":
      return ticketFound(touched(state), input, look);
    case "no-ticket":
      return ticketMissing(touched(state), input);
    case "recorded":
      return recorded(touched(state), input, look);
    case "not-recorded":
      return notRecorded(touched(state));
    case "settled":
      return settled(state, input);
    default:
      return state.saving ? still(state) : tapped(touched(state), input, look);
  }
}

function touched(state: KioskState): KioskState {
  return { ...state, touchedMs: state.nowMs, notKept: false };
}

/** A finger on the screen. */
function tapped(state: KioskState, tap: Tap, look: Look): Step {
  const { screen } = state;
  if (tap.on === "undo") return undoLast(state);
  if (tap.on === "mute") return [withMuted(state, tap.muted), [{ do: "mute", muted: tap.muted }]];
  switch (screen.at) {
    case "loading":
      return still(state);
    case "enrol":
      return atEnrol(state, screen, tap);
    case "door":
      return atDoor(state, screen, tap);
    case "pin":
      return atPin(state, screen, tap, look);
    case "start-shift":
      return atStartShift(state, tap);
    case "bench":
      if (tap.on === "take-ticket") return findTicket(state, { for: "work" }, tap.ticket);
      if (tap.on === "show-sheet") return showSheet(state, tap.item, look);
      return tap.on === "go-on" ? goOn(state, tap.item, look) : atBench(state, tap, look);
    case "sheet":
      return atSheet(state, screen, tap, look);
    case "skip-step":
      return atSkipStep(state, screen, tap);
    case "stop-here":
      return atStopHere(state, screen, tap, look);
    case "other-sheets":
      return atOtherSheets(state, screen, tap, look);
    case "hand-over":
      return atHandOver(state, screen, tap);
    case "handed":
      return atHanded(state, screen, tap, look);
    case "scan":
      return atScan(state, screen, tap, look);
    case "cell-tickets":
    case "offer":
      return atOffer(state, screen, tap, look);
    case "refused":
      return atRefused(state, screen, tap, look);
    case "caution":
      return atCaution(state, screen, tap, look);
    case "pick-item":
      return atPickItem(state, screen, tap, look, (kept) =>
        state.visit ? askReassign(state, look(state, state.visit.worker), kept) : still(state),
      );
    case "count":
      return atCount(state, screen, tap, look);
    case "cause":
      return atCause(state, screen, tap, look);
    case "scrap":
      return atScrap(state, screen, tap, look);
    case "break":
      return atBreak(state, tap, look);
    case "other-work":
      return atOtherWork(state, screen, tap, look);
    case "hours":
      return atHours(state, tap, look);
    case "pick-report":
      return atPickReport(state, tap);
    case "end-open-work":
      return atEndOpenWork(state, tap, look);
    case "done":
      return atDone(state, screen, tap, look);
  }
}

/** A code before the camera or from a wedge scanner: whose badge, or which ticket. */
function scanned(state: KioskState, text: string, look: Look): Step {
  const { screen } = state;
  if (screen.at === "loading" || screen.at === "enrol" || screen.at === "pin") return still(state);
  if (screen.at === "scan" && (screen.seen === text || state.finding)) return still(state);
  const { valid, kind, number } = readCode(text);
  if (valid && kind === "badge" && number) return showBadge(state, number, look);
  if (screen.at === "door") {
    return refuse(state, { ...screen, says: kind === "ticket" ? "ticket-first" : "unread-badge" });
  }
  if (screen.at === "scan") return readTicket(state, screen.purpose, text);
  const takesTickets = ["bench", "cell-tickets", "offer", "refused", "done"].includes(screen.at);
  const isSheetOpen = screen.at === "sheet" && !screen.isLocked;
  const isOut = screen.at === "done" && screen.deed.what === "shift-end";
  if (!(takesTickets || isSheetOpen) || isOut || !state.visit) return still(state);
  return readTicket(state, "purpose" in screen ? screen.purpose : { for: "work" }, text);
}

/** Time passes: an undo runs out, a wait is over, a screen that nobody touches goes. */
function tick(before: KioskState): Step {
  const undo = before.undo && before.nowMs < before.undo.untilMs ? before.undo : null;
  const state: KioskState = { ...before, undo };
  const { screen, nowMs } = state;
  if (screen.at === "pin" && screen.waitUntilMs !== null && nowMs >= screen.waitUntilMs) {
    return show({ ...state, touchedMs: nowMs }, { ...screen, says: null, waitUntilMs: null });
  }
  const stay = stayOf(state);
  return stay && nowMs >= stay.untilMs ? toDoor(state) : still(watched(state));
}

function started(state: KioskState, { known }: Extract<Input, { on: "started" }>): Step {
  const sessions = Object.fromEntries(known.sessions.map((each) => [each.worker, each]));
  const { device, cell, benches, pending } = known;
  const next: KioskState = { ...state, device, benches, pending, sessions };
  if (!device) return show(next, { at: "enrol", says: null, busy: false, isDone: false });
  return toDoor(cell ? withCell(next, cell) : next);
}

/** The cell's tickets are known here; one that was looked up since is newer. */
function withCell(state: KioskState, cell: KioskCell): KioskState {
  const told = cell.tickets.map((ticket) => [ticket.ticket, { ticket, atMs: state.nowMs }]);
  return { ...state, cell, tickets: { ...state.tickets, ...Object.fromEntries(told) } };
}

function withLink(state: KioskState, is: Link["is"]): KioskState {
  return state.link.is === is ? state : { ...state, link: { is, sinceMs: state.nowMs } };
}

/** This browser is a kiosk from now on, of this cell: the page begins anew with that. */
function enrolledAs(state: KioskState, device: Device): Step {
  const forgotten = { cell: null, tickets: {}, sessions: {}, benches: {} };
  const next: KioskState = { ...state, device, ...forgotten };
  return show(next, { at: "enrol", says: null, busy: false, isDone: true });
}

function withMuted(state: KioskState, muted: boolean): KioskState {
  return state.device ? { ...state, device: { ...state.device, muted } } : state;
}

/** The server no longer knows a session: the PIN is asked again, and what was kept stays kept. */
function sessionOver(state: KioskState, worker: string): Step {
  const { [worker]: _, ...sessions } = state.sessions;
  const next: KioskState = { ...state, sessions };
  if (state.visit?.worker !== worker || state.saving) return still(next);
  return askPin({ ...next, visit: null }, worker, { for: "enter" });
}
