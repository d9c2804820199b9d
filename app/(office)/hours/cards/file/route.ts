import { z } from "zod";
import { database } from "@/app/_server/database";
import { handle } from "@/app/_server/handle";
import { payFileResponse } from "@/app/_server/pay-file";
import { exportQuery } from "@/lib/periods/schema";

/** The file of a closed period, as the page offers it. */
export const GET = handle(
  { actor: "person", may: "periods.export", query: exportQuery.extend({ period: z.uuid() }) },
  async ({ actor, query: { period: periodId, ...query }, receivedAt }) => {
    const scope = { db: database(), siteId: actor.siteId };
    const by = `account:${actor.accountId}`;
    return payFileResponse(scope, { ...query, periodId, by, now: receivedAt });
  },
);
