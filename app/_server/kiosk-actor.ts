import "server-only";
import type { KioskActor, WorkerActor } from "@/app/_server/actor";
import { bearerOf } from "@/app/_server/bearer";
import { database } from "@/app/_server/database";
import { inGroups } from "@/app/_server/in-groups";
import { hashSecret } from "@/app/_server/secret";
import { listRolesOfWorker } from "@/db/access/queries";
import { findKioskSession, findKiosksByToken } from "@/db/kiosks/queries";
import { isSessionOver } from "@/lib/kiosks/session";
import { no, ok, type Result } from "@/lib/result";

/** The device cookie that enrolment sets. */
export const KIOSK_COOKIE = "bookmatch_kiosk";

/** Every hand-in asks this first; those of many tablets are asked together. */
const kioskOfToken = inGroups((hashes) => findKiosksByToken(database(), hashes));

/** Finds the kiosk of a request by its device cookie; a revoked one is found too. */
export async function kioskOf(request: Request): Promise<Result<KioskActor>> {
  const token = kioskTokenOf(request);
  const kiosk = token ? await kioskOfToken(hashSecret(token)) : null;
  if (!kiosk) return no("unauthenticated", "This tablet is not enrolled. Ask an admin for a code.");
  return ok({ kind: "kiosk", ...kiosk });
}

/** Finds the worker whose session is open on this kiosk: device cookie and Bearer token together. */
export async function workerOf(request: Request): Promise<Result<WorkerActor>> {
  const kiosk = await kioskOf(request);
  if (!kiosk.ok) return kiosk;
  const { siteId, kioskId, revokedAt } = kiosk.value;
  if (revokedAt) return no("forbidden", "This tablet was taken out of use. Use another one.");
  const scope = { db: database(), siteId };
  const token = bearerOf(request);
  const session = token ? await findKioskSession(scope, kioskId, hashSecret(token)) : null;
  if (!session || isOver(session))
    return no("unauthenticated", "Sign in at this tablet first: number and PIN.");
  const held = await listRolesOfWorker(scope, session.workerId);
  const { sessionId, workerId, number } = session;
  return ok({ kind: "worker", siteId, kioskId, sessionId, workerId, number, held });
}

/** A token opens nothing any more once its session is over: the next act asks for the PIN. */
function isOver(session: NonNullable<Awaited<ReturnType<typeof findKioskSession>>>): boolean {
  const { openedAt, endedAt, shiftEndAt } = session;
  const shifts = shiftEndAt
    ? [{ end: Math.floor(shiftEndAt.getTime() / 1000), endEvent: session.sessionId }]
    : [];
  const held = { openedMs: openedAt.getTime(), endedMs: endedAt?.getTime() ?? null };
  return isSessionOver(held, { atMs: Date.now(), kind: "read" }, shifts);
}

/** The device token of a request's cookie; null where it carries none. */
export function kioskTokenOf(request: Request): string | null {
  const cookies = (request.headers.get("cookie") ?? "").split(/;\s*/);
  const prefix = `${KIOSK_COOKIE}=`;
  return cookies.find((cookie) => cookie.startsWith(prefix))?.slice(prefix.length) ?? null;
}
