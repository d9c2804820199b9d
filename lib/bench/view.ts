import { type Effective, effectiveEvents } from "@/lib/acts/effective";
import { type ItemView, itemView } from "@/lib/bench/item-view";
import type { ItemKey, KioskState } from "@/lib/bench/schema";
import { weightsHere } from "@/lib/bench/weights";
import type { Bench, DaySums } from "@/lib/kiosks/schema";
import type { Activity, ClockEvent, EventBody } from "@/lib/ledger/schema";
import { type SaidAct, saidActs } from "@/lib/sheet/taps";
import { instantMs } from "@/lib/time/instant";
import { dayBounds, productionDay } from "@/lib/time/site-day";
import { sumWindow } from "@/lib/timeline/day-sums";
import { fold } from "@/lib/timeline/fold";
import type {
  CountedReport,
  Doing,
  Folded,
  LedgerEvent,
  Segment,
  Shift,
  SiteRules,
  Standing,
} from "@/lib/timeline/schema";

/** What a worker's bench shows: the server's last word and the records kept here, folded as one. */
export interface BenchView {
  /** Whether there is any knowledge of this worker's day, from the server or from here. */
  isKnown: boolean;
  /** The open shift's start, epoch seconds; null where there is none. */
  shiftStart: number | null;
  /** What is being done now; null outside a shift. */
  doing: Doing | null;
  /** Since when, epoch seconds. */
  since: number | null;
  /** What is on the bench: being worked on, or waiting for the end of a break. */
  items: readonly ItemView[];
  activity: Activity | null;
  /** What a break interrupted. */
  resumes: Doing | null;
  /** The last work of this shift that is still open, to go back to. */
  previous: { activity: Activity; items: readonly ItemKey[] } | null;
  /** The event of the last work or other work of this shift, which `reassign` may move. */
  activityEvent: string | null;
  /** Counts made in this shift that stand, oldest first. */
  reports: readonly CountedReport[];
  /** The production day's segments, oldest first. */
  segments: readonly Segment[];
  today: DaySums;
  planned: { start: number; end: number } | null;
  /** `operation version` of every caution read in this shift. */
  cautionsRead: ReadonlySet<string>;
  /** What stands of all that is known here of this worker, and the ids of every record of it. */
  acts: readonly SaidAct[];
  known: ReadonlySet<string>;
  changes: Bench["changes"];
  looseEnds: Bench["looseEnds"];
  next: Bench["next"];
}

/** Until the cell is known: long enough for any shift, as the site itself will say. */
const UNTOLD_RULES = {
  productionDayStartsAtMinutes: 0,
  shiftLimitSeconds: 14 * 3600,
  sinceLimitSeconds: 1800,
  restMaxSeconds: 1200,
  mealMaxSeconds: 4500,
  restBetweenShiftsSeconds: 39_600,
};

/**
 * Folds what the server last said of a worker and what waits in this tablet into one bench, with
 * the same fold as the server's: what is tapped shows at once, and stays as it is when answered.
 */
export function benchView(state: KioskState, worker: string): BenchView {
  const bench = state.benches[worker];
  const mine = state.pending.filter((event) => event.worker === worker);
  const events = [...(bench?.events ?? []).map(fromServer), ...mine.map((e) => fromHere(state, e))];
  const rules = [rulesHere(state)];
  const planned = plannedOf(bench);
  const facts = { rules, planned: planned ? [planned] : [], homeCell: null };
  const folded = fold(events, facts, state.nowMs);
  const { standing } = folded;
  const effective = effectiveEvents(events);
  const now = Math.floor(state.nowMs / 1000);
  const day = dayBounds(productionDay(state.nowMs, rules), rules);
  return {
    isKnown: bench !== undefined || mine.length > 0,
    ...(standing ? presentOf(state, worker, folded, standing) : NOT_IN),
    activityEvent: standing && activityOf(effective, standing),
    reports: standing
      ? folded.reports.filter(({ atMs }) => atMs >= standing.shift.start * 1000)
      : [],
    segments: folded.segments.filter(({ end }) => (end ?? now) > day.start),
    today: sumWindow(folded.segments, day, now),
    planned,
    cautionsRead: standing ? cautionsRead(effective, standing.shift) : new Set(),
    acts: saidActs(events.map((event) => ({ ...event, worker, note: noteOf(mine, event) }))),
    known: new Set(events.map(({ id }) => id)),
    changes: bench?.changes ?? [],
    looseEnds: bench?.looseEnds ?? [],
    next: bench?.next ?? [],
  };
}

