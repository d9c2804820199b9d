import { sql } from "drizzle-orm";
import type { Scope } from "@/db/client";
import { type EndFound, findEnd } from "@/db/ends/queries";
import { bookDeed } from "@/db/ledger/office";
import { idFrom } from "@/db/ledger/receive";
import type { SettleForm } from "@/lib/ends/schema";
import { settlingActs } from "@/lib/ends/settle";
import { toldTime } from "@/lib/ends/told-time";
import { type EndFacts, isKept } from "@/lib/ends/ways";
import { no, ok, type Result } from "@/lib/result";
import { ruleAt } from "@/lib/time/site-day";
import type { SiteRules } from "@/lib/timeline/schema";

/** Who settles, and how far they may. */
export interface Settling {
  /** `account:<id>` where it is somebody else's time; null where it is one's own. */
  by: string | null;
  actor: string;
  within: readonly string[] | null;
  /** The number of the one worker whose own it is; left out for whoever settles for others. */
  only?: string;
  now: Date;
  rules: readonly SiteRules[];
}

/**
 * Settles a loose end: what the answer means is booked with the answer itself, its author and its
 * reason, and the time is derived again at once. Sent twice, or by two people at once, it is settled
 * once; the later of two people is told so.
 */
export async function settleEnd(
  scope: Scope,
  form: SettleForm,
  settling: Settling,
): Promise<Result<void>> {
  if (await isBooked(scope, form.id)) return ok(undefined);
  const end = await findEnd(scope, form, settling.within);
  const isOthers = settling.only !== undefined && end?.worker !== settling.only;
  if (!end || isOthers)
    return no("notFound", "That is not among your loose ends any more. Look again.");
  if (end.settled) return no("conflict", "Someone settled this meanwhile. Look at the list again.");
  const facts = endFacts(end, settling);
  const told = toldTime(form.time, facts.timeZone);
  if (!told.ok) return told;
  const acts = settlingActs(facts, { answer: form.answer, toldMs: told.value });
  if (!acts.ok) return acts;
  const isForWorker = form.answer === "take-in" && end.code === "unknown-worker";
  if (isForWorker && !form.worker) {
    const message = "Give the number of the worker whose record it is.";
    return no("invalid", message, { errors: [{ path: "worker", message }] });
  }
  const { by, actor, now, within } = settling;
  return bookDeed(scope, {
    acts: acts.value.map((body, place) => ({
      id: place === acts.value.length - 1 ? form.id : idFrom(`${form.id} ${place}`),
      worker: isForWorker ? form.worker : end.worker,
      body,
      note: form.reason,
    })),
    by,
    actor,
    now,
    within,
    answers: isKept(end.code) ? [receiptOf(end)] : [],
  });
}

function receiptOf({ code, subject, workerId, kioskId, atMs }: EndFound) {
  return { code, subject, workerId, kioskId, atMs };
}

/** What decides the ways to settle a loose end at a moment. */
function endFacts(
  end: EndFound,
  { rules, now }: { rules: readonly SiteRules[]; now: Date },
): EndFacts {
  const { code, subject, atMs, receivedMs, body, shift, planned } = end;
  const { timeZone } = ruleAt(rules, atMs);
  const facts = { code, subject, atMs, receivedMs, body, shift, planned };
  return { ...facts, timeZone, nowMs: now.getTime() };
}

async function isBooked({ db, siteId }: Scope, id: string): Promise<boolean> {
  const { rows } = await db.execute(
    sql`select 1 from event_ids where site_id = ${siteId} and id = ${id}`,
  );
  return rows.length > 0;
}
