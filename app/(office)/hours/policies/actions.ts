"use server";

import { act } from "@/app/_server/act";
import { siteOf } from "@/app/_server/site";
import { addPolicyVersion, choosePolicy as choose, setRhythm as set } from "@/db/pay/commands";
import { choiceForm, policyForm, rhythmForm } from "@/lib/policies/schema";
import { localDate, ruleAt } from "@/lib/time/site-day";

/** Adds a version of a pay policy. */
export const addPolicy = act(
  { may: "policies.change", form: policyForm },
  async ({ scope, input, by, person }) => addPolicyVersion(scope, input, { by, name: person.name }),
);

/** Puts the site or one worker under a policy. */
export const choosePolicy = act(
  { may: "policies.change", form: choiceForm },
  async ({ scope, input, by, person }) => choose(scope, input, { by, name: person.name }),
);

/** Says how the site parts its time into pay periods. */
export const setRhythm = act(
  { may: "policies.change", form: rhythmForm },
  async ({ scope, input, by, person }) => {
    const nowMs = Date.now();
    const { rules } = await siteOf(scope.siteId);
    const today = localDate(nowMs, ruleAt(rules, nowMs).timeZone);
    return set(scope, input, { by, name: person.name, today });
  },
);
