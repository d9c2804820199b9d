import { date, pgTable, primaryKey, text, unique } from "drizzle-orm/pg-core";
import { id, instantAt, siteId } from "@/db/columns";
import { sites } from "@/db/sites/tables";

/** What a customer or the stock asked for; its tickets are the instruments and lots made for it. */
export const orders = pgTable(
  "orders",
  {
    siteId: siteId().references(() => sites.id),
    id: id(),
    number: text().notNull(),
    dueOn: date({ mode: "string" }),
    createdAt: instantAt().notNull().defaultNow(),
  },
  (t) => [primaryKey({ columns: [t.siteId, t.id] }), unique().on(t.siteId, t.number)],
);
