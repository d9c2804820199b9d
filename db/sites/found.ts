import { asc } from "drizzle-orm";
import { v7 as uuidv7 } from "uuid";
import type { Db } from "@/db/client";
import { siteRules, sites } from "@/db/sites/tables";

/** What a new site begins with; its admin changes it (LEDGER.md 2). */
const FIRST_RULES = {
  shiftLimitSeconds: 14 * 3600,
  sinceLimitSeconds: 30 * 60,
  restMaxSeconds: 20 * 60,
  mealMaxSeconds: 75 * 60,
  restBetweenShiftsSeconds: 11 * 3600,
};

/** Finds the installation's first site; null before there is one. */
export async function findFirstSite(db: Db) {
  const [site] = await db
    .select({ id: sites.id, name: sites.name })
    .from(sites)
    .orderBy(asc(sites.createdAt), asc(sites.id))
    .limit(1);
  return site ?? null;
}

/**
 * Founds an empty site, whose rules hold from the beginning of time: an event that reaches it late
 * is older than it.
 */
export async function foundSite(
  db: Db,
  site: { id?: string; name: string; timeZone: string },
): Promise<string> {
  const { id = uuidv7(), name, timeZone } = site;
  await db.transaction(async (tx) => {
    await tx.insert(sites).values({ id, name });
    const effectiveFrom = new Date(0);
    const rules = { siteId: id, id: uuidv7(), effectiveFrom, timeZone, ...FIRST_RULES };
    await tx.insert(siteRules).values(rules);
  });
  return id;
}
