import { and, eq, isNull } from "drizzle-orm";
import { v7 as uuidv7 } from "uuid";
import { recordAct } from "@/db/audit/commands";
import { cells } from "@/db/cells/tables";
import type { Scope } from "@/db/client";
import { enrolmentCodes } from "@/db/kiosks/tables";

/** How long an enrolment code can be used (API.md). */
const CODE_MS = 10 * 60_000;

/** Finds a cell of the site by its name as it is written; null if there is none. */
export async function findCellNamed({ db, siteId }: Scope, name: string) {
  const [cell] = await db
    .select({ id: cells.id, name: cells.name })
    .from(cells)
    .where(and(eq(cells.siteId, siteId), eq(cells.name, name)))
    .limit(1);
  return cell ?? null;
}

/**
 * Keeps a new one-time code with which a browser becomes a kiosk of a cell. Kept twice under one id
 * (a form sent again), the code shown last is the one that holds; once used it stays used.
 *
 * @param wanted `codeHash`: SHA-256 of the code in capitals without hyphen; `by`: for the audit log
 * @returns the instant from which the code is of no use
 */
export async function addEnrolmentCode(
  { db, siteId }: Scope,
  wanted: {
    id?: string;
    codeHash: string;
    name: string;
    cellId: string;
    by: string;
    now: Date;
  },
): Promise<Date> {
  const { id = uuidv7(), codeHash, name, cellId, by, now } = wanted;
  const expiresAt = new Date(now.getTime() + CODE_MS);
  await db.transaction(async (tx) => {
    await tx
      .insert(enrolmentCodes)
      .values({ siteId, id, codeHash, name, cellId, expiresAt })
      .onConflictDoUpdate({
        target: [enrolmentCodes.siteId, enrolmentCodes.id],
        set: { codeHash, expiresAt },
        setWhere: isNull(enrolmentCodes.usedAt),
      });
    const entry = {
      by,
      action: "kiosks.enrol",
      subject: `enrolment:${id}`,
      detail: { name, cellId },
    };
    await recordAct({ db: tx, siteId }, entry);
  });
  return expiresAt;
}
