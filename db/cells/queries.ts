import { asc, eq } from "drizzle-orm";
import { cells } from "@/db/cells/tables";
import type { Scope } from "@/db/client";

/** Lists a site's cells in the order in which work passes through them. */
export async function listCells({ db, siteId }: Scope) {
  return db
    .select({ id: cells.id, name: cells.name, position: cells.position })
    .from(cells)
    .where(eq(cells.siteId, siteId))
    .orderBy(asc(cells.position), asc(cells.name));
}
