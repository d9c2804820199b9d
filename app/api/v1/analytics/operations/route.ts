import { readSeam } from "@/app/_server/analytics";
import { database } from "@/app/_server/database";
import { handle } from "@/app/_server/handle";
import { siteOf } from "@/app/_server/site";
import { operationsAnswerOf } from "@/lib/analytics/answer";
import { operationLines } from "@/lib/analytics/lines";
import { decideSpan } from "@/lib/analytics/range";
import { operationsQuery } from "@/lib/analytics/schema";
import { ok } from "@/lib/result";
import { productionDay } from "@/lib/time/site-day";

/** Standard against actual by operation: the figures of the seam page. */
export const GET = handle(
  { actor: "key", may: "analytics.read", query: operationsQuery },
  async ({ actor, query, receivedAt }) => {
    const scope = { db: database(), siteId: actor.siteId };
    const { rules } = await siteOf(actor.siteId);
    const span = decideSpan(query, productionDay(receivedAt.getTime(), rules));
    if (!span.ok) return span;
    const { basis, cell, model } = query;
    const wanted = { cells: null, cell, model };
    const { rows, board, places } = await readSeam(scope, wanted, {
      span: span.value,
      by: "operation",
    });
    const { operations } = board;
    return ok(operationsAnswerOf(operationLines(rows, { operations, basis, places })));
  },
);
