import { type SQL, sql } from "drizzle-orm";

/**
 * The lock that closing a pay period takes and every booking of the site shares, until their
 * transactions end (LEDGER.md 10): what is booked is in the frozen figures, or comes after them.
 */
export function closingKey(siteId: string): SQL {
  return sql`hashtextextended(${`closing ${siteId}`}, 0)`;
}
