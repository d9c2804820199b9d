import type { Metadata } from "next";
import Link from "next/link";
import { personFor } from "@/app/_server/page-actor";
import { siteOf } from "@/app/_server/site";
import { KioskLedger } from "@/components/kiosks/kiosk-ledger";
import { Empty } from "@/components/ui/empty";
import { listKiosks } from "@/db/kiosks/queries";
import { ruleAt } from "@/lib/time/site-day";

export const metadata: Metadata = { title: "Kiosks" };

/** The tablets of the site: where each stands, and what it last said of itself. */
export default async function KiosksPage() {
  const { scope } = await personFor("kiosks.see");
  const now = new Date();
  const [site, kiosks] = await Promise.all([siteOf(scope.siteId), listKiosks(scope, now)]);
  const inUse = kiosks.filter(({ revokedAt }) => revokedAt === null).length;
  const enrol = (
    <Link href="/kiosks/enrol" className="button" data-rim="right" data-tone="solid">
      Enrol a tablet
    </Link>
  );
  return (
    <>
      <h1 className="sr-only">Kiosks</h1>
      {kiosks.length === 0 ? (
        <Empty act={enrol}>No tablet is enrolled. Make a code and key it there.</Empty>
      ) : (
        <>
          <div className="desk-ask">
            <p className="text-t-4">
              <b>{inUse}</b> {inUse === 1 ? "tablet" : "tablets"} in use
            </p>
            <p className="desk-acts">{enrol}</p>
          </div>
          <KioskLedger
            kiosks={kiosks}
            nowMs={now.getTime()}
            timeZone={ruleAt(site.rules, now.getTime()).timeZone}
          />
        </>
      )}
    </>
  );
}
