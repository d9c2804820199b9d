import { buildId } from "@/app/_server/build-id";
import { database } from "@/app/_server/database";
import { handle } from "@/app/_server/handle";
import { currentSealKey } from "@/app/_server/seal";
import { noteSeen } from "@/db/kiosks/seen";
import { type KioskTime, timeQuery } from "@/lib/kiosks/schema";
import { no, ok } from "@/lib/result";

/**
 * Tells a kiosk the time, the build that answers and the key to seal for, and keeps what it says of
 * itself. The time is read last: a kiosk takes it for the middle of its round trip.
 */
export const GET = handle(
  { actor: "kiosk", query: timeQuery },
  async ({ actor, query, receivedAt }) => {
    if (actor.revokedAt)
      return no("forbidden", "This tablet was taken out of use. Use another one.");
    const scope = { db: database(), siteId: actor.siteId };
    const sealKey = await currentSealKey(scope);
    const { build, queued, battery } = query;
    const batteryPercent = battery === undefined ? undefined : Math.round(battery);
    const said = { build, queued, batteryPercent, sealKid: sealKey.kid, now: receivedAt };
    await noteSeen(scope, actor.kioskId, said);
    const time: KioskTime = { serverTime: new Date().toISOString(), build: buildId(), sealKey };
    return ok(time);
  },
);
