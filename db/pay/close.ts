import { sql } from "drizzle-orm";
import { recordAct } from "@/db/audit/commands";
import type { Scope } from "@/db/client";
import { closingKey } from "@/db/ledger/closing-lock";
import { type Adjustment, readAdjustments } from "@/db/pay/adjustments";
import { type Cards, type CardsWanted, readCards, sha256 } from "@/db/pay/cards";
import { type Clerk, lockPay } from "@/db/pay/commands";
import { findPeriod, listPeriods, type PeriodRow } from "@/db/pay/queries";
import { payReopenings } from "@/db/pay/tables";
import { canonicalJson } from "@/lib/ledger/canonical";
import type { Card } from "@/lib/periods/card";
import { type CloseAsked, decideClose } from "@/lib/periods/close";
import { type FrozenCard, type FrozenDay, totalsOfFile } from "@/lib/periods/frozen";
import { no, ok, type Result } from "@/lib/result";

/** A period to be closed, and what payroll says with it. */
export interface ClosingAsked extends CloseAsked {
  periodId: string;
  timeZone: string;
  now: Date;
}

/** What was received in the minutes before a closing began may have been booked after it. */
const UNDER_WAY_MS = 10 * 60_000;

/**
 * Closes a period: freezes every card as it is as the next revision, with what earlier periods still
 * owe, under the period's lock, which booking reads. It reads everything first and holds the lock
 * only to read again those whose time changed meanwhile, and to write; so tablets wait a moment.
 *
 * @returns the revision; `conflict` where something is open and not named, or another was first
 */
export async function closePeriod(
  scope: Scope,
  asked: ClosingAsked,
  clerk: Clerk,
): Promise<Result<{ revision: number }>> {
  return scope.db.transaction(async (tx) => {
    const inside = { ...scope, db: tx };
    await lockPay(inside);
    const period = await findPeriod(inside, asked.periodId);
    if (!period) return no("notFound", "There is no such pay period here.");
    const wanted = wantedOf(period, asked);
    const before = await readVersions(inside);
    const first = await readCards(inside, wanted);
    // a no needs no lock
    const early = await decide(inside, period, first, asked);
    if (!early.ok) return early;
    await holdBookings(inside);
    const { cards, ...rest } = await readChanged(inside, first, before, wanted);
    const named = await decide(inside, period, { cards, ...rest }, asked);
    if (!named.ok) return named;
    const adjustments = await readAdjustments(inside, wanted);
    const closing = { period, cards, adjustments, named: named.value };
    const revision = await freeze(inside, closing, { asked, clerk });
    return ok({ revision });
  });
}

/** Takes a closing back, with the reason; its rows and files stay, and the next one is revision n+1. */
export async function reopenPeriod(
  scope: Scope,
  { periodId, reason }: { periodId: string; reason: string },
  clerk: Clerk,
): Promise<Result<null>> {
  return scope.db.transaction(async (tx) => {
    const inside = { ...scope, db: tx };
    await lockPay(inside);
    const period = await findPeriod(inside, periodId);
    if (!period) return no("notFound", "There is no such pay period here.");
    if (!period.isClosed) return no("conflict", "This period is open. Nothing was changed.");
    const { revision } = period;
    const row = { siteId: scope.siteId, periodId, revision, reason, enteredBy: clerk.name };
    await tx.insert(payReopenings).values(row);
    await recordAct(inside, {
      by: clerk.by,
      action: "periods.reopen",
      subject: `period:${periodId}`,
      detail: { revision },
    });
    return ok(null);
  });
}

function wantedOf(period: PeriodRow, { timeZone, now }: ClosingAsked): CardsWanted {
  const { from, to } = period;
  return { from, to, isClosed: false, timeZone, nowMs: now.getTime() };
}

async function decide(
  scope: Scope,
  period: PeriodRow,
  { cards, overMs }: Cards,
  asked: ClosingAsked,
) {
  const earlier = await listPeriods(scope, { before: period.from, limit: 1000 });
  const facts = {
    isClosed: period.isClosed,
    closedBy: period.closedBy,
    hasPolicy: overMs !== null,
    isOver: overMs !== null && asked.now.getTime() >= overMs,
    openBefore: earlier.findLast(({ isClosed }) => !isClosed)?.from ?? null,
    cards,
  };
  return decideClose(facts, asked);
}

/** The state of everybody's timeline: a version that grew means that time was booked. */
async function readVersions({ db, siteId }: Scope): Promise<Map<string, string>> {
  const { rows } = await db.execute<{ worker: string; state: string }>(sql`
    select w.id as worker, concat_ws(' ', h.version, (
      select count(*) from loose_ends l
      where l.site_id = w.site_id and l.worker_id = w.id and not l.settled)) as state
    from workers w
    left join timeline_heads h on h.site_id = w.site_id and h.worker_id = w.id
    where w.site_id = ${siteId}`);
  return new Map(rows.map(({ worker, state }) => [worker, state]));
}

/** Waits for bookings that are under way, and lets none begin until the transaction ends. */
async function holdBookings({ db, siteId }: Scope): Promise<void> {
  await db.execute(sql`select pg_advisory_xact_lock(${closingKey(siteId)})`);
}

