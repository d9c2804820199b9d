import { and, eq, gt, isNull } from "drizzle-orm";
import {
  accountRoles,
  accounts,
  accountWorkers,
  apiKeys,
  officeSessions,
} from "@/db/access/tables";
import type { Db, Scope } from "@/db/client";
import type { Held } from "@/lib/access/may";
import { role } from "@/lib/access/roles";

/** Finds a live key by the SHA-256 of its secret; null if unknown or revoked. Keys are above sites. */
export async function findKey(db: Db, keyHash: string) {
  const [key] = await db
    .select({ id: apiKeys.id, siteId: apiKeys.siteId, role: apiKeys.role })
    .from(apiKeys)
    .where(and(eq(apiKeys.keyHash, keyHash), isNull(apiKeys.revokedAt)))
    .limit(1);
  return key ? { ...key, role: role.parse(key.role) } : null;
}

/** Finds an office session that is neither revoked nor over, with its account; null otherwise. */
export async function findOfficeSession(db: Db, sessionId: string, now: Date) {
  const [session] = await db
    .select({
      id: officeSessions.id,
      accountId: accounts.id,
      name: accounts.name,
      email: accounts.email,
      lastSeenAt: officeSessions.lastSeenAt,
    })
    .from(officeSessions)
    .innerJoin(accounts, eq(accounts.id, officeSessions.accountId))
    .where(
      and(
        eq(officeSessions.id, sessionId),
        isNull(officeSessions.revokedAt),
        gt(officeSessions.expiresAt, now),
        isNull(accounts.disabledAt),
      ),
    )
    .limit(1);
  return session ?? null;
}

/** Lists the roles of an account by site, a lead with one row per cell. May be empty. */
export async function listRoles(db: Db, accountId: string) {
  const rows = await db
    .select({ siteId: accountRoles.siteId, role: accountRoles.role, cellId: accountRoles.cellId })
    .from(accountRoles)
    .where(eq(accountRoles.accountId, accountId))
    .orderBy(accountRoles.createdAt);
  return rows.map((row) => ({ ...row, role: role.parse(row.role) }));
}

/** Finds the worker that an account is at a site; null if it is none. */
export async function findOwnWorker({ db, siteId }: Scope, accountId: string) {
  const [own] = await db
    .select({ workerId: accountWorkers.workerId })
    .from(accountWorkers)
    .where(and(eq(accountWorkers.siteId, siteId), eq(accountWorkers.accountId, accountId)))
    .limit(1);
  return own?.workerId ?? null;
}

/** Lists what the account behind a worker may do at a kiosk; empty for most workers. */
export async function listRolesOfWorker({ db, siteId }: Scope, workerId: string): Promise<Held[]> {
  const rows = await db
    .select({ role: accountRoles.role, cellId: accountRoles.cellId })
    .from(accountWorkers)
    .innerJoin(accounts, eq(accounts.id, accountWorkers.accountId))
    .innerJoin(
      accountRoles,
      and(
        eq(accountRoles.accountId, accountWorkers.accountId),
        eq(accountRoles.siteId, accountWorkers.siteId),
      ),
    )
    .where(
      and(
        eq(accountWorkers.siteId, siteId),
        eq(accountWorkers.workerId, workerId),
        isNull(accounts.disabledAt),
      ),
    );
  return heldOf(rows);
}

/** Gathers role rows into one entry a role, a lead's with all its cells. */
export function heldOf(rows: readonly { role: string; cellId: string | null }[]): Held[] {
  const names = [...new Set(rows.map((row) => row.role))];
  return names.map((name) => ({
    role: role.parse(name),
    cells: rows.flatMap((row) => (row.role === name && row.cellId ? [row.cellId] : [])),
  }));
}
