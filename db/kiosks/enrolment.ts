import { and, eq, gt, isNull } from "drizzle-orm";
import { v7 as uuidv7 } from "uuid";
import { recordAct } from "@/db/audit/commands";
import { cells } from "@/db/cells/tables";
import type { Db, Scope } from "@/db/client";
import { enrolmentCodes, kioskCells, kiosks } from "@/db/kiosks/tables";

/** How long an enrolment code can be used (API.md). */
const CODE_MS = 10 * 60_000;

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

/** A browser that has just become a kiosk. */
export interface EnrolledKiosk {
  siteId: string;
  kioskId: string;
  name: string;
  cell: string;
}

/**
 * Makes a browser a kiosk of the code's cell, and uses the code up. Codes are above sites: the code
 * says which site it is. Null where it is unknown, used or too old.
 *
 * @param code `codeHash`: SHA-256 of the code in capitals; `tokenHash`: of the device's cookie
 */
export async function enrolKiosk(
  db: Db,
  { codeHash, tokenHash, now }: { codeHash: string; tokenHash: string; now: Date },
): Promise<EnrolledKiosk | null> {
  return db.transaction(async (tx) => {
    const [code] = await tx
      .update(enrolmentCodes)
      .set({ usedAt: now })
      .where(
        and(
          eq(enrolmentCodes.codeHash, codeHash),
          isNull(enrolmentCodes.usedAt),
          gt(enrolmentCodes.expiresAt, now),
        ),
      )
      .returning({
        siteId: enrolmentCodes.siteId,
        id: enrolmentCodes.id,
        name: enrolmentCodes.name,
        cellId: enrolmentCodes.cellId,
      });
    if (!code) return null;
    const { siteId, name, cellId } = code;
    const [cell] = await tx
      .select({ name: cells.name })
      .from(cells)
      .where(and(eq(cells.siteId, siteId), eq(cells.id, cellId)));
    const kioskId = uuidv7();
    await tx.insert(kiosks).values({ siteId, id: kioskId, name, tokenHash, enrolledAt: now });
    const row = { siteId, id: uuidv7(), kioskId, cellId, effectiveFrom: now };
    await tx.insert(kioskCells).values(row);
    await recordAct(
      { db: tx, siteId },
      {
        by: `kiosk:${kioskId}`,
        action: "kiosks.enrolled",
        subject: `kiosk:${kioskId}`,
        detail: { code: code.id },
      },
    );
    return { siteId, kioskId, name, cell: cell?.name ?? "" };
  });
}
