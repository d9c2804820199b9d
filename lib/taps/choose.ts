import { cautionVersion } from "@/lib/bench/cautions";
import { findOperation, mayGoAhead, offersOf, onlyWay, refusalOf } from "@/lib/bench/offers";
import type { Choice, KioskState, Purpose, Screen } from "@/lib/bench/schema";
import type { BenchView } from "@/lib/bench/view";
import { nearestKnown } from "@/lib/codes/near-misses";
import { readCode } from "@/lib/codes/read-code";
import type { Input, Step, Tap } from "@/lib/taps/inputs";
import {
  isSameItem,
  keyOf,
  type Look,
  record,
  refuse,
  show,
  still,
  toBench,
} from "@/lib/taps/moves";

type At<K extends Screen["at"]> = Extract<Screen, { at: K }>;

const TICKET_DIGITS_MAX = 15;

/** The screen that asks for a ticket. */
export function askTicket(state: KioskState, purpose: Purpose): Step {
  return show(state, { at: "scan", purpose, digits: "", says: null, seen: null });
}

/** Taps while a ticket is shown to the camera or keyed. */
export function atScan(state: KioskState, screen: At<"scan">, tap: Tap, look: Look): Step {
  switch (tap.on) {
    case "digit":
      if (screen.digits.length >= TICKET_DIGITS_MAX) return still(state);
      return show(state, { ...screen, digits: screen.digits + tap.digit, says: null });
    case "rub-out":
      return show(state, { ...screen, digits: screen.digits.slice(0, -1), says: null });
    case "submit":
      return screen.digits ? readTicket(state, screen.purpose, screen.digits) : still(state);
    case "take-ticket":
      return findTicket(state, screen.purpose, tap.ticket);
    case "show-cell-tickets":
      return show(state, { at: "cell-tickets", purpose: screen.purpose, page: 0 });
    case "show-other-work":
      return show(state, { at: "other-work", purpose: screen.purpose });
    case "back":
      return toBench(state, look);
    default:
      return still(state);
  }
}

/**
 * Reads a scanned or keyed text as a ticket. A misread says which it is and keeps the digits; the
 * camera's next look at the same code says nothing more.
 */
export function readTicket(state: KioskState, purpose: Purpose, text: string): Step {
  const reading = readCode(text);
  if (reading.valid && reading.kind === "ticket" && reading.number) {
    return findTicket(state, purpose, reading.number);
  }
  const isTicket = reading.kind === "ticket" || reading.kind === null;
  const keyed = text.replace(/\D/g, "").slice(0, TICKET_DIGITS_MAX);
  const digits = isTicket ? (reading.number ?? keyed) : "";
  const screen: At<"scan"> = { at: "scan", purpose, digits, says: null, seen: text };
  if (reading.kind === "badge") return refuse(state, { ...screen, says: { what: "badge" } });
  if (reading.kind === "carrier") return refuse(state, { ...screen, says: { what: "carrier" } });
  if (reading.problem === "form") return refuse(state, { ...screen, says: { what: "form" } });
  return refuse(state, { ...screen, says: { what: "check", ...nearestHere(state, digits) } });
}

/** Looks a ticket up: the server knows it best, this tablet knows those of its cells. */
export function findTicket(state: KioskState, purpose: Purpose, code: string): Step {
  if (!state.visit) return still(state);
  const { worker } = state.visit;
  return [{ ...state, finding: { code, purpose } }, [{ do: "find-ticket", code, worker }]];
}

/** The ticket is there: what it offers, or the one reason why it offers nothing here. */
export function ticketFound(
  state: KioskState,
  { ticket, code }: Extract<Input, { on: "ticket" }>,
  look: Look,
): Step {
  const known = { ticket, atMs: state.nowMs };
  const next: KioskState = { ...state, tickets: { ...state.tickets, [ticket.ticket]: known } };
  if (state.finding?.code !== code || !state.visit) return still(next);
  const { purpose } = state.finding;
  const only = onlyWay(purpose, look(state, state.visit.worker));
  const number = ticket.ticket;
  if (offersOf(ticket, { only }).length === 0) {
    return refuse(next, { at: "refused", purpose, ticket: number, ...refusalOf(ticket) });
  }
  return show(next, { at: "offer", purpose, ticket: number, page: 0 });
}

/** There is no such ticket, or the server is away and it is not of this cell. */
export function ticketMissing(
  state: KioskState,
  { code, away }: Extract<Input, { on: "no-ticket" }>,
): Step {
  if (state.finding?.code !== code) return still(state);
  const { purpose } = state.finding;
  const says = away
    ? ({ what: "away" } as const)
    : ({ what: "not-found", ...nearestHere(state, code) } as const);
  return refuse(state, { at: "scan", purpose, digits: code, says, seen: code });
}

