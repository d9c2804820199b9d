import { sql } from "drizzle-orm";
import {
  boolean,
  check,
  customType,
  date,
  foreignKey,
  index,
  integer,
  jsonb,
  pgTable,
  primaryKey,
  text,
  unique,
  uuid,
} from "drizzle-orm/pg-core";
import { id, instantAt, siteId } from "@/db/columns";
import { workers } from "@/db/people/tables";
import { sites } from "@/db/sites/tables";
import type { TrailStep } from "@/lib/pay/answer";
import type { PayPolicy } from "@/lib/pay/schema";
import type { FileTotals } from "@/lib/periods/file";

const siteDate = () => date({ mode: "string" }).notNull();
const bytes = customType<{ data: Buffer; driverData: Buffer }>({ dataType: () => "bytea" });

/** Who entered a row, as the office shows it, and why. */
const entry = () => ({
  enteredBy: text().notNull(),
  reason: text().notNull(),
  enteredAt: instantAt().notNull().defaultNow(),
});

/** Versions of named pay policies; rows are only added. */
export const payPolicies = pgTable(
  "pay_policies",
  {
    siteId: siteId().references(() => sites.id),
    name: text().notNull(),
    version: integer().notNull(),
    seq: integer().generatedAlwaysAsIdentity(),
    effectiveOn: siteDate(),
    policy: jsonb().$type<PayPolicy>().notNull(),
    ...entry(),
  },
  (t) => [
    primaryKey({ columns: [t.siteId, t.name, t.version] }),
    check("pay_policies_version", sql`${t.version} > 0`),
  ],
);

/** By which policy someone is paid from a date on; without a worker it is the site. Only added. */
export const payChoices = pgTable(
  "pay_choices",
  {
    siteId: siteId().references(() => sites.id),
    id: id(),
    seq: integer().generatedAlwaysAsIdentity(),
    workerId: uuid(),
    /** Name of a policy; null puts a worker back to the site's. */
    policy: text(),
    effectiveOn: siteDate(),
    ...entry(),
  },
  (t) => [
    primaryKey({ columns: [t.siteId, t.id] }),
    foreignKey({ columns: [t.siteId, t.workerId], foreignColumns: [workers.siteId, workers.id] }),
    index().on(t.siteId, t.workerId),
    check("pay_choices_site", sql`${t.workerId} is not null or ${t.policy} is not null`),
  ],
);

/** How a site parts its time into pay periods, from the first one on; the last row counts. */
export const payRhythms = pgTable(
  "pay_rhythms",
  {
    siteId: siteId().references(() => sites.id),
    id: id(),
    seq: integer().generatedAlwaysAsIdentity(),
    /** The first day of a period. */
    startsOn: siteDate(),
    days: integer().notNull(),
    ...entry(),
  },
  (t) => [
    primaryKey({ columns: [t.siteId, t.id] }),
    check("pay_rhythms_days", sql`${t.days} between 1 and 62`),
  ],
);

/** A pay period: workdays from `from_on` up to, not including, `to_on`. They follow each other. */
export const payPeriods = pgTable(
  "pay_periods",
  {
    siteId: siteId().references(() => sites.id),
    id: id(),
    fromOn: siteDate(),
    toOn: siteDate(),
  },
  (t) => [
    primaryKey({ columns: [t.siteId, t.id] }),
    unique("pay_periods_from").on(t.siteId, t.fromOn),
    check("pay_periods_order", sql`${t.toOn} > ${t.fromOn}`),
  ],
);

/** A closing of a period. The last one stands unless it was reopened; rows are only added. */
export const payRevisions = pgTable(
  "pay_revisions",
  {
    siteId: siteId(),
    periodId: uuid().notNull(),
    /** From 1. */
    revision: integer().notNull(),
    closedAt: instantAt().notNull(),
    /** `account:<id>`, and the name that it had. */
    closedBy: text().notNull(),
    closedByName: text().notNull(),
    /** What was received after this moment may not be in the figures. */
    asOf: instantAt().notNull(),
    /** From the first workday's start to the last one's end. */
    startsAt: instantAt().notNull(),
    endsAt: instantAt().notNull(),
    /** SHA-256 of the cards and rows as canonical JSON, in hex. */
    digest: text().notNull(),
    totals: jsonb().$type<FileTotals>().notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.siteId, t.periodId, t.revision] }),
    foreignKey({
      columns: [t.siteId, t.periodId],
      foreignColumns: [payPeriods.siteId, payPeriods.id],
    }),
  ],
);

