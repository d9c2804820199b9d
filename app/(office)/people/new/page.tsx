import type { Metadata } from "next";
import { v7 as uuidv7 } from "uuid";
import { personFor } from "@/app/_server/page-actor";
import { addPerson } from "@/app/(office)/people/actions";
import { NewWorker } from "@/components/people/worker-form";
import { listCells } from "@/db/cells/queries";
import { findNextNumber } from "@/db/people/queries";

export const metadata: Metadata = { title: "New worker" };

/** A new worker, who gets a number and a first PIN. */
export default async function NewWorkerPage() {
  const { scope } = await personFor("people.change");
  const [cells, number] = await Promise.all([listCells(scope), findNextNumber(scope)]);
  const blank = {
    id: uuidv7(),
    number,
    name: "",
    cellId: cells[0]?.id ?? "",
    language: "en",
    payrollNumber: null,
    endsOn: null,
  };
  return (
    <div className="desk-pair">
      <section>
        <h1 className="text-t-6">A new worker</h1>
        <p className="mt-3 max-w-[42ch]">
          The number goes on the badge and is keyed at the kiosk. The PIN is drawn at random and
          shown once, when you add the worker: hand it over then.
        </p>
      </section>
      <section>
        <NewWorker action={addPerson} worker={blank} cells={cells} />
      </section>
    </div>
  );
}