function nearestHere(state: KioskState, digits: string) {
  const here = state.cell?.queue.map(({ ticket }) => ticket) ?? [];
  const near = nearestKnown(digits, here);
  return { nearest: near?.number ?? null, doubtful: near?.at ?? null };
}

/** Taps on the list of the cell's tickets, and on what a ticket offers. */
export function atOffer(
  state: KioskState,
  screen: At<"offer"> | At<"cell-tickets">,
  tap: Tap,
  look: Look,
): Step {
  switch (tap.on) {
    case "page":
      return show(state, { ...screen, page: tap.page });
    case "take-ticket":
      return findTicket(state, screen.purpose, tap.ticket);
    case "take":
      return screen.at === "offer" ? take(state, screen.purpose, tap.choice, look) : still(state);
    case "back":
    case "pick-another":
      return askTicket(state, screen.purpose);
    default:
      return still(state);
  }
}

/** An operation was chosen: said no to, kindly, or shown to be someone's, or begun. */
export function take(state: KioskState, purpose: Purpose, choice: Choice, look: Look): Step {
  if (!state.visit) return still(state);
  const { worker } = state.visit;
  const view = look(state, worker);
  const refused = { at: "refused", purpose, ticket: choice.ticket, choice } as const;
  const isDoing = purpose.for === "add" || view.activity === choice.activity;
  if (purpose.for !== "reassign" && isDoing && isOnBench(view, choice)) {
    return refuse(state, { ...refused, why: "on-bench" });
  }
  const others = findOperation(state, choice)?.workers.filter((each) => each.worker !== worker);
  if (others?.length && purpose.for !== "reassign") {
    return refuse(state, { ...refused, why: "someone-on-it" });
  }
  return begin(state, purpose, choice, view);
}

function isOnBench(view: BenchView, choice: Choice): boolean {
  return view.doing?.kind === "work" && view.items.some((item) => isSameItem(item, choice));
}

/** Taps on a card that said no. */
export function atRefused(state: KioskState, screen: At<"refused">, tap: Tap, look: Look): Step {
  const { purpose, choice, why } = screen;
  switch (tap.on) {
    case "go-ahead":
      if (!choice || !state.visit || !mayGoAhead(why)) return still(state);
      return begin(state, purpose, choice, look(state, state.visit.worker));
    case "call-lead":
      return callLead(state);
    case "pick-another":
      return show(state, { at: "cell-tickets", purpose, page: 0 });
    case "back":
      return askTicket(state, purpose);
    default:
      return still(state);
  }
}

/** Taps on a caution: it is answered before the work begins, once per shift and operation. */
export function atCaution(state: KioskState, screen: At<"caution">, tap: Tap, look: Look): Step {
  const { purpose, choice } = screen;
  switch (tap.on) {
    case "go-ahead":
      if (!state.visit) return still(state);
      return start(state, purpose, choice, look(state, state.visit.worker), true);
    case "call-lead":
      return callLead(state);
    case "back":
      return show(state, { at: "offer", purpose, ticket: choice.ticket, page: 0 });
    default:
      return still(state);
  }
}

function callLead(state: KioskState): Step {
  const code = "waiting-lead";
  return record(state, { what: "other-work", code }, { kind: "indirect", code });
}

/** Begins the work, or first shows the caution that nobody has read in this shift. */
function begin(state: KioskState, purpose: Purpose, choice: Choice, view: BenchView): Step {
  const hazards = findOperation(state, choice)?.hazards ?? [];
  const isRead = view.cautionsRead.has(`${choice.operation} ${cautionVersion(hazards)}`);
  if (hazards.length > 0 && !isRead && purpose.for !== "reassign") {
    return show(state, { at: "caution", purpose, choice }, { do: "sound", sound: "hold" });
  }
  return start(state, purpose, choice, view, false);
}

function start(
  state: KioskState,
  purpose: Purpose,
  choice: Choice,
  view: BenchView,
  isCautionRead: boolean,
): Step {
  const item = keyOf(choice);
  const hazards = findOperation(state, choice)?.hazards ?? [];
  const { operation, activity } = choice;
  const read = isCautionRead
    ? [{ kind: "caution-read", operation, version: cautionVersion(hazards) } as const]
    : [];
  if (purpose.for === "reassign") {
    const items = [...purpose.kept.map(keyOf), item];
    const body = { kind: "reassign", event: purpose.event, activity, items } as const;
    return record(state, { what: "reassign", items }, body);
  }
  const isAdded = purpose.for === "add" && view.items.length > 0;
  const items = isAdded ? [...view.items.map(keyOf), item] : [item];
  const deed = isAdded ? ({ what: "add", items } as const) : ({ what: "work", items } as const);
  return record(state, deed, ...read, { kind: "work", activity, items });
}
