import { and, eq, inArray, sql } from "drizzle-orm";
import type { Scope } from "@/db/client";
import { kioskSessions } from "@/db/kiosks/tables";
import { no, ok, type Result } from "@/lib/result";

/**
 * Opens a worker's session on a kiosk. Opened again by the same worker on the same kiosk, it gets a
 * new token and stays as old as it is; an id that is somebody else's is refused.
 */
export async function openKioskSession(
  { db, siteId }: Scope,
  session: { id: string; kioskId: string; workerId: string; tokenHash: string; now: Date },
): Promise<Result<void>> {
  const { id, kioskId, workerId, tokenHash, now } = session;
  const opened = await db
    .insert(kioskSessions)
    .values({ siteId, id, kioskId, workerId, tokenHash, openedAt: now })
    .onConflictDoUpdate({
      target: [kioskSessions.siteId, kioskSessions.id],
      set: { tokenHash },
      setWhere: sql`${kioskSessions.kioskId} = ${kioskId} and ${kioskSessions.workerId} = ${workerId}`,
    })
    .returning({ id: kioskSessions.id });
  if (opened.length > 0) return ok(undefined);
  return no("conflict", "This session is somebody else's. Begin again with number and PIN.");
}

/** Lists which of these sessions are known on a kiosk: those need no proof any more. */
export async function listKnownSessions(
  { db, siteId }: Scope,
  kioskId: string,
  ids: readonly string[],
): Promise<string[]> {
  if (ids.length === 0) return [];
  const rows = await db
    .select({ id: kioskSessions.id })
    .from(kioskSessions)
    .where(
      and(
        eq(kioskSessions.siteId, siteId),
        eq(kioskSessions.kioskId, kioskId),
        inArray(kioskSessions.id, [...ids]),
      ),
    );
  return rows.map(({ id }) => id);
}
