import { sql } from "drizzle-orm";
import { heldOf } from "@/db/access/queries";
import type { Scope } from "@/db/client";
import type { Asked } from "@/lib/ledger/asked";
import type { BookingContext, ItemFacts, Window } from "@/lib/ledger/context";

/** How far a gap is looked for at first: hardly anybody works for longer without one. */
const REACH_DAYS = 5;
/** Further than the ledger goes back. */
const FARTHEST_DAYS = 100_000;

/**
 * Reads all that is asked, in one statement and so of one moment. Windows reach to the next gap
 * longer than the site's shift limit on both sides; where none is near, it looks further.
 */
export async function readContext(
  scope: Scope,
  asked: Asked,
  reachDays = REACH_DAYS,
): Promise<BookingContext> {
  const { touched, items } = asked;
  const { rows } = await scope.db.execute<{ context: Raw }>(sql`select booking_context(
    ${scope.siteId},
    ${asked.kioskId},
    ${sql.param(asked.numbers)}::text[],
    ${sql.param(asked.sessions)}::uuid[],
    ${sql.param(asked.ids)}::uuid[],
    ${sql.param(touched.map(({ number }) => number))}::text[],
    ${sql.param(touched.map(({ atMs }) => new Date(atMs).toISOString()))}::timestamptz[],
    ${sql.param(asked.targets)}::uuid[],
    ${sql.param(items.map(({ ticket }) => ticket))}::text[],
    ${sql.param(items.map(({ operation }) => operation))}::text[],
    make_interval(days => ${reachDays}),
    ${asked.benchAtMs === null ? null : new Date(asked.benchAtMs).toISOString()}::timestamptz) as context`);
  // safe because the function always answers with one row
  const context = contextOf(rows[0]!.context);
  const isTruncated = context.windows.some(({ truncated }) => truncated);
  return isTruncated && reachDays < FARTHEST_DAYS
    ? readContext(scope, asked, reachDays * 8)
    : context;
}

/** What the database sends: lists that are empty may be null. */
type Raw = Omit<BookingContext, "workers" | "windows" | "facts" | "next"> & {
  workers: {
    id: string;
    number: string;
    homeCellId: string;
    roles: Parameters<typeof heldOf>[0];
  }[];
  windows: { [K in keyof Window]: Window[K] | null }[] | null;
  facts: ItemFacts[] | null;
  next: BookingContext["next"] | null;
};

function contextOf({ workers, windows, facts, next, ...rest }: Raw): BookingContext {
  return {
    ...rest,
    workers: workers.map(({ roles, ...worker }) => ({ ...worker, held: heldOf(roles) })),
    windows: (windows ?? []).map(windowOf),
    facts: facts ?? [],
    next: next ?? [],
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
