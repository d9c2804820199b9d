import type { ItemView } from "@/lib/bench/item-view";
import type {
  CountField,
  Counts,
  DeedTime,
  ItemKey,
  KioskState,
  Purpose,
  Screen,
} from "@/lib/bench/schema";
import type { BenchView } from "@/lib/bench/view";
import type { Step, Tap } from "@/lib/taps/inputs";
import {
  isSameItem,
  keyOf,
  type Look,
  record,
  refuse,
  sheetScreen,
  show,
  still,
  toBench,
} from "@/lib/taps/moves";

type At<K extends Screen["at"]> = Extract<Screen, { at: K }>;

const COUNT_DIGITS_MAX = 5;

/** Asks how the pieces came out; of several tickets on the bench, of which one first. */
export function askCount(state: KioskState, view: BenchView): Step {
  const [item] = view.items;
  if (!item || view.doing?.kind !== "work") return still(state);
  if (view.items.length > 1) return show(state, { at: "pick-item", to: "count" });
  return countItem(state, item);
}

/** The count of one ticket, begun as if all that is open came out good: the usual case. */
export function countItem(state: KioskState, item: ItemView): Step {
  const counts = { good: item.open, rework: 0, scrap: 0 };
  const screen: Screen = { at: "count", item: keyOf(item), counts, open: item.open, keying: null };
  const worker = state.visit?.worker ?? "";
  // The ticket's other operations are needed to say what caused a rework.
  if (state.tickets[item.ticket]) return show(state, screen);
  return show(state, screen, { do: "find-ticket", code: item.ticket, worker });
}

/** Taps on the list of what is on the bench. */
export function atPickItem(
  state: KioskState,
  screen: At<"pick-item">,
  tap: Tap,
  look: Look,
  askReassign: (kept: readonly ItemKey[]) => Step,
): Step {
  if (tap.on === "back") return toBench(state, look);
  if (tap.on !== "pick-item" || !state.visit) return still(state);
  const { items } = look(state, state.visit.worker);
  const picked = items.find((item) => isSameItem(item, tap.item));
  if (!picked) return still(state);
  if (screen.to === "count") return countItem(state, picked);
  if (screen.to === "sheet") return show(state, sheetScreen(picked));
  return askReassign(items.filter((item) => item !== picked).map(keyOf));
}

/** Taps while counting: stepped up and down, or keyed. More than is open is never counted. */
export function atCount(state: KioskState, screen: At<"count">, tap: Tap, look: Look): Step {
  const { counts, open, keying } = screen;
  switch (tap.on) {
    case "step": {
      const wanted = counts[tap.field] + tap.by;
      return show(state, {
        ...screen,
        counts: setCount(counts, open, tap.field, wanted),
        keying: null,
      });
    }
    case "key-count":
      return show(state, { ...screen, keying: { field: tap.field, digits: "" } });
    case "digit": {
      if (!keying || keying.digits.length >= COUNT_DIGITS_MAX) return still(state);
      const digits = keying.digits + tap.digit;
      const keyed = setCount(counts, open, keying.field, Number(digits));
      return show(state, { ...screen, counts: keyed, keying: { ...keying, digits } });
    }
    case "rub-out": {
      if (!keying) return still(state);
      const digits = keying.digits.slice(0, -1);
      const keyed = setCount(counts, open, keying.field, Number(digits));
      return show(state, { ...screen, counts: keyed, keying: { ...keying, digits } });
    }
    case "submit":
      return show(state, { ...screen, keying: null });
    case "counted":
      return counted(state, screen, tap.stop, look);
    case "back":
      return keying ? show(state, { ...screen, keying: null }) : toBench(state, look);
    default:
      return still(state);
  }
}

/**
 * Sets one count within what is open. Rework and scrap are taken out of the good ones when nothing
 * else is left, so that the usual "one of them is bad" is one touch.
 */
export function setCount(counts: Counts, open: number, field: CountField, wanted: number): Counts {
  const { good, rework, scrap } = counts;
  const bad = { rework, scrap, good: rework + scrap };
  const room = { good: open - bad.good, rework: open - scrap, scrap: open - rework }[field];
  const set = { ...counts, [field]: Math.max(0, Math.min(room, wanted)) };
  return {
    ...set,
    good: Math.min(field === "good" ? set.good : good, open - set.rework - set.scrap),
  };
}

function counted(state: KioskState, screen: At<"count">, stop: boolean, look: Look): Step {
  const { item, counts, open } = screen;
  const { good, rework, scrap } = counts;
  if (good + rework + scrap === 0) {
    if (!stop) return toBench(state, look);
    return record(state, { what: "put-aside", item }, { kind: "pause", items: [item] });
  }
  if (rework + scrap > 0) {
    return show(state, { at: "cause", item, counts, open, stop, page: 0 });
  }
  return report(state, { item, counts, open, stop, cause: null }, look);
}

/** Taps where the operation that caused the rework or scrap is named. */
export function atCause(state: KioskState, screen: At<"cause">, tap: Tap, look: Look): Step {
  const { page: _, at: __, ...count } = screen;
  switch (tap.on) {
    case "page":
      return show(state, { ...screen, page: tap.page });
    case "cause":
      if (count.counts.scrap > 0) {
        return refuse(state, { at: "scrap", ...count, cause: tap.operation });
      }
      return report(state, { ...count, cause: tap.operation }, look);
    case "back":
      return backToCount(state, screen);
    default:
      return still(state);
  }
}

/** Taps where scrap is asked about once more: it cannot be worked on again. */
export function atScrap(state: KioskState, screen: At<"scrap">, tap: Tap, look: Look): Step {
  if (tap.on === "back") return backToCount(state, screen);
  return tap.on === "go-ahead" ? report(state, screen, look) : still(state);
}

function backToCount(state: KioskState, screen: At<"cause"> | At<"scrap">): Step {
  const { item, counts, open } = screen;
  return show(state, { at: "count", item, counts, open, keying: null });
}

interface Report {
  item: ItemKey;
  counts: Counts;
  open: number;
  stop: boolean;
  cause: string | null;
}

function report(state: KioskState, { item, counts, open, stop, cause }: Report, look: Look): Step {
  const view = state.visit && look(state, state.visit.worker);
  const shown = view?.items.find((each) => isSameItem(each, item));
  const left = open - counts.good - counts.scrap;
  const time = timeOf(shown, counts);
  return record(
    state,
    { what: stop ? "finish" : "count", item, counts, open: left, time },
    { kind: "report", ...item, ...counts, stop, ...(cause ? { causedBy: cause } : {}) },
  );
}

/** Time against setup and the good pieces; open pieces are named apart (DESIGN.md). */
function timeOf(item: ItemView | undefined, counts: Counts): DeedTime {
  if (!item || item.runSeconds === null) {
    return { standardSeconds: null, actualSeconds: item?.actualSeconds ?? 0 };
  }
  const good = item.good + counts.good;
  const standardSeconds = (item.setupSeconds ?? 0) + item.runSeconds * good;
  return { standardSeconds, actualSeconds: item.actualSeconds };
}

/** What putting a wrong ticket right is about: the last activity of this shift. */
export function reassignment(
  view: BenchView,
  kept: readonly ItemKey[],
): Extract<Purpose, { for: "reassign" }> | null {
  if (!view.activityEvent) return null;
  return { for: "reassign", event: view.activityEvent, activity: view.activity, kept };
}
