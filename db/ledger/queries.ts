import { sql } from "drizzle-orm";
import { heldOf } from "@/db/access/queries";
import type { Scope } from "@/db/client";
import { keepNext, keptNext } from "@/db/ledger/next-work";
import type { Asked } from "@/lib/ledger/asked";
import type { BookingContext, ItemFacts, Window } from "@/lib/ledger/context";
import {
  type AskedTogether,
  askedTogether,
  ownContext,
  type ReadTogether,
} from "@/lib/ledger/together";

/** How far a gap is looked for at first: hardly anybody works for longer without one. */
const REACH_DAYS = 5;
/** Further than the ledger goes back. */
const FARTHEST_DAYS = 100_000;

/**
 * Reads all that is asked, in one statement and so of one moment. Windows reach to the next gap
 * longer than the site's shift limit on both sides; where none is near, it looks further.
 */
export async function readContext(scope: Scope, asked: Asked): Promise<BookingContext> {
  const read = await readTogether(scope, askedTogether([asked]), REACH_DAYS);
  keepNext(read.next);
  return ownContext(read, asked);
}

/**
 * Reads the same for several batches that are booked together, still in one statement. What their
 * kiosks could take up next may be a moment old: it is only proposed.
 */
export async function readContexts(scope: Scope, all: readonly Asked[]): Promise<BookingContext[]> {
  const asked = askedTogether(all);
  const kept = keptNext(asked.kioskIds);
  const read = await readTogether(scope, asked, REACH_DAYS, kept);
  keepNext(read.next);
  const next = new Map([...kept, ...read.next]);
  return all.map((one) => ownContext({ ...read, next }, one));
}

async function readTogether(
  scope: Scope,
  asked: AskedTogether,
  reachDays: number,
  kept: ReadonlyMap<string, unknown> = new Map(),
): Promise<ReadTogether> {
  const { touched, items, benchAtMs } = asked;
  const next = benchAtMs === null ? [] : asked.kioskIds.filter((id) => !kept.has(id));
  const { rows } = await scope.db.execute<{ context: Raw }>(sql`select bookings_context(
    ${scope.siteId},
    ${sql.param(asked.kioskIds)}::uuid[],
    ${sql.param(asked.numbers)}::text[],
    ${sql.param(asked.sessions)}::uuid[],
    ${sql.param(asked.ids)}::uuid[],
    ${sql.param(touched.map(({ number }) => number))}::text[],
    ${sql.param(touched.map(({ atMs }) => new Date(atMs).toISOString()))}::timestamptz[],
    ${sql.param(asked.targets)}::uuid[],
    ${sql.param(items.map(({ ticket }) => ticket))}::text[],
    ${sql.param(items.map(({ operation }) => operation))}::text[],
    make_interval(days => ${reachDays}),
    ${benchAtMs === null ? null : new Date(benchAtMs).toISOString()}::timestamptz,
    ${sql.param(next)}::uuid[]) as context`);
  // safe because the function always answers with one row
  const read = contextOf(rows[0]!.context);
  const isTruncated = read.windows.some(({ truncated }) => truncated);
  return isTruncated && reachDays < FARTHEST_DAYS
    ? readTogether(scope, asked, reachDays * 8, kept)
    : read;
}

/** What the database sends: lists that are empty may be null. */
type Raw = Omit<ReadTogether, "workers" | "windows" | "facts" | "next"> & {
  workers: {
    id: string;
    number: string;
    homeCellId: string;
    roles: Parameters<typeof heldOf>[0];
  }[];
  windows: { [K in keyof Window]: Window[K] | null }[] | null;
  facts: ItemFacts[] | null;
  next: Record<string, BookingContext["next"]> | null;
};

function contextOf({ workers, windows, facts, next, ...rest }: Raw): ReadTogether {
  return {
    ...rest,
    workers: workers.map(({ roles, ...worker }) => ({ ...worker, held: heldOf(roles) })),
    windows: (windows ?? []).map(windowOf),
    facts: facts ?? [],
    next: new Map(Object.entries(next ?? {})),
  };
}

/**
 * An event may come twice, as one of the window and as what a correction is about; one entered in
 * the office or on a phone has no kiosk's session.
 */
function windowOf(window: { [K in keyof Window]: Window[K] | null }): Window {
  const read = (window.events ?? []).map((event) => ({ ...event, session: event.session ?? "" }));
  const events = new Map(read.map((event) => [event.id, event]));
  return {
    // safe because the columns behind the rest of the fields are never null
    ...(window as Window),
    events: [...events.values()],
    planned: window.planned ?? [],
    segments: window.segments ?? [],
    shifts: window.shifts ?? [],
    reports: window.reports ?? [],
    looseEnds: window.looseEnds ?? [],
    judged: window.judged ?? [],
    earlier: window.earlier ?? [],
  };
}
