import { database } from "@/app/_server/database";
import { handle } from "@/app/_server/handle";
import { listTickets } from "@/db/tickets/queries";
import { pageOf } from "@/lib/api/page";
import { ticketSummaryOf } from "@/lib/api/ticket-summary";
import { ticketsQuery } from "@/lib/api/tickets";
import { ok } from "@/lib/result";

/** Lists the site's tickets, page by page in the order in which they were made. */
export const GET = handle(
  { actor: "key", may: "tickets.read", query: ticketsQuery },
  async ({ actor, query }) => {
    const { cursor: after, limit, ...filters } = query;
    const scope = { db: database(), siteId: actor.siteId };
    const rows = await listTickets(scope, { ...filters, after, limit: limit + 1 });
    const { items, nextCursor } = pageOf(rows, limit, ({ seq }) => seq);
    return ok({ items: items.map(ticketSummaryOf), nextCursor });
  },
);
