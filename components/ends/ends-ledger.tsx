import Link from "next/link";
import { Fragment, type ReactNode } from "react";
import { Columns } from "@/components/shell/columns";
import { TicketLink } from "@/components/tickets/ticket-link";
import { Icon } from "@/components/ui/icon";
import { Head, Ledger } from "@/components/ui/table";
import type { EndLine } from "@/lib/ends/view";

const WIDTHS = { number: 6, worker: 18, cell: 12, when: 14, what: 26, where: 20, open: 4 };

/** What must be settled, the worst first; the open one with how it may be, under its line. */
export function EndsLedger({
  groups,
  open,
  address,
  linksTickets,
  children,
}: {
  groups: readonly { heading: string; lines: readonly EndLine[] }[];
  /** The key of the one that is open. */
  open: string;
  /** The filter as the address has it. */
  address: Record<string, string>;
  linksTickets: boolean;
  /** What stands under the open line: its two cells. */
  children: ReactNode;
}) {
  return (
    <Ledger caption="Loose ends, the worst first" className="mirror-ledger">
      <Columns widths={WIDTHS} />
      <thead>
        <tr>
          <Head>No</Head>
          <Head>Worker</Head>
          <Head>Home cell</Head>
          <Head>When</Head>
          <Head className="desk-after-seam">To settle</Head>
          <Head>Where</Head>
          <th scope="col">
            <span className="sr-only">Open</span>
          </th>
        </tr>
      </thead>
      {groups.map(({ heading, lines }) => (
        <tbody key={heading}>
          <tr data-group="">
            <th scope="rowgroup" colSpan={4} data-book="">
              {heading}
            </th>
            <td colSpan={3} data-day="" className="desk-after-seam">
              <span className="text-t-2 font-medium text-ink-2">oldest first</span>
            </td>
          </tr>
          {lines.map((line) => (
            <Fragment key={line.key}>
              <EndRow
                line={line}
                isOpen={line.key === open}
                address={address}
                linksTickets={linksTickets}
              />
              {line.key === open && children}
            </Fragment>
          ))}
        </tbody>
      ))}
    </Ledger>
  );
}

function EndRow({
  line,
  isOpen,
  address,
  linksTickets,
}: {
  line: EndLine;
  isOpen: boolean;
  address: Record<string, string>;
  linksTickets: boolean;
}) {
  const { key, worker, name, cell, when, what, ticket, kiosk } = line;
  const query = new URLSearchParams({ ...address, open: key });
  return (
    <tr data-open={isOpen ? "" : undefined}>
      <td data-book="" className="code text-ink-2">
        {worker ?? ""}
      </td>
      <td data-book="" className="desk-cut font-[650]">
        {name ?? "nobody known"}
      </td>
      <td data-book="" className="desk-cut text-ink-2">
        {cell ?? ""}
      </td>
      <td data-book="" className="desk-cut">
        {when}
      </td>
      <td data-day="" className="desk-after-seam desk-cut">
        <span className="tag text-danger">
          <Icon name="loose" />
          {what}
        </span>
      </td>
      <td data-day="" className="desk-cut text-ink-2">
        {ticket ? <TicketLink number={ticket} links={linksTickets} /> : kiosk}
      </td>
      <td data-day="">
        {!isOpen && (
          <Link
            href={`/ends?${query}`}
            scroll={false}
            className="desk-opener"
            aria-label={`Settle: ${name ?? "nobody known"}, ${what}, ${when}`}
          >
            <Icon name="down" />
          </Link>
        )}
      </td>
    </tr>
  );
}
