import { database } from "@/app/_server/database";
import { handle } from "@/app/_server/handle";
import { kioskCookie } from "@/app/_server/kiosk-cookie";
import { currentSealKey } from "@/app/_server/seal";
import { hashSecret, newSecret } from "@/app/_server/secret";
import { enrolKiosk } from "@/db/kiosks/enrolment";
import { findSite } from "@/db/sites/queries";
import { type Enrolled, enrolRequest } from "@/lib/kiosks/schema";
import { no } from "@/lib/result";
import { ruleAt } from "@/lib/time/site-day";

/** Makes this browser a kiosk with a one-time code of ten minutes; the cookie is its proof. */
export const POST = handle(
  { actor: "nobody", body: enrolRequest },
  async ({ body, request, receivedAt }) => {
    const token = newSecret();
    const hashes = { codeHash: hashSecret(body.code), tokenHash: hashSecret(token) };
    const kiosk = await enrolKiosk(database(), { ...hashes, now: receivedAt });
    if (!kiosk)
      return no("unauthenticated", "This code is unknown, used or older than ten minutes.");
    const { siteId, kioskId, name, cell } = kiosk;
    const scope = { db: database(), siteId };
    const [site, sealKey] = await Promise.all([findSite(scope), currentSealKey(scope)]);
    if (!site) throw new Error(`site ${siteId} has a kiosk and is not there`);
    const { timeZone } = ruleAt(site.rules, receivedAt.getTime());
    const enrolled: Enrolled = {
      deviceId: kioskId,
      name,
      cell,
      site: { id: siteId, name: site.name, timeZone, locale: site.locale },
      sealKey,
      serverTime: new Date().toISOString(),
    };
    const headers = { "cache-control": "no-store", "set-cookie": kioskCookie(token, request) };
    return Response.json(enrolled, { headers });
  },
);
