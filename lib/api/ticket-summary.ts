import type { TicketSummary } from "@/lib/api/tickets";

/** A ticket as the database lists it. */
export interface ListedTicket
  extends Omit<TicketSummary, "ticket" | "createdAt" | "finishedAt" | "options"> {
  number: string;
  options: readonly string[];
  createdAt: Date;
  finishedAt: Date | null;
}

/** A ticket as the integration sees it; what else the database knows of it stays there. */
export function ticketSummaryOf(ticket: ListedTicket): TicketSummary {
  return {
    ticket: ticket.number,
    status: ticket.status,
    model: ticket.model,
    options: [...ticket.options],
    order: ticket.order,
    quantity: ticket.quantity,
    dueOn: ticket.dueOn,
    operation: ticket.operation,
    operationName: ticket.operationName,
    stage: ticket.stage,
    cell: ticket.cell,
    createdAt: ticket.createdAt.toISOString(),
    finishedAt: ticket.finishedAt?.toISOString() ?? null,
  };
}
