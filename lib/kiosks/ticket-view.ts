import type { KioskTicket, TicketOperation } from "@/lib/kiosks/schema";
import { standardInForce } from "@/lib/standards/in-force";
import { type BookedOperation, judgeBook, type TicketBook } from "@/lib/tickets/book";
import type { JudgedTicket } from "@/lib/tickets/facts";
import { obstacles } from "@/lib/tickets/obstacles";
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
 */
export function kioskTicketOf(book: TicketBook, from: Viewpoint): KioskTicket | null {
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
      operationOf(operation, { place, judged, book, from }),
    ),
  };
}

function operationOf(
  booked: BookedOperation,
  seen: { place: number; judged: JudgedTicket; book: TicketBook; from: Viewpoint },
): TicketOperation {
  const { judged, book, from } = seen;
  const one = judged.operations[seen.place]!;
  const standard = standardInForce(
    booked.standards,
    productionDay(one.firstWorkMs ?? firstReportMs(book, booked) ?? from.atMs, from.rules),
    booked.standards.flatMap(({ option }) => option ?? []),
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
  };
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
