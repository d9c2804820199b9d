import type { Deed, ItemKey, KioskState, Screen } from "@/lib/bench/schema";
import type { BenchView } from "@/lib/bench/view";
import type { EventBody } from "@/lib/ledger/schema";
import { handedTo, sheetItem } from "@/lib/sheet/on-bench";
import type { Effect, Step } from "@/lib/taps/inputs";

/** How the reducer sees a worker's bench: `benchView`, or a plain value in a test. */
export type Look = (state: KioskState, worker: string) => BenchView;

/** Nothing changes. */
export function still(state: KioskState): Step {
  return [state, []];
}

/** Another screen, or the same one with other words on it. */
export function show(state: KioskState, screen: Screen, ...effects: Effect[]): Step {
  return [{ ...state, screen, finding: null }, effects];
}

/** A screen that says no: two low knocks with it. */
export function refuse(state: KioskState, screen: Screen): Step {
  return show(state, screen, { do: "sound", sound: "refuse" });
}

/** The door, empty: whoever stood here is signed out, and the time of the site runs on. */
export function toDoor(state: KioskState): Step {
  const door: Screen = { at: "door", digits: "", says: null };
  return show({ ...state, visit: null, language: null }, door);
}

/**
 * The visitor's bench: what was handed over first, the sheet where the work is built in steps. Where
 * no shift is open, the start of one is offered instead; a kiosk that
 * knows nothing of the worker's day takes their word for being in.
 */
export function toBench(state: KioskState, look: Look, ...effects: Effect[]): Step {
  if (!state.visit) return toDoor(state);
  const view = look(state, state.visit.worker);
  if (view.shiftStart === null && !state.visit.saidIn) {
    return show(state, { at: "start-shift" }, ...effects);
  }
  const handed = handedTo(state, state.visit.worker);
  const isNew = handed && !state.visit.notNow?.includes(handed.event);
  if (isNew) return show(state, { at: "handed", ...handed }, ...effects);
  const item = sheetItem(state, view);
  return show(state, item ? sheetScreen(item) : { at: "bench" }, ...effects);
}

/** The sheet of a ticket operation, nothing picked on it. */
export function sheetScreen(item: ItemKey): Extract<Screen, { at: "sheet" }> {
  return { at: "sheet", item: keyOf(item), picked: null, isLocked: false };
}

/** Writes acts down for the visitor; the card that says so comes once they are kept. */
export function record(state: KioskState, deed: Deed, ...bodies: EventBody[]): Step {
  const session = state.visit && state.sessions[state.visit.worker];
  if (!session) return toDoor(state);
  return recordAs(state, deed, session, bodies);
}

/** Writes an act down for the visitor with the word why. */
export function recordBecause(
  state: KioskState,
  deed: Deed,
  body: EventBody,
  reason: string,
): Step {
  const [next, effects] = record(state, deed, body);
  return [next, effects.map((one) => (one.do === "record" ? { ...one, note: reason } : one))];
}

/** Writes acts down for the worker of a session, signed in or not. */
export function recordAs(
  state: KioskState,
  deed: Deed,
  { worker, session }: { worker: string; session: string },
  bodies: readonly EventBody[],
): Step {
  const saving = { deed, worker, session };
  return [{ ...state, saving }, [{ do: "record", bodies, worker, session }]];
}

/** Whether two keys name the same ticket operation. */
export function isSameItem(a: ItemKey, b: ItemKey): boolean {
  return a.ticket === b.ticket && a.operation === b.operation;
}

/** The bare key of an item, as an event carries it. */
export function keyOf({ ticket, operation }: ItemKey): ItemKey {
  return { ticket, operation };
}
