import type { Metadata } from "next";
import { v7 as uuidv7 } from "uuid";
import { ownAddress } from "@/app/_server/own-address";
import { personFor } from "@/app/_server/page-actor";
import { makeCode } from "@/app/(office)/kiosks/actions";
import { EnrolmentForm } from "@/components/kiosks/enrolment-form";
import { listCells } from "@/db/cells/queries";

export const metadata: Metadata = { title: "Enrol a tablet" };

/** A one-time code that makes a browser a kiosk of a cell. */
export default async function EnrolPage() {
  const { scope } = await personFor("kiosks.change");
  const [cells, address] = await Promise.all([listCells(scope), ownAddress()]);
  return (
    <div className="desk-pair">
      <section>
        <h1 className="text-t-6">Enrol a tablet</h1>
        <ol className="mt-4 grid max-w-[46ch] list-decimal gap-2 pl-5">
          <li>Make a code for the cell where the tablet hangs. It holds for ten minutes, once.</li>
          <li>
            On the tablet open{" "}
            <code className="break-all whitespace-normal">{address}/kiosk/enrol</code> or scan the
            QR code.
          </li>
          <li>Key the code there. From then on the tablet belongs to the cell.</li>
        </ol>
        <p className="mt-4 max-w-[46ch] text-ink-2">
          A tablet needs https to use its camera, unless Bookmatch runs on the tablet itself.
        </p>
      </section>
      <section>
        <h2 className="text-t-5">A code</h2>
        <EnrolmentForm action={makeCode} id={uuidv7()} cells={cells} />
      </section>
    </div>
  );
}
