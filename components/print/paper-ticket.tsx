import type { CSSProperties } from "react";
import { BarCode } from "@/components/print/bar-code";
import { QrCode } from "@/components/print/qr-code";
import { SeamGauge } from "@/components/seam/gauge";
import { Mark } from "@/components/shell/mark";
import { Icon } from "@/components/ui/icon";
import type { BirthRecord } from "@/lib/api/tickets";
import { showTicket } from "@/lib/codes/ticket-code";
import { seamScale } from "@/lib/seam/scale";
import { standardMinutes } from "@/lib/seam/verdict";
import { dayText } from "@/lib/time/format";

/** A ticket on an A4 sheet: standards as bars on the left, an empty rule to shade on the right. */
export function PaperTicket({
  record,
  site,
  printedOn,
  bars,
  dots,
}: {
  record: BirthRecord;
  site: string;
  printedOn: string;
  bars: readonly number[];
  dots: readonly (readonly boolean[])[];
}) {
  const { model, options, quantity, dueOn, operations } = record;
  const shown = showTicket(record.ticket);
  const lot = quantity === 1 ? "one instrument" : `lot of ${quantity}`;
  const scaleSeconds = seamScale(
    operations.map(({ standardSeconds }) => ({ standardSeconds, actualSeconds: 0 })),
  );
  return (
    <article className="paper" data-theme="light">
      <header className="paper-head">
        <div>
          <h1>{model}</h1>
          <p>{options.join(", ")}</p>
          <p>
            {lot}
            {dueOn && `, for ${dayText(dueOn, "en-GB")}`}
          </p>
        </div>
        <Mark className="h-[26mm]" />
        <div>
          <p>
            {site}
            <br />
            printed {dayText(printedOn, "en-GB")}
          </p>
          <QrCode dots={dots} label={`QR code of ticket ${shown}`} />
        </div>
      </header>
      <div className="paper-row paper-columns">
        <p>standard min for the {quantity === 1 ? "piece" : "lot"}</p>
        <p>
          shade it, if the tablet is away: good <Icon name="good" />, rework <Icon name="rework" />,
          scrap <Icon name="scrap" />
        </p>
      </div>
      <ol>
        {operations.map((operation) => (
          <li key={operation.operation} className="paper-row">
            <p>
              <code>{operation.operation}</code> <b>{operation.name}</b>
            </p>
            <p className="paper-boxes">
              <Icon name="good" />
              <i />
              <Icon name="rework" />
              <i />
              <Icon name="scrap" />
              <i />
            </p>
            {operation.standardSeconds !== null && (
              <p
                className="paper-figure"
                style={{ "--bar": operation.standardSeconds / scaleSeconds } as CSSProperties}
              >
                {standardMinutes(operation.standardSeconds)}
              </p>
            )}
            <SeamGauge
              standardSeconds={operation.standardSeconds}
              actualSeconds={0}
              scaleSeconds={scaleSeconds}
              size="paper"
              flush
              name={operation.name}
            />
          </li>
        ))}
      </ol>
      <footer className="paper-foot">
        <BarCode bars={bars} label={`Bar code of ticket ${shown}`} />
        <p className="code">{shown}</p>
      </footer>
    </article>
  );
}
