import { auditLog } from "@/db/audit/tables";
import type { Scope } from "@/db/client";

/** Who did what to what: written in the transaction of the change itself. */
export interface AuditEntry {
  /** `account:<id>`, `kiosk:<id>`, `key:<id>`, `job:<name>` or `command:<name>`. */
  by: string;
  action: string;
  subject: string;
  /** What changed, without secrets and free text. */
  detail?: Record<string, unknown>;
}

/** Keeps who changed what, for ever. */
export async function recordAct({ db, siteId }: Scope, entry: AuditEntry): Promise<void> {
  const { by, action, subject, detail = null } = entry;
  await db.insert(auditLog).values({ siteId, actor: by, action, subject, detail });
}
