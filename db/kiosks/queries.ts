import { and, eq } from "drizzle-orm";
import type { Db, Scope } from "@/db/client";
import { kioskSessions, kiosks } from "@/db/kiosks/tables";
import { workers } from "@/db/people/tables";

/** Finds the kiosk of a device cookie by the cookie's SHA-256; revoked ones too. */
export async function findKioskByToken(db: Db, tokenHash: string) {
  const [kiosk] = await db
    .select({ siteId: kiosks.siteId, kioskId: kiosks.id, revokedAt: kiosks.revokedAt })
    .from(kiosks)
    .where(eq(kiosks.tokenHash, tokenHash))
    .limit(1);
  return kiosk ?? null;
}

/** Finds a kiosk session by its token's SHA-256, on one kiosk only; ended ones too. */
export async function findKioskSession({ db, siteId }: Scope, kioskId: string, tokenHash: string) {
  const [session] = await db
    .select({
      sessionId: kioskSessions.id,
      workerId: workers.id,
      number: workers.number,
      openedAt: kioskSessions.openedAt,
      endedAt: kioskSessions.endedAt,
    })
    .from(kioskSessions)
    .innerJoin(
      workers,
      and(eq(workers.siteId, kioskSessions.siteId), eq(workers.id, kioskSessions.workerId)),
    )
    .where(
      and(
        eq(kioskSessions.siteId, siteId),
        eq(kioskSessions.kioskId, kioskId),
        eq(kioskSessions.tokenHash, tokenHash),
      ),
    )
    .limit(1);
  return session ?? null;
}
