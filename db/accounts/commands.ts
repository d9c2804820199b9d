import { and, eq, isNull, sql } from "drizzle-orm";
import { clearTries, revokeSessionsOf } from "@/db/access/commands";
import { accountRoles, accounts } from "@/db/access/tables";
import { giveStanding } from "@/db/accounts/standing";
import { recordAct } from "@/db/audit/commands";
import type { Scope } from "@/db/client";
import { sites } from "@/db/sites/tables";
import type { AccountForm, RolesForm } from "@/lib/access/schema";
import { no, noField, ok, type Result } from "@/lib/result";

/** Who changes an account (as the audit log names it), and when. */
interface Hand {
  by: string;
  now: Date;
}

/** Adds an account with its roles at the site; sent twice it adds one. */
export async function addAccount(
  scope: Scope,
  account: AccountForm & { passwordHash: string },
  { by }: Hand,
): Promise<Result<void>> {
  return settling(scope, async (tx) => {
    const { id, name, email, passwordHash } = account;
    const [known] = await tx.db
      .select({ id: accounts.id })
      .from(accounts)
      .where(eq(accounts.email, email));
    if (known && known.id !== id) {
      return noField("email", "This e-mail signs in already. Change its roles instead.");
    }
    await tx.db
      .insert(accounts)
      .values({ id, name, email, passwordHash })
      .onConflictDoUpdate({ target: accounts.id, set: { passwordHash } });
    await recordAct(tx, { by, action: "accounts.add", subject: `account:${id}` });
    return giveStanding(tx, id, account);
  });
}

/** Gives an account exactly these roles at the site, from the next request on. */
export async function setRoles(scope: Scope, form: RolesForm, { by }: Hand): Promise<Result<void>> {
  return settling(scope, async (tx) => {
    const { account: id, roles, cells } = form;
    if (!(await isHere(tx, id))) return NOT_HERE;
    const detail = { roles, cells };
    await recordAct(tx, { by, action: "accounts.roles", subject: `account:${id}`, detail });
    return giveStanding(tx, id, form);
  });
}

/** Closes an account or opens it again; closing ends its sessions everywhere, at once. */
export async function closeAccount(
  scope: Scope,
  account: { id: string; isClosed: boolean },
  { by, now }: Hand,
): Promise<Result<void>> {
  return settling(scope, async (tx) => {
    const { id, isClosed } = account;
    if (!(await isHere(tx, id))) return NOT_HERE;
    await tx.db
      .update(accounts)
      .set({ disabledAt: isClosed ? now : null })
      .where(eq(accounts.id, id));
    if (isClosed) await revokeSessionsOf(tx.db, id, now);
    const action = isClosed ? "accounts.close" : "accounts.open";
    await recordAct(tx, { by, action, subject: `account:${id}` });
    return ok(undefined);
  });
}

/**
 * Gives an account of the site a new password: the old one and all its sessions end, wrong tries are
 * forgotten.
 */
export async function setPassword(
  scope: Scope,
  account: { id: string; passwordHash: string; tryKey: string },
  { by, now }: Hand,
): Promise<Result<void>> {
  return settling(scope, async (tx) => {
    const { id, passwordHash, tryKey } = account;
    if (!(await isHere(tx, id))) return NOT_HERE;
    await tx.db.update(accounts).set({ passwordHash }).where(eq(accounts.id, id));
    await revokeSessionsOf(tx.db, id, now);
    await clearTries(tx.db, [tryKey]);
    await recordAct(tx, { by, action: "accounts.password", subject: `account:${id}` });
    return ok(undefined);
  });
}

const NOT_HERE = no("notFound", "This account is not here any more.");

/**
 * Runs a change of accounts; undone where it is refused or would leave the site without an admin.
 * One at a time per site, or two admins could each take the other's role.
 */
async function settling(
  scope: Scope,
  change: (tx: Scope) => Promise<Result<void>>,
): Promise<Result<void>> {
  const undone = new Error("undone");
  let result: Result<void> = ok(undefined);
  try {
    await scope.db.transaction(async (db) => {
      await db.execute(sql`select 1 from ${sites} where ${sites.id} = ${scope.siteId} for update`);
      result = await change({ ...scope, db });
      if (result.ok && !(await hasAdmin({ ...scope, db }))) result = NO_ADMIN;
      if (!result.ok) throw undone;
    });
  } catch (error) {
    if (error !== undone) throw error;
  }
  return result;
}

const NO_ADMIN = no("conflict", "Someone must stay admin. Make another admin first.");

async function hasAdmin({ db, siteId }: Scope): Promise<boolean> {
  const [admin] = await db
    .select({ id: accounts.id })
    .from(accountRoles)
    .innerJoin(accounts, eq(accounts.id, accountRoles.accountId))
    .where(
      and(
        eq(accountRoles.siteId, siteId),
        eq(accountRoles.role, "admin"),
        isNull(accounts.disabledAt),
      ),
    )
    .limit(1);
  return admin !== undefined;
}

async function isHere({ db, siteId }: Scope, accountId: string): Promise<boolean> {
  const [row] = await db
    .select({ id: accountRoles.id })
    .from(accountRoles)
    .where(and(eq(accountRoles.siteId, siteId), eq(accountRoles.accountId, accountId)))
    .limit(1);
  return row !== undefined;
}
