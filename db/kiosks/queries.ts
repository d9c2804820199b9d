import { and, asc, eq, sql } from "drizzle-orm";
import type { Db, Scope } from "@/db/client";
import { kioskSessions, kiosks } from "@/db/kiosks/tables";
import { workers } from "@/db/people/tables";

/** Finds the kiosks of device cookies by the cookies' SHA-256, in a map by it; revoked ones too. */
export async function findKiosksByToken(db: Db, tokenHashes: readonly string[]) {
  const rows = await db
    .select({
      tokenHash: kiosks.tokenHash,
      siteId: kiosks.siteId,
      kioskId: kiosks.id,
      revokedAt: kiosks.revokedAt,
    })
    .from(kiosks)
    .where(sql`${kiosks.tokenHash} = any (${sql.param(tokenHashes)}::text[])`);
  return new Map(rows.map(({ tokenHash, ...kiosk }) => [tokenHash, kiosk]));
}

/**
 * Finds a kiosk session by its token's SHA-256, on one kiosk only; ended ones too. `shiftEndAt`: when
 * its worker first ended a shift since it was opened; null where that is still to come.
 */
export async function findKioskSession({ db, siteId }: Scope, kioskId: string, tokenHash: string) {
  const [session] = await db
    .select({
      sessionId: kioskSessions.id,
      workerId: workers.id,
      number: workers.number,
      openedAt: kioskSessions.openedAt,
      endedAt: kioskSessions.endedAt,
      shiftEndAt: sql<Date | null>`(
        select min(s.end_at)
        from shifts s
        where s.site_id = ${siteId}
          and s.worker_id = ${kioskSessions.workerId}
          and s.end_at > ${kioskSessions.openedAt}
          and s.end_event_id is not null)`.mapWith(kioskSessions.endedAt),
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

/** Lists a site's kiosks with the cells they serve at `now`, by name; revoked ones last. */
export async function listKiosks({ db, siteId }: Scope, now: Date) {
  const cells = sql<{ id: string; name: string }[]>`coalesce((
    select json_agg(json_build_object('id', c.id, 'name', c.name) order by kc.position)
    from kiosk_cells kc
    join cells c on c.site_id = kc.site_id and c.id = kc.cell_id
    where kc.site_id = ${siteId}
      and kc.kiosk_id = kiosks.id
      and kc.effective_from = (
        select max(latest.effective_from)
        from kiosk_cells latest
        where latest.site_id = ${siteId}
          and latest.kiosk_id = kiosks.id
          and latest.effective_from <= ${now.toISOString()}::timestamptz)), '[]')`;
  return db
    .select({
      id: kiosks.id,
      name: kiosks.name,
      cells,
      enrolledAt: kiosks.enrolledAt,
      lastSeenAt: kiosks.lastSeenAt,
      revokedAt: kiosks.revokedAt,
      build: kiosks.build,
      queued: kiosks.queued,
      batteryPercent: kiosks.batteryPercent,
    })
    .from(kiosks)
    .where(eq(kiosks.siteId, siteId))
    .orderBy(sql`${kiosks.revokedAt} is not null`, asc(kiosks.name), asc(kiosks.id));
}
