import "server-only";
import { provesPassword } from "@/app/_server/password";
import { tryPin } from "@/app/_server/throttle";
import type { Scope } from "@/db/client";
import { findWorkerToSignIn } from "@/db/people/sign-in";
import { findSite } from "@/db/sites/queries";
import { no, ok, type Result } from "@/lib/result";
import { localDate, ruleAt } from "@/lib/time/site-day";

/** A PIN as it was keyed, and where. */
export interface KeyedPin {
  number: string;
  pin: string;
  kioskId: string;
  now: Date;
}

/** Who proved to be themselves. */
export type ProvedWorker = Omit<
  NonNullable<Awaited<ReturnType<typeof findWorkerToSignIn>>>,
  "pinHash" | "endsOn"
>;

/**
 * Checks a number and a PIN on a kiosk. An unknown number, somebody who left and a wrong PIN get the
 * same words after the same work; tries are slowed down before any of it.
 */
export async function provePin(scope: Scope, keyed: KeyedPin): Promise<Result<ProvedWorker>> {
  const { number, pin, kioskId, now } = keyed;
  const found = await findWorkerToSignIn(scope, number);
  const one = { siteId: scope.siteId, worker: found?.id ?? number, kioskId, now };
  const tried = await tryPin(scope.db, one, async () => {
    const isHere = found !== null && (await worksHere(scope, found.endsOn, now));
    return provesPassword(isHere ? found.pinHash : null, pin);
  });
  if ("waitSeconds" in tried) {
    const detail = "Too many wrong tries here. Wait, or ask your lead for a new PIN.";
    return no("throttled", detail, { retryAfterSeconds: tried.waitSeconds });
  }
  if (!tried.isRight || !found) {
    return no("unauthenticated", "Number and PIN do not match. Try again, or ask your lead.");
  }
  const { pinHash, endsOn, ...worker } = found;
  return ok(worker);
}

/** Somebody works here up to and including the last day, by the site's calendar. */
async function worksHere(scope: Scope, endsOn: string | null, now: Date): Promise<boolean> {
  if (endsOn === null) return true;
  const site = await findSite(scope);
  if (!site) return false;
  return localDate(now.getTime(), ruleAt(site.rules, now.getTime()).timeZone) <= endsOn;
}
