import type { BookedOperation, BookedWork, TicketBook } from "@/lib/tickets/book";
import type { TicketReport } from "@/lib/tickets/facts";

const T0 = Date.UTC(2026, 4, 14, 8);

/** An operation as nothing was booked to it, in a cell named like its id. */
export function makeOperation(operation: string, cellId: string): BookedOperation {
  return {
    id: `id of ${operation}`,
    operation,
    name: `${cellId} work`,
    stage: cellId,
    cellId,
    cell: `The ${cellId}`,
    hazards: ["dust"],
    state: "waiting",
    good: 0,
    rework: 0,
    scrap: 0,
    openQuantity: 1,
    actualSeconds: 0,
    firstWorkMs: null,
    finishedMs: null,
    standards: [
      { seq: 1, option: null, effectiveFrom: "2026-01-01", setupSeconds: 600, runSeconds: 1800 },
    ],
  };
}

/** Ticket 26000017, a single Heron that goes through the mill and the neck cell. */
export function makeBook(other: Partial<TicketBook> = {}): TicketBook {
  return {
    ticket: "26000017",
    known: {
      id: "id of ticket",
      quantity: 1,
      status: "open",
      finishedMs: null,
      dueOn: "2026-06-01",
      model: "Heron",
      options: ["Sunburst"],
    },
    operations: [makeOperation("010", "mill"), makeOperation("020", "neck")],
    reports: [],
    work: [],
    looseEnds: [],
    settled: [],
    ...other,
  };
}

/** Time on the ticket, from so many seconds after eight; without seconds it runs. */
export function makeWork(
  start: number,
  seconds: number | null,
  other: Partial<BookedWork> = {},
): BookedWork {
  return {
    worker: "w1",
    number: "1042",
    name: "Ilo Varn",
    operation: "010",
    activity: "run",
    startMs: T0 + start * 1000,
    endMs: seconds === null ? null : T0 + (start + seconds) * 1000,
    seconds,
    item: 0,
    cell: "mill",
    event: `e${start}`,
    weights: seconds === null ? [1] : null,
    ...other,
  };
}

/** A count of one good piece, so many seconds after eight. */
export function makeReport(at: number, other: Partial<TicketReport> = {}): TicketReport {
  return {
    event: `r${at}`,
    kind: "report",
    worker: "w1",
    atMs: T0 + at * 1000,
    ticket: "26000017",
    operation: "010",
    good: 1,
    rework: 0,
    scrap: 0,
    stop: true,
    causedBy: null,
    defects: [],
    cell: "mill",
    ...other,
  };
}

/** So many seconds after eight, in epoch milliseconds. */
export const afterEight = (seconds: number): number => T0 + seconds * 1000;
