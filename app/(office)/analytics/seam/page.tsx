import type { Metadata } from "next";
import { readOpenSeam } from "@/app/_server/analytics";
import { personFor } from "@/app/_server/page-actor";
import { seamWish } from "@/app/_server/seam-visit";
import { siteOf } from "@/app/_server/site";
import { SeamFigures } from "@/components/analytics/figures";
import { SeamSentence } from "@/components/analytics/filter-sentence";
import { SeamFoot } from "@/components/analytics/foot";
import { SeamNotes } from "@/components/analytics/notes";
import { OverLedger } from "@/components/analytics/over-ledger";
import { SeamLedger } from "@/components/analytics/seam-ledger";
import { Empty } from "@/components/ui/empty";
import { seamFilter } from "@/lib/analytics/filter";
import { operationLines, overSums, seamTotals } from "@/lib/analytics/lines";
import { hoursOf } from "@/lib/analytics/words";
import { ruleAt } from "@/lib/time/site-day";

export const metadata: Metadata = { title: "Seam" };

interface SeamProps {
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}

/** Standard against actual by operation, opened by model, option, week or ticket. */
export default async function SeamPage({ searchParams }: SeamProps) {
  const { scope, cells } = await personFor("analytics.see");
  const { rules } = await siteOf(scope.siteId);
  const now = new Date();
  const asked = seamFilter.parse(await searchParams);
  const { span, filter, wanted } = seamWish(asked, { cells, rules, now });
  const { basis, open, by, ticket, model, stage } = filter;
  const figures = await readOpenSeam(scope, wanted, {
    span,
    basis,
    open: open ? { operation: open, by, ticket } : null,
  });
  const { rows, board, places, opened } = figures;
  const lines = operationLines(rows, { operations: board.operations, basis, places });
  const totals = seamTotals(rows, board, { basis, isOfCells: !model && !stage });
  const noStandard = totals[basis].noStandardSeconds;
  const { timeZone } = ruleAt(rules, now.getTime());
  return (
    <>
      <h1 className="sr-only">Seam: standard against actual</h1>
      <SeamSentence
        filter={filter}
        models={board.models}
        cells={board.cells.map(({ name }) => name)}
        stages={[...new Set(board.operations.map((operation) => operation.stage))]}
      />
      {lines.length > 0 ? (
        <>
          <SeamFigures totals={totals} basis={basis} />
          <SeamNotes filter={filter} totals={totals} over={overSums(board.over)} />
          {filter.over && (
            <div className="seam-over">
              <OverLedger over={board.over} operations={board.operations} />
            </div>
          )}
          <SeamLedger lines={lines} filter={filter} opened={opened} timeZone={timeZone} />
        </>
      ) : (
        <Empty>
          {basis === "matched"
            ? "Nothing was finished on these days. Choose other dates, or all time booked."
            : "Nothing was booked on these days. Choose other dates or another cell."}
        </Empty>
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
