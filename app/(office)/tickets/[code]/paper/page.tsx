import type { Metadata } from "next";
import { personFor } from "@/app/_server/page-actor";
import { barsOf, dotsOf } from "@/app/_server/print";
import { readTicket } from "@/app/(office)/tickets/[code]/read-ticket";
import { PaperTicket } from "@/components/print/paper-ticket";
import { PrintButton } from "@/components/print/print-button";
import { ticketCode } from "@/lib/codes/ticket-code";
import { localDate, ruleAt } from "@/lib/time/site-day";

interface PaperProps {
  params: Promise<{ code: string }>;
}

export const metadata: Metadata = { title: "Paper ticket" };

/** A ticket on paper: it goes with the instrument, and can be shaded by pencil. */
export default async function PaperPage({ params }: PaperProps) {
  const { scope } = await personFor("tickets.see");
  const now = new Date();
  const { site, record } = await readTicket(scope, (await params).code, now);
  const code = ticketCode(record.ticket);
  const { timeZone } = ruleAt(site.rules, now.getTime());
  return (
    <div className="paper-desk">
      <PrintButton />
      <PaperTicket
        record={record}
        site={site.name}
        printedOn={localDate(now.getTime(), timeZone)}
        bars={barsOf(code)}
        dots={dotsOf(code)}
      />
    </div>
  );
}
