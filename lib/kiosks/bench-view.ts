import type { Bench, BenchItem } from "@/lib/kiosks/schema";
import type { BookingContext, ItemFacts, Window } from "@/lib/ledger/context";
import { openPieces, standardOf } from "@/lib/ledger/weigh";
import { sum } from "@/lib/sum";
import { dayBounds, productionDay, ruleAt } from "@/lib/time/site-day";
import { shareOf, sumWindow } from "@/lib/timeline/day-sums";
import type { SegmentRow } from "@/lib/timeline/rows";
import type { Folded, Segment, SiteRules, WorkItem } from "@/lib/timeline/schema";

/** A worker's window and what the fold makes of it, with what else is known at that moment. */
export interface BenchSource {
  window: Window;
  folded: Folded;
  context: Pick<BookingContext, "rules" | "facts" | "next">;
  atMs: number;
}

/** What a worker's own screen shows at an instant (API.md). */
export function benchOf(source: BenchSource): Bench {
  const { window, folded, context, atMs } = source;
  const { standing } = folded;
  const doing = standing?.doing;
  const since = iso((standing?.since ?? 0) * 1000);
  return {
    shift: standing ? { start: iso(standing.shift.start * 1000) } : null,
    work:
      standing && doing?.kind === "work"
        ? {
            activity: doing.activity,
            items: doing.items.map((item) => benchItem(item, source)),
            since,
            said: standing.said,
          }
        : null,
    other: doing?.kind === "indirect" ? { code: doing.code, since } : null,
    break: standing?.break?.kind ?? null,
    breakSince: standing?.break ? iso(standing.break.since * 1000) : null,
    today: todayOf(source),
    changes: changesOf(window),
    looseEnds: looseEndsOf(window, folded),
    events: openEvents(window, context.rules, atMs),
    planned: plannedAt(window, atMs),
    next: context.next.filter(({ ticket, operation }) => !isOn(folded, { ticket, operation })),
  };
}

/** The ticket operations that a worker is on and that facts are needed of; may be empty. */
export function itemsOn({ standing }: Folded): readonly WorkItem[] {
  return standing?.doing.kind === "work" ? standing.doing.items : [];
}

function isOn(folded: Folded, pair: Pair): boolean {
  return itemsOn(folded).some((item) => isSame(item, pair));
}

function benchItem(item: WorkItem, source: BenchSource): BenchItem {
  const { ticket, operation, weight } = item;
  const found = source.context.facts.find((facts) => isSame(facts, item));
  if (!found) return { ...NOTHING_KNOWN, ticket, operation, weight, name: operation };
  const facts = withOwnCounts(found, source);
  const standard = standardOf(facts, source.context.rules, source.atMs);
  return {
    ticket,
    operation,
    weight,
    model: facts.model,
    options: facts.options,
    name: facts.name,
    quantity: facts.quantity,
    openQuantity: openPieces(facts),
    good: facts.good,
    setupSeconds: standard?.setupSeconds ?? null,
    runSeconds: standard?.runSeconds ?? null,
    bookedSeconds: bookedBefore(facts, source),
    hazards: facts.hazards,
  };
}

const NOTHING_KNOWN = {
  model: "",
  options: [],
  quantity: 0,
  openQuantity: 0,
  good: 0,
  setupSeconds: null,
  runSeconds: null,
  bookedSeconds: 0,
  hazards: [],
};

/** Facts are of the moment before the batch: its worker's counts are put in place of the old ones. */
function withOwnCounts(facts: ItemFacts, { window, folded }: BenchSource): ItemFacts {
  const before = window.reports.filter((report) => isSame(report, facts));
  const now = folded.reports.filter(
    (report) => isSame(report, facts) && isWithin(window, report.atMs),
  );
  const change = (count: "good" | "scrap") =>
    sum(now.map((report) => report[count])) - sum(before.map((report) => report[count]));
  return { ...facts, good: facts.good + change("good"), scrap: facts.scrap + change("scrap") };
}

/**
 * All time booked to an item before the worker's present stretch on it, in whole seconds: others'
 * as of the instant, one's own as the fold has it now.
 */
function bookedBefore(facts: ItemFacts, { window, folded, atMs }: BenchSource): number {
  const others = facts.booked
    .filter(({ workerId }) => workerId !== window.workerId)
    .map(({ seconds, sinceMs, weight, total }) => {
      const runningSeconds = sinceMs === null ? 0 : Math.max(0, atMs - sinceMs) / 1000;
      return seconds + Math.floor((runningSeconds * (weight ?? 1)) / (total || 1));
    });
  const kept = facts.booked.find(({ workerId }) => workerId === window.workerId)?.seconds ?? 0;
  const replaced = window.segments.filter((row) => isSame(row, facts));
  const own = folded.segments
    .filter(({ start, end }) => end !== null && isWithin(window, start * 1000))
    .filter(({ start }) => start < (folded.standing?.since ?? Number.POSITIVE_INFINITY))
    .flatMap((segment) => shareOf(segment, segment.end ?? segment.start))
    .filter((share) => isSame(share, facts));
  const ownBefore = kept - sum(replaced.map(({ seconds }) => seconds ?? 0));
  return Math.max(0, sum(others) + ownBefore + sum(own.map(({ seconds }) => seconds)));
}

