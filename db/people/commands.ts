import { and, eq, like, ne, or, sql } from "drizzle-orm";
import { throttles } from "@/db/access/tables";
import { recordAct } from "@/db/audit/commands";
import { cells } from "@/db/cells/tables";
import type { Scope } from "@/db/client";
import { workers } from "@/db/people/tables";
import type { WorkerForm } from "@/lib/people/schema";
import { no, noField, ok, type Result } from "@/lib/result";

/**
 * Adds a worker with a first PIN. Sent twice it adds one worker, whose PIN is the last one shown.
 * A number or payroll number that someone else has is refused.
 */
export async function addWorker(
  scope: Scope,
  worker: WorkerForm,
  pin: { hash: string; at: Date; by: string },
): Promise<Result<void>> {
  return scope.db.transaction(async (db) => {
    const taken = await whatIsTaken({ ...scope, db }, worker);
    if (taken) return taken;
    const secret = { pinHash: pin.hash, pinSetAt: pin.at };
    await db
      .insert(workers)
      .values({ siteId: scope.siteId, id: worker.id, ...columnsOf(worker), ...secret })
      .onConflictDoUpdate({ target: [workers.siteId, workers.id], set: secret });
    await recordAct(
      { ...scope, db },
      { by: pin.by, action: "people.add", subject: `worker:${worker.id}` },
    );
    return ok(undefined);
  });
}

/** Changes what is kept of a worker. The past keeps its cells: they stand on the events. */
export async function changeWorker(
  scope: Scope,
  worker: WorkerForm,
  by: string,
): Promise<Result<void>> {
  return scope.db.transaction(async (db) => {
    const taken = await whatIsTaken({ ...scope, db }, worker);
    if (taken) return taken;
    const changed = await db
      .update(workers)
      .set(columnsOf(worker))
      .where(and(eq(workers.siteId, scope.siteId), eq(workers.id, worker.id)))
      .returning({ id: workers.id });
    if (changed.length === 0) return no("notFound", "This worker is not here. Go back to People.");
    const subject = `worker:${worker.id}`;
    await recordAct({ ...scope, db }, { by, action: "people.change", subject });
    return ok(undefined);
  });
}

/** Gives a worker a new PIN: the old one ends at once, and wrong tries are forgotten. */
export async function setPin(
  scope: Scope,
  workerId: string,
  pin: { hash: string; at: Date; by: string },
): Promise<void> {
  await scope.db.transaction(async (db) => {
    const { siteId } = scope;
    await db
      .update(workers)
      .set({ pinHash: pin.hash, pinSetAt: pin.at })
      .where(and(eq(workers.siteId, siteId), eq(workers.id, workerId)));
    await db
      .delete(throttles)
      .where(
        or(
          like(throttles.key, `pin:${siteId}:${workerId}:%`),
          eq(throttles.key, `worker:${siteId}:${workerId}`),
        ),
      );
    const subject = `worker:${workerId}`;
    await recordAct({ ...scope, db }, { by: pin.by, action: "people.reset-pin", subject });
  });
}

const columnsOf = ({ number, name, cell, language, payrollNumber, endsOn }: WorkerForm) => ({
  number,
  name,
  language,
  homeCellId: cell,
  payrollNumber,
  endsOn,
});

/** Says kindly what the unique keys would refuse: number, payroll number, and an unknown cell. */
async function whatIsTaken({ db, siteId }: Scope, worker: WorkerForm) {
  const [found] = await db
    .select({
      cell: sql<boolean>`exists (select from ${cells}
        where ${cells.siteId} = ${siteId} and ${cells.id} = ${worker.cell})`,
      number: taken(and(eq(workers.siteId, siteId), eq(workers.number, worker.number)), worker),
      payroll: worker.payrollNumber
        ? taken(eq(workers.payrollNumber, worker.payrollNumber), worker)
        : sql<boolean>`false`,
    })
    .from(sql`(values (1)) as one`);
  if (!found?.cell) return noField("cell", "This cell is not here any more. Choose another.");
  if (found.number) return noField("number", `${worker.number} is someone else's number.`);
  if (found.payroll) return noField("payrollNumber", "Someone else is paid under this number.");
  return null;
}

const taken = (condition: ReturnType<typeof and>, worker: WorkerForm) =>
  sql<boolean>`exists (select from ${workers} where ${and(condition, ne(workers.id, worker.id))})`;
