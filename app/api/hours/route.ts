import { z } from "zod";
import { database } from "@/app/_server/database";
import { handle } from "@/app/_server/handle";
import { hoursView, readCards } from "@/app/_server/hours";
import { cellsOf } from "@/lib/access/may";
import { writeCsv } from "@/lib/csv/write";
import { hoursFile } from "@/lib/hours/file";

const PAGE = 500;

/** A wish for a file is exact: a wrong date is refused rather than guessed. */
const fileQuery = z.strictObject({
  from: z.iso.date(),
  to: z.iso.date(),
  cell: z.uuid().optional(),
});

/** The hours of a range as a CSV file, a row a worker and day; a lead gets the own cells. */
export const GET = handle(
  { actor: "person", may: "hours.export", query: fileQuery },
  async ({ actor, reach, query, receivedAt }) => {
    const scope = { db: database(), siteId: actor.siteId };
    const cells = reach === "cells" ? cellsOf(actor.held) : null;
    const wish = { from: query.from, to: query.to, cell: query.cell ?? "", after: "" };
    const { range, within } = await hoursView(scope, wish, { cells, now: receivedAt });
    const cards = [];
    for (let after: string | null = null, more = true; more; ) {
      const page = await readCards(scope, range, { within, after, limit: PAGE }, receivedAt);
      cards.push(...page);
      after = page.at(-1)?.number ?? null;
      more = page.length === PAGE;
    }
    const name = `hours-${range.from}-to-${range.to}.csv`;
    return new Response(writeCsv(hoursFile(cards)), {
      headers: {
        "content-type": "text/csv; charset=utf-8",
        "content-disposition": `attachment; filename="${name}"`,
        "cache-control": "no-store",
      },
    });
  },
);
