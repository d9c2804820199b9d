import type { Choice, KioskState, Purpose, Refusal } from "@/lib/bench/schema";
import type { BenchView } from "@/lib/bench/view";
import type { KioskTicket, TicketOperation } from "@/lib/kiosks/schema";
import type { Activity } from "@/lib/ledger/schema";

/**
 * Lists what a ticket offers here: every way to work on each of its operations that are next in
 * this kiosk's cells, in routing order. Setup is offered until its standard is earned, rework where
 * a piece waits for it. A ticket that joins others on a bench, or stands in for a wrong one, takes
 * their way of working.
 */
export function offersOf(
  ticket: KioskTicket,
  { only, keepsCell = true }: { only: Activity | null; keepsCell?: boolean },
): Choice[] {
  if (ticket.status !== "open") return [];
  return ticket.operations
    .filter((operation) => operation.here || !keepsCell)
    .filter(({ obstacles, state }) => obstacles.length === 0 && isOpen(state))
    .flatMap((operation) =>
      (only ? [only] : waysTo(operation)).map((activity) => ({
        ticket: ticket.ticket,
        operation: operation.operation,
        activity,
      })),
    );
}

function waysTo({ setupSeconds, setupEarned, rework }: TicketOperation): Activity[] {
  const ways: Activity[] = [];
  if (setupSeconds && !setupEarned) ways.push("setup");
  ways.push("run");
  if (rework > 0) ways.push("rework");
  return ways;
}

const isOpen = (state: TicketOperation["state"]) => state !== "finished" && state !== "closed";

/** The way of working that a purpose leaves no choice about; null leaves it open. */
export function onlyWay(purpose: Purpose, view: BenchView): Activity | null {
  if (purpose.for === "add") return view.activity;
  return purpose.for === "reassign" ? (purpose.activity ?? "run") : null;
}

/**
 * Says why a ticket offers nothing here: the obstacle of its first open operation in these cells,
 * else that its next one is another cell's, else that all is finished.
 */
export function refusalOf(ticket: KioskTicket): { why: Refusal; choice: Choice | null } {
  if (ticket.status !== "open") return { why: "ticket-closed", choice: null };
  const open = ticket.operations.filter(({ state }) => isOpen(state));
  const operation = open.find(({ here }) => here) ?? open[0];
  if (!operation) return { why: "finished", choice: null };
  const why = operation.obstacles[0] ?? (operation.here ? "nothing-here" : "wrong-cell");
  const choice: Choice = {
    ticket: ticket.ticket,
    operation: operation.operation,
    activity: "run",
  };
  return { why, choice };
}

/** Where work may start although the kiosk said no: the lead sees it, the time is kept. */
export function mayGoAhead(why: Refusal): boolean {
  return why === "someone-on-it" || why === "predecessor-open" || why === "wrong-cell";
}

/** Finds an operation among the tickets known here. */
export function findOperation(
  { tickets }: KioskState,
  { ticket, operation }: { ticket: string; operation: string },
): TicketOperation | null {
  const known = tickets[ticket]?.ticket.operations;
  return known?.find((each) => each.operation === operation) ?? null;
}
