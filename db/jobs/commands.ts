import { sql } from "drizzle-orm";
import type { Db } from "@/db/client";

/** Months before and after the present one that are made ahead. */
const MONTHS_AROUND = 3;

/** Makes the partitions of the months around an instant, where they are missing (LEDGER.md 1). */
export async function makePartitions(db: Db, now: Date): Promise<void> {
  const months = Array.from({ length: 2 * MONTHS_AROUND + 1 }, (_, at) =>
    new Date(
      Date.UTC(now.getUTCFullYear(), now.getUTCMonth() + at - MONTHS_AROUND, 1),
    ).toISOString(),
  );
  await db.execute(sql`
    select make_partition(t.parent, m.month)
    from unnest(array['clock_events', 'segments']) as t (parent)
    cross join unnest(${sql.param(months)}::timestamptz[]) as m (month)`);
}
