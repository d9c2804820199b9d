import { sql } from "drizzle-orm";
import {
  boolean,
  check,
  foreignKey,
  index,
  integer,
  pgTable,
  primaryKey,
  smallint,
  text,
  uuid,
} from "drizzle-orm/pg-core";
import { id, instantAt, siteId } from "@/db/columns";
import { workers } from "@/db/people/tables";

/** One row a worker: the version that a booking read, so that two never derive from old events. */
export const timelineHeads = pgTable(
  "timeline_heads",
  {
    siteId: siteId(),
    workerId: uuid().notNull(),
    version: integer().notNull().default(0),
    /** The latest moment as of which the timeline was derived; a rebuild uses it again. */
    asOf: instantAt().notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.siteId, t.workerId] }),
    foreignKey({ columns: [t.siteId, t.workerId], foreignColumns: [workers.siteId, workers.id] }),
  ],
);

/**
 * Derived: what a worker did, one row per interval and item. `seconds` is the item's fair share and
 * null while the interval runs; the rows of an interval sum to its length. Partitioned by month of
 * `start_at`. Time without a ticket has one row with `item` 0.
 */
export const segments = pgTable(
  "segments",
  {
    siteId: siteId(),
    startAt: instantAt().notNull(),
    workerId: uuid().notNull(),
    item: smallint().notNull(),
    endAt: instantAt(),
    activity: text({
      enum: ["setup", "run", "rework", "inspect", "indirect", "meal", "rest", "unassigned"],
    }).notNull(),
    /** Ticket number and operation code as the event had them; null for other time. */
    ticket: text(),
    operation: text(),
    /** The other-work code of indirect time. */
    code: text(),
    weight: integer(),
    seconds: integer(),
    cellId: uuid(),
    said: boolean().notNull().default(false),
    eventId: uuid().notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.siteId, t.startAt, t.workerId, t.item] }),
    foreignKey({ columns: [t.siteId, t.workerId], foreignColumns: [workers.siteId, workers.id] }),
    index("segments_worker").on(t.siteId, t.workerId, t.startAt),
    index("segments_ticket").on(t.siteId, t.ticket, t.operation),
    index("segments_open").on(t.siteId, t.workerId).where(sql`end_at is null`),
    check("segments_order", sql`${t.endAt} > ${t.startAt}`),
  ],
);

/** Derived: attendance as the fold found it. `end_at` null means that it runs. */
export const shifts = pgTable(
  "shifts",
  {
    siteId: siteId(),
    workerId: uuid().notNull(),
    startAt: instantAt().notNull(),
    endAt: instantAt(),
    startEventId: uuid().notNull(),
    endEventId: uuid(),
    provisional: boolean().notNull().default(false),
    cellId: uuid(),
  },
  (t) => [
    primaryKey({ columns: [t.siteId, t.workerId, t.startAt] }),
    foreignKey({ columns: [t.siteId, t.workerId], foreignColumns: [workers.siteId, workers.id] }),
    index("shifts_start").on(t.siteId, t.startAt),
    index("shifts_open").on(t.siteId, t.workerId).where(sql`end_at is null`),
  ],
);

/** Derived: the counts that stand after undo, void and move. */
export const reports = pgTable(
  "reports",
  {
    siteId: siteId(),
    /** The id of the event. */
    id: id(),
    kind: text({ enum: ["report", "inspect"] }).notNull(),
    workerId: uuid().notNull(),
    at: instantAt().notNull(),
    ticket: text().notNull(),
    operation: text().notNull(),
    good: integer().notNull(),
    rework: integer().notNull(),
    scrap: integer().notNull(),
    stop: boolean().notNull(),
    causedBy: text(),
    defects: text().array().notNull().default(sql`'{}'::text[]`),
    cellId: uuid(),
  },
  (t) => [
    primaryKey({ columns: [t.siteId, t.id] }),
    foreignKey({ columns: [t.siteId, t.workerId], foreignColumns: [workers.siteId, workers.id] }),
    index().on(t.siteId, t.ticket, t.operation),
    index().on(t.siteId, t.workerId, t.at),
  ],
);

/** Derived: what a person must settle. Code and subject find the same one again each time. */
export const looseEnds = pgTable(
  "loose_ends",
  {
    siteId: siteId(),
    code: text().notNull(),
    subject: text().notNull(),
    /** What raised it: the receiving of a batch, the fold of a worker, the judge of a ticket. */
    source: text({ enum: ["receipt", "fold", "judge"] }).notNull(),
    workerId: uuid(),
    kioskId: uuid(),
    ticket: text(),
    at: instantAt().notNull(),
    settled: boolean().notNull().default(false),
  },
  (t) => [
    primaryKey({ columns: [t.siteId, t.code, t.subject] }),
    foreignKey({ columns: [t.siteId, t.workerId], foreignColumns: [workers.siteId, workers.id] }),
    index().on(t.siteId, t.workerId, t.at),
    index().on(t.siteId, t.settled, t.at),
    index().on(t.siteId, t.ticket),
  ],
);
