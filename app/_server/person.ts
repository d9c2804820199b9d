import "server-only";
import { sealData, unsealData } from "iron-session";
import { cookies } from "next/headers";
import { cache } from "react";
import type { PersonActor } from "@/app/_server/actor";
import { database } from "@/app/_server/database";
import { env } from "@/app/_server/env";
import { heldOf, listSessionRoles } from "@/db/access/queries";
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

/**
 * Finds who is signed in to the office, with the roles at their site; the server's row decides.
 * Within one request it is asked once, however many parts of a page want to know.
 */
export const personOf = cache(async (): Promise<Result<PersonActor>> => {
  const sealed = (await cookies()).get(OFFICE_COOKIE)?.value;
  const { sessionId } = sealed ? await unsealData<OfficeCookie>(sealed, sealing()) : {};
  const rows = sessionId ? await listSessionRoles(database(), sessionId, new Date()) : [];
  const [first] = rows;
  if (!first) return no("unauthenticated", "Sign in first.");
  const { siteId } = first;
  if (!siteId) return no("forbidden", "Your account has no role here yet. Ask an admin for one.");
  const atSite = rows.filter((row) => row.siteId === siteId);
  const held = heldOf(atSite.flatMap(({ role, cellId }) => (role ? [{ role, cellId }] : [])));
  const { accountId, name, email, workerId } = first;
  const who = { siteId, accountId, sessionId: first.sessionId, name, email, workerId };
  return ok({ kind: "person", ...who, held });
});
