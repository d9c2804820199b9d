import { sql } from "drizzle-orm";
import type { Scope } from "@/db/client";
import type { TicketSteps } from "@/lib/sheet/operation-sheet";
import type { TicketBook } from "@/lib/tickets/book";

/** All that is booked to a ticket number, and its steps where some of its operations have any. */
export interface SteppedBook {
  book: TicketBook;
  steps: TicketSteps | undefined;
}

/**
 * Lists all that is booked to some ticket numbers, known or not, in their order, with their steps and
 * all that was said of those, corrections too; one statement.
 */
export async function listSteppedBooks(
  { db, siteId }: Scope,
  numbers: readonly string[],
): Promise<SteppedBook[]> {
  const { rows } = await db.execute<{ books: TicketBook[]; steps: TicketSteps[] }>(sql`
    select
      ticket_books(${siteId}, ${sql.param(numbers)}::text[]) as books,
      ticket_steps(${siteId}, ${sql.param(numbers)}::text[]) as steps`);
  const { books = [], steps = [] } = rows[0] ?? {};
  return books.map((book) => ({
    book,
    steps: steps.find(({ ticket }) => ticket === book.ticket),
  }));
}
