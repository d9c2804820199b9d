import { type EndFacts, enteredKind, insertOf, isKept, waysFor } from "@/lib/ends/ways";
import type { EventBody } from "@/lib/ledger/schema";
import { no, ok, type Result } from "@/lib/result";
import { instantMs } from "@/lib/time/instant";
import { endKey } from "@/lib/timeline/settlements";

/** What somebody answered: one of the ways, with the time or the worker that it asks for. */
export interface GivenAnswer {
  answer: string;
  /** The told instant, epoch milliseconds; null where none was told. */
  toldMs: number | null;
}

/** No shift is longer (LEDGER.md 1). */
const LONGEST_MS = 36 * 3_600_000;

/**
 * What an answer to a loose end enters in the ledger: the `settle`, and before it the correction
 * that it means, if it means one. Only the ways that `waysFor` offers are taken; a told time must fit.
 */
export function settlingActs(end: EndFacts, given: GivenAnswer): Result<EventBody[]> {
  const { answer, toldMs } = told(given);
  const way = waysFor(end).find((one) => one.answer === given.answer || one.answer === answer);
  if (!way) return no("conflict", "That is no longer how it can be settled. Look at it again.");
  if (way.asks === "time" && toldMs === null) return noTime("Give the time.");
  const misfit = toldMs === null ? null : misfitOf(end, answer, toldMs);
  if (misfit) return noTime(misfit);
  const settle: EventBody = {
    kind: "settle",
    end: endKey(end.code, end.subject),
    answer: answer === "end-at" ? `end-at:${iso(toldMs!)}` : answer, // told, as checked above
  };
  const correction = correctionOf(end, answer, toldMs);
  return ok(correction ? [correction, settle] : [settle]);
}

function noTime(message: string) {
  return no("invalid", message, { errors: [{ path: "time", message }] });
}

/** Parts an answer from the instant at its end, where a proposed way carries one. */
function told({ answer, toldMs }: GivenAnswer) {
  const [, kind = answer, instant] = /^(end-at|enter:[a-z-]+):(.+)$/.exec(answer) ?? [];
  return { answer: kind, toldMs: instant === undefined ? toldMs : instantMs(instant) };
}

/** Says what is wrong with a told time; null where it fits. */
function misfitOf({ atMs, shift, nowMs }: EndFacts, answer: string, toldMs: number): string | null {
  if (toldMs > nowMs) return "That is still to come. Give a time that has passed.";
  if (answer === "end-at" && toldMs < Math.floor(atMs / 1000) * 1000)
    return "There is a tap after that. Move or take out that one first.";
  const startMs = shift?.startMs ?? atMs;
  if (answer !== "enter:shift-start" && toldMs < startMs)
    return "That is before the shift. Give a time within it.";
  if (answer === "enter:shift-start" && toldMs > atMs)
    return "That is after the first tap. Give the time of coming in.";
  return Math.abs(toldMs - startMs) > LONGEST_MS
    ? "That is more than 36 hours away. Give a time within the shift."
    : null;
}

function correctionOf(end: EndFacts, answer: string, toldMs: number | null): EventBody | null {
  const event = end.subject.slice(-36);
  const entered = enteredKind(answer);
  if (entered && toldMs !== null) return insertOf(enteredBody(end, entered), toldMs);
  switch (answer) {
    case "void":
      return { kind: "void", event };
    case "void-undone":
      return end.body?.kind === "undo" ? { kind: "void", event: end.body.event } : null;
    case "move":
      return { kind: "move", event, to: iso(toldMs ?? end.atMs) };
    case "take-in":
      return isKept(end.code) && end.body ? insertOf(end.body, toldMs ?? end.atMs) : null;
    default:
      return null;
  }
}

/** A break's end is of the kind of the break that it ends. */
function enteredBody({ body }: EndFacts, kind: NonNullable<ReturnType<typeof enteredKind>>) {
  if (kind !== "break-end") return { kind } as const;
  return { kind, break: body?.kind === "break-start" ? body.break : "rest" } as const;
}

function iso(ms: number): string {
  return new Date(ms).toISOString();
}
