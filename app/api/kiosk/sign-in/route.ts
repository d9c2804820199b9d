import { database } from "@/app/_server/database";
import { handle } from "@/app/_server/handle";
import { provePin } from "@/app/_server/pin";
import { hashSecret, newSecret } from "@/app/_server/secret";
import { listRolesOfWorker } from "@/db/access/queries";
import { findBench } from "@/db/kiosks/bench";
import { openKioskSession } from "@/db/kiosks/sessions";
import { type SignedIn, signInRequest } from "@/lib/kiosks/schema";
import { no, ok } from "@/lib/result";

/**
 * Opens a worker's session on this kiosk with number and PIN, and answers with the bench, so that no
 * second request follows. Asked again with the same session (an answer got lost) it gives a new
 * token.
 */
export const POST = handle(
  { actor: "kiosk", body: signInRequest },
  async ({ actor, body, receivedAt }) => {
    if (actor.revokedAt)
      return no("forbidden", "This tablet was taken out of use. Use another one.");
    const scope = { db: database(), siteId: actor.siteId };
    const { kioskId } = actor;
    const { session, pin, worker: number } = body;
    const proof = await provePin(scope, { number, pin, kioskId, now: receivedAt });
    if (!proof.ok) return proof;
    const token = newSecret();
    const { id: workerId, name, language } = proof.value;
    const opened = await openKioskSession(scope, {
      id: session,
      kioskId,
      workerId,
      tokenHash: hashSecret(token),
      now: receivedAt,
    });
    if (!opened.ok) return opened;
    const [held, bench] = await Promise.all([
      listRolesOfWorker(scope, workerId),
      findBench(scope, { kioskId, number, at: receivedAt }),
    ]);
    if (!bench) throw new Error(`worker ${workerId} signed in and has no bench`);
    const role = held.some((one) => one.role === "lead") ? "lead" : "worker";
    const signedIn: SignedIn = { token, worker: { worker: number, name, language, role }, bench };
    return ok(signedIn);
  },
);
