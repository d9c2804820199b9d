import type { Deed, KioskState, Saving, Screen, UndoOffer } from "@/lib/bench/schema";
import { askTicket } from "@/lib/taps/choose";
import type { Effect, Input, Step, Tap } from "@/lib/taps/inputs";
import { type Look, recordAs, sheetScreen, show, still, toBench, toDoor } from "@/lib/taps/moves";

type At<K extends Screen["at"]> = Extract<Screen, { at: K }>;

/** An act may be taken back for 10 s (LEDGER.md 3). */
const UNDO_MS = 10_000;
/** The start window: the queue at the tablet before and after a planned start. */
const WINDOW_BEFORE_SECONDS = 30 * 60;
const WINDOW_AFTER_SECONDS = 15 * 60;

/** The acts are on the tablet's disk: the screen may say so now, and they may be taken back. */
export function recorded(
  state: KioskState,
  { events }: Extract<Input, { on: "recorded" }>,
  look: Look,
): Step {
  const { saving } = state;
  const kept = { ...state, saving: null, pending: [...state.pending, ...events] };
  if (!saving) return still(kept);
  const { deed, worker } = saving;
  const quick = deed.what === "shift-start" && isStartWindow(kept, worker, look);
  const next = { ...kept, undo: undoOffer(kept, saving, events) };
  const effects: Effect[] = [{ do: "sound", sound: "accept" }];
  if (isOnSheet(deed) && next.visit) return show(next, sheetScreen(deed.item), ...effects);
  if (deed.what !== "shift-end") return show(next, { at: "done", deed, quick }, ...effects);
  const { [worker]: _, ...sessions } = state.sessions;
  const ended = { do: "end-sessions", worker } as const;
  return show({ ...next, sessions }, { at: "done", deed, quick }, ...effects, ended);
}

type StepDeed = Extract<Deed, { what: "step-done" | "step-open" | "step-skip" | "step-undo" }>;

/** What was tapped on a sheet leaves it standing: the row itself says so. */
function isOnSheet(deed: Deed): deed is StepDeed {
  return deed.what.startsWith("step-");
}

function undoOffer(
  state: KioskState,
  { deed, worker, session }: Saving,
  events: Extract<Input, { on: "recorded" }>["events"],
): UndoOffer | null {
  const event = events.findLast(({ kind }) => kind !== "caution-read");
  if (!event || deed.what === "undo" || deed.what === "step-undo") return null;
  return { event: event.id, worker, session, deed, untilMs: state.nowMs + UNDO_MS };
}

function isStartWindow(state: KioskState, worker: string, look: Look): boolean {
  const { planned } = look(state, worker);
  if (!planned) return false;
  const now = state.nowMs / 1000;
  const { start } = planned;
  return now >= start - WINDOW_BEFORE_SECONDS && now <= start + WINDOW_AFTER_SECONDS;
}

/** The tablet's storage took nothing: the screen stays as it was and says so. */
export function notRecorded(state: KioskState): Step {
  const next: KioskState = { ...state, saving: null, notKept: true };
  return [next, [{ do: "sound", sound: "refuse" }]];
}

/** Takes the last act back, at the door too, for the rest of its 10 s. */
export function undoLast(state: KioskState): Step {
  const { undo } = state;
  if (!undo || state.nowMs >= undo.untilMs) return still({ ...state, undo: null });
  const deed: Deed = isOnSheet(undo.deed)
    ? { what: "step-undo", item: undo.deed.item }
    : { what: "undo" };
  return recordAs({ ...state, undo: null }, deed, undo, [{ kind: "undo", event: undo.event }]);
}

/** Taps on the card that says what was done. */
export function atDone(state: KioskState, { deed }: At<"done">, tap: Tap, look: Look): Step {
  if (tap.on === "leave" || !state.visit) return toDoor(state);
  const isOut = deed.what === "shift-end";
  if (tap.on === "stay" && !isOut) return toBench(state, look);
  if (tap.on === "scan-for" && !isOut) return askTicket(state, { for: "work" });
  return still(state);
}

/** The server has answered for these records: they are its own now, and its bench is the newer. */
export function settled(
  state: KioskState,
  { ids, benches }: Extract<Input, { on: "settled" }>,
): Step {
  const gone = new Set(ids);
  const known = Object.entries(benches).filter(([worker]) => state.sessions[worker]);
  return still({
    ...state,
    pending: state.pending.filter(({ id }) => !gone.has(id)),
    benches: { ...state.benches, ...Object.fromEntries(known) },
  });
}
