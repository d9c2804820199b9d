import { database } from "@/app/_server/database";
import { handle } from "@/app/_server/handle";
import { listPeriods } from "@/db/pay/queries";
import { pageOf } from "@/lib/api/page";
import { periodViewOf } from "@/lib/periods/period-view";
import { periodsQuery } from "@/lib/periods/schema";
import { ok } from "@/lib/result";

/** Lists pay periods, the latest first, each with what stands beside its file. */
export const GET = handle(
  { actor: "key", may: "periods.export", query: periodsQuery },
  async ({ actor, query }) => {
    const scope = { db: database(), siteId: actor.siteId };
    const before = query.cursor?.from;
    const rows = await listPeriods(scope, { before, limit: query.limit + 1 });
    const { items, nextCursor } = pageOf(rows, query.limit, ({ from }) => ({ from }));
    return ok({ items: items.map(periodViewOf), nextCursor });
  },
);
