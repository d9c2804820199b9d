import type { ItemKey, KioskState, Screen } from "@/lib/bench/schema";
import type { BenchView } from "@/lib/bench/view";
import { askTicket } from "@/lib/taps/choose";
import { askPin } from "@/lib/taps/enter";
import type { Step, Tap } from "@/lib/taps/inputs";
import { keyOf, type Look, record, show, still, toBench, toDoor } from "@/lib/taps/moves";
import { askCount, reassignment } from "@/lib/taps/report";

type At<K extends Screen["at"]> = Extract<Screen, { at: K }>;

/** Taps on a worker's own bench. */
export function atBench(state: KioskState, tap: Tap, look: Look): Step {
  if (!state.visit) return toDoor(state);
  const view = look(state, state.visit.worker);
  switch (tap.on) {
    case "scan-for":
      return askTicket(state, { for: tap.add ? "add" : "work" });
    case "run":
      return runOn(state, view);
    case "resume":
      return resume(state, view);
    case "end-break":
      return endBreak(state, view);
    case "show-break":
      return show(state, { at: "break" });
    case "show-other-work":
      return show(state, { at: "other-work", purpose: { for: "work" } });
    case "count":
      return askCount(state, view);
    case "show-hours":
      return show(state, { at: "hours" });
    case "end-shift":
      return view.items.length > 0 ? show(state, { at: "end-open-work" }) : askEndPin(state);
    case "leave":
      return toDoor(state);
    default:
      return still(state);
  }
}

/** Setup is done: the same tickets run from now on. */
function runOn(state: KioskState, view: BenchView): Step {
  if (view.doing?.kind !== "work" || view.doing.activity !== "setup") return still(state);
  const items = view.items.map(keyOf);
  return record(state, { what: "run", items }, { kind: "work", activity: "run", items });
}

/** Back to the work that other work or a put-aside interrupted. */
function resume(state: KioskState, { previous }: BenchView): Step {
  if (!previous) return still(state);
  const { activity } = previous;
  const items = previous.items.map(keyOf);
  return record(state, { what: "work", items }, { kind: "work", activity, items });
}

function endBreak(state: KioskState, { doing }: BenchView): Step {
  if (doing?.kind !== "meal" && doing?.kind !== "rest") return still(state);
  return record(state, { what: "back-to-work" }, { kind: "break-end", break: doing.kind });
}

function askEndPin(state: KioskState): Step {
  if (!state.visit) return toDoor(state);
  return askPin(state, state.visit.worker, { for: "end-shift" });
}

/** Taps where a break is chosen. */
export function atBreak(state: KioskState, tap: Tap, look: Look): Step {
  if (tap.on === "back") return toBench(state, look);
  if (tap.on !== "break") return still(state);
  const kind = tap.break;
  return record(state, { what: "break", break: kind }, { kind: "break-start", break: kind });
}

/** Taps on the list of other work; it may also stand in for a wrong ticket. */
export function atOtherWork(
  state: KioskState,
  { purpose }: At<"other-work">,
  tap: Tap,
  look: Look,
): Step {
  if (tap.on === "back") {
    return purpose.for === "reassign" ? askTicket(state, purpose) : toBench(state, look);
  }
  if (tap.on !== "other-work") return still(state);
  const { code } = tap;
  if (purpose.for === "reassign") {
    const { event } = purpose;
    return record(state, { what: "reassign", items: [] }, { kind: "reassign", event, code });
  }
  return record(state, { what: "other-work", code }, { kind: "indirect", code });
}

/** Taps on a worker's own hours, and on what can be put right there. */
export function atHours(state: KioskState, tap: Tap, look: Look): Step {
  if (!state.visit) return toDoor(state);
  const view = look(state, state.visit.worker);
  switch (tap.on) {
    case "wrong-ticket":
      if (view.doing?.kind === "work" && view.items.length > 1) {
        return show(state, { at: "pick-item", to: "reassign" });
      }
      return askReassign(state, view, []);
    case "wrong-count": {
      const [only, ...more] = view.reports;
      if (!only) return still(state);
      return more.length > 0 ? show(state, { at: "pick-report" }) : object(state, only.event);
    }
    case "back":
      return toBench(state, look);
    case "leave":
      return toDoor(state);
    default:
      return still(state);
  }
}

/** Asks for the PIN before the last activity is moved to another ticket (LEDGER.md 9). */
export function askReassign(state: KioskState, view: BenchView, kept: readonly ItemKey[]): Step {
  const purpose = reassignment(view, kept);
  if (!purpose || !state.visit) return still(state);
  return askPin(state, state.visit.worker, { for: "reassign", purpose });
}

/** Taps where the count that is not right is pointed at. */
export function atPickReport(state: KioskState, tap: Tap): Step {
  if (tap.on === "back") return show(state, { at: "hours" });
  return tap.on === "object" ? object(state, tap.report) : still(state);
}

function object(state: KioskState, subject: string): Step {
  return record(state, { what: "object" }, { kind: "object", subject });
}

/** Taps where work is still open at the end of a shift: it is asked about first. */
export function atEndOpenWork(state: KioskState, tap: Tap, look: Look): Step {
  if (!state.visit) return toDoor(state);
  switch (tap.on) {
    case "end-shift":
      return askEndPin(state);
    case "count":
      return askCount(state, look(state, state.visit.worker));
    case "back":
      return toBench(state, look);
    default:
      return still(state);
  }
}
