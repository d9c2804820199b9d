import type { KioskTicket, TicketOperation } from "@/lib/kiosks/schema";
import { operationSheetOf, type TicketSteps } from "@/lib/sheet/operation-sheet";
import type { TimePiece } from "@/lib/sheet/schema";
import { standardInForce } from "@/lib/standards/in-force";
import { type BookedOperation, judgeBook, type TicketBook } from "@/lib/tickets/book";
import type { JudgedTicket } from "@/lib/tickets/facts";
import { obstacles } from "@/lib/tickets/obstacles";
import { reworkAt } from "@/lib/tickets/reworks";
import { type DayRule, productionDay } from "@/lib/time/site-day";

/** From where a ticket is looked at: the cells of the kiosk, the site's days, the instant. */
export interface Viewpoint {
  cells: readonly string[];
  rules: readonly DayRule[];
  atMs: number;
  /** Leaves out time that runs: a copy that is kept does not grow old by the second. */
  isToKeep?: boolean;
}

/**
 * What a kiosk shows of a ticket, judged as of the instant from all that is booked to it, whether or
 * not the judge in the background has come that far. Null for a number that is no ticket's.
 *
 * @param stepped the ticket's steps, where some of its operations are built in steps
 */
export function kioskTicketOf(
  book: TicketBook,
  from: Viewpoint,
  stepped?: TicketSteps,
): KioskTicket | null {
  const { known, ticket } = book;
  if (!known) return null;
  const judged = judgeBook(book, from.isToKeep ? null : from.atMs);
  return {
    ticket,
    model: known.model,
    options: known.options,
    quantity: known.quantity,
    status: judged.status,
    dueOn: known.dueOn,
    operations: book.operations.map((operation, place) =>
      operationOf(operation, { place, judged, book, from, stepped }),
    ),
  };
}

function operationOf(
  booked: BookedOperation,
  seen: {
    place: number;
    judged: JudgedTicket;
    book: TicketBook;
    from: Viewpoint;
    stepped: TicketSteps | undefined;
  },
): TicketOperation {
  const { judged, book, from, stepped } = seen;
  const one = judged.operations[seen.place]!;
  const standard = standardInForce(
    booked.standards,
    productionDay(one.firstWorkMs ?? firstReportMs(book, booked) ?? from.atMs, from.rules),
    booked.standards.flatMap(({ option }) => option ?? []),
  );
  const sheet =
    stepped &&
    operationSheetOf(
      stepped,
      {
        operation: booked.operation,
        standardSeconds: standard && standard.setupSeconds + standard.runSeconds * one.quantity,
        isFinished: one.finishedMs !== null,
        time: timeOn(book, judged, booked),
      },
      from.isToKeep ? null : from.atMs,
    );
  return {
    operation: booked.operation,
    name: booked.name,
    stage: booked.stage,
    cell: booked.cell,
    state: one.state,
    setupSeconds: standard?.setupSeconds ?? null,
    runSeconds: standard?.runSeconds ?? null,
    setupEarned: one.setupEarned,
    quantity: one.quantity,
    openQuantity: one.openQuantity,
    good: one.good,
    rework: one.rework,
    scrap: one.scrap,
    actualSeconds: one.actualSeconds,
    workers: workersOn(book, booked),
    here: from.cells.includes(booked.cellId),
    obstacles: obstacles(one, { status: judged.status, cells: from.cells }),
    hazards: booked.hazards,
    holds: [],
    qualification: null,
    ...(sheet && { sheet }),
  };
}

/** All time that the judge counts for an operation, that of its rework operations left out. */
function timeOn(
  { work }: TicketBook,
  { reworks }: JudgedTicket,
  { operation }: BookedOperation,
): TimePiece[] {
  return work
    .filter((one) => one.operation === operation && !reworkAt(reworks, one))
    .map(({ number, startMs, endMs, seconds, weights, item }) => ({
      worker: number,
      start: startMs / 1000,
      end: endMs === null ? null : endMs / 1000,
      seconds,
      weights: weights ?? [],
      item,
    }));
}

function firstReportMs({ reports }: TicketBook, { operation }: BookedOperation): number | null {
  const instants = reports.flatMap((one) => (one.operation === operation ? one.atMs : []));
  return instants.length > 0 ? Math.min(...instants) : null;
}

function workersOn({ work }: TicketBook, { operation }: BookedOperation) {
  const now = work.filter((one) => one.operation === operation && one.endMs === null);
  const names = new Map(now.map(({ number, name }) => [number, name]));
  return [...names].map(([worker, name]) => ({ worker, name }));
}
