import Link from "next/link";
import { plannedWords } from "@/components/hours/planned-words";
import { SeamAxis } from "@/components/seam/axis";
import { SeamGauge } from "@/components/seam/gauge";
import { Columns } from "@/components/shell/columns";
import { Icon } from "@/components/ui/icon";
import { Head, Ledger, NumberCell, NumberHead } from "@/components/ui/table";
import type { HoursCard } from "@/lib/hours/cards";
import { addHundredths, type Hundredths, hoursText } from "@/lib/hours/decimals";
import type { DayRange } from "@/lib/hours/range";
import { seamScale } from "@/lib/seam/scale";
import { sum } from "@/lib/sum";

const WIDTHS = {
  number: 6,
  name: 16,
  cell: 9,
  planned: 7,
  gauge: 24,
  attended: 6,
  direct: 6,
  indirect: 6,
  rest: 5,
  unassigned: 6,
  meal: 5,
  ends: 4,
};

/** A worker's line: hours, what was planned, and how much is still open. */
export interface HoursLine {
  card: HoursCard;
  plannedSeconds: number;
  looseEnds: number;
}

/** Hours of a range, a line a worker; every row and column adds up to the hundredth. */
export function HoursLedger({ rows, range }: { rows: readonly HoursLine[]; range: DayRange }) {
  const pairs = rows.map(pairOf);
  const scaleSeconds = seamScale(pairs);
  const total = addHundredths(rows.map(({ card }) => card.decimals.total));
  const plannedSeconds = sum(rows.map((row) => row.plannedSeconds));
  return (
    <Ledger caption="Hours by worker" tight className="mirror-ledger">
      <Columns widths={WIDTHS} />
      <thead>
        <tr>
          <NumberHead>No</NumberHead>
          <Head>Worker</Head>
          <Head>Home cell</Head>
          <NumberHead>Planned</NumberHead>
          <th scope="col">
            <span className="sr-only">Planned shifts and time from shift start to end</span>
            <SeamAxis scaleSeconds={scaleSeconds} unitShown />
          </th>
          <NumberHead>Attended</NumberHead>
          <NumberHead>Direct</NumberHead>
          <NumberHead>Indirect</NumberHead>
          <NumberHead>Rest</NumberHead>
          <NumberHead>On nothing</NumberHead>
          <NumberHead>Meals</NumberHead>
          <Head>
            <span className="sr-only">To look at</span>
          </Head>
        </tr>
      </thead>
      <tbody>
        {rows.map((row) => (
          <HoursRow key={row.card.number} row={row} range={range} scaleSeconds={scaleSeconds} />
        ))}
      </tbody>
      <tfoot>
        <tr>
          <th scope="row" colSpan={3} data-book="">
            {rows.length === 1 ? "1 worker" : `${rows.length} people`}
          </th>
          <NumberCell data-book="" data-standard="">
            {hours(plannedSeconds)}
          </NumberCell>
          <td data-gauge="" aria-hidden />
          <HourCells hours={total} />
          <td data-day="" />
        </tr>
      </tfoot>
    </Ledger>
  );
}

function HoursRow({
  row,
  range,
  scaleSeconds,
}: {
  row: HoursLine;
  range: DayRange;
  scaleSeconds: number;
}) {
  const { card, plannedSeconds, looseEnds } = row;
  const path = `/hours/${card.number}?${new URLSearchParams({ ...range })}`;
  return (
    <tr>
      <td data-book="" data-number="" className="code text-ink-2">
        {card.number}
      </td>
      <td data-book="" className="desk-cut">
        <Link href={path} className="font-[650]">
          {card.name}
        </Link>
      </td>
      <td data-book="" className="desk-cut">
        {card.cell}
      </td>
      <NumberCell data-book="" data-standard="" data-label="planned">
        {plannedSeconds > 0 && hours(plannedSeconds)}
      </NumberCell>
      <td data-gauge="">
        <SeamGauge
          {...pairOf(row)}
          size="cell"
          flush
          scaleSeconds={scaleSeconds}
          words={plannedWords}
          name={card.name}
        />
      </td>
      <HourCells hours={card.decimals.total} />
      <td data-day="">
        {looseEnds > 0 && (
          <span className="tag text-danger" title={`${looseEnds} to look at`}>
            <Icon name="loose" />
            {looseEnds}
            <span className="sr-only"> to look at</span>
          </span>
        )}
      </td>
    </tr>
  );
}

/** The hours of a line, from attended to meals; nothing is left blank where it is nothing. */
export function HourCells({ hours: of }: { hours: Hundredths }) {
  return (
    <>
      <NumberCell data-day="" data-actual="" data-label="attended">
        {hoursText(of.attended)}
      </NumberCell>
      <NumberCell data-day="" data-label="direct">
        {shown(of.direct)}
      </NumberCell>
      <NumberCell data-day="" data-label="indirect">
        {shown(of.indirect)}
      </NumberCell>
      <NumberCell data-day="" data-label="rest">
        {shown(of.rest)}
      </NumberCell>
      <NumberCell data-day="" data-label="on nothing">
        {shown(of.unassigned)}
      </NumberCell>
      <NumberCell data-day="" data-label="meals" className="text-ink-2">
        {shown(of.meal)}
      </NumberCell>
    </>
  );
}

const shown = (hundredths: number) => (hundredths > 0 ? hoursText(hundredths) : null);

const hours = (seconds: number) => (seconds / 3600).toFixed(2);

/** Like for like: planned from start to end, and the time from shift start to shift end. */
function pairOf({ card, plannedSeconds }: HoursLine) {
  return {
    standardSeconds: plannedSeconds > 0 ? plannedSeconds : null,
    actualSeconds: card.total.attendedSeconds + card.total.mealSeconds,
  };
}
