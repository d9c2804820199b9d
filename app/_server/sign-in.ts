import "server-only";
import { headers } from "next/headers";
import { v7 as uuidv7 } from "uuid";
import { database } from "@/app/_server/database";
import { provesPassword } from "@/app/_server/password";
import { OFFICE_SESSION_MS, openOffice } from "@/app/_server/person";
import { hashSecret } from "@/app/_server/secret";
import { clearTries, openSession, reserveTry } from "@/db/access/commands";
import { findSignIn } from "@/db/access/queries";
import type { Db } from "@/db/client";
import { waitsSeconds } from "@/lib/access/throttle";
import { no, ok, type Result } from "@/lib/result";

/** Under which key the wrong passwords of an e-mail are counted. */
export function tryKeyOf(email: string): string {
  return `email:${hashSecret(email)}`;
}

/**
 * Finds the account that an e-mail and its password open. An unknown e-mail, a closed account and a
 * wrong password get the same words after the same work; tries are counted per e-mail, known or not.
 */
export async function proveAccount(
  db: Db,
  { email, password, now }: { email: string; password: string; now: Date },
): Promise<Result<{ accountId: string }>> {
  const key = tryKeyOf(email);
  const retryAfterSeconds = await reserveTry(db, { key, waitsSeconds, now });
  if (retryAfterSeconds > 0) {
    return no("throttled", waitWords(retryAfterSeconds), { retryAfterSeconds });
  }
  const account = await findSignIn(db, email);
  const hash = account && !account.disabledAt ? account.passwordHash : null;
  if (!(await provesPassword(hash, password)) || !account) {
    return no("unauthenticated", "E-mail and password do not belong together. Look at both.");
  }
  await clearTries(db, [key]);
  return ok({ accountId: account.accountId });
}

/** Opens the office for an account in the browser that asks. */
export async function enterOffice(accountId: string, now: Date): Promise<void> {
  const id = uuidv7();
  const expiresAt = new Date(now.getTime() + OFFICE_SESSION_MS);
  await openSession(database(), { id, accountId, expiresAt });
  await openOffice(id, isLocal((await headers()).get("host") ?? ""));
}

/** Browsers keep a `Secure` cookie over http on the machine itself; not all do, so it is left out. */
function isLocal(host: string): boolean {
  return /^(localhost|127\.0\.0\.1|\[::1\])(:\d+)?$/.test(host);
}

function waitWords(seconds: number): string {
  if (seconds > 86_400) return "Too many tries. Ask an admin for a new password.";
  const wait = seconds > 90 ? `${Math.ceil(seconds / 60)} minutes` : `${seconds} seconds`;
  return `Too many tries. Wait ${wait}, then try again.`;
}
