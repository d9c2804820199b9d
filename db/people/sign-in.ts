import { and, eq } from "drizzle-orm";
import type { Scope } from "@/db/client";
import { workers } from "@/db/people/tables";

/** Finds what signing in asks of a worker by the number on the badge; null if there is none. */
export async function findWorkerToSignIn({ db, siteId }: Scope, number: string) {
  const [worker] = await db
    .select({
      id: workers.id,
      number: workers.number,
      name: workers.name,
      language: workers.language,
      homeCellId: workers.homeCellId,
      pinHash: workers.pinHash,
      endsOn: workers.endsOn,
    })
    .from(workers)
    .where(and(eq(workers.siteId, siteId), eq(workers.number, number)))
    .limit(1);
  return worker ?? null;
}
