import { date, index, integer, pgTable, primaryKey, text, uuid } from "drizzle-orm/pg-core";
import { instantAt, siteId } from "@/db/columns";
import { sites } from "@/db/sites/tables";

const operation = () => text().notNull();
/** Production day. */
const day = () => date({ mode: "string" }).notNull();
/** Cells and models are no foreign keys here: nobody knows that of all that is booked. */
const cellId = () => uuid().notNull();
const modelId = () => uuid().notNull();
/** Ids of the ticket's options, sorted. */
const optionIds = () => uuid().array().notNull();
const seconds = () => integer().notNull();

/** Derived with each judgement: what was booked to a ticket operation, and earned by it, by day. */
export const bookedParts = pgTable(
  "booked_parts",
  {
    siteId: siteId().references(() => sites.id),
    ticket: text().notNull(),
    operation: operation(),
    day: day(),
    cellId: cellId(),
    activity: text({ enum: ["setup", "run", "rework", "inspect", "earned"] }).notNull(),
    modelId: modelId(),
    optionIds: optionIds(),
    seconds: seconds(),
    noStandardSeconds: seconds(),
    elsewhereSeconds: seconds(),
    pieces: integer().notNull(),
    firstAt: instantAt(),
  },
  (t) => [
    primaryKey({ columns: [t.siteId, t.ticket, t.operation, t.day, t.cellId, t.activity] }),
    index().on(t.siteId, t.operation, t.day),
  ],
);

/** Derived with each judgement: what a finished ticket operation took and earned, by cell. */
export const matchedParts = pgTable(
  "matched_parts",
  {
    siteId: siteId().references(() => sites.id),
    ticket: text().notNull(),
    operation: operation(),
    /** The event that opened a rework operation, else empty. */
    rework: text().notNull(),
    cellId: cellId(),
    day: day(),
    modelId: modelId(),
    optionIds: optionIds(),
    pieces: integer().notNull(),
    actualSeconds: seconds(),
    reworkSeconds: seconds(),
    elsewhereSeconds: seconds(),
    noStandardSeconds: seconds(),
    noStandardReworkSeconds: seconds(),
    earnedSeconds: seconds(),
    reportEarnedSeconds: seconds(),
  },
  (t) => [
    primaryKey({ columns: [t.siteId, t.ticket, t.operation, t.rework, t.cellId] }),
    index().on(t.siteId, t.operation, t.day),
  ],
);

/** Derived with each judgement: unfinished ticket operations past the standard of their whole lot. */
export const overParts = pgTable(
  "over_parts",
  {
    siteId: siteId().references(() => sites.id),
    ticket: text().notNull(),
    operation: operation(),
    cellId: cellId(),
    modelId: modelId(),
    optionIds: optionIds(),
    standardSeconds: seconds(),
    actualSeconds: seconds(),
  },
  (t) => [primaryKey({ columns: [t.siteId, t.ticket, t.operation] })],
);

/** Roll-up of `booked_parts` over tickets. */
export const bookedDays = pgTable(
  "booked_days",
  {
    siteId: siteId().references(() => sites.id),
    day: day(),
    cellId: cellId(),
    operation: operation(),
    modelId: modelId(),
    optionIds: optionIds(),
    activity: text({ enum: ["setup", "run", "rework", "inspect", "earned"] }).notNull(),
    seconds: seconds(),
    noStandardSeconds: seconds(),
    elsewhereSeconds: seconds(),
    pieces: integer().notNull(),
  },
  (t) => [
    primaryKey({
      name: "booked_days_pk",
      columns: [t.siteId, t.day, t.operation, t.cellId, t.modelId, t.optionIds, t.activity],
    }),
  ],
);

/** Roll-up of `matched_parts` over tickets. */
export const matchedDays = pgTable(
  "matched_days",
  {
    siteId: siteId().references(() => sites.id),
    day: day(),
    cellId: cellId(),
    operation: operation(),
    modelId: modelId(),
    optionIds: optionIds(),
    pieces: integer().notNull(),
    actualSeconds: seconds(),
    reworkSeconds: seconds(),
    elsewhereSeconds: seconds(),
    noStandardSeconds: seconds(),
    noStandardReworkSeconds: seconds(),
    earnedSeconds: seconds(),
    reportEarnedSeconds: seconds(),
  },
  (t) => [
    primaryKey({
      name: "matched_days_pk",
      columns: [t.siteId, t.day, t.operation, t.cellId, t.modelId, t.optionIds],
    }),
  ],
);

/** Roll-up of the segments that have ended: what the attendance of a cell was made of. */
export const attendanceDays = pgTable(
  "attendance_days",
  {
    siteId: siteId().references(() => sites.id),
    day: day(),
    cellId: cellId(),
    setupSeconds: seconds(),
    runSeconds: seconds(),
    reworkSeconds: seconds(),
    inspectSeconds: seconds(),
    indirectSeconds: seconds(),
    restSeconds: seconds(),
    unassignedSeconds: seconds(),
    mealSeconds: seconds(),
  },
  (t) => [primaryKey({ columns: [t.siteId, t.day, t.cellId] })],
);
