import { and, eq } from "drizzle-orm";
import { v7 as uuidv7 } from "uuid";
import { accountRoles, accountWorkers } from "@/db/access/tables";
import type { Scope } from "@/db/client";
import { workers } from "@/db/people/tables";
import type { AccountForm } from "@/lib/access/schema";
import { noField, ok, type Result } from "@/lib/result";

/** What an account may do at a site, and which worker the person is. */
type Standing = Pick<AccountForm, "roles" | "cells" | "worker">;

/** Writes roles, led cells and the worker that the person is, in place of what stood there. */
export async function giveStanding(
  { db, siteId }: Scope,
  accountId: string,
  { roles, cells, worker }: Standing,
): Promise<Result<void>> {
  if (roles.length + cells.length === 0) return noField("roles", "Choose at least one role.");
  const workerId = worker ? await findFreeWorker({ db, siteId }, worker, accountId) : null;
  if (worker && !workerId) {
    return noField("worker", `${worker} is no worker here, or another account's.`);
  }
  const own = and(eq(accountRoles.siteId, siteId), eq(accountRoles.accountId, accountId));
  await db.delete(accountRoles).where(own);
  const rows = [
    ...roles.map((role) => ({ role, cellId: null })),
    ...cells.map((cellId) => ({ role: "lead", cellId })),
  ];
  await db
    .insert(accountRoles)
    .values(rows.map((row) => ({ siteId, id: uuidv7(), accountId, ...row })));
  await db
    .delete(accountWorkers)
    .where(and(eq(accountWorkers.siteId, siteId), eq(accountWorkers.accountId, accountId)));
  if (workerId) await db.insert(accountWorkers).values({ siteId, accountId, workerId });
  return ok(undefined);
}

async function findFreeWorker({ db, siteId }: Scope, number: string, accountId: string) {
  const [worker] = await db
    .select({ id: workers.id, accountId: accountWorkers.accountId })
    .from(workers)
    .leftJoin(
      accountWorkers,
      and(eq(accountWorkers.siteId, workers.siteId), eq(accountWorkers.workerId, workers.id)),
    )
    .where(and(eq(workers.siteId, siteId), eq(workers.number, number)));
  return worker && (worker.accountId ?? accountId) === accountId ? worker.id : null;
}
