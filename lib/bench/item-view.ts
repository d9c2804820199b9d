import { findOperation } from "@/lib/bench/offers";
import type { ItemKey, KioskState } from "@/lib/bench/schema";
import { sum } from "@/lib/sum";
import { isSameItem } from "@/lib/taps/moves";
import { instantMs } from "@/lib/time/instant";
import { shareOf } from "@/lib/timeline/day-sums";
import type { Doing, Folded, WorkItem } from "@/lib/timeline/schema";

/** A ticket operation on someone's bench with what the screen says of it. */
export interface ItemView extends ItemKey {
  /** The operation's name. */
  name: string;
  model: string;
  options: readonly string[];
  quantity: number;
  open: number;
  good: number;
  /** Setup and run of all pieces that are or will be good; null without a standard. */
  standardSeconds: number | null;
  setupSeconds: number | null;
  runSeconds: number | null;
  /** All time ever booked to it by anyone, until now. */
  actualSeconds: number;
  /** The part of each second now that goes to it, 0 to 1. */
  share: number;
}

/** What is known of a ticket operation, from when, before this worker's own later acts. */
interface Known
  extends Omit<ItemView, keyof ItemKey | "standardSeconds" | "actualSeconds" | "share"> {
  bookedSeconds: number;
  /** All time before this instant is in `bookedSeconds`; epoch seconds. */
  bookedUntil: number;
  /** Says whether a report of this worker is not in the counts yet. */
  isUncounted(report: { event: string; atMs: number }): boolean;
}

const nothingKnown: Known = {
  name: "",
  model: "",
  options: [],
  quantity: 1,
  open: 1,
  good: 0,
  setupSeconds: null,
  runSeconds: null,
  bookedSeconds: 0,
  bookedUntil: 0,
  isUncounted: () => true,
};

/** Shows a ticket operation on a bench: what was known of it, and all that was done since. */
export function itemView(
  state: KioskState,
  worker: string,
  folded: Folded,
  work: Extract<Doing, { kind: "work" }>,
  item: WorkItem,
): ItemView {
  const { bookedSeconds, bookedUntil, isUncounted, ...known } =
    fromBench(state, worker, item) ?? fromTicket(state, item) ?? nothingKnown;
  const reports = folded.reports.filter(
    (report) => isSameItem(report, item) && isUncounted(report),
  );
  const good = known.good + sum(reports.map((report) => report.good));
  const done = sum(reports.map((report) => report.good + report.scrap));
  const open = Math.max(0, known.open - done);
  const weight = sum(work.items.map((each) => each.weight));
  return {
    ...known,
    ticket: item.ticket,
    operation: item.operation,
    good,
    open,
    standardSeconds: standardOf(known, good + open),
    actualSeconds: bookedSeconds + ownSeconds(state, folded, item, bookedUntil),
    share: weight > 0 ? item.weight / weight : 1 / work.items.length,
  };
}

function standardOf({ setupSeconds, runSeconds }: Known | ItemViewKnown, pieces: number) {
  return runSeconds === null ? null : (setupSeconds ?? 0) + runSeconds * pieces;
}

type ItemViewKnown = Pick<ItemView, "setupSeconds" | "runSeconds">;

/** The server's own word on what lies on this bench. */
function fromBench(state: KioskState, worker: string, key: ItemKey): Known | null {
  const work = state.benches[worker]?.work;
  const item = work?.items.find((each) => isSameItem(each, key));
  if (!work || !item) return null;
  const waiting = new Set(state.pending.map(({ id }) => id));
  return {
    ...item,
    open: item.openQuantity,
    bookedUntil: Math.floor((instantMs(work.since) ?? 0) / 1000),
    isUncounted: ({ event }) => waiting.has(event),
  };
}

/** A ticket looked up, or one of the cell's: true when it came, and the worker's acts since. */
function fromTicket(state: KioskState, key: ItemKey): Known | null {
  const told = state.tickets[key.ticket];
  const operation = findOperation(state, key);
  if (!told || !operation) return null;
  return {
    ...operation,
    model: told.ticket.model,
    options: told.ticket.options,
    open: operation.openQuantity,
    bookedSeconds: operation.actualSeconds,
    bookedUntil: Math.floor(told.atMs / 1000),
    isUncounted: ({ atMs }) => atMs > told.atMs,
  };
}

/** This worker's fair share of the time on an item since an instant. */
function ownSeconds(state: KioskState, { segments }: Folded, key: ItemKey, since: number): number {
  const now = Math.floor(state.nowMs / 1000);
  const later = segments.filter(({ end }) => (end ?? now) > since);
  return sum(
    later.map((segment) => {
      const part = { ...segment, start: Math.max(segment.start, since) };
      return shareOf(part, now).find((share) => isSameItem(share, key))?.seconds ?? 0;
    }),
  );
}
