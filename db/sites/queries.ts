import { asc, eq } from "drizzle-orm";
import type { Db, Scope } from "@/db/client";
import { siteRules, sites } from "@/db/sites/tables";
import type { SiteRules } from "@/lib/timeline/schema";

const rule = {
  effectiveFrom: siteRules.effectiveFrom,
  timeZone: siteRules.timeZone,
  productionDayStartsAtMinutes: siteRules.productionDayStartsAtMinutes,
  shiftLimitSeconds: siteRules.shiftLimitSeconds,
  sinceLimitSeconds: siteRules.sinceLimitSeconds,
  restMaxSeconds: siteRules.restMaxSeconds,
  mealMaxSeconds: siteRules.mealMaxSeconds,
  restBetweenShiftsSeconds: siteRules.restBetweenShiftsSeconds,
};

/** A site with its rules, oldest first; `lib/time` asks them which zone holds when. */
export interface Site {
  name: string;
  locale: string;
  rules: SiteRules[];
}

/** Finds a site with all its rules, in one statement; null if there is no such site. */
export async function findSite({ db, siteId }: Scope): Promise<Site | null> {
  const rows = await db
    .select({ name: sites.name, locale: sites.locale, rule })
    .from(sites)
    .leftJoin(siteRules, eq(siteRules.siteId, sites.id))
    .where(eq(sites.id, siteId))
    .orderBy(asc(siteRules.effectiveFrom), asc(siteRules.id));
  const [first] = rows;
  if (!first) return null;
  const rules = rows.flatMap(({ rule }) => {
    if (!rule) return [];
    const { effectiveFrom, ...rest } = rule;
    return [{ fromMs: effectiveFrom.getTime(), ...rest }];
  });
  return { name: first.name, locale: first.locale, rules };
}
/** Lists the ids of all sites of the installation, the oldest first. */
export async function listSiteIds(db: Db): Promise<string[]> {
  const rows = await db.select({ id: sites.id }).from(sites).orderBy(asc(sites.createdAt));
  return rows.map(({ id }) => id);
}
