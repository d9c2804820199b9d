import { sql } from "drizzle-orm";
import type { Scope } from "@/db/client";

/** Finds by what tickets can be filtered: models by name, cells in the order of the work. */
export async function findTicketChoices({ db, siteId }: Scope) {
  const found = await db.execute<{ models: string[]; cells: string[] }>(sql`
    select
      array(select name from models where site_id = ${siteId} order by name) as models,
      array(select name from cells where site_id = ${siteId} order by position, name) as cells`);
  return found.rows[0]!;
}
