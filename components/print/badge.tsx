import { BarCode } from "@/components/print/bar-code";
import { QrCode } from "@/components/print/qr-code";
import { SmallMark } from "@/components/shell/mark";

/** A badge the size of a bank card (ISO/IEC 7810 ID-1, 85.6 × 54 mm), with lines to cut along. */
export function Badge({
  worker,
  site,
  bars,
  dots,
}: {
  worker: { number: string; name: string; cell: string };
  site: string;
  bars: readonly number[];
  dots: readonly (readonly boolean[])[];
}) {
  return (
    <article className="badge" data-theme="light">
      <header>
        <SmallMark className="h-[9mm]" />
        <p>{site}</p>
      </header>
      <div>
        <h1>{worker.name}</h1>
        <p>{worker.cell}</p>
        <p className="code">{worker.number}</p>
      </div>
      <QrCode dots={dots} label={`QR code of badge ${worker.number}`} />
      <BarCode bars={bars} label={`Bar code of badge ${worker.number}`} />
    </article>
  );
}
