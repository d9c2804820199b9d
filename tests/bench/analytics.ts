import { sql } from "drizzle-orm";
import { readOpenSeam, readSeam } from "@/app/_server/analytics";
import { type Db, openPool, type Scope, wrap } from "@/db/client";
import { rebuildRollups } from "@/db/seam/commands";
import { loadDemo } from "@/db/seed/load";
import { DEMO_SITE_ID } from "@/db/seed/sign-ins";
import { addDays } from "@/lib/time/site-day";
import { APP, ask, cloneDatabase, urlFor } from "@/tests/setup/clone";
import { makeTemplate } from "@/tests/setup/template";

const NAME = "bench_analytics";
/** The demo's eight weeks, this often: laid out over a year, several factories of it at once. */
const TIMES = 50;
const WEEKS = 8;
const BLOCKS = 6;
const CALLS = 60;
/** What a page may take of the server, in ms (95 of 100). */
const BUDGET_MS = 200;

/**
 * Measures what the pages of standard and actual read, over the demo fifty times: four weeks, a year,
 * and an operation opened by ticket. Says it in lines.
 */
export async function benchAnalytics(server: string, say: (text: string) => void): Promise<string> {
  await ask(server, `drop database if exists ${NAME} with (force)`);
  await cloneDatabase(server, await makeTemplate(server), NAME);
  const pool = openPool(urlFor(server, APP, NAME), (error) => say(error.message));
  const db = wrap(pool);
  try {
    say("loading the demo");
    const hash = (secret: string) => Promise.resolve(secret);
    const started = performance.now();
    await loadDemo({ db, now: new Date(), hash });
    const loadSeconds = (performance.now() - started) / 1000;
    say(`the demo ${TIMES} times`);
    const scope = { db, siteId: DEMO_SITE_ID };
    const parts = await multiply(db);
    await rebuildRollups(scope);
    await ask(server, "vacuum analyze", [], NAME);
    return [
      `analytics over the demo × ${TIMES}: ${parts} parts, ${await countSums(db)} sums of days`,
      ...(await measure(scope)),
      `  loading the demo itself: ${loadSeconds.toFixed(0)} s`,
      "",
    ].join("\n");
  } finally {
    await pool.end();
    await ask(server, `drop database ${NAME} with (force)`);
  }
}

/** Copies the parts of all tickets under new numbers, block by block of eight weeks into the past. */
async function multiply(db: Db): Promise<number> {
  for (let copy = 1; copy < TIMES; copy += 1) {
    const days = (copy % BLOCKS) * WEEKS * 7;
    await db.execute(sql`
      insert into booked_parts
      select (jsonb_populate_record(p, jsonb_build_object(
        'ticket', p.ticket || '-' || ${copy}::int, 'day', p.day - ${days}::int))).*
      from booked_parts p where position('-' in p.ticket) = 0`);
    await db.execute(sql`
      insert into matched_parts
      select (jsonb_populate_record(p, jsonb_build_object(
        'ticket', p.ticket || '-' || ${copy}::int, 'day', p.day - ${days}::int))).*
      from matched_parts p where position('-' in p.ticket) = 0`);
  }
  const { rows } = await db.execute<{ parts: number }>(sql`
    select ((select count(*) from booked_parts) + (select count(*) from matched_parts))::int
      as parts`);
  return rows[0]!.parts;
}

async function countSums(db: Db): Promise<number> {
  const { rows } = await db.execute<{ sums: number }>(sql`
    select ((select count(*) from booked_days) + (select count(*) from matched_days))::int as sums`);
  return rows[0]!.sums;
}

async function measure(scope: Scope): Promise<string[]> {
  const past = addDays(new Date().toISOString().slice(0, 10), 1);
  const [weeks, year] = [28, 365].map((days) => ({ first: addDays(past, -days), past }));
  const wanted = { cells: null };
  const open = { operation: "300", by: "ticket", ticket: "" } as const;
  const reads: [string, () => Promise<unknown>][] = [
    ["operations, 4 weeks", () => readSeam(scope, wanted, { span: weeks!, by: "operation" })],
    ["operations, a year", () => readSeam(scope, wanted, { span: year!, by: "operation" })],
    ["cells, a year", () => readSeam(scope, wanted, { span: year!, by: "cell" })],
    [
      "one opened by ticket, 4 weeks",
      () => readOpenSeam(scope, wanted, { span: weeks!, basis: "matched", open }),
    ],
  ];
  const lines = [];
  for (const [name, read] of reads) lines.push(await timed(name, read));
  return lines;
}

async function timed(name: string, read: () => Promise<unknown>): Promise<string> {
  const taken: number[] = [];
  for (let call = 0; call < CALLS; call += 1) {
    const from = performance.now();
    await read();
    taken.push(performance.now() - from);
  }
  taken.sort((a, b) => a - b);
  const of = (share: number) => taken[Math.floor(share * (CALLS - 1))]!.toFixed(0).padStart(6);
  return `  ${name.padEnd(32)} ${of(0.5)} ${of(0.95)} ms, half and 95 of 100   (budget: ${BUDGET_MS})`;
}
