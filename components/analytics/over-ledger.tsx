import { SeamAxis } from "@/components/seam/axis";
import { SeamGauge } from "@/components/seam/gauge";
import { hourWords, VerdictTag } from "@/components/seam/verdict-tag";
import { Columns } from "@/components/shell/columns";
import { TicketLink } from "@/components/tickets/ticket-link";
import { Head, Ledger, NumberCell, NumberHead } from "@/components/ui/table";
import type { OverRow, SeamOperation } from "@/lib/analytics/facts";
import { hoursOf } from "@/lib/analytics/words";
import { seamScale } from "@/lib/seam/scale";

const WIDTHS = { ticket: 10, operation: 21, standard: 9, gauge: 20, actual: 8, word: 12, cell: 20 };

/** The unfinished tickets that are over their standard, the farthest first: standard of the lot. */
export function OverLedger({
  over,
  operations,
}: {
  over: readonly OverRow[];
  operations: readonly SeamOperation[];
}) {
  const scaleSeconds = seamScale(over);
  const known = new Map(operations.map((operation) => [operation.code, operation]));
  return (
    <Ledger caption="Unfinished tickets over their standard" tight className="mirror-ledger">
      <Columns widths={WIDTHS} />
      <thead>
        <tr>
          <Head>Ticket</Head>
          <Head>Unfinished operation</Head>
          <NumberHead>Standard, whole lot</NumberHead>
          <th scope="col">
            <span className="sr-only">Standard and actual</span>
            <SeamAxis scaleSeconds={scaleSeconds} unitShown />
          </th>
          <NumberHead>Actual</NumberHead>
          <Head>Over</Head>
          <Head>Cell</Head>
        </tr>
      </thead>
      <tbody>
        {over.map((row) => (
          <tr key={`${row.ticket} ${row.operation}`}>
            <td data-book="">
              <TicketLink number={row.ticket} links />
            </td>
            <td data-book="" className="desk-cut">
              <span className="code text-ink-2">{row.operation}</span>{" "}
              {known.get(row.operation)?.name}
            </td>
            <NumberCell data-book="" data-standard="" data-label="standard">
              {hoursOf(row.standardSeconds)}
            </NumberCell>
            <td data-gauge="">
              <SeamGauge
                standardSeconds={row.standardSeconds}
                actualSeconds={row.actualSeconds}
                flush
                size="cell"
                state="live"
                scaleSeconds={scaleSeconds}
                words={hourWords}
                name={row.ticket}
              />
            </td>
            <NumberCell data-day="" data-actual="" data-label="actual">
              {hoursOf(row.actualSeconds)}
            </NumberCell>
            <td data-day="">
              <VerdictTag pair={row} finished={false} words={hourWords} />
            </td>
            <td data-day="" className="text-ink-2">
              {known.get(row.operation)?.cell}
            </td>
          </tr>
        ))}
      </tbody>
    </Ledger>
  );
}
