import { database } from "@/app/_server/database";
import { handle } from "@/app/_server/handle";
import { payFileResponse } from "@/app/_server/pay-file";
import { exportQuery } from "@/lib/periods/schema";

/** A closed period's hours as a file: the same bytes for ever, with their digest in the head. */
export const GET = handle(
  { actor: "key", may: "periods.export", query: exportQuery },
  async ({ actor, params, query, receivedAt }) => {
    const scope = { db: database(), siteId: actor.siteId };
    const asked = { ...query, periodId: params.id ?? "", by: `key:${actor.keyId}` };
    return payFileResponse(scope, { ...asked, now: receivedAt });
  },
);
