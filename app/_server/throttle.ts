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

/** A try of this process, from before its place is asked for until its PIN was checked. */
interface UnderWay {
  /** Seconds to wait; 0 where it got its place. */
  reserved: Promise<number>;
  ended: Promise<unknown>;
  /** The tries that were under way at any time while it asked: they may hold its place. */
  beside: Set<UnderWay>;
}
/** By each thing that they count against. */
const underWay = new Map<string, Set<UnderWay>>();

/** What became of a try: whether the PIN was right, or how many seconds are still to wait. */
export type Tried = { isRight: boolean } | { waitSeconds: number };

/**
 * Checks a PIN once there is a place for the try. A place is taken before the check, so that tries at
 * the same time cannot slip past the count; where the places are only taken by tries that are still
 * being checked, this one waits for them: a queue of people with right PINs slows nobody down.
 */
export async function tryPin(db: Db, one: PinTry, proves: () => Promise<boolean>): Promise<Tried> {
  const keys = Object.values(keysOf(one));
  for (;;) {
    const reserved = reservePinTry(db, one);
    const ended = reserved.then((waitSeconds) => (waitSeconds ? null : check(db, one, proves)));
    const attempt = { reserved, ended, beside: new Set<UnderWay>() };
    const isRight = await whileUnderWay(keys, attempt, ended);
    if (isRight !== null) return { isRight };
    const beside = [...attempt.beside];
    const waits = await Promise.all(beside.map((other) => other.reserved.catch(() => 1)));
    const checking = beside.filter((_, at) => waits[at] === 0);
    if (checking.length === 0) return { waitSeconds: await reserved };
    await Promise.race(checking.map((other) => other.ended.catch(() => null)));
  }
}

async function check(db: Db, one: PinTry, proves: () => Promise<boolean>): Promise<boolean> {
  const isRight = await proves();
  if (isRight) await forgetPinTries(db, one);
  return isRight;
}

async function whileUnderWay<T>(
  keys: readonly string[],
  attempt: UnderWay,
  answer: Promise<T>,
): Promise<T> {
  for (const key of keys) {
    const others = underWay.get(key) ?? new Set();
    for (const other of others) {
      other.beside.add(attempt);
      attempt.beside.add(other);
    }
    underWay.set(key, others.add(attempt));
  }
  try {
    return await answer;
  } finally {
    for (const key of keys) {
      underWay.get(key)?.delete(attempt);
      if (underWay.get(key)?.size === 0) underWay.delete(key);
    }
  }
}

/** Takes a place for one try; answers how many seconds are still to wait, 0 for go on. */
function reservePinTry(db: Db, one: PinTry): Promise<number> {
  const { pair, worker, kiosk } = keysOf(one);
  const slowed = [
    { key: pair, waitsSeconds: pinWaits.pair },
    { key: worker, waitsSeconds: pinWaits.worker },
    { key: kiosk, waitsSeconds: pinWaits.kiosk },
  ];
  return reserveTries(db, slowed, one.now);
}

/** Forgets the worker's wrong tries after a right one; of the tablet's it takes back this one. */
async function forgetPinTries(db: Db, one: PinTry): Promise<void> {
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
