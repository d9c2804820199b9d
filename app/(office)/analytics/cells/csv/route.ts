import { readSeam } from "@/app/_server/analytics";
import { csvResponse } from "@/app/_server/csv-response";
import { database } from "@/app/_server/database";
import { handle } from "@/app/_server/handle";
import { seamWish } from "@/app/_server/seam-visit";
import { siteOf } from "@/app/_server/site";
import { cellsOf } from "@/lib/access/may";
import { cellLines, cellTotal } from "@/lib/analytics/cells";
import { cellsCsv } from "@/lib/analytics/csv";
import { seamFilter } from "@/lib/analytics/filter";

/** The table of the cells page as a file. */
export const GET = handle(
  { actor: "person", may: "analytics.see", query: seamFilter },
  async ({ actor, reach, query, receivedAt }) => {
    const { siteId, held } = actor;
    const { rules } = await siteOf(siteId);
    const cells = reach === "site" ? null : cellsOf(held);
    const { span, filter, wanted } = seamWish(query, { cells, rules, now: receivedAt });
    const { basis, from, to } = filter;
    const scope = { db: database(), siteId };
    const { rows, board, places } = await readSeam(
      scope,
      { cells: wanted.cells },
      { span, by: "cell" },
    );
    const how = { basis, places };
    const lines = cellLines(rows, board, how);
    return csvResponse(`cells-${from}-to-${to}`, cellsCsv(lines, cellTotal(rows, lines, how)));
  },
);
