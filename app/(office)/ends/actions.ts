"use server";

import { act } from "@/app/_server/act";
import { siteOf } from "@/app/_server/site";
import { settleEnd } from "@/db/ends/commands";
import { settleForm } from "@/lib/ends/schema";

/** Settles a loose end of one's own cells, or of the site, with a reason. */
export const settle = act(
  { may: "ends.settle", form: settleForm },
  async ({ scope, cells, input, by }) => {
    const { rules } = await siteOf(scope.siteId);
    return settleEnd(scope, input, { by, actor: by, within: cells, now: new Date(), rules });
  },
);
