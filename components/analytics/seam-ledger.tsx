import { Fragment } from "react";
import { LineRow } from "@/components/analytics/line-row";
import { OpenedRows } from "@/components/analytics/opened-rows";
import { LineOpener } from "@/components/analytics/opener";
import { SeamAxis } from "@/components/seam/axis";
import { Columns } from "@/components/shell/columns";
import { Head, Ledger, NumberHead } from "@/components/ui/table";
import { type SeamFilter, seamAddress } from "@/lib/analytics/filter";
import type { OperationLine } from "@/lib/analytics/lines";
import type { Opened } from "@/lib/analytics/opened";
import { seamScale } from "@/lib/seam/scale";

const WIDTHS = {
  code: 4.5,
  name: 16,
  pieces: 5,
  standard: 5,
  earned: 5.5,
  gauge: 28,
  actual: 5.5,
  word: 10,
  efficiency: 7,
  trend: 9.5,
  open: 4,
};

interface LedgerProps {
  lines: readonly OperationLine[];
  filter: SeamFilter;
  /** What is behind the operation that is open, if any. */
  opened: Opened | null;
  timeZone: string;
}

/** Operations in route order on one scale; one opens by model, option, week or ticket. */
export function SeamLedger({ lines, filter, opened, timeZone }: LedgerProps) {
  const scaleSeconds = seamScale(lines.flatMap(({ pair }) => pair ?? []));
  return (
    <Ledger caption="Standard and actual by operation" tight className="mirror-ledger">
      <Columns widths={WIDTHS} />
      <thead>
        <tr>
          <Head>Op</Head>
          <Head>Operation, in route order</Head>
          <NumberHead>Pieces</NumberHead>
          <NumberHead>Std min</NumberHead>
          <NumberHead>Earned</NumberHead>
          <th scope="col">
            <span className="sr-only">Earned and actual</span>
            <SeamAxis scaleSeconds={scaleSeconds} unitShown />
          </th>
          <NumberHead>Actual</NumberHead>
          <Head>Over or under</Head>
          <NumberHead>Efficiency</NumberHead>
          <Head>8 weeks</Head>
          <th scope="col">
            <span className="sr-only">Open</span>
          </th>
        </tr>
      </thead>
      <tbody>
        {lines.map((line) => {
          const isOpen = line.key === filter.open && opened !== null;
          return (
            <Fragment key={line.key}>
              <OperationRow {...{ line, filter, isOpen, scaleSeconds }} />
              {isOpen && opened && (
                <OpenedRows
                  {...{ opened, filter, scaleSeconds, timeZone }}
                  columns={Object.keys(WIDTHS).length}
                />
              )}
            </Fragment>
          );
        })}
      </tbody>
    </Ledger>
  );
}

function OperationRow(props: {
  line: OperationLine;
  filter: SeamFilter;
  isOpen: boolean;
  scaleSeconds: number;
}) {
  const { line, filter, isOpen, scaleSeconds } = props;
  const name = line.operation?.name ?? "An operation that nobody knows";
  const href = seamAddress("/analytics/seam", filter, {
    open: isOpen ? "" : line.key,
    ticket: "",
  });
  return (
    <LineRow
      {...{ line, isOpen, scaleSeconds }}
      code={line.key}
      name={<span className="font-[650]">{name}</span>}
      spoken={name}
      isTrended
      opener={<LineOpener href={href} isOpen={isOpen} label={`What is behind ${name}`} />}
    />
  );
}