/** The word that went with a record; the server keeps those that it has answered for. */
function noteOf(waiting: readonly ClockEvent[], { id }: LedgerEvent): string | null {
  return waiting.find((event) => event.id === id)?.note ?? null;
}

type Present = Pick<
  BenchView,
  "shiftStart" | "doing" | "since" | "items" | "activity" | "resumes" | "previous"
>;

/** Outside a shift. */
const NOT_IN: Present = {
  shiftStart: null,
  doing: null,
  since: null,
  items: [],
  activity: null,
  resumes: null,
  previous: null,
};

/** What is done now, what lies on the bench, and what it would go back to. */
function presentOf(
  state: KioskState,
  worker: string,
  folded: Folded,
  { shift, doing, since, break: pause }: Standing,
): Present {
  const work = doing.kind === "work" ? doing : null;
  const inShift = folded.segments.filter(({ start }) => start >= shift.start);
  return {
    shiftStart: shift.start,
    doing: pause ? { kind: pause.kind } : doing,
    since: pause?.since ?? since,
    items: work ? work.items.map((item) => itemView(state, worker, folded, work, item)) : [],
    activity: work?.activity ?? null,
    resumes: pause ? doing : null,
    previous: work ? null : previousWork(inShift, folded.reports),
  };
}

/** The last work of a shift without what was reported done since. */
function previousWork(
  segments: readonly Segment[],
  reports: readonly CountedReport[],
): BenchView["previous"] {
  const last = segments.findLast(({ doing }) => doing.kind === "work");
  if (last?.doing.kind !== "work") return null;
  const items = last.doing.items.filter(
    (item) =>
      !reports.some(
        (report) =>
          report.stop &&
          report.atMs >= last.start * 1000 &&
          report.ticket === item.ticket &&
          report.operation === item.operation,
      ),
  );
  return items.length > 0 ? { activity: last.doing.activity, items } : null;
}

/** The present activity, or the last one of the shift: what `reassign` moves. */
function activityOf({ acts }: Effective, { doing, event, shift }: Standing): string | null {
  if (doing.kind !== "unassigned") return event;
  const inShift = acts.filter(({ atMs }) => atMs >= shift.start * 1000);
  const last = inShift.findLast(({ body }) => body.kind === "work" || body.kind === "indirect");
  return last?.id ?? null;
}

function cautionsRead({ standing }: Effective, shift: Shift): Set<string> {
  const read = standing.filter(({ atMs }) => atMs >= shift.start * 1000);
  return new Set(
    read.flatMap(({ body }) =>
      body.kind === "caution-read" ? [`${body.operation} ${body.version}`] : [],
    ),
  );
}

function rulesHere({ cell, device }: KioskState): SiteRules {
  if (cell) return { fromMs: 0, ...cell.rules };
  return { fromMs: 0, timeZone: device?.site.timeZone ?? "UTC", ...UNTOLD_RULES };
}

function plannedOf(bench: Bench | undefined): BenchView["planned"] {
  const start = instantMs(bench?.planned?.start ?? "");
  const end = instantMs(bench?.planned?.end ?? "");
  return start !== null && end !== null ? { start: start / 1000, end: end / 1000 } : null;
}

function fromServer(event: Bench["events"][number]): LedgerEvent {
  // safe because the server reads a body with the ledger's own schema before it sends it
  return { ...event, body: event.body as EventBody };
}

function fromHere(state: KioskState, event: ClockEvent): LedgerEvent {
  const items = "items" in event ? (event.items ?? []) : [];
  return {
    id: event.id,
    atMs: instantMs(event.at) ?? state.nowMs,
    seq: event.clock.seq,
    kiosk: state.device?.deviceId ?? null,
    session: event.session,
    cell: state.cell?.cells[0] ?? state.device?.cell ?? null,
    by: event.by ?? null,
    receivedMs: null,
    weights: weightsOf(state, items),
    questions: [],
    body: event,
  };
}

function weightsOf(
  state: KioskState,
  items: readonly (ItemKey & { weight?: number | undefined })[],
): number[] {
  if (items.length === 0) return [];
  const here = weightsHere(state, items);
  return items.map(({ weight }, at) => weight ?? here[at] ?? 1);
}
