import Link from "next/link";
import { Trend } from "@/components/analytics/trend";
import { SeamAxis } from "@/components/seam/axis";
import { SeamGauge } from "@/components/seam/gauge";
import { hourWords, VerdictTag } from "@/components/seam/verdict-tag";
import { Columns } from "@/components/shell/columns";
import { Head, Ledger, NumberCell, NumberHead } from "@/components/ui/table";
import type { CellLine } from "@/lib/analytics/cells";
import { type SeamFilter, seamAddress } from "@/lib/analytics/filter";
import { hoursOf, percentOf } from "@/lib/analytics/words";
import { seamScale } from "@/lib/seam/scale";

const WIDTHS = {
  cell: 12,
  attended: 7,
  indirect: 6,
  rest: 4.5,
  unassigned: 7,
  earned: 6.5,
  gauge: 14,
  actual: 5,
  word: 9,
  efficiency: 5,
  without: 4.9,
  rework: 6,
  utilization: 3.8,
  productivity: 3.8,
  trend: 5.5,
};

/** Cells on one scale, with what their attendance was made of. Analytics stop at the cell. */
export function CellsLedger({
  lines,
  total,
  filter,
}: {
  lines: readonly CellLine[];
  total: CellLine;
  filter: SeamFilter;
}) {
  const scaleSeconds = seamScale(lines.flatMap(({ line }) => line.pair ?? []));
  return (
    <Ledger
      caption="Attendance, standard and actual by cell"
      className="mirror-ledger cells-ledger"
    >
      <Columns widths={WIDTHS} />
      <thead>
        <tr>
          <Head>Cell</Head>
          <NumberHead>Attended</NumberHead>
          <NumberHead>Indirect</NumberHead>
          <NumberHead>Rest</NumberHead>
          <NumberHead>Unassigned</NumberHead>
          <NumberHead>Earned</NumberHead>
          <th scope="col">
            <span className="sr-only">Earned and actual</span>
            <SeamAxis scaleSeconds={scaleSeconds} unitShown className="axis-sparse" />
          </th>
          <NumberHead>Actual</NumberHead>
          <Head>Over or under</Head>
          <NumberHead>Efficiency</NumberHead>
          <NumberHead title="Efficiency without rework">No rework</NumberHead>
          <NumberHead title="Hours of rework; in brackets what another cell caused">
            Rework
          </NumberHead>
          <NumberHead title="Utilization: direct ÷ attended">Util.</NumberHead>
          <NumberHead title="Productivity: earned ÷ attended">Prod.</NumberHead>
          <Head>8 weeks</Head>
        </tr>
      </thead>
      <tbody>
        {lines.map((cell) => (
          <CellRow key={cell.name} {...{ cell, filter, scaleSeconds }} links />
        ))}
        <CellRow cell={total} filter={filter} scaleSeconds={scaleSeconds} links={false} />
      </tbody>
    </Ledger>
  );
}

interface RowProps {
  cell: CellLine;
  filter: SeamFilter;
  scaleSeconds: number;
  /** False for the sum of all: it has no line of its own to open, and no place on the scale. */
  links: boolean;
}

function CellRow({ cell, filter, scaleSeconds, links }: RowProps) {
  const { name, time, line } = cell;
  const href = seamAddress("/analytics/seam", filter, { cell: name });
  const { reworkSeconds, elsewhereSeconds } = line.work;
  return (
    <tr data-sum={links ? undefined : ""}>
      <td data-book="" className="desk-cut">
        <b>{links ? <Link href={href}>{name}</Link> : name}</b>
      </td>
      <NumberCell data-book="" data-label="attended">
        {hoursOf(time.attendanceSeconds)}
      </NumberCell>
      <NumberCell data-book="" data-label="indirect">
        {hoursOf(time.indirectSeconds)}
      </NumberCell>
      <NumberCell data-book="" data-label="rest">
        {hoursOf(time.restSeconds)}
      </NumberCell>
      <NumberCell data-book="" data-label="unassigned">
        {hoursOf(time.unassignedSeconds)}
      </NumberCell>
      <NumberCell data-book="" data-standard="" data-label="earned">
        {hoursOf(line.work.earnedSeconds)}
      </NumberCell>
      <td data-gauge="">
        {links && line.pair && (
          <SeamGauge
            {...line.pair}
            flush
            size="cell"
            scaleSeconds={scaleSeconds}
            words={hourWords}
            name={name}
          />
        )}
      </td>
      <NumberCell data-day="" data-actual="" data-label="actual">
        {hoursOf(line.pair?.actualSeconds ?? 0)}
      </NumberCell>
      <td data-day="">{line.pair && <VerdictTag pair={line.pair} finished words={hourWords} />}</td>
      <NumberCell data-day="" data-label="efficiency">
        <b>{percentOf(line.efficiency)}</b>
      </NumberCell>
      <NumberCell data-day="" data-label="without rework">
        {percentOf(cell.withoutRework)}
      </NumberCell>
      <NumberCell data-day="" data-label="rework">
        {hoursOf(reworkSeconds)}
        {elsewhereSeconds > 0 && ` (${hoursOf(elsewhereSeconds)})`}
      </NumberCell>
      <NumberCell data-day="" data-label="utilization">
        {percentOf(cell.utilization)}
      </NumberCell>
      <NumberCell data-day="" data-label="productivity">
        {percentOf(cell.productivity)}
      </NumberCell>
      <td data-day="">
        <Trend values={line.trend} />
      </td>
    </tr>
  );
}
