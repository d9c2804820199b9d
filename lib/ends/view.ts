import type { EndPosition } from "@/lib/ends/schema";
import { storyOf } from "@/lib/ends/story";
import { rankWords } from "@/lib/ends/urgency";
import { type EndFacts, type Way, waysFor } from "@/lib/ends/ways";
import { endWords } from "@/lib/ends/words";
import { groupBy } from "@/lib/group";
import type { Activity } from "@/lib/hours/sheet";
import type { EventBody, LooseEndCode } from "@/lib/ledger/schema";
import { clockText, dayText } from "@/lib/time/format";
import { localDate } from "@/lib/time/site-day";
import { endKey } from "@/lib/timeline/settlements";

/** A loose end of a list, as the database has it. */
export interface ListedEnd {
  rank: number;
  code: LooseEndCode;
  subject: string;
  atMs: number;
  ticket: string | null;
  worker: string | null;
  name: string | null;
  cell: string | null;
  kiosk: string | null;
}

/** The one that is open, with its record, shift and plan. */
export interface OpenedEnd extends ListedEnd {
  receivedMs: number | null;
  eventMs: number | null;
  body: EventBody | null;
  by: string | null;
  note: string | null;
  shift: { startMs: number; endMs: number | null; provisional: boolean } | null;
  planned: { startMs: number; endMs: number } | null;
  stretches: readonly { start: number; end: number | null; activity: Activity }[];
}

/** A line of the list: whose, when, what. */
export interface EndLine extends ListedEnd {
  key: string;
  what: string;
  when: string;
}

/** The open line: its story, and how it may be settled. */
export interface EndOpen {
  key: string;
  story: string[];
  /** What somebody wrote with it. */
  note: string | null;
  ways: Way[];
  /** What a field for a time begins with. */
  proposed: string;
  /** The site date of the day to look at, and whether only its worker can know the answer. */
  day: string;
  asksWorker: boolean;
  planned: OpenedEnd["planned"];
  stretches: OpenedEnd["stretches"];
}

/** Gathers a list by rank: what wants a look first, apart from what is only to be known. */
export function endGroups(
  rows: readonly ListedEnd[],
  timeZone: string,
): { heading: string; lines: EndLine[] }[] {
  const byRank = groupBy(rows, ({ rank }) => rank);
  return [...byRank].map(([rank, ends]) => ({
    heading: rankWords[rank] ?? "To be known",
    lines: ends.map((end) => lineOf(end, timeZone)),
  }));
}

function lineOf(end: ListedEnd, timeZone: string): EndLine {
  const { code, subject, atMs } = end;
  const day = dayText(localDate(atMs, timeZone), "en-GB");
  return {
    ...end,
    key: endKey(code, subject),
    what: endWords[code],
    when: `${day}, ${clockText(atMs, timeZone)}`,
  };
}

/** What is open under its line. */
export function endOpen(end: OpenedEnd, at: { timeZone: string; nowMs: number }): EndOpen {
  const { code, subject, atMs, receivedMs, body, shift, planned, note, stretches } = end;
  const facts: EndFacts = { code, subject, atMs, receivedMs, body, shift, planned, ...at };
  return {
    key: endKey(code, subject),
    story: storyOf(end, at.timeZone),
    note,
    ways: waysFor(facts),
    proposed: fieldTime(Math.min(proposedMs(facts), at.nowMs), at.timeZone),
    day: localDate(shift?.startMs ?? atMs, at.timeZone),
    asksWorker: code === "no-shift-end" && end.worker !== null,
    planned,
    stretches,
  };
}

/** A told time is looked for from the likeliest on: the plan where it has one, else where it lies. */
function proposedMs({ code, atMs, planned }: EndFacts): number {
  if (code === "implied-start") return Math.min(planned?.startMs ?? atMs, atMs);
  if (code === "no-shift-end") return Math.max(planned?.endMs ?? atMs, atMs);
  return atMs;
}

function fieldTime(ms: number, timeZone: string): string {
  return `${localDate(ms, timeZone)}T${clockText(ms, timeZone)}`;
}

/** Where a page of the list ended, for the next one. */
export function positionOf({ rank, atMs, code, subject }: ListedEnd): EndPosition {
  return [rank, atMs, code, subject];
}

/** Reads the key of a loose end as an address has it: code and subject; empty for none. */
export function readKey(key: string): { code: string; subject: string } {
  const at = key.indexOf(":");
  return at < 0
    ? { code: "", subject: "" }
    : { code: key.slice(0, at), subject: key.slice(at + 1) };
}
