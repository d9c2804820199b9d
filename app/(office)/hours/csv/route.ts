import { database } from "@/app/_server/database";
import { handle } from "@/app/_server/handle";
import { hoursWanted } from "@/app/_server/hours";
import { sumHours } from "@/db/hours/queries";
import { cellsOf } from "@/lib/access/may";
import { hoursCsv } from "@/lib/hours/csv";
import { hoursFilter } from "@/lib/hours/filter";
import { hoursSheet } from "@/lib/hours/sheet";

/** The hours that the page shows, as a file: a row for each worker and day. */
export const GET = handle(
  { actor: "person", may: "hours.export", query: hoursFilter },
  async ({ actor, reach, query, receivedAt }) => {
    const { siteId, workerId, held } = actor;
    const asker = { siteId, workerId, reach: reach ?? ("self" as const), cells: cellsOf(held) };
    const { wanted, range } = await hoursWanted(asker, query, receivedAt);
    const scope = { db: database(), siteId };
    const rows = await sumHours(scope, { ...wanted, limit: null });
    return new Response(hoursCsv(hoursSheet(rows)), {
      headers: {
        "content-type": "text/csv; charset=utf-8",
        "content-disposition": `attachment; filename="hours-${range.from}-to-${range.to}.csv"`,
        "cache-control": "no-store",
      },
    });
  },
);
