import Link from "next/link";
import { Fragment } from "react";
import { SeamAxis } from "@/components/seam/axis";
import { SeamGauge } from "@/components/seam/gauge";
import { VerdictTag } from "@/components/seam/verdict-tag";
import { Columns } from "@/components/shell/columns";
import { SheetLineRow } from "@/components/tickets/sheet-line-row";
import { Icon } from "@/components/ui/icon";
import { Head, Ledger, NumberCell, NumberHead } from "@/components/ui/table";
import { seamScale } from "@/lib/seam/scale";
import { actualMinutes, standardMinutes } from "@/lib/seam/verdict";
import type { Sheet, SheetOperation } from "@/lib/tickets/sheet";

const WIDTHS = {
  code: 6,
  name: 18,
  cell: 8,
  standard: 6,
  gauge: 24,
  actual: 6,
  word: 10,
  pieces: 9,
  state: 13,
};

/** The operations of a ticket in route order on one scale; one opens to all that is behind it. */
export function OperationsLedger({
  sheet,
  open,
  path,
  timeZone,
}: {
  sheet: Sheet;
  /** The code of the operation that is open, if any. */
  open: string | undefined;
  path: string;
  timeZone: string;
}) {
  const scaleSeconds = seamScale(sheet.operations.map(({ pair }) => pair));
  return (
    <Ledger caption="Operations in route order" className="mirror-ledger">
      <Columns widths={WIDTHS} />
      <thead>
        <tr>
          <Head>Op</Head>
          <Head>Operation, in route order</Head>
          <Head>Cell</Head>
          <NumberHead>Std min</NumberHead>
          <th scope="col">
            <span className="sr-only">Standard and actual</span>
            <SeamAxis scaleSeconds={scaleSeconds} unitShown />
          </th>
          <NumberHead>Actual</NumberHead>
          <Head>Over or under</Head>
          <Head>Pieces</Head>
          <Head>State</Head>
        </tr>
      </thead>
      <tbody>
        {sheet.operations.map((operation) => (
          <Fragment key={operation.operation}>
            <OperationRow
              operation={operation}
              isOpen={operation.operation === open}
              path={path}
              scaleSeconds={scaleSeconds}
            />
            {operation.operation === open && (
              <OpenLines operation={operation} timeZone={timeZone} />
            )}
          </Fragment>
        ))}
      </tbody>
    </Ledger>
  );
}

function OperationRow({
  operation,
  isOpen,
  path,
  scaleSeconds,
}: {
  operation: SheetOperation;
  isOpen: boolean;
  path: string;
  scaleSeconds: number;
}) {
  const { pair, state, lines, onIt } = operation;
  const isFinished = state === "finished" || state === "closed";
  const isTouched = pair.actualSeconds > 0 || isFinished;
  return (
    <tr data-open={isOpen ? "" : undefined}>
      <td data-book="" className="code text-ink-2">
        {operation.operation}
      </td>
      <td data-book="" className="desk-wrap">
        <span className="font-[650]">{operation.name}</span>
      </td>
      <td data-book="" className="text-ink-2">
        {operation.cell}
      </td>
      <NumberCell data-book="" data-standard="" data-label="std min">
        {pair.standardSeconds === null ? "none" : standardMinutes(pair.standardSeconds)}
      </NumberCell>
      <td data-gauge="">
        <SeamGauge
          {...pair}
          flush
          state={isFinished ? "finished" : "live"}
          scaleSeconds={scaleSeconds}
          name={operation.name}
        />
      </td>
      <NumberCell data-day="" data-actual="" data-label="actual">
        {pair.actualSeconds > 0 && actualMinutes(pair.actualSeconds)}
      </NumberCell>
      <td data-day="">{isTouched && <VerdictTag pair={pair} finished={isFinished} />}</td>
      <td data-day="">{piecesOf(operation)}</td>
      <td data-day="" className="desk-cut">
        <span className="flex items-center justify-between">
          {onIt.length > 0 ? `${onIt.join(", ")} on it` : state}
          {lines.length > 0 && (
            <Link
              href={isOpen ? path : `${path}?open=${operation.operation}`}
              scroll={false}
              className="desk-opener"
              aria-expanded={isOpen}
              aria-label={`Who worked on ${operation.name}, ${lines.length} records`}
            >
              <Icon name={isOpen ? "up" : "down"} />
            </Link>
          )}
        </span>
      </td>
    </tr>
  );
}

function OpenLines({ operation, timeZone }: { operation: SheetOperation; timeZone: string }) {
  return operation.lines.map((line) => (
    <SheetLineRow
      key={`${line.line} ${line.line === "segment" ? line.start : line.at} ${line.worker?.worker}`}
      line={line}
      timeZone={timeZone}
    />
  ));
}

function piecesOf({ good, rework, scrap, openQuantity }: SheetOperation): string {
  const counts = [
    good > 0 && `${good} good`,
    rework > 0 && `${rework} rework`,
    scrap > 0 && `${scrap} scrap`,
    good + rework + scrap > 0 && openQuantity > 0 && `${openQuantity} open`,
  ];
  return counts.filter(Boolean).join(", ");
}
