import type { LooseEndCode } from "@/lib/ledger/schema";
import type { JudgeEnd, TicketFacts, TicketReport, TicketWork } from "@/lib/tickets/facts";
import { reworkAt } from "@/lib/tickets/reworks";
import type { TicketTally } from "@/lib/tickets/tally";
import { endKey } from "@/lib/timeline/settlements";

/** A ticket's records, in order of time. */
interface Records {
  facts: TicketFacts;
  tallied: TicketTally;
  counts: readonly TicketReport[];
  time: readonly TicketWork[];
  settled: ReadonlySet<string>;
}

/** What is odd about one record, and since when. */
interface Odd {
  code: LooseEndCode;
  at: number;
}

/**
 * Finds a ticket's loose ends (LEDGER.md 6). One code is asked once per worker and operation, on the
 * first record that raises it: each break would repeat it otherwise. A count is about one operation
 * and the end hangs on its event; an act may be about many tickets, so there the subject is ticket,
 * operation and event.
 *
 * @returns by time and key
 */
export function ticketEnds(records: Records): JudgeEnd[] {
  const { facts, settled } = records;
  const asked = new Map<string, JudgeEnd>();
  const ask = (subject: string, record: TicketWork | TicketReport, { code, at }: Odd) => {
    const { worker, operation } = record;
    // each count too many is one more to put right
    const key = code === "over-count" ? subject : `${code} ${worker} ${operation}`;
    if (asked.has(key)) return;
    asked.set(key, { code, subject, at, settled: settled.has(endKey(code, subject)), worker });
  };
  for (const one of records.time) {
    const subject = `${facts.ticket}/${one.operation}:${one.event}`;
    for (const odd of oddTime(one, records)) ask(subject, one, odd);
  }
  for (const one of records.counts)
    for (const odd of oddCount(one, records)) ask(one.event, one, odd);
  return [...asked.values()].sort(
    (a, b) => a.at - b.at || (endKey(a.code, a.subject) < endKey(b.code, b.subject) ? -1 : 1),
  );
}

function oddTime(one: TicketWork, { facts, tallied }: Records): Odd[] {
  const { start, end } = one;
  const place = facts.operations.findIndex(({ operation }) => operation === one.operation);
  if (place < 0) return [{ code: "unknown-ticket", at: start }];
  const odd: Odd[] = [];
  const { cell } = facts.operations[place]!;
  if (one.cell !== null && one.cell !== cell) odd.push({ code: "wrong-cell", at: start });
  if (isAhead(tallied, place, start)) odd.push({ code: "out-of-order", at: start });
  const runsPast = (ms: number | null | undefined): ms is number =>
    typeof ms === "number" && (end === null || end > second(ms));
  const { scrappedMs } = tallied;
  const { finishedMs } = tallied.operations[place]!;
  if (runsPast(scrappedMs)) {
    odd.push({ code: "ticket-scrapped", at: Math.max(start, second(scrappedMs)) });
  } else if (runsPast(finishedMs) && !isRedone(one, tallied)) {
    odd.push({ code: "past-finish", at: Math.max(start, second(finishedMs)) });
  }
  return odd;
}

function oddCount(one: TicketReport, { facts, tallied, time }: Records): Odd[] {
  const at = second(one.atMs);
  const place = facts.operations.findIndex(({ operation }) => operation === one.operation);
  if (place < 0) return [{ code: "unknown-ticket", at }];
  const odd: Odd[] = [];
  if (tallied.scrappedMs !== null && one.atMs > tallied.scrappedMs)
    odd.push({ code: "ticket-scrapped", at });
  if (tallied.overCounts.includes(one.event)) odd.push({ code: "over-count", at });
  const isWorkedOn = time.some(
    ({ operation, start }) => operation === one.operation && start <= at,
  );
  if (!isWorkedOn) odd.push({ code: "count-without-work", at });
  if (!isWorkedOn && isAhead(tallied, place, at)) odd.push({ code: "out-of-order", at });
  return odd;
}

/** Says whether an operation before the one at `place` was not finished by a second. */
function isAhead({ operations }: TicketTally, place: number, at: number): boolean {
  return operations
    .slice(0, place)
    .some(({ finishedMs }) => finishedMs === null || second(finishedMs) > at);
}

/** Time on a rework operation is past the finish of the first, and in order. */
function isRedone({ operation, start }: TicketWork, { reworks }: TicketTally): boolean {
  return reworkAt(reworks, { operation, startMs: start * 1000 }) !== undefined;
}

function second(ms: number): number {
  return Math.floor(ms / 1000);
}
