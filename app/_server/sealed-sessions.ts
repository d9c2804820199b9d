import "server-only";
import type { KioskActor } from "@/app/_server/actor";
import { provePin } from "@/app/_server/pin";
import { hashSealed, unsealPin } from "@/app/_server/seal";
import type { Scope } from "@/db/client";
import { listKnownSessions } from "@/db/kiosks/sessions";
import type { ProvedSession } from "@/lib/ledger/decide-booking";
import type { EventBatch } from "@/lib/ledger/schema";

/**
 * Verifies the sealed credentials that came with a batch, each session once: a known one needs no
 * proof. A wrong or a throttled one is left out, and its records are kept as `unproved`, so that a
 * batch tells nobody a PIN. One after the other, as tries are counted.
 */
export async function provedSessions(
  scope: Scope,
  { kioskId }: KioskActor,
  { sessions = [] }: EventBatch,
  now: Date,
): Promise<ProvedSession[]> {
  const ids = sessions.map(({ session }) => session);
  const known = new Set(await listKnownSessions(scope, kioskId, ids));
  const proved: ProvedSession[] = [];
  for (const { session, worker, sealed } of sessions) {
    if (known.has(session)) continue;
    known.add(session);
    const boundTo = { siteId: scope.siteId, kioskId, worker, session };
    const pin = await unsealPin(scope, sealed, boundTo);
    if (pin === null) continue;
    const proof = await provePin(scope, { number: worker, pin, kioskId, now });
    if (proof.ok) proved.push({ session, worker, sealedHash: hashSealed(sealed) });
  }
  return proved;
}
