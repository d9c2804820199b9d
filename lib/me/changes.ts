import { endWords } from "@/lib/ends/words";
import { tapWords } from "@/lib/hours/taps";
import { type LooseEndCode, looseEndCode } from "@/lib/ledger/schema";
import { clockText, dayText } from "@/lib/time/format";
import { instantMs } from "@/lib/time/instant";
import { localDate } from "@/lib/time/site-day";

/** Something that somebody else entered in a worker's time; instants are epoch milliseconds. */
export interface Change {
  id: string;
  kind: string;
  atMs: number;
  /** Where it makes something count: a move's `to`, an entered act's own instant. */
  countsMs: number | null;
  by: string;
  note: string | null;
  body: Record<string, unknown>;
  targetKind: string | null;
  targetBody: Record<string, unknown> | null;
  targetMs: number | null;
}

/** A change as its worker reads it: what, by whom and when, and why. */
export interface ChangeLine {
  id: string;
  what: string;
  who: string;
  why: string | null;
}

/** Says in words what others altered; an answer that came with its correction is told once. */
export function changeLines(changes: readonly Change[], timeZone: string): ChangeLine[] {
  const told = changes.filter((change) => !isSaidByCorrection(change, changes));
  return told.map((change) => ({
    id: change.id,
    what: changeWords(change, timeZone),
    who: `${change.by}, ${momentText(change.atMs, timeZone)}`,
    why: change.note,
  }));
}

/** A settlement is entered at one moment with the correction that it means, which says more. */
function isSaidByCorrection(change: Change, all: readonly Change[]): boolean {
  if (change.kind !== "settle") return false;
  return all.some(
    ({ kind, atMs, by }) => kind !== "settle" && atMs === change.atMs && by === change.by,
  );
}

function changeWords(change: Change, timeZone: string): string {
  const { kind, body, countsMs } = change;
  const at = (ms: number | null) => (ms === null ? "" : ` ${momentText(ms, timeZone)}`);
  const target = targetWords(change, timeZone);
  switch (kind) {
    case "move":
      return `Moved ${target}, to${at(countsMs)}`;
    case "void":
      return `Took out ${target}`;
    case "insert":
      return `Entered ${tapWords({ kind, body })},${at(countsMs)}`;
    case "settle":
      return settledWords(String(body.end), String(body.answer), timeZone);
    default:
      return `Entered ${tapWords({ kind, body })},${at(change.atMs)}`;
  }
}

function targetWords({ targetKind, targetBody, targetMs }: Change, timeZone: string): string {
  if (!targetKind) return "a record";
  const words = tapWords({ kind: targetKind, body: targetBody ?? {} });
  return targetMs === null ? words : `${words}, ${momentText(targetMs, timeZone)}`;
}

function settledWords(end: string, answer: string, timeZone: string): string {
  const code = looseEndCode.safeParse(end.slice(0, end.indexOf(":")));
  const what = code.success ? endWords[code.data satisfies LooseEndCode] : "a question";
  const toldMs = instantMs(answer.slice(answer.indexOf(":") + 1));
  const told = toldMs === null ? "" : `: the shift ended ${momentText(toldMs, timeZone)}`;
  return `Settled ${what}${told}`;
}

/** "Wed 6 May, 14:30". */
function momentText(ms: number, timeZone: string): string {
  return `${dayText(localDate(ms, timeZone), "en-GB")}, ${clockText(ms, timeZone)}`;
}
