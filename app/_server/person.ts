import "server-only";
import { sealData, unsealData } from "iron-session";
import { cookies } from "next/headers";
import type { PersonActor } from "@/app/_server/actor";
import { database } from "@/app/_server/database";
import { env } from "@/app/_server/env";
import { findOfficeSession, findOwnWorker, heldOf, listRoles } from "@/db/access/queries";
import { no, ok, type Result } from "@/lib/result";

/** What the office's cookie carries: the id of a row that can be revoked. */
interface OfficeCookie {
  sessionId?: string;
}

/** An office session ends after a working day, used or not (OWASP ASVS 4.0.3 3.3.2, level 2). */
export const OFFICE_SESSION_MS = 12 * 3_600_000;

const OFFICE_COOKIE = "bookmatch_office";

const sealing = () => ({ password: env().SESSION_SECRET, ttl: OFFICE_SESSION_MS / 1000 });

/** Gives this browser the office session; `isLocal` leaves `Secure` out, for http on this machine. */
export async function openOffice(sessionId: string, isLocal: boolean): Promise<void> {
  const value = await sealData({ sessionId } satisfies OfficeCookie, sealing());
  const maxAge = OFFICE_SESSION_MS / 1000;
  const cookie = { httpOnly: true, sameSite: "lax", secure: !isLocal, path: "/", maxAge } as const;
  (await cookies()).set(OFFICE_COOKIE, value, cookie);
}

/** Takes the office session from this browser. */
export async function closeOffice(): Promise<void> {
  (await cookies()).delete(OFFICE_COOKIE);
}

/** Finds who is signed in to the office, with roles at their site; the server's row decides. */
export async function personOf(): Promise<Result<PersonActor>> {
  const sealed = (await cookies()).get(OFFICE_COOKIE)?.value;
  const { sessionId } = sealed ? await unsealData<OfficeCookie>(sealed, sealing()) : {};
  const session = sessionId ? await findOfficeSession(database(), sessionId, new Date()) : null;
  if (!session) return no("unauthenticated", "Sign in first.");
  const rows = await listRoles(database(), session.accountId);
  const siteId = rows[0]?.siteId;
  if (!siteId) return no("forbidden", "Your account has no role here yet. Ask an admin for one.");
  const { accountId, name, email } = session;
  const workerId = await findOwnWorker({ db: database(), siteId }, accountId);
  const held = heldOf(rows.filter((row) => row.siteId === siteId));
  return ok({
    kind: "person",
    siteId,
    accountId,
    sessionId: session.id,
    name,
    email,
    workerId,
    held,
  });
}
