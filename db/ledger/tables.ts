import { sql } from "drizzle-orm";
import {
  bigint,
  index,
  integer,
  jsonb,
  pgTable,
  primaryKey,
  text,
  uuid,
} from "drizzle-orm/pg-core";
import { id, instantAt, siteId } from "@/db/columns";

/**
 * What happened: everything that arrives, for ever (LEDGER.md 1). Append-only, partitioned by month
 * of `received_at`, no foreign keys. What could not be read has its bytes in `body.raw`.
 */
export const clockEvents = pgTable(
  "clock_events",
  {
    siteId: siteId(),
    receivedAt: instantAt().notNull(),
    id: id(),
    kind: text().notNull(),
    workerId: uuid(),
    workerNumber: text(),
    kioskId: uuid(),
    sessionId: uuid(),
    /** Worker number of the lead who entered it for the worker. */
    by: text(),
    /** As the tablet's own clock had it; null where it cannot be told. */
    rawAt: instantAt(),
    /** The instant it counts at (LEDGER.md 2); never recomputed. */
    at: instantAt(),
    /** The event that a correction is about: undo, void, move, reassign, and a settled subject. */
    targetId: uuid(),
    /** Where a correction makes something count: a move's `to`, the instant of an inserted event. */
    countsAt: instantAt(),
    uncertaintyMs: integer(),
    seq: bigint({ mode: "number" }),
    /** The cell that the act belongs to, resolved at `at`. */
    cellId: uuid(),
    /** Fair-split weights in whole seconds, one per item of the body, fixed at booking. */
    weights: integer().array(),
    /** Why it is kept and not counted; null where it is booked. */
    keptFor: text(),
    /** Questions that booking found. */
    questions: text().array(),
    body: jsonb().notNull(),
    bodyHash: text().notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.siteId, t.receivedAt, t.id] }),
    index("clock_events_worker").on(t.siteId, t.workerId, t.at),
    index("clock_events_id").on(t.siteId, t.id),
    // corrections are few and reach across days: a window asks for all of its worker's
    index("clock_events_corrections")
      .on(t.siteId, t.workerId)
      .where(sql`kind in ('void', 'move', 'insert', 'reassign', 'settle')`),
    // a sheet asks for what was said of its ticket's steps; those few kinds only are indexed
    index("clock_events_steps")
      .on(t.siteId, sql`(body ->> 'ticket')`)
      .where(sql`kind in ('step-done', 'step-open', 'step-skip', 'hand-over')`),
    index("clock_events_inserted")
      .on(t.siteId, sql`(body #>> '{event,ticket}')`)
      .where(sql`kind = 'insert'`),
    // what may change a pay period that is closed already: few of all
    index("clock_events_late")
      .on(t.siteId, t.receivedAt, t.workerId)
      .where(
        sql`received_at - at > interval '24 hours'
          or kind in ('void', 'move', 'insert', 'reassign', 'settle')`,
      ),
  ],
);

/** Written first: the same id and hash again is a duplicate. */
export const eventIds = pgTable(
  "event_ids",
  { siteId: siteId(), id: id(), receivedAt: instantAt().notNull(), bodyHash: text().notNull() },
  (t) => [primaryKey({ columns: [t.siteId, t.id] })],
);

/** Free text of an event, which may be erased; the ledger may not. */
export const notes = pgTable(
  "notes",
  { siteId: siteId(), eventId: uuid().notNull(), text: text(), erasedAt: instantAt() },
  (t) => [primaryKey({ columns: [t.siteId, t.eventId] })],
);
