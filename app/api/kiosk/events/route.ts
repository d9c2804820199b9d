import { nudgeJudge } from "@/app/_jobs/tickets";
import { bookInLine } from "@/app/_server/booking-line";
import { database } from "@/app/_server/database";
import { handle } from "@/app/_server/handle";
import { renewedCookie } from "@/app/_server/kiosk-cookie";
import { provedSessions } from "@/app/_server/sealed-sessions";
import { reserveKept } from "@/app/_server/throttle";
import { listBenches } from "@/db/kiosks/bench";
import type { EventResults } from "@/lib/kiosks/schema";
import { eventBatch } from "@/lib/ledger/schema";
import { instantMs } from "@/lib/time/instant";

/**
 * Books a kiosk's batch, at most 500 records, and answers record by record in the order sent; each
 * worker's last one carries a fresh bench. The schema checks the envelope only: what cannot be read
 * is kept as a loose end. Sending a batch twice books it once.
 */
export const POST = handle(
  { actor: "kiosk", body: eventBatch },
  async ({ actor, body, request, receivedAt }) => {
    const scope = { db: database(), siteId: actor.siteId };
    const isRevoked = actor.revokedAt !== null;
    if (isRevoked) {
      const full = await reserveKept(scope, actor.kioskId, body.events);
      if (full) return full;
    }
    const proved = isRevoked ? [] : await provedSessions(scope, actor, body, receivedAt);
    const booked = await bookInLine(scope, {
      kioskId: actor.kioskId,
      isRevoked,
      events: body.events,
      receivedAt,
      deviceMs: instantMs(body.deviceTime) ?? receivedAt.getTime(),
      proved,
      withBench: !isRevoked,
    });
    if (!booked.ok) return booked;
    nudgeJudge();
    const benches = isRevoked ? null : await listBenches(scope, booked.value, receivedAt);
    const answer: EventResults = {
      results: booked.value.results.map((result, place) => {
        const bench = benches?.get(place);
        return bench ? { ...result, bench } : result;
      }),
      serverTime: new Date().toISOString(),
    };
    return Response.json(answer, {
      headers: { "cache-control": "no-store", "set-cookie": renewedCookie(request) },
    });
  },
);
