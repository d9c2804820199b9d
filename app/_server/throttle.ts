import "server-only";
import { clearTries } from "@/db/access/commands";
import type { Db, Scope } from "@/db/client";
import { addUpTo, reserveTries, takeBackTry } from "@/db/kiosks/tries";
import { pinWaits } from "@/lib/kiosks/pin-waits";
import { canonicalJson } from "@/lib/ledger/canonical";
import { no } from "@/lib/result";
import { sum } from "@/lib/sum";

/** One try at a PIN: whose, on which tablet. `worker` is the id, or the number of nobody known. */
export interface PinTry {
  siteId: string;
  worker: string;
  kioskId: string;
  now: Date;
}

/** Takes a place for one try; answers how many seconds are still to wait, 0 for go on. */
export function reservePinTry(db: Db, one: PinTry): Promise<number> {
  const { pair, worker, kiosk } = keysOf(one);
  const slowed = [
    { key: pair, waitsSeconds: pinWaits.pair },
    { key: worker, waitsSeconds: pinWaits.worker },
    { key: kiosk, waitsSeconds: pinWaits.kiosk },
  ];
  return reserveTries(db, slowed, one.now);
}

/** Forgets the worker's wrong tries after a right one; of the tablet's it takes back this one. */
export async function forgetPinTries(db: Db, one: PinTry): Promise<void> {
  const { pair, worker, kiosk } = keysOf(one);
  await clearTries(db, [pair, worker]);
  await takeBackTry(db, kiosk);
}

/** What a tablet taken out of use may still hand in: 2 MB, in parts of 500 bytes. */
const KEPT_MAX = 4000;
const KEPT_PART_BYTES = 500;

/** Makes room for what a revoked kiosk hands in; a problem once it has handed in its share. */
export async function reserveKept(scope: Scope, kioskId: string, events: readonly unknown[]) {
  const parts = sum(
    events.map((event) => Math.ceil(canonicalJson(event).length / KEPT_PART_BYTES)),
  );
  const key = `revoked:${scope.siteId}:${kioskId}`;
  if (await addUpTo(scope.db, { key, parts, max: KEPT_MAX, now: new Date() })) return null;
  return no("forbidden", "This tablet was taken out of use and has handed in all it may.");
}

function keysOf({ siteId, worker, kioskId, now }: PinTry) {
  return {
    pair: `pin:${siteId}:${worker}:${kioskId}`,
    worker: `worker:${siteId}:${worker}`,
    // by the hour: a tablet's slips are forgiven with time, not by somebody's right PIN
    kiosk: `kiosk:${siteId}:${kioskId}:${now.toISOString().slice(0, 13)}`,
  };
}
