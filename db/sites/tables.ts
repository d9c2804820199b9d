import { sql } from "drizzle-orm";
import { check, integer, pgTable, primaryKey, text, uuid } from "drizzle-orm/pg-core";
import { id, instantAt, siteId } from "@/db/columns";

/** A factory; all else hangs on it. */
export const sites = pgTable("sites", {
  id: uuid().primaryKey(),
  name: text().notNull(),
  locale: text().notNull().default("en"),
  createdAt: instantAt().notNull().defaultNow(),
});

/** What holds at a site from an instant on; rows are only added (LEDGER.md 2). */
export const siteRules = pgTable(
  "site_rules",
  {
    siteId: siteId().references(() => sites.id),
    id: id(),
    effectiveFrom: instantAt().notNull(),
    timeZone: text().notNull(),
    productionDayStartsAtMinutes: integer().notNull().default(0),
    shiftLimitSeconds: integer().notNull(),
    sinceLimitSeconds: integer().notNull(),
    restMaxSeconds: integer().notNull(),
    mealMaxSeconds: integer().notNull(),
    restBetweenShiftsSeconds: integer().notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.siteId, t.id] }),
    check("site_rules_day_starts", sql`${t.productionDayStartsAtMinutes} between 0 and 1439`),
  ],
);
