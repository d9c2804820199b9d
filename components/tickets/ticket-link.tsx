import Link from "next/link";
import { showTicket } from "@/lib/codes/ticket-code";

/** A ticket's number as people read it, leading to the ticket for those who may see it. */
export function TicketLink({ number, links }: { number: string; links: boolean }) {
  const shown = showTicket(number);
  if (!links) return <code>{shown}</code>;
  return (
    <Link href={`/tickets/${shown}`}>
      <code>{shown}</code>
    </Link>
  );
}
