import { and, eq } from "drizzle-orm";
import type { Scope } from "@/db/client";
import { kiosks } from "@/db/kiosks/tables";

/** What a kiosk says of itself; what it leaves out is kept as it was. */
export interface SaidOfItself {
  build?: string | undefined;
  queued?: number | undefined;
  batteryPercent?: number | undefined;
}

/** Keeps when a kiosk was last heard of, what it said, and for which key it now seals. */
export async function noteSeen(
  { db, siteId }: Scope,
  kioskId: string,
  { now, sealKid, ...said }: SaidOfItself & { now: Date; sealKid: string },
): Promise<void> {
  await db
    .update(kiosks)
    .set({ lastSeenAt: now, sealKid, ...said })
    .where(and(eq(kiosks.siteId, siteId), eq(kiosks.id, kioskId)));
}
