import "server-only";
import { database } from "@/app/_server/database";
import { openDuePeriods } from "@/db/pay/commands";
import { findSite, listSiteIds } from "@/db/sites/queries";
import { localDate, ruleAt } from "@/lib/time/site-day";

/** Opens the pay periods that are due at every site. */
export async function openPeriods(): Promise<void> {
  const db = database();
  const nowMs = Date.now();
  for (const siteId of await listSiteIds(db)) {
    const site = await findSite({ db, siteId });
    if (!site || site.rules.length === 0) continue;
    const { timeZone } = ruleAt(site.rules, nowMs);
    await openDuePeriods({ db, siteId }, localDate(nowMs, timeZone));
  }
}
