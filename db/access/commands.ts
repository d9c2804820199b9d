import { and, eq, gt, inArray, isNull, like, lt, sql } from "drizzle-orm";
import { v7 as uuidv7 } from "uuid";
import { accountRoles, accounts, officeSessions, setupLinks, throttles } from "@/db/access/tables";
import { recordAct } from "@/db/audit/commands";
import type { Db } from "@/db/client";
import { sites } from "@/db/sites/tables";
import { no, ok, type Result } from "@/lib/result";

/** Opens an office session for an account, until `expiresAt`. */
export async function openSession(
  db: Db,
  session: { id: string; accountId: string; expiresAt: Date },
): Promise<void> {
  await db.insert(officeSessions).values(session);
}

/** Ends one office session, at once and for good. */
export async function revokeSession(db: Db, sessionId: string, now: Date): Promise<void> {
  await db
    .update(officeSessions)
    .set({ revokedAt: now })
    .where(and(eq(officeSessions.id, sessionId), isNull(officeSessions.revokedAt)));
}

/** Ends all office sessions of an account: a new password or a closed account means everywhere. */
export async function revokeSessionsOf(db: Db, accountId: string, now: Date): Promise<void> {
  await db
    .update(officeSessions)
    .set({ revokedAt: now })
    .where(and(eq(officeSessions.accountId, accountId), isNull(officeSessions.revokedAt)));
}

/**
 * Takes a place for one try at a secret before it is checked, so that tries at the same time cannot
 * slip past the count. Counts as wrong until `clearTries`.
 *
 * @param key what is slowed down, such as `email:<hash>`
 * @param waitsSeconds the wait after the n-th wrong try in a row, at index n − 1 (`lib/access`)
 * @returns how many seconds are still to wait; 0 means that this try may be made
 */
export async function reserveTry(
  db: Db,
  { key, waitsSeconds, now }: { key: string; waitsSeconds: readonly number[]; now: Date },
): Promise<number> {
  const waits = sql`${sql.param(waitsSeconds)}::int[]`;
  const until = (nth: unknown) =>
    sql`${now.toISOString()}::timestamptz
      + (${waits})[least(${nth}, array_length(${waits}, 1))] * interval '1 second'`;
  const reserved = await db
    .insert(throttles)
    .values({ key, failures: 1, lastFailedAt: now, blockedUntil: until(1) })
    .onConflictDoUpdate({
      target: throttles.key,
      set: {
        failures: sql`${throttles.failures} + 1`,
        lastFailedAt: now,
        blockedUntil: until(sql`${throttles.failures} + 1`),
      },
      setWhere: sql`${throttles.blockedUntil} is null
        or ${throttles.blockedUntil} <= ${now.toISOString()}::timestamptz`,
    })
    .returning({ key: throttles.key });
  if (reserved.length > 0) return 0;
  const [blocked] = await db
    .select({ until: throttles.blockedUntil })
    .from(throttles)
    .where(eq(throttles.key, key));
  return Math.max(1, Math.ceil(((blocked?.until ?? now).getTime() - now.getTime()) / 1000));
}

/** Forgets wrong tries: after a right one, or because a new secret was given. */
export async function clearTries(db: Db, keys: readonly string[]): Promise<void> {
  await db.delete(throttles).where(inArray(throttles.key, [...keys]));
}

/**
 * Makes the first admin of an installation from its one-time link, once: the link is used up in the
 * same transaction. The link must be live and the installation have a site. For an e-mail that signs
 * in already it gives a new password and the admin's role: the way back in for a lost last admin.
 */
export async function makeFirstAdmin(
  db: Db,
  admin: { tokenHash: string; name: string; email: string; passwordHash: string; now: Date },
): Promise<Result<{ accountId: string }>> {
  return db.transaction(async (tx) => {
    const used = await tx
      .update(setupLinks)
      .set({ usedAt: admin.now })
      .where(
        and(
          eq(setupLinks.tokenHash, admin.tokenHash),
          isNull(setupLinks.usedAt),
          gt(setupLinks.expiresAt, admin.now),
        ),
      )
      .returning({ id: setupLinks.id });
    const [site] = await tx.select({ id: sites.id }).from(sites).orderBy(sites.createdAt).limit(1);
    if (used.length === 0 || !site) return no("gone", LINK_USED);
    const { name, email, passwordHash } = admin;
    const [account] = await tx
      .insert(accounts)
      .values({ id: uuidv7(), name, email, passwordHash })
      .onConflictDoUpdate({ target: accounts.email, set: { name, passwordHash, disabledAt: null } })
      .returning({ id: accounts.id });
    const accountId = account!.id;
    await revokeSessionsOf(tx, accountId, admin.now);
    await tx
      .insert(accountRoles)
      .values({ siteId: site.id, id: uuidv7(), accountId, role: "admin" })
      .onConflictDoNothing();
    const scope = { db: tx, siteId: site.id };
    const subject = `account:${accountId}`;
    await recordAct(scope, { by: "command:first-admin", action: "accounts.first", subject });
    return ok({ accountId });
  });
}

const LINK_USED = "This link was used or is over. Ask for a new one where Bookmatch was started.";

/** Forgets the hourly counts of tablets once they bear on nothing any more. */
export async function clearOldTries(db: Db, now: Date): Promise<void> {
  const before = new Date(now.getTime() - 2 * 86_400_000);
  await db
    .delete(throttles)
    .where(and(like(throttles.key, "kiosk:%"), lt(throttles.lastFailedAt, before)));
}
