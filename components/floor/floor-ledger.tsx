import { Fragment } from "react";
import { ElsewhereRow } from "@/components/floor/elsewhere-row";
import { type Forgotten, PersonName } from "@/components/floor/person-name";
import { WorkRow } from "@/components/floor/work-row";
import { SeamAxis } from "@/components/seam/axis";
import { Columns } from "@/components/shell/columns";
import { Head, Ledger, NumberHead } from "@/components/ui/table";
import { actualSeconds } from "@/lib/floor/actual";
import { gatherElsewhere } from "@/lib/floor/gather";
import type { FloorCell, FloorView } from "@/lib/floor/schema";
import { seamScale } from "@/lib/seam/scale";
import { clockText } from "@/lib/time/format";

const WIDTHS = { operation: 24, ticket: 9, standard: 6, gauge: 22, word: 10, who: 29 };

/** The floor cell by cell, all gauges on one scale, so that they compare. */
export function FloorLedger({
  floor,
  nowMs,
  linksTickets,
  forgotten,
}: {
  floor: FloorView;
  nowMs: number;
  linksTickets: boolean;
  forgotten: Forgotten | null;
}) {
  const now = Math.floor(nowMs / 1000);
  const pairs = floor.cells.flatMap(({ work }) =>
    work.map((each) => ({
      standardSeconds: each.standardSeconds,
      actualSeconds: actualSeconds(each, now),
    })),
  );
  const row = {
    now,
    scaleSeconds: seamScale(pairs),
    timeZone: floor.timeZone,
    linksTickets,
    forgotten,
  };
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
          <CellRow cell={cell} timeZone={floor.timeZone} forgotten={forgotten} />
          {cell.work.map((work) => (
            <WorkRow key={`${work.operation} ${work.ticket}`} work={work} {...row} />
          ))}
          {gatherElsewhere(cell.elsewhere).map((people) => (
            <ElsewhereRow key={people[0]!.worker} people={people} {...row} />
          ))}
        </tbody>
      ))}
    </Ledger>
  );
}

/** The cell's line: how many are in, and who was planned and is not. */
function CellRow({
  cell,
  timeZone,
  forgotten,
}: {
  cell: FloorCell;
  timeZone: string;
  forgotten: Forgotten | null;
}) {
  return (
    <tr data-group="">
      <th scope="rowgroup" colSpan={3} data-book="">
        {cell.cell}
      </th>
      <td aria-hidden />
      <td colSpan={2} data-day="">
        {cell.inCount} in
        {cell.missing.length > 0 && (
          <span className="text-t-2 font-medium text-ink-2">
            {" · not in: "}
            {cell.missing.map((person, place) => (
              <Fragment key={person.worker}>
                {place > 0 && "; "}
                <PersonName
                  person={person}
                  deed="shift-start"
                  proposedSecond={person.plannedAt}
                  timeZone={timeZone}
                  forgotten={forgotten}
                />
                , planned {clockText(person.plannedAt * 1000, timeZone)}
              </Fragment>
            ))}
          </span>
        )}
      </td>
    </tr>
  );
}
