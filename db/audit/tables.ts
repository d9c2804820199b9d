import { bigint, index, jsonb, pgTable, primaryKey, text, uuid } from "drizzle-orm/pg-core";
import { instantAt, siteId } from "@/db/columns";

/** Who changed what, for ever: append-only like the ledger. */
export const auditLog = pgTable(
  "audit_log",
  {
    siteId: siteId(),
    seq: bigint({ mode: "number" }).generatedAlwaysAsIdentity(),
    at: instantAt().notNull().defaultNow(),
    /** `account:<id>`, `kiosk:<id>`, `key:<id>`, `job:<name>` or `command:<name>`. */
    actor: text().notNull(),
    action: text().notNull(),
    subject: text().notNull(),
    detail: jsonb(),
    requestId: uuid(),
  },
  (t) => [primaryKey({ columns: [t.siteId, t.seq] }), index().on(t.siteId, t.subject)],
);
