import { readOpenSeam } from "@/app/_server/analytics";
import { csvResponse } from "@/app/_server/csv-response";
import { database } from "@/app/_server/database";
import { handle } from "@/app/_server/handle";
import { seamWish } from "@/app/_server/seam-visit";
import { siteOf } from "@/app/_server/site";
import { cellsOf } from "@/lib/access/may";
import { openedCsv, operationsCsv, overCsv, segmentsCsv } from "@/lib/analytics/csv";
import { seamFilter } from "@/lib/analytics/filter";
import { operationLines } from "@/lib/analytics/lines";

/** The table that the seam page's filter has open, as a file; without any, the operations. */
export const GET = handle(
  { actor: "person", may: "analytics.see", query: seamFilter },
  async ({ actor, reach, query, receivedAt }) => {
    const { siteId, held } = actor;
    const { rules } = await siteOf(siteId);
    const cells = reach === "site" ? null : cellsOf(held);
    const { span, filter, wanted } = seamWish(query, { cells, rules, now: receivedAt });
    const { basis, open, by, ticket, over } = filter;
    const { rows, board, places, opened } = await readOpenSeam({ db: database(), siteId }, wanted, {
      span,
      basis,
      open: open ? { operation: open, by, ticket } : null,
    });
    const name = (what: string) => `${what}-${filter.from}-to-${filter.to}`;
    if (over) return csvResponse("over-standard", overCsv(board.over));
    if (opened && ticket) return csvResponse(name("time"), segmentsCsv(opened.segments));
    if (opened) return csvResponse(name(`seam-by-${by}`), openedCsv(by, opened.lines));
    const { operations } = board;
    const lines = operationLines(rows, { operations, basis, places });
    return csvResponse(name("seam"), operationsCsv(lines));
  },
);
