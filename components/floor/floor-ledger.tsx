import { ElsewhereRow } from "@/components/floor/elsewhere-row";
import { WorkRow } from "@/components/floor/work-row";
import { SeamAxis } from "@/components/seam/axis";
import { Columns } from "@/components/shell/columns";
import { Head, Ledger, NumberHead } from "@/components/ui/table";
import { actualSeconds } from "@/lib/floor/actual";
import type { FloorCell, FloorView } from "@/lib/floor/schema";
import { seamScale } from "@/lib/seam/scale";
import { clockText } from "@/lib/time/format";

const WIDTHS = { operation: 21, ticket: 9, standard: 7, gauge: 26, word: 11, who: 26 };

/** The floor cell by cell, all gauges on one scale, so that they compare. */
export function FloorLedger({
  floor,
  nowMs,
  linksTickets,
}: {
  floor: FloorView;
  nowMs: number;
  linksTickets: boolean;
}) {
  const now = Math.floor(nowMs / 1000);
  const pairs = floor.cells.flatMap(({ work }) =>
    work.map((each) => ({
      standardSeconds: each.standardSeconds,
      actualSeconds: actualSeconds(each, now),
    })),
  );
  const row = { now, scaleSeconds: seamScale(pairs), timeZone: floor.timeZone, linksTickets };
  return (
    <Ledger caption="Who is on what, by cell" className="mirror-ledger">
      <Columns widths={WIDTHS} />
      <thead>
        <tr>
          <Head>Operation</Head>
          <Head>Ticket</Head>
          <NumberHead>Std min</NumberHead>
          <th scope="col">
            <span className="sr-only">Standard and actual</span>
            <SeamAxis scaleSeconds={row.scaleSeconds} unitShown />
          </th>
          <Head>Over or left</Head>
          <Head>On it, since</Head>
        </tr>
      </thead>
      {floor.cells.map((cell) => (
        <tbody key={cell.cell}>
          <CellRow cell={cell} timeZone={floor.timeZone} />
          {cell.work.map((work) => (
            <WorkRow key={`${work.operation} ${work.ticket}`} work={work} {...row} />
          ))}
          {cell.elsewhere.map((person) => (
            <ElsewhereRow key={person.worker} person={person} {...row} />
          ))}
        </tbody>
      ))}
    </Ledger>
  );
}

/** The cell's line: how many are in, and who was planned and is not. */
function CellRow({ cell, timeZone }: { cell: FloorCell; timeZone: string }) {
  const missing = cell.missing.map(
    ({ name, plannedAt }) => `${name}, planned ${clockText(plannedAt * 1000, timeZone)}`,
  );
  return (
    <tr data-group="">
      <th scope="rowgroup" colSpan={3} data-book="">
        {cell.cell}
      </th>
      <td aria-hidden />
      <td colSpan={2} data-day="">
        {cell.inCount} in
        {missing.length > 0 && (
          <span className="text-t-2 font-medium text-ink-2"> · not in: {missing.join("; ")}</span>
        )}
      </td>
    </tr>
  );
}
