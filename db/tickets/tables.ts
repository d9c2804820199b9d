import { sql } from "drizzle-orm";
import {
  bigint,
  check,
  date,
  foreignKey,
  index,
  integer,
  pgTable,
  primaryKey,
  text,
  unique,
  uuid,
} from "drizzle-orm/pg-core";
import { id, instantAt, siteId } from "@/db/columns";
import { orders } from "@/db/orders/tables";
import { sites } from "@/db/sites/tables";
import { models, operations, options } from "@/db/standards/tables";

/** The traveller that goes with an instrument or a lot. `number` is digits with the check digit. */
export const tickets = pgTable(
  "tickets",
  {
    siteId: siteId().references(() => sites.id),
    id: id(),
    /** Given by the server: the order in which lists page. */
    seq: bigint({ mode: "number" }).generatedAlwaysAsIdentity(),
    number: text().notNull(),
    modelId: uuid().notNull(),
    orderId: uuid(),
    quantity: integer().notNull(),
    dueOn: date({ mode: "string" }),
    status: text({ enum: ["open", "finished", "scrapped", "cancelled"] })
      .notNull()
      .default("open"),
    createdAt: instantAt().notNull().defaultNow(),
    finishedAt: instantAt(),
  },
  (t) => [
    primaryKey({ columns: [t.siteId, t.id] }),
    unique().on(t.siteId, t.number),
    unique().on(t.siteId, t.seq),
    foreignKey({ columns: [t.siteId, t.modelId], foreignColumns: [models.siteId, models.id] }),
    foreignKey({ columns: [t.siteId, t.orderId], foreignColumns: [orders.siteId, orders.id] }),
    index().on(t.siteId, t.status, t.seq),
    index().on(t.siteId, t.modelId),
    index().on(t.siteId, t.orderId),
    check("tickets_quantity", sql`${t.quantity} > 0`),
    check("tickets_status", sql`${t.status} in ('open', 'finished', 'scrapped', 'cancelled')`),
  ],
);

export const ticketOptions = pgTable(
  "ticket_options",
  { siteId: siteId(), ticketId: uuid().notNull(), optionId: uuid().notNull() },
  (t) => [
    primaryKey({ columns: [t.siteId, t.ticketId, t.optionId] }),
    foreignKey({ columns: [t.siteId, t.ticketId], foreignColumns: [tickets.siteId, tickets.id] }),
    foreignKey({ columns: [t.siteId, t.optionId], foreignColumns: [options.siteId, options.id] }),
    index().on(t.siteId, t.optionId),
  ],
);

/**
 * An operation that a ticket must go through, copied from the routing, with what the judge made of
 * its reports and segments. The columns from `state` on are derived and can be made again.
 */
export const ticketOperations = pgTable(
  "ticket_operations",
  {
    siteId: siteId(),
    id: id(),
    ticketId: uuid().notNull(),
    operationId: uuid().notNull(),
    position: integer().notNull(),
    state: text({ enum: ["waiting", "ready", "working", "finished", "closed"] })
      .notNull()
      .default("waiting"),
    good: integer().notNull().default(0),
    rework: integer().notNull().default(0),
    scrap: integer().notNull().default(0),
    openQuantity: integer().notNull(),
    actualSeconds: integer().notNull().default(0),
    firstWorkAt: instantAt(),
    finishedAt: instantAt(),
  },
  (t) => [
    primaryKey({ columns: [t.siteId, t.id] }),
    unique().on(t.siteId, t.ticketId, t.position),
    unique().on(t.siteId, t.ticketId, t.operationId),
    foreignKey({ columns: [t.siteId, t.ticketId], foreignColumns: [tickets.siteId, tickets.id] }),
    foreignKey({
      columns: [t.siteId, t.operationId],
      foreignColumns: [operations.siteId, operations.id],
    }),
    index().on(t.siteId, t.operationId, t.state),
    check(
      "ticket_operations_state",
      sql`${t.state} in ('waiting', 'ready', 'working', 'finished', 'closed')`,
    ),
  ],
);
