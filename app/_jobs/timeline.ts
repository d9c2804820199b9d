import "server-only";
import { database } from "@/app/_server/database";
import { findSite, listSiteIds } from "@/db/sites/queries";
import { closeOverdueShifts } from "@/db/timeline/commands";

/** Closes, provisionally, the shifts that nobody ended within the site's limit. */
export async function closeForgottenShifts(): Promise<void> {
  const db = database();
  for (const siteId of await listSiteIds(db)) {
    const site = await findSite({ db, siteId });
    if (site && site.rules.length > 0) {
      await closeOverdueShifts({ db, siteId }, site.rules, new Date());
    }
  }
}
