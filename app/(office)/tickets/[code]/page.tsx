import type { Metadata } from "next";
import { personFor } from "@/app/_server/page-actor";
import { barsOf, dotsOf } from "@/app/_server/print";
import { readTicket } from "@/app/(office)/tickets/[code]/read-ticket";
import { OperationsLedger } from "@/components/tickets/operations-ledger";
import { StrayLines } from "@/components/tickets/stray-lines";
import { TicketHead } from "@/components/tickets/ticket-head";
import { showTicket, ticketCode } from "@/lib/codes/ticket-code";
import { sheetOf } from "@/lib/tickets/sheet";
import { ruleAt } from "@/lib/time/site-day";

interface TicketProps {
  params: Promise<{ code: string }>;
  searchParams: Promise<{ open?: string | string[] }>;
}

export async function generateMetadata({ params }: TicketProps): Promise<Metadata> {
  return { title: `Ticket ${(await params).code}` };
}

/** One ticket: each operation's standard against its actual, opened to every segment behind it. */
export default async function TicketPage({ params, searchParams }: TicketProps) {
  const { scope } = await personFor("tickets.see");
  const now = new Date();
  const { site, record } = await readTicket(scope, (await params).code, now);
  const sheet = sheetOf(record);
  const { timeZone } = ruleAt(site.rules, now.getTime());
  const code = ticketCode(record.ticket);
  const path = `/tickets/${showTicket(record.ticket)}`;
  const open = [(await searchParams).open].flat()[0];
  return (
    <>
      <TicketHead
        record={record}
        sheet={sheet}
        path={path}
        bars={barsOf(code)}
        dots={dotsOf(code)}
      />
      <OperationsLedger sheet={sheet} open={open} path={path} timeZone={timeZone} />
      {sheet.strays.length > 0 && <StrayLines lines={sheet.strays} timeZone={timeZone} />}
    </>
  );
}
