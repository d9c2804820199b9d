"use server";

import { act } from "@/app/_server/act";
import { siteOf } from "@/app/_server/site";
import { agreeDays } from "@/db/agreement/commands";
import { agreeForm } from "@/lib/agreement/schema";

/** Agrees to the days of cards of one's own cells, as they were shown. */
export const agree = act(
  { may: "hours.agree", form: agreeForm },
  async ({ scope, cells, input, by }) => {
    const { rules } = await siteOf(scope.siteId);
    return agreeDays(scope, input, { by, actor: by, within: cells, now: new Date(), rules });
  },
);
