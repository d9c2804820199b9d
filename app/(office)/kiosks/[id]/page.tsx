import type { Metadata } from "next";
import Link from "next/link";
import { notFound } from "next/navigation";
import { personFor } from "@/app/_server/page-actor";
import { changeKiosk, revokeKiosk } from "@/app/(office)/kiosks/actions";
import { KioskChange, KioskRevocation } from "@/components/kiosks/kiosk-acts";
import { listCells } from "@/db/cells/queries";
import { listKiosks } from "@/db/kiosks/queries";

export const metadata: Metadata = { title: "Kiosk" };

interface KioskProps {
  params: Promise<{ id: string }>;
}

/** One tablet: what it is on the left, what may be changed on the right. */
export default async function KioskPage({ params }: KioskProps) {
  const { scope } = await personFor("kiosks.change");
  const [kiosks, cells] = await Promise.all([listKiosks(scope, new Date()), listCells(scope)]);
  const { id } = await params;
  const kiosk = kiosks.find((each) => each.id === id);
  if (!kiosk) notFound();
  return (
    <div className="desk-pair">
      <section>
        <h1 className="text-t-6">{kiosk.name}</h1>
        <dl className="desk-facts">
          <dt>Cell</dt>
          <dd>{kiosk.cells.map(({ name }) => name).join(", ")}</dd>
          <dt>Build</dt>
          <dd>{kiosk.build ? <code>{kiosk.build}</code> : "not said yet"}</dd>
          <dt>Records waiting there</dt>
          <dd>{kiosk.queued ?? "not said yet"}</dd>
        </dl>
        <p>
          <Link href="/kiosks" className="button" data-rim="left">
            All kiosks
          </Link>
        </p>
      </section>
      {kiosk.revokedAt ? (
        <section>
          <p className="text-t-4">This tablet is out of use. Enrol it again with a new code.</p>
        </section>
      ) : (
        <section className="grid content-start gap-8">
          <div>
            <h2 className="text-t-5">Name and cell</h2>
            <KioskChange action={changeKiosk} kiosk={kiosk} cells={cells} />
          </div>
          <div>
            <h2 className="text-t-5">Take it out of use</h2>
            <KioskRevocation action={revokeKiosk} kiosk={kiosk.id} />
          </div>
        </section>
      )}
    </div>
  );
}
