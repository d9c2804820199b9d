import { and, asc, eq, sql } from "drizzle-orm";
import type { Scope } from "@/db/client";
import { payCards, payPeriods, payRows } from "@/db/pay/tables";
import type { PaidWorkday } from "@/lib/periods/adjust";

/** A frozen workday, with the period that it is about: another one's is an adjustment. */
export interface FrozenRow extends PaidWorkday {
  workerId: string;
  aboutId: string;
  aboutFrom: string;
  trail: { rule: string; seconds: number; text: string }[];
}

const figures = {
  workerId: payRows.workerId,
  aboutId: payRows.aboutId,
  workweek: payRows.workweekOn,
  date: payRows.workdayOn,
  policy: payRows.policy,
  workedSeconds: payRows.workedSeconds,
  paidSeconds: payRows.paidSeconds,
  regular: payRows.regularSeconds,
  overtime: payRows.overtimeSeconds,
  double: payRows.doubleSeconds,
  premiums: payRows.premiums,
};

/** Lists the rows that a closing froze, by worker, period that they are about, and workday. */
export async function listFrozenRows(
  { db, siteId }: Scope,
  { periodId, revision }: { periodId: string; revision: number },
): Promise<FrozenRow[]> {
  const rows = await db
    .select({ ...figures, trail: payRows.trail, aboutFrom: payPeriods.fromOn })
    .from(payRows)
    .innerJoin(
      payPeriods,
      and(eq(payPeriods.siteId, payRows.siteId), eq(payPeriods.id, payRows.aboutId)),
    )
    .where(
      and(
        eq(payRows.siteId, siteId),
        eq(payRows.periodId, periodId),
        eq(payRows.revision, revision),
      ),
    )
    .orderBy(
      asc(payRows.workerId),
      asc(payPeriods.fromOn),
      asc(payRows.workweekOn),
      asc(payRows.workdayOn),
    );
  return rows.map(inBuckets);
}

/** Lists the cards that a closing froze, by worker number. */
export async function listFrozenCards(
  { db, siteId }: Scope,
  { periodId, revision }: { periodId: string; revision: number },
) {
  return db
    .select({
      id: payCards.workerId,
      number: payCards.number,
      name: payCards.name,
      cell: payCards.cell,
      payrollNumber: payCards.payrollNumber,
      reason: payCards.reason,
      openEnds: payCards.openEnds,
      signedByWorker: payCards.signedByWorker,
      signedByLead: payCards.signedByLead,
    })
    .from(payCards)
    .where(
      and(
        eq(payCards.siteId, siteId),
        eq(payCards.periodId, periodId),
        eq(payCards.revision, revision),
      ),
    )
    .orderBy(sql`length(${payCards.number})`, asc(payCards.number));
}

/**
 * Lists all that was paid about the workdays of a period, in whichever closing: its own rows and
 * later adjustments. What was reopened does not count.
 */
export async function listPaidAbout(
  scope: Scope,
  { aboutId, workers }: { aboutId: string; workers: readonly string[] },
): Promise<(PaidWorkday & { workerId: string })[]> {
  const { db, siteId } = scope;
  const rows = await db
    .select(figures)
    .from(payRows)
    .where(
      and(
        eq(payRows.siteId, siteId),
        eq(payRows.aboutId, aboutId),
        sql`${payRows.workerId} = any (${sql.param([...workers])}::uuid[])`,
        sql`not exists (
          select from pay_reopenings o
          where o.site_id = ${payRows.siteId} and o.period_id = ${payRows.periodId}
            and o.revision = ${payRows.revision})`,
      ),
    );
  return rows.map(inBuckets);
}

/** A closed period some of whose workers may have to be paid otherwise by now. */
export interface LatePeriod {
  id: string;
  from: string;
  to: string;
  workers: string[];
}

/**
 * Lists closed periods with the workers of whom something about them, or a workweek that they cut,
 * was received since, or who were closed with a question open. Not all of it changes what is paid:
 * the statement tells. Whatever is asked for here is in an index of the few records that come late.
 */
export async function listLatePeriods({ db, siteId }: Scope): Promise<LatePeriod[]> {
  const { rows } = await db.execute<LatePeriod & Record<string, unknown>>(sql`
    with closed as (
      select p.id, p.from_on, p.to_on, r.revision, r.as_of, r.ends_at,
        r.starts_at - interval '200 hours' as low, r.ends_at + interval '200 hours' as high
      from pay_periods p
      join pay_revisions r on r.site_id = p.site_id and r.period_id = p.id
      where p.site_id = ${siteId}
        and not exists (
          select from pay_reopenings o
          where o.site_id = r.site_id and o.period_id = r.period_id and o.revision = r.revision)),
    late as (
      select c.id, e.worker_id
      from closed c
      join clock_events e on e.site_id = ${siteId} and e.received_at >= c.as_of
        and e.worker_id is not null
      where e.received_at - e.at > interval '24 hours'
        and e.at >= c.low and e.at < c.high
        and (e.received_at - e.at > interval '24 hours'
          or e.kind in ('void', 'move', 'insert', 'reassign', 'settle'))
      union
      select c.id, e.worker_id
      from closed c
      join clock_events e on e.site_id = ${siteId} and e.received_at >= c.as_of
        and e.received_at < c.ends_at + interval '24 hours' and e.at < c.ends_at
        and e.worker_id is not null
      union
      select c.id, e.worker_id
      from closed c
      join clock_events e on e.site_id = ${siteId} and e.received_at >= c.as_of
        and e.worker_id is not null
      left join clock_events t on t.site_id = ${siteId} and t.id = e.target_id
      where e.kind in ('void', 'move', 'insert', 'reassign', 'settle')
        and (e.received_at - e.at > interval '24 hours'
          or e.kind in ('void', 'move', 'insert', 'reassign', 'settle'))
        and (
          (e.counts_at >= c.low and e.counts_at < c.high)
          or (t.at >= c.low and t.at < c.high)
          or (t.counts_at >= c.low and t.counts_at < c.high))
      union
      select c.id, k.worker_id
      from closed c
      join pay_cards k on k.site_id = ${siteId} and k.period_id = c.id and k.revision = c.revision
        and k.reason is not null)
    select c.id, c.from_on::text as "from", c.to_on::text as "to",
      array_agg(l.worker_id order by l.worker_id) as workers
    from closed c
    join late l on l.id = c.id
    group by c.id, c.from_on, c.to_on
    order by c.from_on`);
  return rows;
}

function inBuckets<T extends { regular: number; overtime: number; double: number }>({
  regular,
  overtime,
  double,
  ...rest
}: T) {
  return { ...rest, buckets: { regular, overtime, double } };
}
