import { sql } from "drizzle-orm";
import type { Scope } from "@/db/client";
import { findSite } from "@/db/sites/queries";
import { listTicketBooks } from "@/db/tickets/books";
import { UNKNOWN } from "@/lib/matching/parts";
import { ticketParts } from "@/lib/matching/ticket-parts";
import { type dayBounds, daysTouched } from "@/lib/time/site-day";

/** The three roll-ups as text lines, sorted: what is kept, or what should be. */
export interface Rollups {
  booked: string[];
  matched: string[];
  attendance: string[];
}

/** Reads the roll-ups as they are kept. */
export async function keptRollups({ db, siteId }: Scope): Promise<Rollups> {
  const lines = async (columns: string, table: string) => {
    const { rows } = await db.execute<{ line: string }>(sql`
      select concat_ws(' ', ${sql.raw(columns)}) as line
      from ${sql.raw(table)} where site_id = ${siteId}`);
    return rows.map(({ line }) => line).sort();
  };
  return {
    booked: await lines(
      "day, operation, cell_id, activity, seconds, no_standard_seconds, elsewhere_seconds, pieces",
      "booked_days",
    ),
    matched: await lines(
      `day, operation, cell_id, pieces, actual_seconds, rework_seconds, elsewhere_seconds,
      no_standard_seconds, no_standard_rework_seconds, earned_seconds, report_earned_seconds`,
      "matched_days",
    ),
    attendance: await lines(
      `day, cell_id, setup_seconds, run_seconds, rework_seconds, inspect_seconds,
      indirect_seconds, rest_seconds, unassigned_seconds, meal_seconds`,
      "attendance_days",
    ),
  };
}

/**
 * Works the roll-ups out anew, second by second from the segments and from each ticket's whole book,
 * without anything that is kept of either. For sites whose models have no options.
 */
export async function recomputedRollups(
  scope: Scope,
  whenBooked: ReadonlySet<string> = new Set(),
): Promise<Rollups> {
  const site = await findSite(scope);
  const rules = site!.rules;
  const { rows: numbers } = await scope.db.execute<{ number: string }>(sql`
    select number from tickets where site_id = ${scope.siteId}
    union select ticket from segments where site_id = ${scope.siteId} and ticket is not null
    union select ticket from reports where site_id = ${scope.siteId}`);
  const books = await listTicketBooks(
    scope,
    numbers.map(({ number }) => number),
  );
  const shared = await sharesByInterval(scope);
  const facts = {
    rules,
    whenBooked,
    sharesOf: (one: { worker: string; startMs: number }) =>
      shared.get(`${one.worker} ${one.startMs}`) ?? null,
  };
  const setups = books.flatMap((book) => ticketParts(book, { ...facts, rivals: [] }).setups);
  const parts = books.map((book) => {
    const rivals = setups.filter(({ ticket }) => ticket !== book.ticket);
    // models are told apart, as in the roll-ups; their names stand for their ids
    return { model: book.known?.model ?? "", ...ticketParts(book, { ...facts, rivals }) };
  });
  const booked = parts.flatMap(({ model, booked: some }) =>
    some.map((one) => ({
      key: `${model}|${one.day} ${one.operation} ${one.cell} ${one.activity}`,
      figures: [one.seconds, one.noStandardSeconds, one.elsewhereSeconds, one.pieces],
    })),
  );
  const matched = parts.flatMap(({ model, matched: some }) =>
    some.map((one) => ({
      key: `${model}|${one.day} ${one.operation} ${one.cell}`,
      figures: [
        one.pieces,
        one.actualSeconds,
        one.reworkSeconds,
        one.elsewhereSeconds,
        one.noStandardSeconds,
        one.noStandardReworkSeconds,
        one.earnedSeconds,
        one.reportEarnedSeconds,
      ],
    })),
  );
  return {
    booked: summed(booked),
    matched: summed(matched),
    attendance: summed(await attendanceOf(scope, rules)),
  };
}

const ACTIVITIES = [
  "setup",
  "run",
  "rework",
  "inspect",
  "indirect",
  "rest",
  "unassigned",
  "meal",
] as const;

/** Each second of each segment on its day, one interval at a time. */
async function attendanceOf({ db, siteId }: Scope, rules: Parameters<typeof dayBounds>[1]) {
  const { rows } = await db.execute<{
    cell: string | null;
    activity: (typeof ACTIVITIES)[number];
    start: number;
    end: number;
  }>(sql`
    select cell_id as cell, activity, extract(epoch from start_at)::float as start,
      extract(epoch from end_at)::float as end
    from segments where site_id = ${siteId} and item = 0 and end_at is not null`);
  return rows.flatMap(({ cell, activity, ...stretch }) =>
    daysTouched(stretch, rules).map(({ date, start, end }) => {
      const seconds = Math.min(end, stretch.end) - Math.max(start, stretch.start);
      const figures = ACTIVITIES.map((one) => (one === activity ? seconds : 0));
      return { key: `|${date} ${cell ?? UNKNOWN}`, figures };
    }),
  );
}

async function sharesByInterval({ db, siteId }: Scope): Promise<Map<string, number[]>> {
  const { rows } = await db.execute<{ key: string; shares: number[] }>(sql`
    select s.worker_id || ' ' || epoch_ms(s.start_at) as key,
      array_agg(s.seconds order by s.item) as shares
    from segments s where s.site_id = ${siteId} and s.ticket is not null
    group by s.worker_id, s.start_at`);
  return new Map(rows.map(({ key, shares }) => [key, shares]));
}

function summed(rows: readonly { key: string; figures: readonly number[] }[]): string[] {
  const sums = new Map<string, number[]>();
  for (const { key, figures } of rows) {
    const before = sums.get(key) ?? figures.map(() => 0);
    sums.set(
      key,
      figures.map((figure, at) => figure + before[at]!),
    );
  }
  return [...sums].map(([key, figures]) => [key.split("|")[1], ...figures].join(" ")).sort();
}
