import { createHash } from "node:crypto";
import { sql } from "drizzle-orm";
import type { Scope } from "@/db/client";
import { book, isInterference } from "@/db/ledger/commands";
import type { ReceiptEnd } from "@/db/ledger/payload";
import { readContext } from "@/db/ledger/queries";
import { judgeTickets } from "@/db/tickets/commands";
import { insertedAct } from "@/lib/acts/act";
import type { Asked } from "@/lib/ledger/asked";
import { canonicalJson } from "@/lib/ledger/canonical";
import type { BookingContext } from "@/lib/ledger/context";
import { decideOffice, type OfficeAct } from "@/lib/ledger/office";
import { effectMs } from "@/lib/ledger/place";
import type { EventBody } from "@/lib/ledger/schema";
import { namedItems, targetOf, ticketsAbout } from "@/lib/ledger/target";
import { no, ok, type Problem, type Result } from "@/lib/result";
import { ticketsTouched } from "@/lib/timeline/derive";

/** Something that a person enters at a desk or on a phone, as one deed: all of it or nothing. */
export interface OfficeDeed {
  acts: readonly Omit<OfficeAct, "hash">[];
  /** `account:<id>` where it is entered for somebody else; null where it is one's own. */
  by: string | null;
  /** Who it is in the audit log. */
  actor: string;
  now: Date;
  /** Home cells of the workers whose records may be touched; null for the whole site. */
  within: readonly string[] | null;
  /** Kept records that the deed answers: each is locked, and must not have been answered before. */
  answers?: readonly ReceiptEnd[];
  /** What else must hold of what is known when it is booked. */
  check?: (context: BookingContext) => Problem | null;
}

/** How often a deed is decided again because somebody else booked meanwhile (LEDGER.md 8). */
const TRIES_MAX = 5;

/**
 * Books what a person enters in the office or on a phone by the way that kiosk records go: read,
 * decide, and write ledger, timelines, loose ends and audit at once; the tickets that it touches are
 * judged again in the same transaction, so that the page drawn afterwards shows it. Sent twice it
 * books once; of two people who settle the same thing, the second is told so.
 */
export async function bookDeed(scope: Scope, deed: OfficeDeed): Promise<Result<void>> {
  const acts = deed.acts.map((act) => ({ ...act, hash: hashOf(act) }));
  for (let tries = 0; tries < TRIES_MAX; tries += 1) {
    const answer = await tryOnce(scope, deed, acts);
    if (answer) return answer;
  }
  return no("unavailable", "Others are booking for the same people. Try again in a moment.");
}

/** Null where somebody else booked meanwhile, and nothing was written. */
async function tryOnce(
  scope: Scope,
  deed: OfficeDeed,
  acts: readonly OfficeAct[],
): Promise<Result<void> | null> {
  const interfered = new Error("somebody booked meanwhile");
  try {
    return await scope.db.transaction(async (db) => {
      const within = { ...scope, db };
      const lost = await lockAnswered(within, deed.answers ?? []);
      const context = await readContext(within, askedByDeed(acts, deed.now));
      const outside = isOutside(context, acts, deed);
      if (outside) return { ok: false, problem: outside };
      const entry = { by: deed.by, nowMs: deed.now.getTime() };
      const decided = decideOffice(acts, context, entry);
      if (!decided.ok) return decided;
      const { rows, timelines } = decided.value;
      if (rows.length === 0) return ok(undefined);
      if (lost) return no("conflict", SETTLED);
      const refusal = deed.check?.(context);
      if (refusal) return { ok: false, problem: refusal };
      const booking = {
        siteId: scope.siteId,
        kioskId: null,
        sessions: [],
        rows,
        timelines,
        actor: deed.actor,
        answered: deed.answers ?? [],
      };
      if (!(await book(within, booking))) throw interfered;
      const events = new Map(
        timelines.flatMap(({ window }) => window.events.map(({ id, body }) => [id, body] as const)),
      );
      const tickets = [
        ...timelines.flatMap(({ derived, window }) => ticketsTouched(derived, window.segments)),
        ...rows.flatMap(({ targetId }) => ticketsAbout(targetId, events)),
      ];
      if (tickets.length > 0) await judgeTickets(within, [...new Set(tickets)].sort());
      return ok(undefined);
    });
  } catch (error) {
    if (error === interfered || isInterference(error)) return null;
    throw error;
  }
}

const SETTLED = "Someone settled this meanwhile. Look at the list again.";

/** A person who leads some cells enters nothing for the people of others. */
function isOutside(
  { workers }: BookingContext,
  acts: readonly OfficeAct[],
  { within }: OfficeDeed,
): Problem | null {
  if (within === null) return null;
  const outside = acts.find(({ worker }) => {
    const found = workers.find(({ number }) => number === worker);
    return worker !== null && !(found && within.includes(found.homeCellId));
  });
  if (!outside) return null;
  return { code: "notFound", detail: `${outside.worker} is not one of your people.` };
}

/**
 * Locks the loose ends of kept records until the transaction ends, in the order of their keys;
 * answers whether one of them has been settled or is no more.
 */
async function lockAnswered(
  { db, siteId }: Scope,
  answers: readonly ReceiptEnd[],
): Promise<boolean> {
  if (answers.length === 0) return false;
  const { rows } = await db.execute<{ settled: boolean }>(sql`
    select l.settled
    from loose_ends l
    join unnest(
      ${sql.param(answers.map(({ code }) => code))}::text[],
      ${sql.param(answers.map(({ subject }) => subject))}::text[]) as a (code, subject)
      on l.code = a.code and l.subject = a.subject
    where l.site_id = ${siteId} and l.source = 'receipt'
    order by l.code, l.subject
    for update of l`);
  return rows.length < answers.length || rows.some(({ settled }) => settled);
}

function askedByDeed(acts: readonly OfficeAct[], now: Date): Asked {
  const touched = acts.flatMap(({ worker, body }) =>
    [now.getTime(), effectMs(body)].flatMap((atMs) =>
      worker === null || atMs === null ? [] : { number: worker, atMs },
    ),
  );
  return {
    kioskId: null,
    numbers: [...new Set(acts.flatMap(({ worker }) => worker ?? []))],
    sessions: [],
    ids: acts.map(({ id }) => id),
    touched,
    targets: acts.flatMap(({ body }) => targetOf(body) ?? []),
    items: acts.flatMap(({ body }) => [...namedItems(actIn(body))]),
    benchAtMs: null,
  };
}

function actIn(body: EventBody): EventBody {
  return insertedAct(body)?.body ?? body;
}

function hashOf({ worker, body, note }: Omit<OfficeAct, "hash">): string {
  return createHash("sha256").update(canonicalJson({ worker, body, note })).digest("hex");
}
