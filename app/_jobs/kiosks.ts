import "server-only";
import { nudgeJudge } from "@/app/_jobs/tickets";
import { database } from "@/app/_server/database";
import { retrySealedBoxes } from "@/app/_server/sealed-sessions";
import { listSiteIds } from "@/db/sites/queries";

/** Tries again the sealed credentials that came while tries were slowed down. */
export async function retryBoxes(): Promise<void> {
  const db = database();
  for (const siteId of await listSiteIds(db)) {
    if ((await retrySealedBoxes({ db, siteId }, new Date())) > 0) nudgeJudge();
  }
}
