"use server";

import { act } from "@/app/_server/act";
import { siteOf } from "@/app/_server/site";
import { correctRecord, enterShift } from "@/db/records/commands";
import { recordForm, shiftForm } from "@/lib/records/schema";

/** Starts or ends a shift for someone of one's own cells who forgot. */
export const enterForgotten = act(
  { may: "records.correct", form: shiftForm },
  async ({ scope, cells, input, by }) => {
    const { rules } = await siteOf(scope.siteId);
    return enterShift(scope, input, { by, actor: by, within: cells, now: new Date(), rules });
  },
);

/** Moves a record of someone of one's own cells to its right time, or takes it out. */
export const correct = act(
  { may: "records.correct", form: recordForm },
  async ({ scope, cells, input, by }) => {
    const { rules } = await siteOf(scope.siteId);
    return correctRecord(scope, input, { by, actor: by, within: cells, now: new Date(), rules });
  },
);
