import { sql } from "drizzle-orm";
import {
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
import { cells } from "@/db/cells/tables";
import { id, instantAt, siteId } from "@/db/columns";
import { sites } from "@/db/sites/tables";

/** What the factory builds. */
export const models = pgTable(
  "models",
  {
    siteId: siteId().references(() => sites.id),
    id: id(),
    name: text().notNull(),
    kind: text().notNull(),
    createdAt: instantAt().notNull().defaultNow(),
  },
  (t) => [primaryKey({ columns: [t.siteId, t.id] }), unique().on(t.siteId, t.name)],
);

/** What an order may choose for a model: a finish, a pickup set, an inlay. */
export const options = pgTable(
  "options",
  {
    siteId: siteId(),
    id: id(),
    modelId: uuid().notNull(),
    name: text().notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.siteId, t.id] }),
    foreignKey({ columns: [t.siteId, t.modelId], foreignColumns: [models.siteId, models.id] }),
    unique().on(t.siteId, t.modelId, t.name),
  ],
);

/** A piece of work of the trade, done in one cell. `hazards` name the cautions before it. */
export const operations = pgTable(
  "operations",
  {
    siteId: siteId().references(() => sites.id),
    id: id(),
    code: text().notNull(),
    name: text().notNull(),
    stage: text().notNull(),
    cellId: uuid().notNull(),
    /** How concurrent items share time (CALCULATIONS.md 2). */
    shareBy: text({ enum: ["standard", "equal"] })
      .notNull()
      .default("standard"),
    /** When its setup is earned (CALCULATIONS.md 3): one setup may serve several lots. */
    setupEarned: text({ enum: ["first-good", "when-booked"] })
      .notNull()
      .default("first-good"),
    hazards: text().array().notNull().default(sql`'{}'::text[]`),
  },
  (t) => [
    primaryKey({ columns: [t.siteId, t.id] }),
    unique().on(t.siteId, t.code),
    foreignKey({ columns: [t.siteId, t.cellId], foreignColumns: [cells.siteId, cells.id] }),
    index().on(t.siteId, t.cellId),
    check("operations_share_by", sql`${t.shareBy} in ('standard', 'equal')`),
    check("operations_setup_earned", sql`${t.setupEarned} in ('first-good', 'when-booked')`),
  ],
);

/** The order of operations for a model; a ticket copies the one in force when it is made. */
export const routings = pgTable(
  "routings",
  {
    siteId: siteId(),
    id: id(),
    modelId: uuid().notNull(),
    revision: integer().notNull(),
    createdAt: instantAt().notNull().defaultNow(),
  },
  (t) => [
    primaryKey({ columns: [t.siteId, t.id] }),
    foreignKey({ columns: [t.siteId, t.modelId], foreignColumns: [models.siteId, models.id] }),
    unique().on(t.siteId, t.modelId, t.revision),
  ],
);

export const routingOperations = pgTable(
  "routing_operations",
  {
    siteId: siteId(),
    id: id(),
    routingId: uuid().notNull(),
    operationId: uuid().notNull(),
    position: integer().notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.siteId, t.id] }),
    foreignKey({
      columns: [t.siteId, t.routingId],
      foreignColumns: [routings.siteId, routings.id],
    }),
    foreignKey({
      columns: [t.siteId, t.operationId],
      foreignColumns: [operations.siteId, operations.id],
    }),
    unique().on(t.siteId, t.routingId, t.position),
    index().on(t.siteId, t.operationId),
  ],
);

/**
 * The steps in which an operation of a routing is built, as the cell sheet lists them. They are never
 * changed: another revision of the routing has its own. `seconds` is what a step takes against the
 * others: its part of the operation's standard, and its weight where steps are tapped off together.
 */
export const routingSteps = pgTable(
  "routing_steps",
  {
    siteId: siteId(),
    id: id(),
    routingOperationId: uuid().notNull(),
    position: integer().notNull(),
    /** What an event names. */
    step: text().notNull(),
    name: text().notNull(),
    seconds: integer().notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.siteId, t.id] }),
    foreignKey({
      columns: [t.siteId, t.routingOperationId],
      foreignColumns: [routingOperations.siteId, routingOperations.id],
    }),
    unique().on(t.siteId, t.routingOperationId, t.position),
    unique().on(t.siteId, t.routingOperationId, t.step),
    check("routing_steps_seconds", sql`${t.seconds} > 0`),
  ],
);

/**
 * Standard times in person-seconds, effective-dated and insert-only (CALCULATIONS.md 3).
 * `optionId` null is the base, otherwise an adder for that option. `seq` decides ties of one day.
 */
export const standards = pgTable(
  "standards",
  {
    siteId: siteId(),
    id: id(),
    seq: integer().generatedAlwaysAsIdentity(),
    modelId: uuid().notNull(),
    operationId: uuid().notNull(),
    optionId: uuid(),
    setupSeconds: integer().notNull(),
    runSeconds: integer().notNull(),
    effectiveFrom: date({ mode: "string" }).notNull(),
    enteredBy: text().notNull(),
    reason: text().notNull(),
    createdAt: instantAt().notNull().defaultNow(),
  },
  (t) => [
    primaryKey({ columns: [t.siteId, t.id] }),
    foreignKey({ columns: [t.siteId, t.modelId], foreignColumns: [models.siteId, models.id] }),
    foreignKey({
      columns: [t.siteId, t.operationId],
      foreignColumns: [operations.siteId, operations.id],
    }),
    foreignKey({ columns: [t.siteId, t.optionId], foreignColumns: [options.siteId, options.id] }),
    index().on(t.siteId, t.modelId, t.operationId, t.effectiveFrom),
    index().on(t.siteId, t.operationId),
    index().on(t.siteId, t.optionId),
    check("standards_seconds", sql`${t.setupSeconds} >= 0 and ${t.runSeconds} >= 0`),
  ],
);
