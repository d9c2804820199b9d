"use server";

import { act } from "@/app/_server/act";
import { siteOf } from "@/app/_server/site";
import { closePeriod as close, reopenPeriod as reopen } from "@/db/pay/close";
import { closeForm } from "@/lib/periods/schema";
import { reopenForm } from "@/lib/policies/schema";
import { ruleAt } from "@/lib/time/site-day";

/** Closes a pay period for good. */
export const closePeriod = act(
  { may: "periods.close", form: closeForm },
  async ({ scope, input, by, person }) => {
    const now = new Date();
    const { rules } = await siteOf(scope.siteId);
    const { timeZone } = ruleAt(rules, now.getTime());
    const { period: periodId, ...said } = input;
    return close(scope, { periodId, timeZone, now, ...said }, { by, name: person.name });
  },
);

/** Takes a closing back, with the reason. */
export const reopenPeriod = act(
  { may: "periods.close", form: reopenForm },
  async ({ scope, input, by, person }) => {
    const { period: periodId, reason } = input;
    return reopen(scope, { periodId, reason }, { by, name: person.name });
  },
);
