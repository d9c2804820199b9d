import { and, asc, eq, exists, gt, ilike, isNull, or, type SQL, sql } from "drizzle-orm";
import {
  accountRoles,
  accounts,
  accountWorkers,
  apiKeys,
  officeSessions,
  setupLinks,
} from "@/db/access/tables";
import type { Db, Scope } from "@/db/client";
import { workers } from "@/db/people/tables";
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

/**
 * Finds who an office session belongs to, with the roles at each site and the worker that the
 * account is there: one row per role, none where the session is revoked or over or the account is
 * disabled, and one without a role where it has none.
 */
export async function listSessionRoles(db: Db, sessionId: string, now: Date) {
  return db
    .select({
      sessionId: officeSessions.id,
      accountId: accounts.id,
      name: accounts.name,
      email: accounts.email,
      siteId: accountRoles.siteId,
      role: accountRoles.role,
      cellId: accountRoles.cellId,
      workerId: accountWorkers.workerId,
    })
    .from(officeSessions)
    .innerJoin(accounts, eq(accounts.id, officeSessions.accountId))
    .leftJoin(accountRoles, eq(accountRoles.accountId, accounts.id))
    .leftJoin(
      accountWorkers,
      and(
        eq(accountWorkers.accountId, accounts.id),
        eq(accountWorkers.siteId, accountRoles.siteId),
      ),
    )
    .where(
      and(
        eq(officeSessions.id, sessionId),
        isNull(officeSessions.revokedAt),
        gt(officeSessions.expiresAt, now),
        isNull(accounts.disabledAt),
      ),
    )
    .orderBy(accountRoles.createdAt, accountRoles.id);
}

/** Finds the account of an e-mail, in small letters, with what proves it; disabled ones too. */
export async function findSignIn(db: Db, email: string) {
  const [account] = await db
    .select({
      accountId: accounts.id,
      passwordHash: accounts.passwordHash,
      disabledAt: accounts.disabledAt,
    })
    .from(accounts)
    .where(eq(accounts.email, email))
    .limit(1);
  return account ?? null;
}

/** Finds a live link that makes the first admin, by its token's SHA-256; null once used or over. */
export async function findSetupLink(db: Db, tokenHash: string, now: Date) {
  const [link] = await db
    .select({ id: setupLinks.id, expiresAt: setupLinks.expiresAt })
    .from(setupLinks)
    .where(
      and(
        eq(setupLinks.tokenHash, tokenHash),
        isNull(setupLinks.usedAt),
        gt(setupLinks.expiresAt, now),
      ),
    )
    .limit(1);
  return link ?? null;
}

/** An account of the office as the admin sees it, with what it may do at the site. */
export interface Account {
  id: string;
  name: string;
  email: string;
  isClosed: boolean;
  held: Held[];
  /** The number of the worker that the person is, if any. */
  worker: string | null;
}

/**
 * Lists the accounts that hold a role at the site, by name, those with `text` in name or e-mail.
 * `after` is the id of the last account of the page before; null begins.
 */
export async function listAccounts(
  scope: Scope,
  text: string,
  page: { after: string | null; limit: number },
): Promise<Account[]> {
  const part = `%${text.replace(/[\\%_]/g, "\\$&")}%`;
  const named = text && or(ilike(accounts.name, part), ilike(accounts.email, part));
  const later =
    page.after &&
    sql`(${accounts.name}, ${accounts.id}) > (
      select a.name, a.id from accounts a where a.id = ${page.after})`;
  return accountsOf(scope, and(named || undefined, later || undefined), page.limit);
}

/** Finds an account that holds a role at the site; null for any other. */
export async function findAccount(scope: Scope, accountId: string): Promise<Account | null> {
  return (await accountsOf(scope, eq(accounts.id, accountId), 1))[0] ?? null;
}

async function accountsOf(
  { db, siteId }: Scope,
  which: SQL | undefined,
  limit: number,
): Promise<Account[]> {
  const roles = sql<{ role: string; cellId: string | null }[]>`(
    select json_agg(json_build_object('role', r.role, 'cellId', r.cell_id) order by r.created_at)
    from ${accountRoles} r
    where r.site_id = ${siteId} and r.account_id = ${accounts.id})`;
  const isHere = db
    .select({ one: sql`1` })
    .from(accountRoles)
    .where(and(eq(accountRoles.siteId, siteId), eq(accountRoles.accountId, accounts.id)));
  const rows = await db
    .select({
      id: accounts.id,
      name: accounts.name,
      email: accounts.email,
      disabledAt: accounts.disabledAt,
      roles,
      worker: workers.number,
    })
    .from(accounts)
    .leftJoin(
      accountWorkers,
      and(eq(accountWorkers.siteId, siteId), eq(accountWorkers.accountId, accounts.id)),
    )
    .leftJoin(workers, and(eq(workers.siteId, siteId), eq(workers.id, accountWorkers.workerId)))
    .where(and(exists(isHere), which))
    .orderBy(asc(accounts.name), asc(accounts.id))
    .limit(limit);
  return rows.map(({ disabledAt, roles, ...account }) => ({
    ...account,
    isClosed: disabledAt !== null,
    held: heldOf(roles),
  }));
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
