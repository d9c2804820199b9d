import "server-only";
import { clearTries } from "@/db/access/commands";
import type { Db } from "@/db/client";
import { reserveTries, takeBackTry } from "@/db/kiosks/pin-tries";
import { pinWaits } from "@/lib/kiosks/pin-waits";

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

function keysOf({ siteId, worker, kioskId, now }: PinTry) {
  return {
    pair: `pin:${siteId}:${worker}:${kioskId}`,
    worker: `worker:${siteId}:${worker}`,
    // by the hour: a tablet's slips are forgiven with time, not by somebody's right PIN
    kiosk: `kiosk:${siteId}:${kioskId}:${now.toISOString().slice(0, 13)}`,
  };
}
