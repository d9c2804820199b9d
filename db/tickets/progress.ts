import { and, asc, eq, inArray } from "drizzle-orm";
import type { Scope } from "@/db/client";
import { operations } from "@/db/standards/tables";
import { type TicketsWanted, ticketsOnPage } from "@/db/tickets/queries";
import { ticketOperations } from "@/db/tickets/tables";

/** Lists the operations of all tickets on a page, each ticket's in the order of its routing. */
export async function listProgressOnPage(scope: Scope, wanted: TicketsWanted) {
  const page = ticketsOnPage(scope, wanted);
  const ids = scope.db.select({ id: page.id }).from(page);
  return scope.db
    .select({
      ticketId: ticketOperations.ticketId,
      operation: operations.code,
      state: ticketOperations.state,
      good: ticketOperations.good,
      actualSeconds: ticketOperations.actualSeconds,
      firstWorkAt: ticketOperations.firstWorkAt,
      finishedAt: ticketOperations.finishedAt,
    })
    .from(ticketOperations)
    .innerJoin(
      operations,
      and(
        eq(operations.siteId, ticketOperations.siteId),
        eq(operations.id, ticketOperations.operationId),
      ),
    )
    .where(and(eq(ticketOperations.siteId, scope.siteId), inArray(ticketOperations.ticketId, ids)))
    .orderBy(asc(ticketOperations.ticketId), asc(ticketOperations.position));
}
