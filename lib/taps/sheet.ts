import type { Deed, ItemKey, KioskState, Screen } from "@/lib/bench/schema";
import { sheetOnBench } from "@/lib/sheet/on-bench";
import { nextStep } from "@/lib/sheet/order";
import { askTicket, take } from "@/lib/taps/choose";
import { askPin } from "@/lib/taps/enter";
import type { Step, Tap } from "@/lib/taps/inputs";
import {
  isSameItem,
  keyOf,
  type Look,
  record,
  recordBecause,
  sheetScreen,
  show,
  still,
  toBench,
  toDoor,
} from "@/lib/taps/moves";
import { countItem } from "@/lib/taps/report";

type At<K extends Screen["at"]> = Extract<Screen, { at: K }>;

/** The sheet of one's work, or the choice of one where there are several tickets on the bench. */
export function showSheet(state: KioskState, item: ItemKey | null, look: Look): Step {
  if (!state.visit) return toDoor(state);
  const { items } = look(state, state.visit.worker);
  if (item) return show(state, sheetScreen(item));
  const [only, ...more] = items;
  if (!only) return still(state);
  return show(state, more.length > 0 ? { at: "pick-item", to: "sheet" } : sheetScreen(only));
}

/** Taps on a sheet. One that nobody touched for a while hears nothing until a badge is shown. */
export function atSheet(state: KioskState, screen: At<"sheet">, tap: Tap, look: Look): Step {
  if (!state.visit) return toDoor(state);
  const { item, isLocked } = screen;
  if (tap.on === "leave") return toDoor(state);
  if (isLocked) {
    if (tap.on !== "key-pin") return still(state);
    return askPin({ ...state, visit: null }, state.visit.worker, { for: "enter" });
  }
  switch (tap.on) {
    case "pick-step":
      return show(state, { ...screen, picked: tap.step === screen.picked ? null : tap.step });
    case "tap-off":
      return recordStep(state, screen, { what: "step-done", step: tap.step, look });
    case "take-back":
      return recordStep(state, screen, { what: "step-open", step: tap.step, look });
    case "skip-step":
      return show(state, { at: "skip-step", item, step: tap.step });
    case "stop-here":
      return show(state, { at: "stop-here", item });
    case "show-bench":
      return show(state, { at: "bench" });
    case "count":
      return finish(state, item, look);
    default:
      return still(state);
  }
}

/** An open step is tapped off, a closed one opened again; the same tap twice is one. */
function recordStep(
  state: KioskState,
  { item }: At<"sheet">,
  { what, step, look }: { what: "step-done" | "step-open"; step: string; look: Look },
): Step {
  const view = look(state, state.visit?.worker ?? "");
  const found = sheetOnBench(state, view, item)?.steps.find((one) => one.step === step);
  if (!found || (found.state === "open") !== (what === "step-done")) return still(state);
  return record(state, { what, item }, { kind: what, ...item, step });
}

/** Taps where it is said why a step does not apply. */
export function atSkipStep(state: KioskState, { item, step }: At<"skip-step">, tap: Tap): Step {
  if (tap.on === "back") return show(state, { ...sheetScreen(item), picked: step });
  if (tap.on !== "skip-because") return still(state);
  const deed: Deed = { what: "step-skip", item };
  return recordBecause(state, deed, { kind: "step-skip", ...item, step }, tap.reason);
}

/** Taps where the work on an instrument stops: for a while, for another day, or for good. */
export function atStopHere(
  state: KioskState,
  { item }: At<"stop-here">,
  tap: Tap,
  look: Look,
): Step {
  switch (tap.on) {
    case "back":
      return show(state, sheetScreen(item));
    case "show-break":
      return show(state, { at: "break" });
    case "show-other-work":
      return show(state, { at: "other-work", purpose: { for: "work" } });
    case "show-other-sheets":
      return show(state, { at: "other-sheets", page: 0 });
    case "show-hand-over":
      return show(state, { at: "hand-over", item, to: null, page: 0 });
    case "put-aside":
      return record(state, { what: "put-aside", item }, { kind: "pause", items: [item] });
    case "count":
      return finish(state, item, look);
    default:
      return still(state);
  }
}

function finish(state: KioskState, item: ItemKey, look: Look): Step {
  const view = look(state, state.visit?.worker ?? "");
  const found = view.items.find((one) => isSameItem(one, item));
  return found ? countItem(state, found) : toBench(state, look);
}

/** Taps on the list of instruments that one may go on with. */
export function atOtherSheets(
  state: KioskState,
  screen: At<"other-sheets">,
  tap: Tap,
  look: Look,
): Step {
  switch (tap.on) {
    case "page":
      return show(state, { ...screen, page: tap.page });
    case "go-on":
      return goOn(state, tap.item, look);
    case "scan-for":
      return askTicket(state, { for: "work" });
    case "back":
      return toBench(state, look);
    default:
      return still(state);
  }
}

/** Goes on with an instrument that was begun: the time runs on it from now on. */
export function goOn(state: KioskState, item: ItemKey, look: Look): Step {
  return take(state, { for: "work" }, { ...keyOf(item), activity: "run" }, look);
}

/** Taps where a colleague is chosen who goes on, and then why. */
export function atHandOver(state: KioskState, screen: At<"hand-over">, tap: Tap): Step {
  const { item, to } = screen;
  switch (tap.on) {
    case "page":
      return show(state, { ...screen, page: tap.page });
    case "hand-to":
      return show(state, { ...screen, to: tap.to });
    case "hand-because": {
      if (to === null) return still(state);
      const deed: Deed = { what: "hand-over", item, to };
      return recordBecause(state, deed, { kind: "hand-over", ...item, to }, tap.reason);
    }
    case "back":
      return show(state, to === null ? { at: "stop-here", item } : { ...screen, to: null });
    default:
      return still(state);
  }
}

/** Taps where a colleague has handed an instrument over: taken now, or left for later. */
export function atHanded(state: KioskState, screen: At<"handed">, tap: Tap, look: Look): Step {
  if (!state.visit) return toDoor(state);
  if (tap.on === "go-ahead") return goOn(state, screen.item, look);
  if (tap.on !== "back") return still(state);
  const notNow = [...(state.visit.notNow ?? []), screen.event];
  return toBench({ ...state, visit: { ...state.visit, notNow } }, look);
}

/** Tap-off stays, but asks for a badge when nobody has touched it for so long (DESIGN.md). */
const LOCK_MS = 5 * 60_000;

/** The sheet as time passes: locked once nobody has touched it for a while. */
export function watched(state: KioskState): KioskState {
  const { screen, touchedMs, nowMs } = state;
  if (screen.at !== "sheet" || screen.isLocked || nowMs - touchedMs < LOCK_MS) return state;
  return { ...state, screen: { ...screen, picked: null, isLocked: true } };
}

/** The step that the bar of a sheet is about: the picked one, else the next. */
export function stepInHand(
  { picked }: At<"sheet">,
  sheet: Parameters<typeof nextStep>[0],
): string | null {
  return picked ?? nextStep(sheet)?.step ?? null;
}
