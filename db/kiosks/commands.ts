import { and, eq, isNull } from "drizzle-orm";
import { v7 as uuidv7 } from "uuid";
import { recordAct } from "@/db/audit/commands";
import type { Scope } from "@/db/client";
import { kioskCells, kiosks } from "@/db/kiosks/tables";
import { no, ok, type Result } from "@/lib/result";

/**
 * Gives a kiosk a new name and, from `now` on, a cell; a null `cellId` leaves the cells as they are.
 * What it booked before stays where it was.
 */
export async function changeKiosk(
  scope: Scope,
  kiosk: { id: string; name: string; cellId: string | null },
  { by, now }: { by: string; now: Date },
): Promise<Result<void>> {
  const { id, name, cellId } = kiosk;
  return scope.db.transaction(async (db) => {
    const changed = await db
      .update(kiosks)
      .set({ name })
      .where(and(eq(kiosks.siteId, scope.siteId), eq(kiosks.id, id), isNull(kiosks.revokedAt)))
      .returning({ id: kiosks.id });
    if (changed.length === 0) return NOT_HERE;
    if (cellId) {
      const row = { siteId: scope.siteId, id: uuidv7(), kioskId: id, cellId };
      await db.insert(kioskCells).values({ ...row, effectiveFrom: now });
    }
    const detail = { cellId };
    await recordAct(
      { ...scope, db },
      { by, action: "kiosks.change", subject: `kiosk:${id}`, detail },
    );
    return ok(undefined);
  });
}

/** Takes a kiosk out of use: from now on it books nothing; what it kept is handed in as loose ends. */
export async function revokeKiosk(
  scope: Scope,
  kioskId: string,
  { by, now }: { by: string; now: Date },
): Promise<Result<void>> {
  return scope.db.transaction(async (db) => {
    const revoked = await db
      .update(kiosks)
      .set({ revokedAt: now })
      .where(and(eq(kiosks.siteId, scope.siteId), eq(kiosks.id, kioskId), isNull(kiosks.revokedAt)))
      .returning({ id: kiosks.id });
    if (revoked.length === 0) return NOT_HERE;
    await recordAct({ ...scope, db }, { by, action: "kiosks.revoke", subject: `kiosk:${kioskId}` });
    return ok(undefined);
  });
}

const NOT_HERE = no("notFound", "This kiosk is not in use any more.");