async function readChanged(
  scope: Scope,
  first: Cards,
  before: ReadonlyMap<string, string>,
  wanted: CardsWanted,
): Promise<Cards> {
  const now = await readVersions(scope);
  const changed = [...now].filter(([id, state]) => before.get(id) !== state).map(([id]) => id);
  if (changed.length === 0) return first;
  const again = await readCards(scope, { ...wanted, workers: changed });
  const kept = first.cards.filter(({ worker }) => !changed.includes(worker.id));
  const byNumber = (one: Card, other: Card) =>
    Number(one.worker.number) - Number(other.worker.number);
  return { ...first, cards: [...kept, ...again.cards].toSorted(byNumber) };
}

interface Closing {
  period: PeriodRow;
  cards: readonly Card[];
  adjustments: readonly Adjustment[];
  named: ReadonlyMap<string, string>;
}

/** Writes a closing in one statement. */
async function freeze(
  scope: Scope,
  closing: Closing,
  { asked, clerk }: { asked: ClosingAsked; clerk: Clerk },
): Promise<number> {
  const { db, siteId } = scope;
  const { period } = closing;
  const revision = period.revision + 1;
  const cards = frozenCards(closing);
  const rows = frozenDays(closing);
  const digest = sha256(canonicalJson({ cards, rows }));
  const totals = totalsOfFile(period.id, cards, rows);
  const bounds = closing.cards.flatMap(({ days }) => days);
  const startMs = Math.min(...bounds.map((day) => day.startMs), Date.parse(period.from));
  const endMs = Math.max(...bounds.map((day) => day.endMs), Date.parse(period.to));
  const at = (ms: number) => new Date(ms).toISOString();
  await db.execute(sql`
    with revision as (
      insert into pay_revisions (site_id, period_id, revision, closed_at, closed_by,
        closed_by_name, as_of, starts_at, ends_at, digest, totals)
      values (${siteId}, ${period.id}, ${revision}, ${at(asked.now.getTime())}, ${clerk.by},
        ${clerk.name}, ${at(asked.now.getTime() - UNDER_WAY_MS)}, ${at(startMs)}, ${at(endMs)},
        ${digest}, ${JSON.stringify(totals)}::jsonb)),
    cards as (
      insert into pay_cards (site_id, period_id, revision, worker_id, number, name, cell,
        payroll_number, reason, open_ends, signed_by_worker, signed_by_lead)
      select ${siteId}, ${period.id}, ${revision}, c."workerId", c.number, c.name, c.cell,
        c."payrollNumber", c.reason, c."openEnds", c."signedByWorker", c."signedByLead"
      from jsonb_to_recordset(${JSON.stringify(cards)}::jsonb) as c ("workerId" uuid, number text,
        name text, cell text, "payrollNumber" text, reason text, "openEnds" integer,
        "signedByWorker" boolean, "signedByLead" boolean))
    insert into pay_rows (site_id, period_id, revision, about_id, worker_id, workweek_on,
      workday_on, policy, worked_seconds, paid_seconds, regular_seconds, overtime_seconds,
      double_seconds, premiums, trail)
    select ${siteId}, ${period.id}, ${revision}, r."aboutId", r."workerId", r.workweek, r.date,
      r.policy, r."workedSeconds", r."paidSeconds", (r.buckets ->> 'regular')::integer,
      (r.buckets ->> 'overtime')::integer, (r.buckets ->> 'double')::integer, r.premiums, r.trail
    from jsonb_to_recordset(${JSON.stringify(rows)}::jsonb) as r ("aboutId" uuid, "workerId" uuid,
      workweek date, date date, policy text, "workedSeconds" integer, "paidSeconds" integer,
      buckets jsonb, premiums jsonb, trail jsonb)`);
  await recordAct(scope, {
    by: clerk.by,
    action: "periods.close",
    subject: `period:${period.id}`,
    detail: { revision, digest, closedByName: closing.named.size },
  });
  return revision;
}

/** Who has an adjustment only is named in the file too. */
function frozenCards({ cards, adjustments, named }: Closing): FrozenCard[] {
  const own = cards.map(({ worker, ends, signedByWorker, signedByLead }) => {
    const { id, ...who } = worker;
    const reason = named.get(id) ?? null;
    return { workerId: id, ...who, reason, openEnds: ends.length, signedByWorker, signedByLead };
  });
  const known = new Set(own.map(({ workerId }) => workerId));
  const others = new Map(
    adjustments
      .filter(({ worker }) => !known.has(worker.id))
      .map(({ worker: { id, ...who } }) => [id, { workerId: id, ...who }]),
  );
  const none = { reason: null, openEnds: 0, signedByWorker: false, signedByLead: false };
  return [...own, ...[...others.values()].map((worker) => ({ ...worker, ...none }))];
}

function frozenDays({ period, cards, adjustments }: Closing): FrozenDay[] {
  const own = cards.flatMap(({ worker, days }) =>
    days.flatMap(({ stated }) =>
      stated.map((day) => ({ ...day, workerId: worker.id, aboutId: period.id })),
    ),
  );
  const changes = adjustments.map(({ worker, aboutFrom, ...day }) => ({
    ...day,
    workerId: worker.id,
    trail: [],
  }));
  return [...own, ...changes];
}
