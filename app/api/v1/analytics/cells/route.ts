import { readSeam } from "@/app/_server/analytics";
import { database } from "@/app/_server/database";
import { handle } from "@/app/_server/handle";
import { siteOf } from "@/app/_server/site";
import { cellsAnswerOf } from "@/lib/analytics/answer";
import { cellLines, cellTotal } from "@/lib/analytics/cells";
import { decideSpan } from "@/lib/analytics/range";
import { cellsQuery } from "@/lib/analytics/schema";
import { ok } from "@/lib/result";
import { productionDay } from "@/lib/time/site-day";

/** Attendance, standard and actual by cell: the figures of the cells page. */
export const GET = handle(
  { actor: "key", may: "analytics.read", query: cellsQuery },
  async ({ actor, query, receivedAt }) => {
    const scope = { db: database(), siteId: actor.siteId };
    const { rules } = await siteOf(actor.siteId);
    const span = decideSpan(query, productionDay(receivedAt.getTime(), rules));
    if (!span.ok) return span;
    const { basis } = query;
    const figures = await readSeam(scope, { cells: null }, { span: span.value, by: "cell" });
    const { rows, board, places } = figures;
    const lines = cellLines(rows, board, { basis, places });
    return ok(cellsAnswerOf(lines, cellTotal(rows, lines, { basis, places })));
  },
);
