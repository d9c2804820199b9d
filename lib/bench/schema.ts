import type { Language } from "@/lib/kiosks/languages";
import type { Bench, Enrolled, KioskCell, KioskTicket, Obstacle } from "@/lib/kiosks/schema";
import type { Activity, ClockEvent } from "@/lib/ledger/schema";

/** What this browser is at the site, since it was enrolled. */
export interface Device extends Omit<Enrolled, "serverTime"> {
  muted: boolean;
}

/** One PIN entry on this kiosk (LEDGER.md 9), kept until its worker's shift ends. */
export interface BenchSession {
  session: string;
  worker: string;
  name: string;
  language: string;
  role: string;
  openedMs: number;
  endedMs: number | null;
  /** The server's token; null where the PIN was keyed while the server was away. */
  token: string | null;
  /** The sealed credential that proves the session later; null where there is a token. */
  sealed: string | null;
}

/** A ticket operation by its numbers. */
export interface ItemKey {
  ticket: string;
  operation: string;
}

/** A way to work on a ticket operation, as offered and chosen. */
export interface Choice extends ItemKey {
  activity: Activity;
}

/** What a chosen ticket is for: the work from now on, one more beside it, or a wrong one put right. */
export type Purpose =
  | { for: "work" }
  | { for: "add" }
  | { for: "reassign"; event: string; activity: Activity | null; kept: readonly ItemKey[] };

export interface Counts {
  good: number;
  rework: number;
  scrap: number;
}

export type CountField = keyof Counts;

/** Why the PIN is asked (LEDGER.md 9). */
export type PinReason =
  | { for: "enter" }
  | { for: "end-shift" }
  | { for: "reassign"; purpose: Extract<Purpose, { for: "reassign" }> };

/** What a number or a code turned out to be where it could not be taken. */
export type Miss =
  | { what: "form" | "badge" | "carrier" | "away" }
  | { what: "check" | "not-found"; nearest: string | null; doubtful: number | null };

/** Why a ticket operation is refused at first: LEDGER.md 5's kindly no, and the join. */
export type Refusal = Obstacle | "someone-on-it" | "on-bench" | "nothing-here";

/** What was done, for the card that says so. */
export type Deed =
  | { what: "shift-start" | "shift-end" | "back-to-work" | "undo" | "object" }
  | { what: "work" | "add" | "run" | "reassign"; items: readonly ItemKey[] }
  | { what: "count" | "finish"; item: ItemKey; counts: Counts; open: number; time: DeedTime }
  | { what: "put-aside"; item: ItemKey }
  | { what: "step-done" | "step-open" | "step-skip" | "step-undo"; item: ItemKey }
  | { what: "hand-over"; item: ItemKey; to: string }
  | { what: "break"; break: "meal" | "rest" }
  | { what: "other-work"; code: string };

/** Standard for setup and the good pieces, and all time on the operation, when it was counted. */
export interface DeedTime {
  standardSeconds: number | null;
  actualSeconds: number;
}

/** What one may take back, and until when (LEDGER.md 3: 10 s). */
export interface UndoOffer {
  event: string;
  worker: string;
  session: string;
  deed: Deed;
  untilMs: number;
}

/** Why no kiosk was made: the code, the server, too many tries, or records that go in first. */
export type EnrolRefusal = "wrong" | "away" | "wait" | "kept";

export type Screen =
  | { at: "loading" }
  | { at: "enrol"; says: EnrolRefusal | null; busy: boolean; isDone: boolean }
  | { at: "door"; digits: string; says: "unread-badge" | "ticket-first" | null }
  | {
      at: "pin";
      worker: string;
      reason: PinReason;
      digits: string;
      says: "wrong" | "away" | null;
      busy: boolean;
      waitUntilMs: number | null;
    }
  | { at: "start-shift" }
  | { at: "bench" }
  | { at: "scan"; purpose: Purpose; digits: string; says: Miss | null; seen: string | null }
  | { at: "cell-tickets"; purpose: Purpose; page: number }
  | { at: "offer"; purpose: Purpose; ticket: string; page: number }
  | { at: "refused"; purpose: Purpose; ticket: string; choice: Choice | null; why: Refusal }
  | { at: "caution"; purpose: Purpose; choice: Choice }
  | { at: "pick-item"; to: "count" | "reassign" | "sheet" }
  | { at: "sheet"; item: ItemKey; picked: string | null; isLocked: boolean }
  | { at: "skip-step"; item: ItemKey; step: string }
  | { at: "stop-here"; item: ItemKey }
  | { at: "other-sheets"; page: number }
  | { at: "hand-over"; item: ItemKey; to: string | null; page: number }
  | { at: "handed"; item: ItemKey; event: string }
  | { at: "count"; item: ItemKey; counts: Counts; open: number; keying: Keying | null }
  | { at: "cause"; item: ItemKey; counts: Counts; open: number; stop: boolean; page: number }
  | { at: "scrap"; item: ItemKey; counts: Counts; open: number; stop: boolean; cause: string }
  | { at: "break" }
  | { at: "other-work"; purpose: Purpose }
  | { at: "hours" }
  | { at: "pick-report" }
  | { at: "end-open-work" }
  | { at: "done"; deed: Deed; quick: boolean };

/** A count keyed on the pad instead of stepped up and down. */
interface Keying {
  field: CountField;
  digits: string;
}

/** Who stands at the kiosk. */
interface Visit {
  worker: string;
  /** True where the worker said "I am already in" to a kiosk that knew of no shift. */
  saidIn: boolean;
  /** Hand-overs that the worker answered with "not now" in this visit. */
  notNow?: readonly string[];
}

export interface Link {
  /** `unknown-device` asks for enrolment: the server does not know this tablet any more. */
  is: "connected" | "away" | "unknown-device";
  /** Since when; epoch milliseconds. */
  sinceMs: number;
}

/** All that the kiosk knows; screens are drawn from it and nothing else. */
export interface KioskState {
  /** The site's time at the last input, epoch milliseconds. */
  nowMs: number;
  touchedMs: number;
  screen: Screen;
  device: Device | null;
  cell: KioskCell | null;
  /** Tickets known here: those of the cell, and those looked up; with the time of the knowledge. */
  tickets: Readonly<Record<string, KnownTicket>>;
  /** The language chosen at the door; null leaves it to the worker's own. */
  language: Language | null;
  link: Link;
  /** Records kept here and not yet answered, oldest first. */
  pending: readonly ClockEvent[];
  sessions: Readonly<Record<string, BenchSession>>;
  benches: Readonly<Record<string, Bench>>;
  visit: Visit | null;
  /** What is being written to this tablet's storage; taps wait. */
  saving: Saving | null;
  /** True where the storage would not take the last record: nothing was done. */
  notKept: boolean;
  /** The ticket being looked up, and what for. */
  finding: { code: string; purpose: Purpose } | null;
  undo: UndoOffer | null;
}

interface KnownTicket {
  ticket: KioskTicket;
  atMs: number;
}

export interface Saving {
  deed: Deed;
  worker: string;
  session: string;
}
