import { UNKNOWN } from "@/lib/matching/parts";
import { type OperationEarning, operationEarning } from "@/lib/standards/earning";
import type { BookedOperation, TicketBook } from "@/lib/tickets/book";
import { judgeBook } from "@/lib/tickets/book";
import type { JudgedRework, JudgedTicket, TicketReport } from "@/lib/tickets/facts";
import { reworkAt } from "@/lib/tickets/reworks";
import type { DayRule } from "@/lib/time/site-day";

/** What must be known of a ticket beside its book. */
export interface MatchingFacts {
  rules: readonly DayRule[];
  /** Operations whose setup is earned when it is booked (CALCULATIONS.md 3). */
  whenBooked: ReadonlySet<string>;
}

type BookedWork = TicketBook["work"][number];

/** Time that has ended, with the rework operation that it belongs to, if any. */
export interface EndedWork extends BookedWork {
  endMs: number;
  seconds: number;
  rework: JudgedRework | null;
  /** True where another cell caused the rework that it is. */
  isElsewhere: boolean;
}

/** An operation of a ticket's routing with all that happened on it. */
export interface OperationLife {
  operation: string;
  /** The cell that does it by the routing. */
  cell: string;
  finishedMs: number | null;
  isOpen: boolean;
  good: number;
  quantity: number;
  earning: OperationEarning<TicketReport>;
  /** In order of time; that of its rework operations too. */
  work: EndedWork[];
}

/** A ticket's operations with their lives, and what was booked to operations that it does not have. */
export interface TicketLives {
  operations: OperationLife[];
  strays: EndedWork[];
  reworks: JudgedRework[];
}

/** Puts a ticket's time and counts to its operations, each with what it earned. */
export function livesOf(book: TicketBook, facts: MatchingFacts): TicketLives {
  const judged = judgeBook(book, null);
  const routing = new Map(book.operations.map((row) => [row.operation, row]));
  const work = endedWork(book, judged, routing);
  const operations = book.operations.map((row, place) => {
    const { state, good, quantity, finishedMs, firstWorkMs } = judged.operations[place]!;
    const { operation, cellId, standards } = row;
    const earning = operationEarning(
      {
        quantity,
        firstWorkMs,
        standards,
        reports: ownReports(book, judged, operation),
        options: standards.flatMap(({ option }) => option ?? []),
        setupEarned: facts.whenBooked.has(operation) ? "when-booked" : "first-good",
      },
      facts.rules,
    );
    const own = work.filter((one) => one.operation === operation);
    const isOpen = state !== "finished" && state !== "closed";
    return { operation, cell: cellId, finishedMs, isOpen, good, quantity, earning, work: own };
  });
  const strays = work.filter(({ operation }) => !routing.has(operation));
  return { operations, strays, reworks: judged.reworks };
}

/** Counts of an operation in the ledger's order, without those of its rework operations. */
function ownReports(book: TicketBook, { reworks }: JudgedTicket, operation: string) {
  const redone = new Set(reworks.flatMap(({ counts }) => counts));
  return book.reports
    .filter((report) => report.operation === operation && !redone.has(report.event))
    .sort((a, b) => a.atMs - b.atMs || (a.event < b.event ? -1 : 1));
}

function endedWork(
  book: TicketBook,
  { reworks }: JudgedTicket,
  routing: ReadonlyMap<string, BookedOperation>,
): EndedWork[] {
  return book.work
    .flatMap((one) => {
      const { endMs, seconds } = one;
      if (endMs === null || seconds === null) return [];
      const rework = reworkAt(reworks, one) ?? null;
      const cause = routing.get(rework?.causedBy ?? causeOf(one, book))?.cellId;
      const isRework = rework !== null || one.activity === "rework";
      const isElsewhere = isRework && cause !== undefined && cause !== (one.cell ?? UNKNOWN);
      return { ...one, endMs, seconds, rework, isElsewhere };
    })
    .sort((a, b) => a.startMs - b.startMs || (a.event < b.event ? -1 : 1));
}

/** What caused the rework that is done on an operation: as its last count with rework said. */
function causeOf({ operation, startMs }: BookedWork, { reports }: TicketBook): string {
  const said = reports
    .filter((one) => one.operation === operation && one.rework > 0 && one.atMs < startMs + 1000)
    .reduce<TicketReport | null>((last, one) => (last && last.atMs > one.atMs ? last : one), null);
  return said?.causedBy ?? operation;
}
