"use server";

import { redirect } from "next/navigation";
import { act } from "@/app/_server/act";
import { siteOf } from "@/app/_server/site";
import { standardsAddress } from "@/components/standards/address";
import { setStandard as setStandardRow } from "@/db/standards/commands";
import { entryOf, formErrors } from "@/lib/replay/drafted";
import { no } from "@/lib/result";
import { standardForm } from "@/lib/standards/schema";

/**
 * Sets the standard that was drafted; a row is added, and none is changed. Then the page says so:
 * what was drafted stands now, and would be no change any more.
 */
export const setStandard = act(
  { may: "standards.set", form: standardForm },
  async ({ scope, input, by }) => {
    const { id, ...form } = input;
    const { rules } = await siteOf(scope.siteId);
    const hand = { by, now: new Date(), rules };
    const set = await setStandardRow(scope, { id, ...entryOf(form) }, hand);
    if (set.ok) {
      const { model, operation: op, option } = form;
      redirect(standardsAddress({ model, op, option: option ?? "", set: id }));
    }
    const { code, detail, errors } = set.problem;
    return no(code, detail, errors ? { errors: formErrors(errors) } : {});
  },
);