/** That a closing was taken back, and why. */
export const payReopenings = pgTable(
  "pay_reopenings",
  {
    siteId: siteId(),
    periodId: uuid().notNull(),
    revision: integer().notNull(),
    ...entry(),
  },
  (t) => [
    primaryKey({ columns: [t.siteId, t.periodId, t.revision] }),
    foreignKey({
      columns: [t.siteId, t.periodId, t.revision],
      foreignColumns: [payRevisions.siteId, payRevisions.periodId, payRevisions.revision],
    }),
  ],
);

/** A worker's card as it was when the period closed: as the file names the person. Only added. */
export const payCards = pgTable(
  "pay_cards",
  {
    siteId: siteId(),
    periodId: uuid().notNull(),
    revision: integer().notNull(),
    workerId: uuid().notNull(),
    number: text().notNull(),
    name: text().notNull(),
    cell: text().notNull(),
    payrollNumber: text(),
    /** Why it was closed with questions open; null where nothing was left to settle. */
    reason: text(),
    openEnds: integer().notNull(),
    signedByWorker: boolean().notNull(),
    signedByLead: boolean().notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.siteId, t.periodId, t.revision, t.workerId] }),
    foreignKey({
      columns: [t.siteId, t.periodId, t.revision],
      foreignColumns: [payRevisions.siteId, payRevisions.periodId, payRevisions.revision],
    }),
    foreignKey({ columns: [t.siteId, t.workerId], foreignColumns: [workers.siteId, workers.id] }),
    index().on(t.siteId, t.workerId),
  ],
);

/**
 * The frozen rows of a closing: a workday of the period, or an adjustment of one of an earlier
 * period, with signs. `about_id` is the period that the workday belongs to. Only added.
 */
export const payRows = pgTable(
  "pay_rows",
  {
    siteId: siteId(),
    periodId: uuid().notNull(),
    revision: integer().notNull(),
    aboutId: uuid().notNull(),
    workerId: uuid().notNull(),
    workweekOn: siteDate(),
    workdayOn: siteDate(),
    /** The policy version by its label. */
    policy: text().notNull(),
    workedSeconds: integer().notNull(),
    paidSeconds: integer().notNull(),
    regularSeconds: integer().notNull(),
    overtimeSeconds: integer().notNull(),
    doubleSeconds: integer().notNull(),
    premiums: jsonb().$type<Record<string, number>>().notNull(),
    trail: jsonb().$type<TrailStep[]>().notNull(),
  },
  (t) => [
    primaryKey({
      columns: [t.siteId, t.periodId, t.revision, t.aboutId, t.workerId, t.workweekOn, t.workdayOn],
    }),
    foreignKey({
      columns: [t.siteId, t.periodId, t.revision],
      foreignColumns: [payRevisions.siteId, payRevisions.periodId, payRevisions.revision],
    }),
    foreignKey({
      columns: [t.siteId, t.aboutId],
      foreignColumns: [payPeriods.siteId, payPeriods.id],
    }),
    foreignKey({ columns: [t.siteId, t.workerId], foreignColumns: [workers.siteId, workers.id] }),
    index().on(t.siteId, t.aboutId, t.workerId),
    index().on(t.siteId, t.workerId),
    check(
      "pay_rows_buckets",
      sql`${t.paidSeconds} = ${t.regularSeconds} + ${t.overtimeSeconds} + ${t.doubleSeconds}`,
    ),
  ],
);

/** A file of a closing: its bytes are kept when it is first made, and are the same for ever. */
export const payExports = pgTable(
  "pay_exports",
  {
    siteId: siteId(),
    periodId: uuid().notNull(),
    revision: integer().notNull(),
    layout: integer().notNull(),
    format: text({ enum: ["csv", "json", "xlsx"] }).notNull(),
    /** Null after they were erased; digest and totals stay. */
    bytes: bytes(),
    /** SHA-256 of the bytes, in hex. */
    digest: text().notNull(),
    totals: jsonb().$type<FileTotals>().notNull(),
    madeBy: text().notNull(),
    madeAt: instantAt().notNull(),
    erasedAt: instantAt(),
  },
  (t) => [
    primaryKey({ columns: [t.siteId, t.periodId, t.revision, t.layout, t.format] }),
    foreignKey({
      columns: [t.siteId, t.periodId, t.revision],
      foreignColumns: [payRevisions.siteId, payRevisions.periodId, payRevisions.revision],
    }),
    check("pay_exports_bytes", sql`(${t.bytes} is null) = (${t.erasedAt} is not null)`),
  ],
);
