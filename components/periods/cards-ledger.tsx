import type { ReactNode } from "react";
import { CardRow } from "@/components/periods/card-row";
import { SeamAxis } from "@/components/seam/axis";
import { Columns } from "@/components/shell/columns";
import { GroupRow, Head, Ledger, NumberHead } from "@/components/ui/table";
import type { CardLine } from "@/lib/periods/cards-view";
import type { CardsFilter } from "@/lib/periods/schema";
import { seamScale } from "@/lib/seam/scale";

const WIDTHS = {
  number: 5,
  worker: 17,
  cell: 11,
  planned: 7,
  gauge: 20,
  tapped: 5.5,
  paid: 5.5,
  overtime: 6,
  double: 5,
  look: 10,
  self: 2.5,
  lead: 2.5,
  open: 3,
};
const COLUMNS = Object.keys(WIDTHS).length;

const groups = [
  ["to look at", "To look at", "settle these first"],
  ["agreed", "Agreed", "the lead has signed every day"],
  ["closed", "Closed", "as it was frozen"],
] as const;

/** The cards of a period on one scale, those to look at first; the one that is open shows its days. */
export function CardsLedger({
  lines,
  filter,
  days,
}: {
  lines: readonly CardLine[];
  filter: CardsFilter;
  /** The rows of the card that is open; null where none is. */
  days: ReactNode;
}) {
  const scaleSeconds = seamScale(
    lines.map(({ plannedSeconds, tappedSeconds }) => ({
      standardSeconds: plannedSeconds,
      actualSeconds: tappedSeconds,
    })),
  );
  return (
    <Ledger caption="Cards of the period" className="mirror-ledger" tight>
      <Columns widths={WIDTHS} />
      <thead>
        <tr>
          <Head>No</Head>
          <Head>Worker</Head>
          <Head>Home cell</Head>
          <NumberHead>Planned</NumberHead>
          <th scope="col">
            <span className="sr-only">Planned and tapped</span>
            <SeamAxis scaleSeconds={scaleSeconds} unitShown />
          </th>
          <NumberHead>Tapped</NumberHead>
          <NumberHead>Paid</NumberHead>
          <NumberHead>Overtime</NumberHead>
          <NumberHead>Double</NumberHead>
          <Head>To look at</Head>
          <Head>Self</Head>
          <Head>Lead</Head>
          <th scope="col">
            <span className="sr-only">Days</span>
          </th>
        </tr>
      </thead>
      {groups.map(([state, name, note]) => {
        const own = lines.filter((line) => line.state === state);
        return (
          own.length > 0 && (
            <tbody key={state}>
              <GroupRow columns={COLUMNS} note={note}>
                {name}, {own.length}
              </GroupRow>
              {own.map((line) => (
                <CardRow
                  key={line.worker.id}
                  line={line}
                  filter={filter}
                  scaleSeconds={scaleSeconds}
                  days={line.worker.number === filter.worker ? days : null}
                />
              ))}
            </tbody>
          )
        );
      })}
    </Ledger>
  );
}
