import type { Obstacle } from "@/lib/kiosks/schema";
import type { JudgedOperation, JudgedTicket } from "@/lib/tickets/facts";

/**
 * What stands in the way of working on an operation of a ticket, asked before the act to say no
 * kindly; in the order in which a person would want to hear it. Empty: nothing does. Nothing is
 * forbidden by it: an act that is booked all the same is kept, and asks.
 *
 * @param cells those that the kiosk serves
 */
export function obstacles(
  { cell, state, predecessorOpen }: JudgedOperation,
  { status, cells }: { status: JudgedTicket["status"]; cells: readonly string[] },
): Obstacle[] {
  const isOpen = state !== "finished" && state !== "closed";
  const found: [Obstacle, boolean][] = [
    ["wrong-cell", !cells.includes(cell)],
    ["finished", state === "finished"],
    ["predecessor-open", isOpen && predecessorOpen],
    ["ticket-closed", status !== "open"],
  ];
  return found.filter(([, stands]) => stands).map(([obstacle]) => obstacle);
}
