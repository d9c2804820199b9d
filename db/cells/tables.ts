import { integer, pgTable, primaryKey, text, unique } from "drizzle-orm/pg-core";
import { id, siteId } from "@/db/columns";
import { sites } from "@/db/sites/tables";

/** A group of benches that does the same work; kiosks, operations and home cells point here. */
export const cells = pgTable(
  "cells",
  {
    siteId: siteId().references(() => sites.id),
    id: id(),
    name: text().notNull(),
    position: integer().notNull(),
  },
  (t) => [primaryKey({ columns: [t.siteId, t.id] }), unique().on(t.siteId, t.name)],
);
