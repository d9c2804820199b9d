import { v7 as uuidv7 } from "uuid";
import type { Scope } from "@/db/client";
import { orders } from "@/db/orders/tables";
import { type FactoryIds, idOf } from "@/db/seed/factory";
import { inChunks } from "@/db/seed/in-chunks";
import { ticketOperations, ticketOptions, tickets } from "@/db/tickets/tables";
import type { Traveller } from "@/lib/simulation/traveller";

/**
 * Writes orders and tickets as they were when they were released, nothing done: what became of them is
 * for the ledger's events to say and for the judge to find.
 */
export async function writeTickets(
  scope: Scope,
  ids: FactoryIds,
  travellers: readonly Traveller[],
): Promise<void> {
  const { db, siteId } = scope;
  const inOrder = [...travellers].sort((a, b) => a.releasedAt - b.releasedAt);
  const orderIds = await writeOrders(scope, inOrder);
  const made = inOrder.map((traveller) => ({ traveller, id: uuidv7() }));
  await inChunks(
    made.map(({ id, traveller: { number, model, order, lot, dueOn, releasedAt } }) => ({
      siteId,
      id,
      number,
      modelId: idOf(ids.models, model.name),
      orderId: idOf(orderIds, order),
      quantity: lot,
      dueOn,
      createdAt: new Date(releasedAt * 1000),
    })),
    (rows) => db.insert(tickets).values(rows),
  );
  await inChunks(
    made.map(({ id, traveller: { model, option } }) => ({
      siteId,
      ticketId: id,
      optionId: idOf(ids.options, `${model.name} ${option}`),
    })),
    (rows) => db.insert(ticketOptions).values(rows),
  );
  await inChunks(made.flatMap(operationsOf(siteId, ids)), (rows) =>
    db.insert(ticketOperations).values(rows),
  );
}

async function writeOrders(
  { db, siteId }: Scope,
  travellers: readonly Traveller[],
): Promise<Map<string, string>> {
  const first = new Map<string, Traveller>();
  for (const each of travellers) if (!first.has(each.order)) first.set(each.order, each);
  const rows = [...first].map(([number, { dueOn, releasedAt }]) => ({
    siteId,
    id: uuidv7(),
    number,
    dueOn,
    createdAt: new Date(releasedAt * 1000),
  }));
  await inChunks(rows, (chunk) => db.insert(orders).values(chunk));
  return new Map(rows.map(({ number, id }) => [number, id]));
}

function operationsOf(siteId: string, ids: FactoryIds) {
  return ({ id, traveller: { steps, lot } }: { id: string; traveller: Traveller }) =>
    steps.map(({ operation }, position) => ({
      siteId,
      id: uuidv7(),
      ticketId: id,
      operationId: idOf(ids.operations, operation.code),
      position,
      state: position === 0 ? ("ready" as const) : ("waiting" as const),
      openQuantity: lot,
    }));
}
