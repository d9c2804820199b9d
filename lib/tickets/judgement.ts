import { judgeBook, type TicketBook } from "@/lib/tickets/book";
import { difference } from "@/lib/timeline/difference";

/** What must be written so that what is kept of a ticket is what the judge makes of it. */
export interface Judgement {
  operations: KeptOperation[];
  /** Null where the ticket itself stays as it is. */
  ticket: { id: string; status: string; finishedMs: number | null } | null;
  looseEnds: {
    gone: KeptEnd[];
    changed: KeptEnd[];
  };
}

type KeptOperation = Pick<
  TicketBook["operations"][number],
  | "id"
  | "state"
  | "good"
  | "rework"
  | "scrap"
  | "openQuantity"
  | "actualSeconds"
  | "firstWorkMs"
  | "finishedMs"
>;
type KeptEnd = TicketBook["looseEnds"][number];

/** Compares what is kept of a ticket with what the judge makes of it now. */
export function judgementOf(book: TicketBook): Judgement {
  const judged = judgeBook(book, null);
  const after = book.operations.map(({ id }, place) => {
    const { state, good, rework, scrap, openQuantity, ...rest } = judged.operations[place]!;
    const { actualSeconds, firstWorkMs, finishedMs } = rest;
    const counts = { good, rework, scrap, openQuantity };
    return { id, state, ...counts, actualSeconds, firstWorkMs, finishedMs };
  });
  const { known } = book;
  const isSame = known?.status === judged.status && known?.finishedMs === judged.endedMs;
  const ends = judged.looseEnds.map(({ code, subject, worker, at, settled }) => {
    return { code, subject, worker, atMs: at * 1000, settled };
  });
  return {
    operations: difference(book.operations.map(keptOf), after, ({ id }) => id).changed,
    ticket:
      known && !isSame ? { id: known.id, status: judged.status, finishedMs: judged.endedMs } : null,
    looseEnds: difference<KeptEnd>(
      book.looseEnds,
      ends,
      ({ code, subject }) => `${code} ${subject}`,
    ),
  };
}

/** How many rows a judgement changes. */
export function countChanges({ operations, ticket, looseEnds }: Judgement): number {
  const { gone, changed } = looseEnds;
  return operations.length + (ticket ? 1 : 0) + gone.length + changed.length;
}

function keptOf(operation: TicketBook["operations"][number]): KeptOperation {
  const { id, state, good, rework, scrap, openQuantity, ...rest } = operation;
  const { actualSeconds, firstWorkMs, finishedMs } = rest;
  const counts = { good, rework, scrap, openQuantity };
  return { id, state, ...counts, actualSeconds, firstWorkMs, finishedMs };
}
