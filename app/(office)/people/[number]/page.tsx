import type { Metadata } from "next";
import Link from "next/link";
import { notFound } from "next/navigation";
import { personFor } from "@/app/_server/page-actor";
import { siteOf } from "@/app/_server/site";
import { changePerson, resetPin } from "@/app/(office)/people/actions";
import { PinReset } from "@/components/people/pin-reset";
import { WorkerChange } from "@/components/people/worker-form";
import { listCells } from "@/db/cells/queries";
import { findWorker } from "@/db/people/queries";
import { reachOf } from "@/lib/access/may";
import { dayText } from "@/lib/time/format";
import { localDate, ruleAt } from "@/lib/time/site-day";

export const metadata: Metadata = { title: "Worker" };

interface WorkerProps {
  params: Promise<{ number: string }>;
}

/** One worker: who it is on the left, what may be changed on the right. */
export default async function WorkerPage({ params }: WorkerProps) {
  const { person, scope, cells: own } = await personFor("people.see");
  const { number } = await params;
  const [worker, cells, site] = await Promise.all([
    findWorker(scope, number, own),
    listCells(scope),
    siteOf(scope.siteId),
  ]);
  if (!worker) notFound();
  const may = (action: Parameters<typeof reachOf>[1]) => reachOf(person.held, action) !== null;
  const { timeZone } = ruleAt(site.rules, Date.now());
  const pinOn = worker.pinSetAt && localDate(worker.pinSetAt.getTime(), timeZone);
  return (
    <div className="desk-pair">
      <section>
        <p className="code text-t-4 text-ink-2">{worker.number}</p>
        <h1 className="text-t-6">{worker.name}</h1>
        <dl className="desk-facts">
          <dt>Home cell</dt>
          <dd>{worker.cell}</dd>
          <dt>Payroll number</dt>
          <dd>{worker.payrollNumber ?? "none yet"}</dd>
          <dt>PIN</dt>
          <dd>{pinOn ? `given ${dayText(pinOn, "en-GB")}` : "none yet"}</dd>
          <dt>Last day</dt>
          <dd>{worker.endsOn ? dayText(worker.endsOn, "en-GB") : "stays"}</dd>
        </dl>
        <p className="flex flex-wrap gap-2">
          <Link href={`/people/${number}/badge`} className="button" data-rim="left">
            Badge
          </Link>
          {may("hours.see") && (
            <Link href={`/hours?worker=${number}`} className="button">
              Hours
            </Link>
          )}
          <Link href="/people" className="button">
            All people
          </Link>
        </p>
      </section>
      <section className="grid content-start gap-8">
        {may("people.reset-pin") && (
          <div>
            <h2 className="text-t-5">New PIN</h2>
            <PinReset action={resetPin} worker={worker} />
          </div>
        )}
        {may("people.change") && (
          <div>
            <h2 className="text-t-5">On file</h2>
            <WorkerChange action={changePerson} worker={worker} cells={cells} />
          </div>
        )}
      </section>
    </div>
  );
}
