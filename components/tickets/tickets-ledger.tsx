import { SeamAxis } from "@/components/seam/axis";
import { SeamGauge } from "@/components/seam/gauge";
import { hourWords, VerdictTag } from "@/components/seam/verdict-tag";
import { Columns } from "@/components/shell/columns";
import { TicketLink } from "@/components/tickets/ticket-link";
import { Head, Ledger, NumberCell, NumberHead } from "@/components/ui/table";
import { seamScale } from "@/lib/seam/scale";
import type { Progress } from "@/lib/tickets/progress";
import { dayText } from "@/lib/time/format";

const WIDTHS = {
  ticket: 10,
  model: 18,
  lot: 5,
  due: 7,
  gauge: 20,
  word: 9,
  done: 7,
  next: 24,
};

/** A ticket of the list, with what its finished work took. */
export interface TicketRow {
  number: string;
  status: "open" | "finished" | "scrapped" | "cancelled";
  model: string;
  options: readonly string[];
  quantity: number;
  dueOn: string | null;
  operationName: string | null;
  cell: string | null;
  progress: Progress;
}

/** Tickets on one scale: the standard of what is finished against what it took, and what is next. */
export function TicketsLedger({ rows }: { rows: readonly TicketRow[] }) {
  const scaleSeconds = seamScale(rows.map(({ progress }) => progress.finished));
  return (
    <Ledger caption="Tickets" className="mirror-ledger">
      <Columns widths={WIDTHS} />
      <thead>
        <tr>
          <Head>Ticket</Head>
          <Head>Model</Head>
          <NumberHead>Lot</NumberHead>
          <NumberHead>Due</NumberHead>
          <th scope="col">
            <span className="sr-only">Standard and actual of finished work</span>
            <SeamAxis scaleSeconds={scaleSeconds} unitShown />
          </th>
          <Head>Finished work</Head>
          <NumberHead>Done</NumberHead>
          <Head>Next</Head>
        </tr>
      </thead>
      <tbody>
        {rows.map((row) => (
          <TicketsRow key={row.number} row={row} scaleSeconds={scaleSeconds} />
        ))}
      </tbody>
    </Ledger>
  );
}

function TicketsRow({ row, scaleSeconds }: { row: TicketRow; scaleSeconds: number }) {
  const { progress, status, cell, operationName } = row;
  const { finished, noStandardSeconds } = progress;
  const hasWork = finished.standardSeconds !== null || noStandardSeconds > 0;
  return (
    <tr>
      <td data-book="">
        <TicketLink number={row.number} links />
      </td>
      <td data-book="" className="desk-cut">
        <span className="font-[650]">{row.model}</span>{" "}
        <span className="text-ink-2">{row.options.join(", ")}</span>
      </td>
      <NumberCell data-book="" data-label="lot of">
        {row.quantity}
      </NumberCell>
      <NumberCell data-book="" data-label="due">
        {row.dueOn ? dayText(row.dueOn, "en-GB").slice(4) : ""}
      </NumberCell>
      <td data-gauge="">
        {hasWork && (
          <SeamGauge
            {...finished}
            flush
            scaleSeconds={scaleSeconds}
            words={hourWords}
            name="Finished work"
          />
        )}
      </td>
      <td data-day="">{hasWork && <VerdictTag pair={finished} finished words={hourWords} />}</td>
      <NumberCell data-day="" data-label="done">
        {progress.done} of {progress.of}
      </NumberCell>
      <td data-day="" className="desk-wrap">
        {status === "open" ? (
          <>
            <span className="font-[650]">{cell}</span>{" "}
            <span className="text-ink-2">
              {operationName}
              {progress.isWorkedOn ? ", in work" : ""}
            </span>
          </>
        ) : (
          status
        )}
      </td>
    </tr>
  );
}
