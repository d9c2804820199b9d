import { and, asc, eq, isNull } from "drizzle-orm";
import type { Scope } from "@/db/client";
import { workers } from "@/db/people/tables";
import { shifts } from "@/db/timeline/tables";

/** Lists the shifts that run, with their workers' numbers, the longest first. */
export async function listOpenShifts({ db, siteId }: Scope) {
  return db
    .select({ number: workers.number, startAt: shifts.startAt })
    .from(shifts)
    .innerJoin(workers, and(eq(workers.siteId, shifts.siteId), eq(workers.id, shifts.workerId)))
    .where(and(eq(shifts.siteId, siteId), isNull(shifts.endAt)))
    .orderBy(asc(shifts.startAt));
}

/** Lists the numbers of all workers of a site, also of those who left. */
export async function listWorkerNumbers({ db, siteId }: Scope): Promise<string[]> {
  const rows = await db
    .select({ number: workers.number })
    .from(workers)
    .where(eq(workers.siteId, siteId))
    .orderBy(asc(workers.number));
  return rows.map(({ number }) => number);
}
