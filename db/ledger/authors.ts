import { sql } from "drizzle-orm";
import type { Scope } from "@/db/client";

/**
 * Finds the names behind what the ledger keeps as author: `account:<id>` of the office, or the worker
 * number of a lead at a kiosk. One whom nobody knows is left out.
 */
export async function listAuthors(
  { db, siteId }: Scope,
  authors: readonly string[],
): Promise<ReadonlyMap<string, string>> {
  if (authors.length === 0) return new Map();
  const { rows } = await db.execute<{ by: string; name: string }>(sql`
    select a.by, coalesce(w.name, c.name) as name
    from unnest(${sql.param([...new Set(authors)])}::text[]) as a (by)
    left join workers w on w.site_id = ${siteId} and w.number = a.by
    left join accounts c on c.id::text = substr(a.by, 9) and a.by like 'account:%'
    where coalesce(w.name, c.name) is not null`);
  return new Map(rows.map(({ by, name }) => [by, name]));
}
