import { and, asc, eq, isNull, sql } from "drizzle-orm";
import type { Scope } from "@/db/client";
import { kiosks, sealedBoxes } from "@/db/kiosks/tables";

/** More than a tablet's people sign in on it in a fortnight without a network. */
const BOXES_MAX = 1000;
/** How many a round tries again. */
const ROUND_MAX = 100;

/** A sealed credential that could not be tried yet. */
export interface SealedBox {
  session: string;
  kioskId: string;
  worker: string;
  sealed: string;
}

/** Keeps a sealed credential to be tried again; the same session's once, and not more than so many. */
export async function keepSealedBox(
  { db, siteId }: Scope,
  { session, kioskId, worker, sealed }: SealedBox,
  now: Date,
): Promise<void> {
  const waiting = and(eq(sealedBoxes.siteId, siteId), eq(sealedBoxes.kioskId, kioskId));
  if ((await db.$count(sealedBoxes, waiting)) >= BOXES_MAX) return;
  await db
    .insert(sealedBoxes)
    .values({ siteId, id: session, kioskId, workerNumber: worker, sealed, keptAt: now })
    .onConflictDoNothing();
}

/** Lists sealed credentials that wait, the oldest first; none of tablets taken out of use. */
export async function listSealedBoxes({ db, siteId }: Scope): Promise<SealedBox[]> {
  return db
    .select({
      session: sealedBoxes.id,
      kioskId: sealedBoxes.kioskId,
      worker: sealedBoxes.workerNumber,
      sealed: sealedBoxes.sealed,
    })
    .from(sealedBoxes)
    .innerJoin(kiosks, and(eq(kiosks.siteId, siteId), eq(kiosks.id, sealedBoxes.kioskId)))
    .where(and(eq(sealedBoxes.siteId, siteId), isNull(kiosks.revokedAt)))
    .orderBy(asc(sealedBoxes.keptAt), asc(sealedBoxes.id))
    .limit(ROUND_MAX);
}

/** Forgets a sealed credential: it was tried. */
export async function dropSealedBox({ db, siteId }: Scope, session: string): Promise<void> {
  await db
    .delete(sealedBoxes)
    .where(sql`${sealedBoxes.siteId} = ${siteId} and ${sealedBoxes.id} = ${session}`);
}
