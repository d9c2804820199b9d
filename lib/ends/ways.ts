import { insertedAct } from "@/lib/acts/act";
import { acceptWords } from "@/lib/ends/words";
import { type EventBody, keptCodes, type LooseEndCode } from "@/lib/ledger/schema";
import { clockText } from "@/lib/time/format";

/** What of a loose end decides how it may be settled; instants are epoch milliseconds. */
export interface EndFacts {
  code: LooseEndCode;
  subject: string;
  /** Where it lies: of a forgotten shift end, the last tap. */
  atMs: number;
  receivedMs: number | null;
  /** The record that it hangs on; null where that cannot be read. */
  body: EventBody | null;
  /** The shift in which it lies, as it stands. */
  shift: { startMs: number; endMs: number | null } | null;
  /** The planned shift that begins nearest to it. */
  planned: { startMs: number; endMs: number } | null;
  timeZone: string;
  nowMs: number;
}

/** One way to settle a loose end: what the form sends, and what its button says. */
export interface Way {
  answer: string;
  label: string;
  /** What must be told along with it. */
  asks?: "time" | "worker";
}

/** What answers name besides a time: which record is entered. */
const enterable = ["shift-start", "shift-end", "break-end"] as const;
export type Enterable = (typeof enterable)[number];

/**
 * The likely ways to settle a loose end, the likeliest first; each becomes events of the ledger with
 * author and reason (LEDGER.md 6). A time that only a person can know is asked for, never guessed:
 * the proposed ones are the last tap and the plan.
 */
export function waysFor(end: EndFacts): Way[] {
  if (isKept(end.code)) return keptWays(end);
  const accepted = acceptWords[end.code];
  const accept = accepted ? [{ answer: "accept", label: accepted }] : [];
  switch (end.code) {
    case "no-shift-end":
      return endWays(end);
    case "implied-start":
      return [...startWays(end), ...accept];
    case "break-open":
    case "break-long":
      return [...accept, asked("enter:break-end", "The break ended then")];
    case "shift-long":
      return [...accept, asked("enter:shift-end", "The shift ended then")];
    case "already-in":
      return [...accept, asked("enter:shift-end", "The shift before ended then")];
    case "since-outside":
    case "clock-unmeasured":
      return [...accept, asked("move", "It was then"), takeOut];
    case "undo-late":
      return [{ answer: "void-undone", label: "Take it back now" }, ...accept];
    case "objection":
      return [{ answer: "put-right", label: "It is put right" }, ...accept];
    case "deduction-unattested":
    case "rest-short":
      return accept;
    default:
      return [...accept, takeOut];
  }
}

const takeOut: Way = { answer: "void", label: "Take the record out" };

function asked(answer: string, label: string): Way {
  return { answer, label, asks: "time" };
}

/** Says whether a loose end is of a record that is kept and does not count until settled. */
export function isKept(code: string): boolean {
  return keptCodes.some((kept) => kept === code);
}

/** A forgotten end: at the last tap, at the planned end where that is later, or as told. */
function endWays({ atMs, planned, timeZone, nowMs }: EndFacts): Way[] {
  const at = (ms: number) => ({
    answer: `end-at:${new Date(ms).toISOString()}`,
    label: `End at ${clockText(ms, timeZone)}`,
  });
  const plannedMs = planned?.endMs ?? 0;
  const byPlan = plannedMs > atMs + 999 && plannedMs <= nowMs ? [at(plannedMs)] : [];
  return [at(lastInstantOf(atMs)), ...byPlan, asked("end-at", "End then")];
}

/**
 * The last instant of a second: an end there comes after every tap of that second, and counts on the
 * very same one.
 */
function lastInstantOf(atMs: number): number {
  return Math.floor(atMs / 1000) * 1000 + 999;
}

/** A missing start: by the plan where that is earlier, or as told. */
function startWays({ atMs, planned, timeZone }: EndFacts): Way[] {
  const plannedMs = planned?.startMs ?? Number.POSITIVE_INFINITY;
  const byPlan =
    plannedMs < atMs
      ? [
          {
            answer: `enter:shift-start:${new Date(plannedMs).toISOString()}`,
            label: `Came in at ${clockText(plannedMs, timeZone)}`,
          },
        ]
      : [];
  return [...byPlan, asked("enter:shift-start", "Came in then")];
}

function keptWays({ code, body, receivedMs, nowMs }: EndFacts): Way[] {
  const leaveOut = { answer: "leave-out", label: "Leave it out" };
  const isAct = body !== null && insertedAct(insertOf(body, 0)) !== null;
  if (code === "unreadable" || !isAct) return [leaveOut];
  if (code === "unknown-worker")
    return [{ answer: "take-in", label: "It belongs to", asks: "worker" }, leaveOut];
  if (code === "future" && (receivedMs ?? nowMs) <= nowMs)
    return [asked("take-in", "It was then"), leaveOut];
  return [{ answer: "take-in", label: "Take it in" }, leaveOut];
}

/** The `insert` with which a lead says that an act happened at an instant. */
export function insertOf(body: EventBody, atMs: number): EventBody {
  const { kind, ...rest } = body;
  return { kind: "insert", event: { kind, at: new Date(atMs).toISOString(), ...rest } };
}

/** Reads which record `enter:…` enters; null for any other answer. */
export function enteredKind(answer: string): Enterable | null {
  return enterable.find((kind) => answer === `enter:${kind}`) ?? null;
}
