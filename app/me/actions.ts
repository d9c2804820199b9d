"use server";

import { act, type DeedCall } from "@/app/_server/act";
import { siteOf } from "@/app/_server/site";
import { agreeDays } from "@/db/agreement/commands";
import { settleEnd } from "@/db/ends/commands";
import { bookDeed } from "@/db/ledger/office";
import { findMe } from "@/db/me/queries";
import { agreeForm } from "@/lib/agreement/schema";
import { leftForm, objectForm } from "@/lib/me/schema";
import { no, ok, type Result } from "@/lib/result";

/** Says that something about one's own day is wrong; it waits for the lead. */
export const object = act({ may: "me.answer", form: objectForm }, async (call) => {
  const own = await ownOf(call);
  if (!own.ok) return own;
  const { id, date, message } = call.input;
  const body = { kind: "object", subject: `workday:${date}` } as const;
  const acts = [{ id, worker: own.value.only, body, note: message }];
  return bookDeed(call.scope, { acts, ...own.value });
});

/** Says when one left, on a day whose end nobody tapped. */
export const tellEnd = act({ may: "me.answer", form: leftForm }, async (call) => {
  const own = await ownOf(call);
  if (!own.ok) return own;
  const { id, subject, time } = call.input;
  const told = { answer: "end-at", worker: "", reason: "said by the worker, on the phone" };
  return settleEnd(call.scope, { id, code: "no-shift-end", subject, time, ...told }, own.value);
});

/** Agrees to one's own days as they are shown. */
export const agreeToOwn = act({ may: "me.answer", form: agreeForm }, async (call) => {
  const own = await ownOf(call);
  if (!own.ok) return own;
  if (call.input.days.some(({ worker }) => worker !== own.value.only))
    return no("forbidden", "Those are not your days. Load the page again.");
  return agreeDays(call.scope, call.input, own.value);
});

/** The worker that the account is; what they enter is their own, so it has no other author. */
async function ownOf({
  person,
  scope,
  by,
}: Pick<DeedCall<unknown>, "person" | "scope" | "by">): Promise<
  Result<{
    only: string;
    by: null;
    actor: string;
    within: null;
    now: Date;
    rules: Awaited<ReturnType<typeof siteOf>>["rules"];
  }>
> {
  const me = person.workerId ? await findMe(scope, person.workerId) : null;
  if (!me) return no("forbidden", "Your account is no worker's yet. Ask an admin to join them.");
  const { rules } = await siteOf(scope.siteId);
  return ok({ only: me.number, by: null, actor: by, within: null, now: new Date(), rules });
}
