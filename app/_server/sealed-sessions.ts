import "server-only";
import type { KioskActor } from "@/app/_server/actor";
import { provePin } from "@/app/_server/pin";
import { hashSealed, unsealPin } from "@/app/_server/seal";
import type { Scope } from "@/db/client";
import {
  dropSealedBox,
  keepSealedBox,
  listSealedBoxes,
  type SealedBox,
} from "@/db/kiosks/sealed-boxes";
import { listKnownSessions } from "@/db/kiosks/sessions";
import { bookProvedLater } from "@/db/ledger/proved-later";
import type { ProvedSession } from "@/lib/ledger/decide-booking";
import type { EventBatch } from "@/lib/ledger/schema";

/**
 * Verifies the sealed credentials that came with a batch, each session once: a known one needs no
 * proof. A wrong or a throttled one is left out, and its records are kept as `unproved`, so that a
 * batch tells nobody a PIN; a throttled one is kept and tried again. One after the other, as tries
 * are counted.
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
  for (const one of sessions) {
    if (known.has(one.session)) continue;
    known.add(one.session);
    const box = { ...one, kioskId };
    const tried = await tryBox(scope, box, now);
    if (tried === "right") proved.push(provedBy(box));
    if (tried === "throttled") await keepSealedBox(scope, box, now);
  }
  return proved;
}

/**
 * Tries the sealed credentials of a site that came while tries were slowed down, and books what was
 * kept for want of proof. One that is still slowed down waits on; a wrong one proves nothing.
 *
 * @returns how many records were booked
 */
export async function retrySealedBoxes(scope: Scope, now: Date): Promise<number> {
  let booked = 0;
  for (const box of await listSealedBoxes(scope)) {
    const [known] = await listKnownSessions(scope, box.kioskId, [box.session]);
    const tried = known ? "right" : await tryBox(scope, box, now);
    if (tried === "throttled") continue;
    if (tried === "right") {
      const { kioskId } = box;
      booked += await bookProvedLater(scope, { kioskId, proved: provedBy(box), now });
    }
    await dropSealedBox(scope, box.session);
  }
  return booked;
}

async function tryBox(
  scope: Scope,
  { session, kioskId, worker, sealed }: SealedBox,
  now: Date,
): Promise<"right" | "wrong" | "throttled"> {
  const boundTo = { siteId: scope.siteId, kioskId, worker, session };
  const pin = await unsealPin(scope, sealed, boundTo);
  if (pin === null) return "wrong";
  const proof = await provePin(scope, { number: worker, pin, kioskId, now });
  if (proof.ok) return "right";
  return proof.problem.code === "throttled" ? "throttled" : "wrong";
}

function provedBy({ session, worker, sealed }: SealedBox): ProvedSession {
  return { session, worker, sealedHash: hashSealed(sealed) };
}
