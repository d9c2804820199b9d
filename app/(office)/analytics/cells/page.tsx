import type { Metadata } from "next";
import { readSeam } from "@/app/_server/analytics";
import { personFor } from "@/app/_server/page-actor";
import { seamWish } from "@/app/_server/seam-visit";
import { siteOf } from "@/app/_server/site";
import { CellsLedger } from "@/components/analytics/cells-ledger";
import { SeamFigures } from "@/components/analytics/figures";
import { CellsSentence } from "@/components/analytics/filter-sentence";
import { SeamFoot } from "@/components/analytics/foot";
import { SeamNotes } from "@/components/analytics/notes";
import { Empty } from "@/components/ui/empty";
import { cellLines, cellTotal } from "@/lib/analytics/cells";
import { seamFilter } from "@/lib/analytics/filter";
import { overSums, seamTotals } from "@/lib/analytics/lines";
import { hoursOf } from "@/lib/analytics/words";
import { ruleAt } from "@/lib/time/site-day";

export const metadata: Metadata = { title: "Cells" };

interface CellsProps {
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}

/** What each cell attended, earned and took. Analytics stop at the cell: no person is ranked. */
export default async function CellsPage({ searchParams }: CellsProps) {
  const { scope, cells } = await personFor("analytics.see");
  const { rules } = await siteOf(scope.siteId);
  const now = new Date();
  const { from, to, basis } = seamFilter.parse(await searchParams);
  const asked = seamFilter.parse({ from, to, basis });
  const { span, filter, wanted } = seamWish(asked, { cells, rules, now });
  const { rows, board, places } = await readSeam(scope, wanted, { span, by: "cell" });
  const how = { basis, places };
  const lines = cellLines(rows, board, how);
  const totals = seamTotals(rows, board, { basis, isOfCells: true });
  const noStandard = totals[basis].noStandardSeconds;
  const { timeZone } = ruleAt(rules, now.getTime());
  return (
    <>
      <h1 className="sr-only">Cells: attendance, standard and actual</h1>
      <CellsSentence filter={filter} />
      {lines.length > 0 ? (
        <>
          <SeamFigures totals={totals} basis={basis} />
          <SeamNotes filter={filter} totals={totals} over={overSums(board.over)} />
          <CellsLedger lines={lines} total={cellTotal(rows, lines, how)} filter={filter} />
        </>
      ) : (
        <Empty>Nobody attended on these days. Choose other dates.</Empty>
      )}
      <SeamFoot
        waiting={board.waiting}
        noStandardHours={noStandard > 0 ? hoursOf(noStandard) : null}
        nowMs={now.getTime()}
        timeZone={timeZone}
      />
    </>
  );
}
