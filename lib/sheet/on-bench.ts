import { findOperation } from "@/lib/bench/offers";
import type { ItemKey, KioskState } from "@/lib/bench/schema";
import type { BenchView } from "@/lib/bench/view";
import type { TicketOperation } from "@/lib/kiosks/schema";
import { type CellSheet, cellSheet } from "@/lib/sheet/cell-sheet";
import { bookedTime } from "@/lib/sheet/operation-sheet";
import type { OperationSheet } from "@/lib/sheet/schema";
import type { BookedTime } from "@/lib/sheet/step-times";
import { type StepTap, tapsOf } from "@/lib/sheet/taps";
import { shareOf } from "@/lib/timeline/day-sums";

/**
 * The sheet of a ticket operation as this tablet knows it now: what the server last said of it, and
 * all that this worker did since, by the same rules. Null for one that is not built in steps.
 */
export function sheetOnBench(state: KioskState, view: BenchView, item: ItemKey): CellSheet | null {
  const known = findOperation(state, item)?.sheet;
  if (!known) return null;
  const steps = known.steps.filter(({ seconds }) => seconds > 0);
  const standards = steps.map(({ standardSeconds }) => standardSeconds);
  const standardSeconds = standards.reduce<number | null>(
    (total, each) => (total === null || each === null ? null : total + each),
    0,
  );
  return cellSheet(steps, standardSeconds, {
    taps: tapsHere(known, view, item),
    time: timeHere(known, { state, view, item }),
  });
}

/** A record that is at hand here is told by this tablet's own fold: it may be undone since. */
function tapsHere(known: OperationSheet, view: BenchView, item: ItemKey): StepTap[] {
  const told = known.taps.filter(({ event }) => !view.known.has(event));
  const own = tapsOf(view.acts, item, known.steps).map((tap) => {
    const reason = tap.reason ?? known.taps.find(({ event }) => event === tap.event)?.reason;
    return { ...tap, reason: reason ?? null };
  });
  return [...told, ...own].sort((a, b) => a.atMs - b.atMs);
}

/** Others' time as it was told, one's own as it is folded here, from where that begins. */
function timeHere(
  known: OperationSheet,
  { state, view, item }: { state: KioskState; view: BenchView; item: ItemKey },
): BookedTime[] {
  const now = Math.floor(state.nowMs / 1000);
  const from = view.segments[0]?.start ?? Number.POSITIVE_INFINITY;
  const worker = state.visit?.worker;
  const told = known.time.filter((one) => one.worker !== worker || one.start < from);
  const own = view.segments.flatMap((segment) =>
    shareOf(segment, now)
      .filter((share) => share.ticket === item.ticket && share.operation === item.operation)
      .map(({ seconds }) => ({ start: segment.start, end: segment.end ?? now, seconds })),
  );
  return [...bookedTime(told, now), ...own];
}

/** The one ticket operation that is worked on now, where it is built in steps; else null. */
export function sheetItem(state: KioskState, view: BenchView): ItemKey | null {
  const [item, ...more] = view.items;
  const isBuilt = view.doing?.kind === "work" && view.activity !== "setup" && more.length === 0;
  return item && isBuilt && findOperation(state, item)?.sheet ? item : null;
}

/** An instrument that somebody has begun here and nobody is on now. */
export interface SheetToGoOn extends ItemKey {
  name: string;
  model: string;
  options: readonly string[];
  sheet: OperationSheet;
}

/** Lists begun instruments of this cell that nobody is on: the worker's own first, the latest first. */
export function sheetsToGoOn(state: KioskState, worker: string, view: BenchView): SheetToGoOn[] {
  const lastOf = ({ sheet }: SheetToGoOn) =>
    Math.max(0, ...sheet.time.filter((one) => one.worker === worker).map(({ start }) => start));
  return sheetsHere(state)
    .filter(({ operation: { state: stands } }) => stands === "working")
    .filter(({ operation: { workers } }) => workers.every((each) => each.worker === worker))
    .map(({ entry }) => entry)
    .filter((entry) => !view.items.some((item) => isSame(item, entry)))
    .sort((a, b) => lastOf(b) - lastOf(a));
}

/** What was handed to a worker who has not begun on it; null where nothing was. */
export function handedTo(
  state: KioskState,
  worker: string,
): { item: ItemKey; event: string } | null {
  const found = sheetsHere(state).find(({ entry }) => entry.sheet.handOver?.to === worker);
  if (!found?.entry.sheet.handOver) return null;
  const { ticket, operation, sheet } = found.entry;
  return { item: { ticket, operation }, event: sheet.handOver!.event };
}

function sheetsHere(state: KioskState): { entry: SheetToGoOn; operation: TicketOperation }[] {
  return Object.values(state.tickets).flatMap(
    ({ ticket: { ticket, model, options, operations } }) =>
      operations.flatMap((operation) => {
        const { sheet, here, name, state: stands } = operation;
        if (!sheet || !here || stands === "finished" || stands === "closed") return [];
        const key = { ticket, operation: operation.operation };
        return [{ entry: { ...key, name, model, options, sheet }, operation }];
      }),
  );
}

function isSame(a: ItemKey, b: ItemKey): boolean {
  return a.ticket === b.ticket && a.operation === b.operation;
}
