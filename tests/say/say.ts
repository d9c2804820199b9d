import type { EventBody, Item } from "@/lib/ledger/schema";
import { fold } from "@/lib/timeline/fold";
import type { Folded, FoldFacts, LedgerEvent, SiteRules } from "@/lib/timeline/schema";
import { eventId, foldFacts, makeEvent, siteRules } from "@/tests/make/events";
import { takeTime } from "./clock";
import { foldedRows } from "./rows";
import { ticketOf } from "./tickets";

/** A scenario read from its table. */
export interface Said {
  /** What the fold makes of each worker's events, in the notation of the table. */
  rows: string[];
  /** The rows of the table that say what is expected. */
  expected: string[];
  folded: Map<string, Folded>;
}

/**
 * Plays a scenario of the ledger (LEDGER.md 3 to 6), one row an event:
 *
 *     08:00 ana shift-start #in        a name, a kind, perhaps a label
 *     08:05 ana run A B*300            tickets are letters, "A/130" names an operation, "*" a weight
 *     09:00 ana rest @west             at another kiosk, which stands in the cell of its name
 *     09:10 ana break-end
 *     09:30 ana done A 3 0 1           good, rework, scrap; "count" lets the work run on
 *     10:00 ana other cleaning since 09:45
 *     12:00 ana void #in by 7          entered by a lead
 *     plan ana 08:00 16:30 · asof Tue 08:00 · rules restMaxSeconds 900 · cells
 *
 * Rows that begin with a sign say what must come of it: "=" a segment, "+" a count, "?" a loose end
 * with what it hangs on. "..." is an end that is still open; `cells` shows cells beside segments.
 */
export function say(table: string): Said {
  const lines = table
    .split("\n")
    .map((line) => line.trim().replace(/\s+/g, " "))
    .filter((line) => line !== "");
  const scenario = new Scenario();
  for (const line of lines) if (!/^[=+?]/.test(line)) scenario.add(line);
  const folded = scenario.fold();
  const rows = [...folded].flatMap(([name, one]) => foldedRows(name, one, scenario));
  return {
    rows: rows.sort(),
    expected: lines.filter((line) => /^[=+?]/.test(line)).sort(),
    folded,
  };
}

class Scenario {
  readonly labels = new Map<string, string>();
  showsCells = false;
  private readonly events = new Map<string, LedgerEvent[]>();
  private readonly planned = new Map<string, { start: number; end: number }[]>();
  private rules: SiteRules = siteRules;
  private asOfMs = 0;
  private givenAsOfMs: number | null = null;
  private count = 0;

  add(line: string): void {
    const words = line.split(" ");
    if (words[0] === "cells") this.showsCells = true;
    else if (words[0] === "plan") this.plan(words.slice(1));
    else if (words[0] === "asof") this.givenAsOfMs = time(words.slice(1));
    else if (words[0] === "rules") this.rules = { ...this.rules, [words[1]!]: Number(words[2]) };
    else this.event(words);
  }

  fold(): Map<string, Folded> {
    const asOfMs = this.givenAsOfMs ?? this.asOfMs + 60_000;
    return new Map(
      [...this.events].map(([name, events]) => {
        const planned = this.planned.get(name) ?? [];
        const facts: FoldFacts = { ...foldFacts, rules: [this.rules], planned };
        return [name, fold(events, facts, asOfMs)];
      }),
    );
  }

  /** The label of an event, else the time and kind that its id stands for. */
  nameOf(id: string): string {
    const [label] = [...this.labels].find(([, labelled]) => labelled === id) ?? [];
    return label ?? id;
  }

  private plan([name, ...words]: string[]): void {
    const [start, end] = [time(words) / 1000, time(words) / 1000];
    this.planned.set(name!, [...(this.planned.get(name!) ?? []), { start, end }]);
  }

  private event(words: string[]): void {
    const number = ++this.count;
    const atMs = time(words);
    const name = words.shift()!;
    const options = this.options(words, eventId(number));
    const body = this.body(words.shift()!, words, options.since);
    const weights = "items" in body ? (body.items ?? []).map(({ weight }) => weight ?? 1) : [];
    const event = makeEvent(number, atMs, body, { weights, ...options.other(atMs) });
    this.events.set(name, [...(this.events.get(name) ?? []), event]);
    this.asOfMs = Math.max(this.asOfMs, atMs);
  }

