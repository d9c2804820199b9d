import type { FloorView, FloorWork } from "@/lib/floor/schema";
import { seamVerdict } from "@/lib/seam/verdict";
import { sum } from "@/lib/sum";
import { split } from "@/lib/timeline/split";

/**
 * All person-seconds on a ticket operation at `now`: what has ended, and the fair share of every
 * interval that runs. Before an interval begins (a clock behind the server's) it adds nothing.
 */
export function actualSeconds(work: FloorWork, now: number): number {
  const running = work.people.map(({ since, weights, share }) => {
    return split(Math.max(0, Math.floor(now) - since), weights)[share]!;
  });
  return work.bookedSeconds + sum(running);
}

/** A ticket operation that is over its standard: it names cell, operation and ticket, and nobody. */
export interface Overrun {
  cell: string;
  ticket: string;
  operation: string;
  name: string;
  overMinutes: number;
}

/** What is over its standard on the floor, in the order of cells and operations, by no other rank. */
export function overruns(floor: FloorView, now: number): Overrun[] {
  return floor.cells.flatMap(({ cell, work }) =>
    work.flatMap((each) => {
      const { ticket, operation, name, standardSeconds } = each;
      const pair = { standardSeconds, actualSeconds: actualSeconds(each, now) };
      const { word, minutes } = seamVerdict(pair, { finished: false });
      return word === "over" ? [{ cell, ticket, operation, name, overMinutes: minutes }] : [];
    }),
  );
}

/** How many people are in, and what they are on; someone on several tickets counts once. */
export function headCount(floor: FloorView) {
  const elsewhere = floor.cells.flatMap((cell) => cell.elsewhere.map(({ doing }) => doing));
  const onTickets = new Set(
    floor.cells.flatMap(({ work }) => work.flatMap(({ people }) => people.map((p) => p.worker))),
  );
  return {
    onTickets: onTickets.size,
    onOtherWork: elsewhere.filter((doing) => doing === "indirect").length,
    onBreak: elsewhere.filter((doing) => doing === "meal" || doing === "rest").length,
    onNothing: elsewhere.filter((doing) => doing === "unassigned").length,
    missing: sum(floor.cells.map((cell) => cell.missing.length)),
  };
}
