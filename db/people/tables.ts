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

/** Someone who clocks labour. The PIN is an Argon2id hash; the number is digits, kept as text. */
export const workers = pgTable(
  "workers",
  {
    siteId: siteId().references(() => sites.id),
    id: id(),
    number: text().notNull(),
    name: text().notNull(),
    language: text().notNull().default("en"),
    homeCellId: uuid().notNull(),
    payrollNumber: text().unique(),
    pinHash: text(),
    pinSetAt: instantAt(),
    /** The last site date on which the person works here; null means open-ended. */
    endsOn: date({ mode: "string" }),
    createdAt: instantAt().notNull().defaultNow(),
  },
  (t) => [
    primaryKey({ columns: [t.siteId, t.id] }),
    unique().on(t.siteId, t.number),
    foreignKey({ columns: [t.siteId, t.homeCellId], foreignColumns: [cells.siteId, cells.id] }),
    index().on(t.siteId, t.homeCellId),
    check("workers_number_digits", sql`${t.number} ~ '^[0-9]{1,8}$'`),
  ],
);

/** What a worker was planned to attend; rows are only added, the highest `seq` of a date counts. */
export const plannedShifts = pgTable(
  "planned_shifts",
  {
    siteId: siteId(),
    id: id(),
    seq: integer().generatedAlwaysAsIdentity(),
    workerId: uuid().notNull(),
    workOn: date({ mode: "string" }).notNull(),
    startAt: instantAt().notNull(),
    endAt: instantAt().notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.siteId, t.id] }),
    foreignKey({ columns: [t.siteId, t.workerId], foreignColumns: [workers.siteId, workers.id] }),
    index().on(t.siteId, t.workerId, t.startAt),
    index().on(t.siteId, t.startAt),
    check("planned_shifts_order", sql`${t.endAt} > ${t.startAt}`),
  ],
);