  /** Takes the words off the end of a row that say how, where and by whom. */
  private options(words: string[], id: string) {
    const other: Partial<LedgerEvent> = {};
    let since: number | null = null;
    let received = (atMs: number): number | null => atMs + 1000;
    const first = words.findIndex(
      (word, index) =>
        index > 0 &&
        /^(#\w+|@\w+|by|since|offline|waiting|asks)$/.test(word) &&
        !isTarget(words, index),
    );
    const rest = first < 0 ? [] : words.splice(first);
    while (rest.length > 0) {
      const word = rest.shift()!;
      if (word.startsWith("#")) this.labels.set(word, id);
      else if (word === "@office") Object.assign(other, { kiosk: null, cell: null });
      else if (word.startsWith("@"))
        Object.assign(other, { kiosk: word.slice(1), cell: word.slice(1) });
      else if (word === "by") other.by = rest.shift()!;
      else if (word === "offline") received = (atMs) => atMs + 3_600_000;
      else if (word === "waiting") received = () => null;
      else if (word === "asks")
        other.questions = [rest.shift() as LedgerEvent["questions"][number]];
      else since = time(rest);
    }
    return { since, other: (atMs: number) => ({ ...other, receivedMs: received(atMs) }) };
  }

  private body(kind: string, words: string[], sinceMs: number | null): EventBody {
    const since = sinceMs === null ? {} : { since: new Date(sinceMs).toISOString() };
    switch (kind) {
      case "meal":
      case "rest":
        return { kind: "break-start", break: kind };
      case "break-end":
        return { kind, break: "meal" };
      case "setup":
      case "run":
      case "rework":
        return { kind: "work", activity: kind, items: words.map(item), ...since };
      case "inspecting":
        return { kind: "work", activity: "inspect", items: words.map(item), ...since };
      case "other":
        return { kind: "indirect", code: words[0]!, ...since };
      case "pause":
        return { kind, items: words.map(item) };
      case "done":
      case "count":
        return { kind: "report", ...counts(words), stop: kind === "done" };
      case "inspect":
        return { kind, ...counts(words) };
      case "hand-over":
        return { kind, ...bare(words[0]!), to: words[1]! };
      case "step-done":
        return { kind, ...bare(words[0]!), step: words[1]! };
      case "reading":
        return { kind, ...bare(words[0]!), name: "humidity", value: 45 };
      case "caution-read":
        return { kind, operation: words[0]!, version: "1" };
      case "undo":
      case "void":
        return { kind, event: this.id(words[0]!) };
      case "move":
        return { kind, event: this.id(words.shift()!), to: new Date(time(words)).toISOString() };
      case "insert": {
        const at = new Date(time(words)).toISOString();
        return { kind, event: { ...this.body(words.shift()!, words, null), at, v: 1 } };
      }
      case "reassign":
        return { kind, event: this.id(words.shift()!), ...reassignment(words) };
      case "settle": {
        const end = `${words.shift()}:${this.id(words.shift()!)}`;
        const isTold = words[0] === "end-at" && words.shift();
        const answer = isTold ? `end-at:${new Date(time(words)).toISOString()}` : words[0]!;
        return { kind, end, answer };
      }
      case "object":
      case "confirm":
        return { kind, subject: words[0]! };
      case "release":
        return { kind, hold: words[0]! };
      case "shift-start":
      case "shift-end":
        return { kind };
      default:
        throw new Error(`say: no such kind "${kind}"`);
    }
  }

  private id(label: string): string {
    return this.labels.get(label) ?? eventId(999_999);
  }
}

/** A label right after a kind that corrects is what it is about, not its own name. */
function isTarget(words: readonly string[], index: number): boolean {
  const about = ["undo", "void", "move", "reassign"].includes(words[index - 1]!);
  return words[index]!.startsWith("#") && (about || words[index - 2] === "settle");
}

function time(words: string[]): number {
  const atMs = takeTime(words);
  if (atMs === null) throw new Error(`say: no time in "${words.join(" ")}"`);
  return atMs;
}

function item(word: string): Item {
  const [name, weight] = word.split("*");
  return weight === undefined ? bare(name!) : { ...bare(name!), weight: Number(weight) };
}

function bare(word: string): { ticket: string; operation: string } {
  const [ticket, operation = "120"] = word.split("/");
  return { ticket: ticketOf(ticket!), operation };
}

function counts([name, good = "0", rework = "0", scrap = "0"]: string[]) {
  return { ...bare(name!), good: Number(good), rework: Number(rework), scrap: Number(scrap) };
}

function reassignment([activity, ...words]: string[]): Partial<
  Extract<EventBody, { kind: "reassign" }>
> {
  if (activity === "other") return { code: words[0]! };
  if (activity === "to") return { items: words.map(item) };
  if (activity === undefined) return {};
  return { activity: activity as "run", items: words.map(item) };
}
