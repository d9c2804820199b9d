import { and, asc, eq } from "drizzle-orm";
import { cells } from "@/db/cells/tables";
import type { Scope } from "@/db/client";
import { workers } from "@/db/people/tables";
import { listStandardsOfModel } from "@/db/standards/queries";
import { operations } from "@/db/standards/tables";
import { listTickets } from "@/db/tickets/queries";
import { ticketOperations } from "@/db/tickets/tables";
import { listSegmentsOfTicket } from "@/db/timeline/booked-segments";
import { reports } from "@/db/timeline/tables";

/**
 * Finds all that is known of a ticket as of one moment, so that its parts add up; null if there is
 * no such ticket. Segments and reports of operations that it does not have are there too.
 */
export async function findBirthRecord({ db, siteId }: Scope, number: string) {
  return db.transaction(
    async (tx) => {
      const scope = { db: tx, siteId };
      const [ticket] = await listTickets(scope, { number, limit: 1 });
      if (!ticket) return null;
      return {
        ticket,
        operations: await listOperationsOf(scope, ticket.id),
        standards: await listStandardsOfModel(scope, ticket.modelId),
        segments: await listSegmentsOfTicket(scope, number),
        reports: await listReportsOf(scope, number),
      };
    },
    { isolationLevel: "repeatable read", accessMode: "read only" },
  );
}

/** Lists the operations of a ticket in the order of its routing, as the judge left them. */
async function listOperationsOf({ db, siteId }: Scope, ticketId: string) {
  return db
    .select({
      operation: operations.code,
      name: operations.name,
      stage: operations.stage,
      cell: cells.name,
      state: ticketOperations.state,
      openQuantity: ticketOperations.openQuantity,
      good: ticketOperations.good,
      rework: ticketOperations.rework,
      scrap: ticketOperations.scrap,
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
    .innerJoin(cells, and(eq(cells.siteId, operations.siteId), eq(cells.id, operations.cellId)))
    .where(and(eq(ticketOperations.siteId, siteId), eq(ticketOperations.ticketId, ticketId)))
    .orderBy(asc(ticketOperations.position));
}

/** Lists the counts of a ticket that stand, in the order of time. */
async function listReportsOf({ db, siteId }: Scope, number: string) {
  return db
    .select({
      kind: reports.kind,
      at: reports.at,
      operation: reports.operation,
      good: reports.good,
      rework: reports.rework,
      scrap: reports.scrap,
      stop: reports.stop,
      causedBy: reports.causedBy,
      defects: reports.defects,
      cell: cells.name,
      workerNumber: workers.number,
      workerName: workers.name,
    })
    .from(reports)
    .innerJoin(workers, and(eq(workers.siteId, reports.siteId), eq(workers.id, reports.workerId)))
    .leftJoin(cells, and(eq(cells.siteId, reports.siteId), eq(cells.id, reports.cellId)))
    .where(and(eq(reports.siteId, siteId), eq(reports.ticket, number)))
    .orderBy(asc(reports.at), asc(reports.id));
}
