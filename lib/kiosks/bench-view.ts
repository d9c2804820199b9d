import { type BenchSource, benchItem, isSame, itemsOn } from "@/lib/kiosks/bench-item";
import type { Bench } from "@/lib/kiosks/schema";
import type { Window } from "@/lib/ledger/context";
import { dayBounds, productionDay, ruleAt } from "@/lib/time/site-day";
import { sumWindow } from "@/lib/timeline/day-sums";
import { isInWindow } from "@/lib/timeline/derive";
import type { SegmentRow } from "@/lib/timeline/rows";
import type { Folded, Segment, SiteRules } from "@/lib/timeline/schema";

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
    next: context.next.filter((next) => !itemsOn(folded).some((item) => isSame(item, next))),
  };
}

function todayOf({ window, folded, context, atMs }: BenchSource): Bench["today"] {
  const day = dayBounds(productionDay(atMs, context.rules), context.rules);
  const segments = [
    ...window.earlier.filter(({ item }) => item === 0).map(segmentOf),
    ...folded.segments.filter(({ start }) => isInWindow(window, start * 1000)),
  ];
  const sums = sumWindow(segments, day, Math.floor(atMs / 1000));
  return {
    attendanceSeconds: sums.attendanceSeconds,
    directSeconds: sums.directSeconds,
    indirectSeconds: sums.indirectSeconds,
    restSeconds: sums.restSeconds,
    mealSeconds: sums.mealSeconds,
    unassignedSeconds: sums.unassignedSeconds,
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

/** What others altered since the sign-in before this one; an agreement alters nothing. */
function changesOf({ events, seenMs }: Window): Bench["changes"] {
  return events.flatMap(({ by, receivedMs, atMs, body, note }) =>
    by === null || body.kind === "confirm" || (receivedMs ?? 0) <= (seenMs ?? 0)
      ? []
      : { kind: body.kind, at: iso(atMs), by, note: note ?? "" },
  );
}

function looseEndsOf(window: Window, folded: Folded): Bench["looseEnds"] {
  const own = folded.looseEnds
    .map(({ code, subject, at, settled }) => ({ code, subject, atMs: at * 1000, settled }))
    .filter(({ atMs }) => isInWindow(window, atMs));
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

function iso(ms: number): string {
  return new Date(ms).toISOString();
}
