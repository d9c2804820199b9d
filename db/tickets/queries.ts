import { and, asc, eq, gt, ilike, like, notInArray, or, type SQL, sql } from "drizzle-orm";
import { cells } from "@/db/cells/tables";
import type { Scope } from "@/db/client";
import { orders } from "@/db/orders/tables";
import { models, operations, options } from "@/db/standards/tables";
import { ticketOperations, ticketOptions, tickets } from "@/db/tickets/tables";

/** Which tickets a list wants; `after` is the last `seq` of the page before. */
export interface TicketsWanted {
  number?: string | undefined;
  /** Part of a ticket's or an order's number; spaces and hyphens are forgiven. */
  text?: string | undefined;
  status?: "open" | "finished" | "scrapped" | "cancelled" | undefined;
  /** Name of the cell where the next operation is. */
  cell?: string | undefined;
  /** Name of the model. */
  model?: string | undefined;
  after?: number | undefined;
  limit: number;
}

/**
 * Lists tickets in the order in which they were made, each with its options and its next operation:
 * the first that is neither finished nor closed, as far as the judge has come. A ticket that is
 * no longer open has none.
 */
export async function listTickets(scope: Scope, wanted: TicketsWanted) {
  const next = nextOperation(scope);
  return scope.db
    .select({
      seq: tickets.seq,
      id: tickets.id,
      number: tickets.number,
      status: tickets.status,
      modelId: tickets.modelId,
      model: models.name,
      options: optionNames(),
      order: orders.number,
      quantity: tickets.quantity,
      dueOn: tickets.dueOn,
      operation: next.code,
      operationName: next.name,
      stage: next.stage,
      cell: next.cell,
      createdAt: tickets.createdAt,
      finishedAt: tickets.finishedAt,
    })
    .from(tickets)
    .innerJoin(models, and(eq(models.siteId, tickets.siteId), eq(models.id, tickets.modelId)))
    .leftJoin(orders, and(eq(orders.siteId, tickets.siteId), eq(orders.id, tickets.orderId)))
    .leftJoinLateral(next, sql`true`)
    .where(
      and(
        ...conditions(scope.siteId, wanted),
        wanted.cell === undefined ? undefined : eq(next.cell, wanted.cell),
      ),
    )
    .orderBy(asc(tickets.seq))
    .limit(wanted.limit);
}

/**
 * The ids and models of the tickets that `listTickets` lists for the same wish: for what is read
 * beside the list in the same wave.
 */
export function ticketsOnPage(scope: Scope, wanted: TicketsWanted) {
  const next = nextOperation(scope);
  return scope.db
    .select({ id: tickets.id, modelId: tickets.modelId })
    .from(tickets)
    .innerJoin(models, and(eq(models.siteId, tickets.siteId), eq(models.id, tickets.modelId)))
    .leftJoin(orders, and(eq(orders.siteId, tickets.siteId), eq(orders.id, tickets.orderId)))
    .leftJoinLateral(next, sql`true`)
    .where(
      and(
        ...conditions(scope.siteId, wanted),
        wanted.cell === undefined ? undefined : eq(next.cell, wanted.cell),
      ),
    )
    .orderBy(asc(tickets.seq))
    .limit(wanted.limit)
    .as("on_page");
}

function conditions(siteId: string, wanted: TicketsWanted): (SQL | undefined)[] {
  const part = wanted.text?.replace(/[\s-]/g, "").replace(/[\\%_]/g, (sign) => `\\${sign}`);
  return [
    eq(tickets.siteId, siteId),
    part ? or(like(tickets.number, `%${part}%`), ilike(orders.number, `%${part}%`)) : undefined,
    wanted.number === undefined ? undefined : eq(tickets.number, wanted.number),
    wanted.status && eq(tickets.status, wanted.status),
    // only an open ticket is waiting in a cell: the index on the status serves this filter too
    wanted.cell === undefined ? undefined : eq(tickets.status, "open"),
    wanted.model === undefined ? undefined : eq(models.name, wanted.model),
    wanted.after === undefined ? undefined : gt(tickets.seq, wanted.after),
  ];
}

/** The next operation of the ticket of the outer query, at most one row. */
function nextOperation({ db }: Scope) {
  return db
    .select({
      code: operations.code,
      name: sql<string>`${operations.name}`.as("operation_name"),
      stage: operations.stage,
      cell: sql<string>`${cells.name}`.as("cell_name"),
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
    .where(
      and(
        eq(ticketOperations.siteId, tickets.siteId),
        eq(ticketOperations.ticketId, tickets.id),
        eq(tickets.status, "open"),
        notInArray(ticketOperations.state, ["finished", "closed"]),
      ),
    )
    .orderBy(asc(ticketOperations.position))
    .limit(1)
    .as("next");
}

/** The names of the options of the ticket of the outer query, sorted. */
function optionNames() {
  return sql<string[]>`array(
    select ${options.name}
    from ${ticketOptions}
    join ${options} on ${options.siteId} = ${ticketOptions.siteId}
      and ${options.id} = ${ticketOptions.optionId}
    where ${ticketOptions.siteId} = ${tickets.siteId} and ${ticketOptions.ticketId} = ${tickets.id}
    order by ${options.name})`;
}
