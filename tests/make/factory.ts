import { sql } from "drizzle-orm";
import { v7 as uuid } from "uuid";
import { apiKeys } from "@/db/access/tables";
import { cells } from "@/db/cells/tables";
import type { Db } from "@/db/client";
import { orders } from "@/db/orders/tables";
import { workers } from "@/db/people/tables";
import { siteRules, sites } from "@/db/sites/tables";
import { models, operations, options, standards } from "@/db/standards/tables";
import { ticketOperations, ticketOptions, tickets } from "@/db/tickets/tables";
import { segments } from "@/db/timeline/tables";
import type { Role } from "@/lib/access/roles";

/** A small factory in the database: one site, three cells, a model with three operations. */
export type Factory = Awaited<ReturnType<typeof makeFactory>>;

const START = new Date("2026-01-01T00:00:00Z");

/** Makes a site with cells Mill, Neck and Spray, the model Heron and operations 010, 020, 030. */
export async function makeFactory(db: Db, timeZone = "America/Chicago") {
  const siteId = uuid();
  const cellIds = { Mill: uuid(), Neck: uuid(), Spray: uuid() };
  const modelId = uuid();
  const optionId = uuid();
  const orderId = uuid();
  const workerId = uuid();
  const operationIds = [uuid(), uuid(), uuid()] as const;
  await db.insert(sites).values({ id: siteId, name: "Testing" });
  await db.insert(siteRules).values({
    siteId,
    id: uuid(),
    effectiveFrom: START,
    timeZone,
    shiftLimitSeconds: 14 * 3600,
    sinceLimitSeconds: 1800,
    restMaxSeconds: 1200,
    mealMaxSeconds: 4500,
    restBetweenShiftsSeconds: 11 * 3600,
  });
  await db
    .insert(cells)
    .values(
      Object.entries(cellIds).map(([name, id], position) => ({ siteId, id, name, position })),
    );
  await db.insert(models).values({ siteId, id: modelId, name: "Heron", kind: "guitar" });
  await db.insert(options).values({ siteId, id: optionId, modelId, name: "Sunburst" });
  await db.insert(orders).values({ siteId, id: orderId, number: "1001" });
  await db.insert(operations).values(
    (["Mill", "Neck", "Spray"] as const).map((cell, at) => ({
      siteId,
      id: operationIds[at]!,
      code: `0${at + 1}0`,
      name: `${cell} work`,
      stage: cell,
      cellId: cellIds[cell],
    })),
  );
  await db.insert(standards).values({
    siteId,
    id: uuid(),
    modelId,
    operationId: operationIds[0],
    setupSeconds: 600,
    runSeconds: 1800,
    effectiveFrom: "2026-01-01",
    enteredBy: "Testing",
    reason: "first",
  });
  await db
    .insert(workers)
    .values({ siteId, id: workerId, number: "1042", name: "Ilo Varn", homeCellId: cellIds.Mill });
  return { db, siteId, cellIds, modelId, optionId, orderId, workerId, operationIds };
}

/** Makes a ticket of the factory with its three operations, the first `finished` of them finished. */
export async function makeTicket(
  factory: Factory,
  ticket: {
    number: string;
    status?: "open" | "finished" | "scrapped" | "cancelled";
    finished?: number;
    quantity?: number;
    withOption?: boolean;
  },
): Promise<string> {
  const { db, siteId, modelId, orderId, optionId, operationIds } = factory;
  const { number, status = "open", finished = 0, quantity = 1 } = ticket;
  const id = uuid();
  await db.insert(tickets).values({ siteId, id, number, modelId, orderId, quantity, status });
  if (ticket.withOption) await db.insert(ticketOptions).values({ siteId, ticketId: id, optionId });
  await db.insert(ticketOperations).values(
    operationIds.map((operationId, position) => ({
      siteId,
      id: uuid(),
      ticketId: id,
      operationId,
      position,
      state: position < finished ? ("finished" as const) : ("ready" as const),
      good: position < finished ? quantity : 0,
      openQuantity: position < finished ? 0 : quantity,
    })),
  );
  return id;
}

/** Puts a segment of the factory's worker into the timeline, as the fold would have. */
export async function makeSegment(
  { db, siteId, cellIds, workerId }: Factory,
  segment: Pick<typeof segments.$inferInsert, "ticket" | "operation" | "code" | "item"> & {
    start: string;
    /** Left out while it runs. */
    seconds?: number;
    activity: (typeof segments.$inferInsert)["activity"];
    worker?: string;
    cell?: keyof Factory["cellIds"];
  },
): Promise<void> {
  const { start, seconds, worker = workerId, cell = "Mill", ...rest } = segment;
  const startAt = new Date(start);
  const endAt = seconds === undefined ? null : new Date(startAt.getTime() + seconds * 1000);
  await db.execute(sql`select make_partition('segments', ${startAt.toISOString()}::timestamptz)`);
  await db.insert(segments).values({
    ...rest,
    siteId,
    startAt,
    endAt,
    seconds: seconds ?? null,
    workerId: worker,
    cellId: cellIds[cell],
    eventId: uuid(),
  });
}

/** Makes another worker of the factory and answers the id. */
export async function makeWorker({ db, siteId, cellIds }: Factory, number: string) {
  const id = uuid();
  const worker = { siteId, id, number, name: `Worker ${number}`, homeCellId: cellIds.Neck };
  await db.insert(workers).values(worker);
  return id;
}

/** Makes an integration key of a role and answers its secret. */
export async function makeKey(
  { db, siteId }: Pick<Factory, "db" | "siteId">,
  role: Role,
  hash: (secret: string) => string,
): Promise<string> {
  const secret = `bm_${uuid().replaceAll("-", "")}`;
  await db.insert(apiKeys).values({ id: uuid(), siteId, role, name: role, keyHash: hash(secret) });
  return secret;
}
