import type { Metadata } from "next";
import { personFor } from "@/app/_server/page-actor";
import { siteOf } from "@/app/_server/site";
import { NextPage } from "@/components/shell/next-page";
import { TicketsFilterSentence } from "@/components/tickets/tickets-filter";
import { TicketsLedger } from "@/components/tickets/tickets-ledger";
import { Empty } from "@/components/ui/empty";
import { listStandardsOnPage } from "@/db/standards/queries";
import { findTicketChoices } from "@/db/tickets/choices";
import { listProgressOnPage } from "@/db/tickets/progress";
import { listTickets } from "@/db/tickets/queries";
import { groupBy } from "@/lib/group";
import { type TicketsFilter, ticketsFilter } from "@/lib/tickets/filter";
import { progressOf } from "@/lib/tickets/progress";

export const metadata: Metadata = { title: "Tickets" };

const PAGE = 50;

interface TicketsProps {
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}

/** The tickets of the site, filtered by a sentence, a page at a time. */
export default async function TicketsPage({ searchParams }: TicketsProps) {
  const { scope } = await personFor("tickets.see");
  const filter = ticketsFilter.parse(await searchParams);
  const wanted = wantedOf(filter);
  const [site, choices, tickets, progress, standards] = await Promise.all([
    siteOf(scope.siteId),
    findTicketChoices(scope),
    listTickets(scope, wanted),
    listProgressOnPage(scope, wanted),
    listStandardsOnPage(scope, wanted),
  ]);
  const byTicket = groupBy(progress, ({ ticketId }) => ticketId);
  const byModel = groupBy(standards, ({ modelId }) => modelId);
  const rows = tickets.slice(0, PAGE).map((ticket) => ({
    ...ticket,
    progress: progressOf(byTicket.get(ticket.id) ?? [], {
      standards: byModel.get(ticket.modelId) ?? [],
      options: ticket.options,
      rules: site.rules,
    }),
  }));
  return (
    <>
      <h1 className="sr-only">Tickets</h1>
      <TicketsFilterSentence filter={filter} {...choices} />
      {rows.length > 0 ? <TicketsLedger rows={rows} /> : <Empty>{emptyWords(filter)}</Empty>}
      {tickets.length > PAGE && (
        <NextPage path="/tickets" query={filter} after={tickets[PAGE - 1]!.seq} />
      )}
    </>
  );
}

function wantedOf({ q, status, model, cell, after }: TicketsFilter) {
  return {
    text: q || undefined,
    status: status === "all" ? undefined : status,
    model: model || undefined,
    cell: cell || undefined,
    after,
    limit: PAGE + 1,
  };
}

function emptyWords({ q, status, model, cell }: TicketsFilter): string {
  if (q) return `No ticket here has ${q} in its number.`;
  if (model || cell || status !== "open") return "No ticket is like that. Choose wider.";
  return "No ticket is open. Tickets come with the orders.";
}
