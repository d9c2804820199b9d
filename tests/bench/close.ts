import { sql } from "drizzle-orm";
import type { Db } from "@/db/client";
import { openPool, wrap } from "@/db/client";
import { closePeriod } from "@/db/pay/close";
import { readPayFile } from "@/db/pay/exports";
import { assert } from "@/lib/assert";
import { makeFactory } from "@/tests/make/factory";
import { AFTER, CLERK, FORTNIGHT, makePeriods, TIME_ZONE } from "@/tests/make/pay-period";
import { APP, ask, cloneDatabase, urlFor } from "@/tests/setup/clone";
import { makeTemplate } from "@/tests/setup/template";

const PEOPLE = 2500;
const BUDGET_SECONDS = 20;

/** Closes a fortnight of a large site, nobody agreed to, and writes its file; the time it took. */
export async function benchClose(server: string, say: (text: string) => void): Promise<string> {
  const name = `bench_close_${process.pid}`;
  await cloneDatabase(server, await makeTemplate(server), name);
  const pool = openPool(urlFor(server, APP, name), (error) => say(error.message));
  try {
    const db = wrap(pool);
    const factory = await makeFactory(db);
    const { ended: periodId } = await makePeriods(factory);
    say(`a fortnight of ${PEOPLE} people`);
    await fillFortnight(db, factory.siteId);
    await ask(server, "vacuum analyze", [], name);
    const found = await db.execute<{ id: string }>(sql`select id from workers`);
    const named = found.rows.map(({ id }) => id);
    const asked = { periodId, timeZone: TIME_ZONE, now: AFTER, named, reason: "bench" };
    say("closing it");
    const begun = performance.now();
    const closed = await closePeriod(factory, asked, CLERK);
    assert(closed.ok, "benchClose: the period can be closed");
    const seconds = (performance.now() - begun) / 1000;
    const file = await readPayFile(factory, { periodId, revision: 1, siteName: "Bench" });
    const fileSeconds = (performance.now() - begun) / 1000 - seconds;
    const { headcount, hours } = file.totals;
    return [
      `closing ${headcount} people × 14 days: ${seconds.toFixed(1)} s   (budget: ${BUDGET_SECONDS} s)`,
      `   ${hours.paid} hours, of them ${hours.overtime} overtime; its file read in ${fileSeconds.toFixed(1)} s`,
      "",
    ].join("\n");
  } finally {
    await pool.end();
    await ask(server, `drop database ${name} with (force)`);
  }
}

/** Eleven days of work each, of thirteen stretches with a meal and two rests. */
async function fillFortnight(db: Db, siteId: string): Promise<void> {
  for (const month of ["2026-05-31", "2026-06-01"]) {
    await db.execute(sql`select make_partition('segments', ${`${month}T12:00:00Z`}::timestamptz)`);
  }
  await db.execute(sql`
    insert into workers (site_id, id, number, name, home_cell_id)
    select ${siteId}, gen_random_uuid(), (20000 + n)::text, 'Worker ' || n, c.id
    from generate_series(1, ${PEOPLE - 1}) as n
    join cells c on c.site_id = ${siteId} and c.name = 'Mill'`);
  const days = sql`
    select w.id, ${`${FORTNIGHT.from}T11:00:00Z`}::timestamptz + make_interval(days => d) as at
    from workers w
    cross join generate_series(1, 13) as d
    where w.site_id = ${siteId} and d not in (6, 7)`;
  await db.execute(sql`
    insert into shifts (site_id, worker_id, start_at, end_at, start_event_id)
    select ${siteId}, d.id, d.at, d.at + interval '520 minutes', gen_random_uuid()
    from (${days}) d`);
  await db.execute(sql`
    insert into segments (site_id, start_at, worker_id, item, end_at, activity, ticket, operation,
      seconds, event_id)
    select ${siteId}, d.at + make_interval(mins => 40 * p), d.id, 0,
      d.at + make_interval(mins => 40 * p + 40),
      case p when 3 then 'rest' when 6 then 'meal' when 9 then 'rest' else 'run' end,
      case when p not in (3, 6, 9) then '26048176' end,
      case when p not in (3, 6, 9) then '010' end, 2400, gen_random_uuid()
    from (${days}) d
    cross join generate_series(0, 12) as p`);
  await db.execute(sql`
    insert into timeline_heads (site_id, worker_id, version, as_of)
    select ${siteId}, w.id, 1, now() from workers w where w.site_id = ${siteId}`);
}
