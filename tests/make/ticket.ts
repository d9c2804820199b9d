import type { TicketFacts, TicketReport, TicketWork } from "@/lib/tickets/facts";

/** A ticket of the mill, the neck shop and the spray booth: operations 110, 120 and 130. */
export function makeTicket(quantity = 1, other: Partial<TicketFacts> = {}): TicketFacts {
  return {
    ticket: "26048176",
    quantity,
    isCancelled: false,
    operations: [
      { operation: "110", cell: "mill" },
      { operation: "120", cell: "neck" },
      { operation: "130", cell: "spray" },
    ],
    ...other,
  };
}

const cells: Record<string, string> = { "110": "mill", "120": "neck", "130": "spray" };

/** A count by ana at a minute; its event is named by operation and minute. */
export function makeCount(
  operation: string,
  minute: number,
  [good, rework = 0, scrap = 0]: [number, number?, number?],
  other: Partial<TicketReport> = {},
): TicketReport {
  return {
    event: `count-${operation}-${minute}`,
    kind: "report",
    atMs: minute * 60_000,
    ticket: "26048176",
    operation,
    good,
    rework,
    scrap,
    stop: true,
    causedBy: null,
    defects: [],
    cell: cells[operation] ?? null,
    worker: "ana",
    ...other,
  };
}

/** Ana's run on an operation between two minutes, in its own cell; the end may be open. */
export function makeWork(
  operation: string,
  [from, to]: [number, number | null],
  other: Partial<TicketWork> = {},
): TicketWork {
  return {
    operation,
    worker: "ana",
    activity: "run",
    start: from * 60,
    end: to === null ? null : to * 60,
    seconds: ((to ?? from) - from) * 60,
    cell: cells[operation] ?? null,
    event: `work-${operation}-${from}`,
    ...other,
  };
}