function todayOf({ window, folded, context, atMs }: BenchSource): Bench["today"] {
  const day = dayBounds(productionDay(atMs, context.rules), context.rules);
  const segments = [
    ...window.earlier.filter(({ item }) => item === 0).map(segmentOf),
    ...folded.segments.filter(({ start }) => isWithin(window, start * 1000)),
  ];
  const { attendanceSeconds, directSeconds, indirectSeconds, ...rest } = sumWindow(
    segments,
    day,
    Math.floor(atMs / 1000),
  );
  const { restSeconds, mealSeconds, unassignedSeconds } = rest;
  return {
    attendanceSeconds,
    directSeconds,
    indirectSeconds,
    restSeconds,
    mealSeconds,
    unassignedSeconds,
  };
}

/** A kept interval as a segment; its items are all one for sums of time. */
function segmentOf(row: SegmentRow): Segment {
  const { activity, startMs, endMs, code, cellId, said, eventId } = row;
  const isWork = activity === "setup" || activity === "run" || activity === "rework";
  const base = {
    start: startMs / 1000,
    end: endMs === null ? null : endMs / 1000,
    cell: cellId,
    said,
    event: eventId,
  };
  if (isWork || activity === "inspect")
    return { ...base, doing: { kind: "work", activity, items: [] } };
  if (activity === "indirect") return { ...base, doing: { kind: "indirect", code: code ?? "" } };
  return { ...base, doing: { kind: activity } };
}

/** What a lead entered since the sign-in before this one. */
function changesOf({ events, seenMs }: Window): Bench["changes"] {
  return events.flatMap(({ by, receivedMs, atMs, body, note }) =>
    by === null || (receivedMs ?? 0) <= (seenMs ?? 0)
      ? []
      : { kind: body.kind, at: iso(atMs), by, note: note ?? "" },
  );
}

function looseEndsOf(window: Window, folded: Folded): Bench["looseEnds"] {
  const own = folded.looseEnds
    .map(({ code, subject, at, settled }) => ({ code, subject, atMs: at * 1000, settled }))
    .filter(({ atMs }) => isWithin(window, atMs));
  return [...own, ...window.judged]
    .filter(({ settled }) => !settled)
    .map(({ code, subject, atMs }) => ({
      // safe because only codes are ever written into the column
      code: code as Bench["looseEnds"][number]["code"],
      subject,
      at: iso(atMs),
    }));
}

/** The events since the last gap that no shift spans, for the same fold on the kiosk. */
function openEvents(
  { events }: Window,
  rules: readonly SiteRules[],
  atMs: number,
): Bench["events"] {
  const { shiftLimitSeconds, restBetweenShiftsSeconds } = ruleAt(rules, atMs);
  const gapMs = Math.max(shiftLimitSeconds, restBetweenShiftsSeconds) * 1000;
  const latestFirst = [...events].sort((a, b) => b.atMs - a.atMs);
  let reachMs = atMs - gapMs;
  const open = latestFirst.filter((event) => {
    if (event.atMs < reachMs) return false;
    reachMs = Math.min(reachMs, event.atMs - gapMs);
    return true;
  });
  return open.reverse().map(({ note, ...event }) => ({
    ...event,
    weights: [...event.weights],
    questions: [...event.questions],
  }));
}

function plannedAt({ planned }: Window, atMs: number): Bench["planned"] {
  const soon = planned.find(
    ({ startMs, endMs }) => endMs > atMs && startMs < atMs + PLANNED_AHEAD_MS,
  );
  return soon ? { start: iso(soon.startMs), end: iso(soon.endMs) } : null;
}

/** A shift that begins later than this is not today's. */
const PLANNED_AHEAD_MS = 12 * 3_600_000;

interface Pair {
  ticket: string | null;
  operation: string | null;
}

function isSame(one: Pair, other: Pair): boolean {
  return one.ticket === other.ticket && one.operation === other.operation;
}

function isWithin({ firstMs, lastMs }: Window, atMs: number): boolean {
  return atMs >= Math.floor(firstMs / 1000) * 1000 && atMs <= lastMs;
}

function iso(ms: number): string {
  return new Date(ms).toISOString();
}
