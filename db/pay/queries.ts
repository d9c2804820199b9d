import { and, asc, desc, eq, sql } from "drizzle-orm";
import type { Scope } from "@/db/client";
import {
  payChoices,
  payPeriods,
  payPolicies,
  payReopenings,
  payRevisions,
  payRhythms,
} from "@/db/pay/tables";
import { workers } from "@/db/people/tables";
import type { FileTotals } from "@/lib/periods/file";
import type { PolicyBook } from "@/lib/policies/in-force";

/** Reads all that a site ever set about pay policies, in the order of entry. */
export async function readPolicyBook(scope: Scope): Promise<PolicyBook> {
  const versions = await listPolicyVersions(scope);
  const choices = await listPolicyChoices(scope);
  return {
    versions,
    choices: choices.map(({ workerId, policy, effectiveOn }) => ({
      worker: workerId,
      policy,
      effectiveOn,
    })),
  };
}

/** Lists every version of every policy with who entered it and why, in the order of entry. */
export async function listPolicyVersions({ db, siteId }: Scope) {
  return db
    .select({
      name: payPolicies.name,
      version: payPolicies.version,
      effectiveOn: payPolicies.effectiveOn,
      policy: payPolicies.policy,
      enteredBy: payPolicies.enteredBy,
      reason: payPolicies.reason,
      enteredAt: payPolicies.enteredAt,
    })
    .from(payPolicies)
    .where(eq(payPolicies.siteId, siteId))
    .orderBy(asc(payPolicies.seq));
}

/** Lists who was put under which policy, the site's own choices too, in the order of entry. */
export async function listPolicyChoices({ db, siteId }: Scope) {
  return db
    .select({
      workerId: payChoices.workerId,
      worker: workers.number,
      name: workers.name,
      policy: payChoices.policy,
      effectiveOn: payChoices.effectiveOn,
      enteredBy: payChoices.enteredBy,
      reason: payChoices.reason,
      enteredAt: payChoices.enteredAt,
    })
    .from(payChoices)
    .leftJoin(
      workers,
      and(eq(workers.siteId, payChoices.siteId), eq(workers.id, payChoices.workerId)),
    )
    .where(eq(payChoices.siteId, siteId))
    .orderBy(asc(payChoices.seq));
}

/** Finds how the site parts its time into pay periods; null before anyone said. */
export async function findRhythm({ db, siteId }: Scope) {
  const [rhythm] = await db
    .select({ startsOn: payRhythms.startsOn, days: payRhythms.days })
    .from(payRhythms)
    .where(eq(payRhythms.siteId, siteId))
    .orderBy(desc(payRhythms.seq))
    .limit(1);
  return rhythm ?? null;
}

/** A pay period with its last closing, if any. */
export interface PeriodRow {
  id: string;
  from: string;
  /** Exclusive. */
  to: string;
  /** The last closing, whether it stands or was reopened; 0 before the first. */
  revision: number;
  isClosed: boolean;
  closedAt: Date | null;
  closedBy: string | null;
  digest: string | null;
  totals: FileTotals | null;
}

/** Lists pay periods, the latest first; `before` is the first day of the last one of the page before. */
export async function listPeriods(
  { db, siteId }: Scope,
  page: { before?: string | undefined; limit: number },
): Promise<PeriodRow[]> {
  return periodsWhere({ db, siteId }, page.limit, [
    page.before === undefined ? undefined : sql`${payPeriods.fromOn} < ${page.before}`,
  ]);
}

/** Finds a period by its id; null where there is none at the site. */
export async function findPeriod(scope: Scope, periodId: string): Promise<PeriodRow | null> {
  const [period] = await periodsWhere(scope, 1, [eq(payPeriods.id, periodId)]);
  return period ?? null;
}

async function periodsWhere(
  { db, siteId }: Scope,
  limit: number,
  wanted: Parameters<typeof and>,
): Promise<PeriodRow[]> {
  const last = sql`(
    select max(r.revision) from pay_revisions r
    where r.site_id = ${payPeriods.siteId} and r.period_id = ${payPeriods.id})`;
  const rows = await db
    .select({
      id: payPeriods.id,
      from: payPeriods.fromOn,
      to: payPeriods.toOn,
      revision: payRevisions.revision,
      closedAt: payRevisions.closedAt,
      closedBy: payRevisions.closedByName,
      digest: payRevisions.digest,
      totals: payRevisions.totals,
      reopened: payReopenings.revision,
    })
    .from(payPeriods)
    .leftJoin(
      payRevisions,
      and(
        eq(payRevisions.siteId, payPeriods.siteId),
        eq(payRevisions.periodId, payPeriods.id),
        eq(payRevisions.revision, last),
      ),
    )
    .leftJoin(
      payReopenings,
      and(
        eq(payReopenings.siteId, payRevisions.siteId),
        eq(payReopenings.periodId, payRevisions.periodId),
        eq(payReopenings.revision, payRevisions.revision),
      ),
    )
    .where(and(eq(payPeriods.siteId, siteId), ...wanted))
    .orderBy(desc(payPeriods.fromOn))
    .limit(limit);
  return rows.map(({ reopened, revision, ...row }) => ({
    ...row,
    revision: revision ?? 0,
    isClosed: revision !== null && reopened === null,
  }));
}

/** Sums what everybody was planned to attend on some dates, in seconds, by worker's id. */
export async function sumPlanned(
  { db, siteId }: Scope,
  { from, to }: { from: string; to: string },
): Promise<Map<string, number>> {
  const { rows } = await db.execute<{ worker: string; seconds: number }>(sql`
    select p.worker_id as worker, sum(p.seconds)::integer as seconds
    from (
      select distinct on (s.worker_id, s.work_on)
        s.worker_id, extract(epoch from s.end_at - s.start_at) as seconds
      from planned_shifts s
      where s.site_id = ${siteId} and s.work_on >= ${from} and s.work_on < ${to}
      order by s.worker_id, s.work_on, s.seq desc) p
    group by p.worker_id`);
  return new Map(rows.map(({ worker, seconds }) => [worker, seconds]));
}
