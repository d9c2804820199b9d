import { sum } from "@/lib/sum";
import type {
  JudgedTicket,
  OperationState,
  TicketFacts,
  TicketReport,
  TicketWork,
} from "@/lib/tickets/facts";
import { reworkAt } from "@/lib/tickets/reworks";
import { type TicketTally, tally } from "@/lib/tickets/tally";
import { ticketEnds } from "@/lib/tickets/ticket-ends";

/**
 * Judges one ticket (LEDGER.md 5): how far each operation is, what was booked to it, and what is odd.
 * Time worked and pieces counted are always kept, whatever the judgement. Nothing depends on the
 * clock but the seconds that the caller gives for what runs.
 *
 * @param reports of the ticket, in any order
 * @param work of the ticket, in any order
 * @param settled keys of loose ends that a person has answered
 */
export function judge(
  facts: TicketFacts,
  reports: readonly TicketReport[],
  work: readonly TicketWork[],
  settled: ReadonlySet<string> = new Set(),
): JudgedTicket {
  const counts = [...reports].sort((a, b) => a.atMs - b.atMs || (a.event < b.event ? -1 : 1));
  const time = [...work].sort((a, b) => a.start - b.start || (a.event < b.event ? -1 : 1));
  const routing = facts.operations.map(({ operation }) => operation);
  const tallied = tally({ quantity: facts.quantity, routing }, counts);
  const redone = new Map(time.map((one) => [one, reworkOn(one, tallied)]));
  const status = statusOf(facts, tallied);
  const operations = facts.operations.map(({ operation, cell }, place) => {
    const booked = time.filter((one) => one.operation === operation && !redone.get(one));
    const counted = tallied.operations[place]!;
    const predecessorOpen = tallied.operations
      .slice(0, place)
      .some(({ finishedMs }) => finishedMs === null);
    const isBegun = booked.length > 0 || counts.some((one) => one.operation === operation);
    const state = stateOf({
      status,
      isFinished: counted.finishedMs !== null,
      isBegun,
      predecessorOpen,
    });
    return { operation, cell, state, predecessorOpen, ...counted, ...timeOf(booked) };
  });
  return {
    status,
    endedMs: endOf(status, tallied),
    operations,
    reworks: tallied.reworks.map((rework) => {
      const own = time.filter((one) => redone.get(one) === rework);
      return { ...rework, actualSeconds: sum(own.map(({ seconds }) => seconds)) };
    }),
    looseEnds: ticketEnds({ facts, tallied, counts, time, settled }),
  };
}

/** The rework operation that time belongs to, if any. */
function reworkOn({ operation, start }: TicketWork, { reworks }: TicketTally) {
  return reworkAt(reworks, { operation, startMs: start * 1000 });
}

function statusOf({ isCancelled }: TicketFacts, { operations, reworks, scrappedMs }: TicketTally) {
  if (isCancelled) return "cancelled";
  if (scrappedMs !== null) return "scrapped";
  const isFinished =
    operations.length > 0 &&
    operations.every((one) => one.finishedMs !== null) &&
    reworks.every((one) => one.closedMs !== null);
  return isFinished ? "finished" : "open";
}

function endOf(
  status: JudgedTicket["status"],
  { operations, reworks, scrappedMs }: TicketTally,
): number | null {
  if (status === "scrapped") return scrappedMs;
  if (status !== "finished") return null;
  const ends = [
    ...operations.map(({ finishedMs }) => finishedMs),
    ...reworks.map(({ closedMs }) => closedMs),
  ];
  return Math.max(...ends.map((ms) => ms ?? 0));
}

function stateOf(now: {
  status: JudgedTicket["status"];
  isFinished: boolean;
  isBegun: boolean;
  predecessorOpen: boolean;
}): OperationState {
  if (now.isFinished) return "finished";
  if (now.status !== "open") return "closed";
  if (now.isBegun) return "working";
  return now.predecessorOpen ? "waiting" : "ready";
}

/** @param booked time of one operation, by its start */
function timeOf(booked: readonly TicketWork[]) {
  const rework = booked.filter(({ activity }) => activity === "rework");
  const first = booked.find(({ activity }) => activity !== "rework");
  return {
    actualSeconds: sum(booked.map(({ seconds }) => seconds)),
    reworkSeconds: sum(rework.map(({ seconds }) => seconds)),
    firstWorkMs: first ? first.start * 1000 : null,
  };
}
