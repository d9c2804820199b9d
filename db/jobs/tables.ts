import { bigint, index, pgTable, primaryKey, text } from "drizzle-orm/pg-core";
import { instantAt, siteId } from "@/db/columns";

/**
 * What must be derived again, append-only and without a unique key (LEDGER.md 7): a worker claims
 * rows with `for update skip locked`, deletes them and derives each key once.
 */
export const dirtyMarks = pgTable(
  "dirty_marks",
  {
    siteId: siteId(),
    id: bigint({ mode: "number" }).generatedAlwaysAsIdentity(),
    kind: text({ enum: ["ticket", "standard", "booked", "matched", "attendance"] }).notNull(),
    /**
     * `ticket`: its number; `standard`: model id, first day, operation; `booked`, `matched`: day,
     * operation; `attendance`: first and last epoch millisecond, cell id (parted by blanks).
     */
    key: text().notNull(),
    markedAt: instantAt().notNull().defaultNow(),
  },
  (t) => [primaryKey({ columns: [t.siteId, t.id] }), index().on(t.kind, t.id)],
);
