"use server";

import { redirect } from "next/navigation";
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
    const asked = { periodId, timeZone, now, ...said };
    const closed = await close(scope, asked, { by, name: person.name });
    // the page by itself would go on to the next open period
    if (closed.ok) redirect(`/hours/cards?${new URLSearchParams({ period: periodId })}`);
    return closed;
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
