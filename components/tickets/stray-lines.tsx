import { Columns } from "@/components/shell/columns";
import { SheetLineRow } from "@/components/tickets/sheet-line-row";
import { GroupRow, Ledger } from "@/components/ui/table";
import type { SheetLine } from "@/lib/tickets/sheet";

const WIDTHS = { code: 6, name: 18, number: 8, what: 6, when: 24, actual: 6, said: 19, cell: 13 };

/** What was booked on operations that the ticket does not have: kept, and shown apart. */
export function StrayLines({ lines, timeZone }: { lines: readonly SheetLine[]; timeZone: string }) {
  return (
    <Ledger caption="Booked on other operations" className="mirror-ledger">
      <Columns widths={WIDTHS} />
      <tbody>
        <GroupRow columns={8}>Booked on operations that this ticket does not have</GroupRow>
        {lines.map((line) => (
          <SheetLineRow
            key={`${line.operation} ${line.line === "segment" ? line.start : line.at}`}
            line={line}
            timeZone={timeZone}
          />
        ))}
      </tbody>
    </Ledger>
  );
}
