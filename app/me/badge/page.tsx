import type { Metadata } from "next";
import Link from "next/link";
import { notFound } from "next/navigation";
import { personFor } from "@/app/_server/page-actor";
import { dotsOf } from "@/app/_server/print";
import { QrCode } from "@/components/print/qr-code";
import { findMe } from "@/db/me/queries";
import { badgeCode } from "@/lib/codes/badge-code";

export const metadata: Metadata = { title: "My badge" };

/** One's own badge on the phone's screen, for the kiosk's camera: always dark on light. */
export default async function OwnBadgePage() {
  const { person, scope } = await personFor("me.see");
  const me = person.workerId ? await findMe(scope, person.workerId) : null;
  if (!me) notFound();
  return (
    <main className="me-badge">
      <h1>{me.name}</h1>
      <p className="code">{me.number}</p>
      <div data-theme="light" className="me-code">
        <QrCode dots={dotsOf(badgeCode(me.number))} label={`QR code of badge ${me.number}`} />
      </div>
      <p>Hold it before the kiosk's camera.</p>
      <Link href="/me" className="plate" data-rim="both" data-minor="">
        <span>Back to my hours</span>
      </Link>
    </main>
  );
}
