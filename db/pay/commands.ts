import { and, desc, eq, sql } from "drizzle-orm";
import { v7 as uuidv7 } from "uuid";
import { recordAct } from "@/db/audit/commands";
import type { Scope } from "@/db/client";
import { findRhythm, readPolicyBook } from "@/db/pay/queries";
import { payChoices, payPeriods, payPolicies, payRhythms } from "@/db/pay/tables";
import { workers } from "@/db/people/tables";
import { duePeriods, type Rhythm } from "@/lib/periods/rhythm";
import type { NewPolicy } from "@/lib/policies/schema";
import { no, noField, ok, type Result } from "@/lib/result";

/** Who enters something, for the audit log and as it is shown. */
export interface Clerk {
  /** `account:<id>`. */
  by: string;
  name: string;
}

/**
 * Adds a version of a policy. What is paid already stays: a date in a closed period is refused, and
 * so is a version that somebody else added meanwhile.
 */
export async function addPolicyVersion(
  scope: Scope,
  entered: NewPolicy,
  clerk: Clerk,
): Promise<Result<{ version: number }>> {
  const { name, policy, effectiveOn, reason, after } = entered;
  return scope.db.transaction(async (tx) => {
    const inside = { ...scope, db: tx };
    await lockPay(inside);
    const closedTo = await findClosedTo(inside);
    if (closedTo && effectiveOn < closedTo) return closedAlready(closedTo);
    const { versions } = await readPolicyBook(inside);
    const last = versions.filter((version) => version.name === name).length;
    if (last !== after) {
      return noField("name", `Version ${last} of ${name} is there already. Look at it first.`);
    }
    const version = last + 1;
    const row = { siteId: scope.siteId, name, version, effectiveOn, policy, reason };
    await tx.insert(payPolicies).values({ ...row, enteredBy: clerk.name });
    await recordAct(inside, {
      by: clerk.by,
      action: "policies.add",
      subject: `policy:${name} ${version}`,
      detail: { effectiveOn },
    });
    return ok({ version });
  });
}

/** Puts the site, or one worker, under a policy from a date on; the form's id makes it once. */
export async function choosePolicy(
  scope: Scope,
  entered: { id: string; worker: string; policy: string; effectiveOn: string; reason: string },
  clerk: Clerk,
): Promise<Result<null>> {
  const { id, policy, effectiveOn, reason } = entered;
  return scope.db.transaction(async (tx) => {
    const inside = { ...scope, db: tx };
    await lockPay(inside);
    const worker = entered.worker === "" ? null : await findWorkerId(inside, entered.worker);
    if (worker === undefined) return noField("worker", "Nobody here has this number.");
    if (worker === null && policy === "") return noField("policy", "Choose a policy.");
    const { versions, choices } = await readPolicyBook(inside);
    if (policy !== "" && !versions.some(({ name }) => name === policy)) {
      return noField("policy", "There is no such policy yet. Add it first.");
    }
    const closedTo = await findClosedTo(inside);
    const isFirst = choices.length === 0;
    if (closedTo && !isFirst && effectiveOn < closedTo) return closedAlready(closedTo);
    const row = { siteId: scope.siteId, id, workerId: worker, effectiveOn, reason };
    const added = await tx
      .insert(payChoices)
      .values({ ...row, policy: policy || null, enteredBy: clerk.name })
      .onConflictDoNothing()
      .returning({ id: payChoices.id });
    if (added.length > 0) {
      await recordAct(inside, {
        by: clerk.by,
        action: "policies.choose",
        subject: worker === null ? `site:${scope.siteId}` : `worker:${worker}`,
        detail: { policy: policy || null, effectiveOn },
      });
    }
    return ok(null);
  });
}

/** Says how the site parts its time from now on, and opens what is due. */
export async function setRhythm(
  scope: Scope,
  entered: Rhythm & { id: string; reason: string },
  { today, ...clerk }: Clerk & { today: string },
): Promise<Result<null>> {
  return scope.db.transaction(async (tx) => {
    const inside = { ...scope, db: tx };
    await lockPay(inside);
    const row = { ...entered, siteId: scope.siteId, enteredBy: clerk.name };
    const added = await tx
      .insert(payRhythms)
      .values(row)
      .onConflictDoNothing()
      .returning({ id: payRhythms.id });
    if (added.length > 0) {
      const { startsOn, days } = entered;
      const detail = { startsOn, days };
      const subject = `site:${scope.siteId}`;
      await recordAct(inside, { by: clerk.by, action: "periods.set", subject, detail });
    }
    await addDuePeriods(inside, today);
    return ok(null);
  });
}

/** Opens the periods that are due by a site date; answers how many that was. */
export async function openDuePeriods(scope: Scope, today: string): Promise<number> {
  return scope.db.transaction(async (tx) => {
    const inside = { ...scope, db: tx };
    await lockPay(inside);
    return addDuePeriods(inside, today);
  });
}

async function addDuePeriods(scope: Scope, today: string): Promise<number> {
  const { db, siteId } = scope;
  const rhythm = await findRhythm(scope);
  if (!rhythm) return 0;
  const [last] = await db
    .select({ to: payPeriods.toOn })
    .from(payPeriods)
    .where(eq(payPeriods.siteId, siteId))
    .orderBy(desc(payPeriods.fromOn))
    .limit(1);
  const due = duePeriods(rhythm, last?.to ?? null, today);
  const rows = due.map(({ from, to }) => ({ siteId, id: uuidv7(), fromOn: from, toOn: to }));
  if (rows.length > 0) await db.insert(payPeriods).values(rows);
  return rows.length;
}

/** One at a time sets what a site is paid by; held until the end of the transaction. */
export async function lockPay({ db, siteId }: Scope): Promise<void> {
  await db.execute(sql`select pg_advisory_xact_lock(hashtextextended(${`pay ${siteId}`}, 0))`);
}

/** The day after the last closed workday; null where nothing is closed. */
async function findClosedTo({ db, siteId }: Scope): Promise<string | null> {
  const { rows } = await db.execute<{ to: string | null }>(sql`
    select max(p.to_on)::text as "to"
    from pay_periods p
    join pay_revisions r on r.site_id = p.site_id and r.period_id = p.id
    left join pay_reopenings o
      on o.site_id = r.site_id and o.period_id = r.period_id and o.revision = r.revision
    where p.site_id = ${siteId} and o.revision is null`);
  return rows[0]?.to ?? null;
}

async function findWorkerId({ db, siteId }: Scope, number: string): Promise<string | undefined> {
  const [worker] = await db
    .select({ id: workers.id })
    .from(workers)
    .where(and(eq(workers.siteId, siteId), eq(workers.number, number)))
    .limit(1);
  return worker?.id;
}

function closedAlready(closedTo: string) {
  const message = `Days before ${closedTo} are closed and paid. Choose ${closedTo} or later.`;
  return no("conflict", message, { errors: [{ path: "effectiveOn", message }] });
}
