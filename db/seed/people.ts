import { v7 as uuidv7 } from "uuid";
import { accountRoles, accounts, accountWorkers } from "@/db/access/tables";
import type { Scope } from "@/db/client";
import { plannedShifts, workers } from "@/db/people/tables";
import { type FactoryIds, idOf } from "@/db/seed/factory";
import { inChunks } from "@/db/seed/in-chunks";
import type { Role } from "@/lib/access/roles";
import { cast } from "@/lib/demo/cast";
import { type OfficeMember, office } from "@/lib/demo/office";
import type { DemoShift } from "@/lib/demo/shifts";

/** Turns a PIN or a password into what may be stored; the server gives it and knows how. */
export type Hash = (secret: string) => Promise<string>;

/** Payroll numbers are unique in the installation; the demo's begin here. */
const PAYROLL_FIRST = 70_000;

/** Writes everyone who clocks labour, each with a PIN, and answers their ids by number. */
export async function writeWorkers(
  { db, siteId }: Scope,
  ids: FactoryIds,
  { hash, now }: { hash: Hash; now: Date },
): Promise<Map<string, string>> {
  const pinHashes = await Promise.all(cast.map(({ pin }) => hash(pin)));
  const rows = cast.map(({ number, name, language, cell }, at) => ({
    siteId,
    id: uuidv7(),
    number,
    name,
    language,
    homeCellId: idOf(ids.cells, cell),
    payrollNumber: String(PAYROLL_FIRST + Number(number)),
    pinHash: pinHashes[at]!,
    pinSetAt: now,
  }));
  await db.insert(workers).values(rows);
  return new Map(rows.map(({ number, id }) => [number, id]));
}

/** Writes the accounts of the office with their roles, and who of them clocks labour. */
export async function writeAccounts(
  { db, siteId }: Scope,
  ids: FactoryIds & { workers: ReadonlyMap<string, string> },
  hash: Hash,
): Promise<void> {
  const members = await Promise.all(
    office.map(async (member) => ({
      ...member,
      accountId: uuidv7(),
      passwordHash: await hash(member.password),
    })),
  );
  await db.insert(accounts).values(
    members.map(({ accountId: id, email, name, passwordHash }) => ({
      id,
      email,
      name,
      passwordHash,
    })),
  );
  await db.insert(accountRoles).values(
    members.flatMap((member) =>
      rolesOf(member, ids).map((role) => ({
        siteId,
        id: uuidv7(),
        accountId: member.accountId,
        ...role,
      })),
    ),
  );
  await db
    .insert(accountWorkers)
    .values(
      members.flatMap(({ accountId, worker }) =>
        worker === null ? [] : [{ siteId, accountId, workerId: idOf(ids.workers, worker) }],
      ),
    );
}

/** One row a role; a lead's has one for each cell. */
function rolesOf({ roles, cells }: OfficeMember, ids: FactoryIds) {
  return roles.flatMap((role): { role: Role; cellId: string | null }[] =>
    role === "lead"
      ? cells.map((cell) => ({ role, cellId: idOf(ids.cells, cell) }))
      : [{ role, cellId: null }],
  );
}

/** Writes what everyone is planned to attend, in the history and for the days to come. */
export async function writePlannedShifts(
  { db, siteId }: Scope,
  workerIds: ReadonlyMap<string, string>,
  shifts: readonly DemoShift[],
): Promise<void> {
  await inChunks(
    shifts.map(({ worker, workOn, start, end }) => ({
      siteId,
      id: uuidv7(),
      workerId: idOf(workerIds, worker),
      workOn,
      startAt: new Date(start * 1000),
      endAt: new Date(end * 1000),
    })),
    (rows) => db.insert(plannedShifts).values(rows),
  );
}
