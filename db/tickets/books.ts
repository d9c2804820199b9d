import { sql } from "drizzle-orm";
import type { Scope } from "@/db/client";
import type { TicketBook } from "@/lib/tickets/book";

/** Lists all that is booked to some ticket numbers, known or not, in their order; one statement. */
export async function listTicketBooks(
  { db, siteId }: Scope,
  numbers: readonly string[],
): Promise<TicketBook[]> {
  const { rows } = await db.execute<{ books: TicketBook[] }>(
    sql`select ticket_books(${siteId}, ${sql.param(numbers)}::text[]) as books`,
  );
  return rows[0]?.books ?? [];
}
