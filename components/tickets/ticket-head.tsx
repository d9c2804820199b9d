import { BarCode } from "@/components/print/bar-code";
import { QrCode } from "@/components/print/qr-code";
import type { BirthRecord } from "@/lib/api/tickets";
import { showTicket } from "@/lib/codes/ticket-code";
import type { Sheet } from "@/lib/tickets/sheet";
import { dayText } from "@/lib/time/format";

const hours = (seconds: number) => (seconds / 3600).toFixed(1);

/** What a ticket is, and the hours of its finished work at the seam. */
export function TicketHead({
  record,
  sheet,
  path,
  bars,
  dots,
}: {
  record: BirthRecord;
  sheet: Sheet;
  path: string;
  bars: readonly number[];
  dots: readonly (readonly boolean[])[];
}) {
  const { standardSeconds, actualSeconds } = sheet.finished;
  const shown = showTicket(record.ticket);
  return (
    <header className="desk-figures">
      <div>
        <div className="mr-auto">
          <h1 className="code text-t-6">{shown}</h1>
          <p className="font-[650]">
            {record.model}
            {record.options.length > 0 && (
              <span className="font-medium text-ink-2">, {record.options.join(", ")}</span>
            )}
          </p>
          <p className="text-t-2 text-ink-2">{factsOf(record)}</p>
        </div>
        <p className="desk-figure">
          <span className="text-standard-ink">
            standard
            <br /> hours
          </span>
          <b>{standardSeconds === null ? "–" : hours(standardSeconds)}</b>
        </p>
      </div>
      <div>
        <p className="desk-figure text-actual">
          <b>{hours(actualSeconds)}</b>
          <span>
            actual
            <br /> hours
          </span>
        </p>
        <p className="desk-aside desk-aside-wide">
          {sheet.done} of {sheet.operations.length} operations finished
          <br />
          {placeOf(record)}
        </p>
        <div className="desk-codes">
          <BarCode bars={bars} label={`Bar code of ticket ${shown}`} />
          <QrCode dots={dots} label={`QR code of ticket ${shown}`} />
          <a href={`${path}/paper`} className="button" data-rim="right">
            Print
          </a>
        </div>
      </div>
    </header>
  );
}

function factsOf({ quantity, order, dueOn }: BirthRecord): string {
  const lot = quantity === 1 ? "one instrument" : `lot of ${quantity}`;
  const facts = [lot, order && `order ${order}`, dueOn && `due ${dayText(dueOn, "en-GB")}`];
  return facts.filter(Boolean).join(" · ");
}

function placeOf({ status, cell, operationName }: BirthRecord): string {
  if (status !== "open") return status;
  return cell ? `next: ${operationName}, ${cell}` : "nothing is left to do";
}
