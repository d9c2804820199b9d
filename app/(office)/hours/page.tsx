import type { Metadata } from "next";
import { redirect } from "next/navigation";
import { hoursView, readCards } from "@/app/_server/hours";
import { personFor } from "@/app/_server/page-actor";
import { siteOf } from "@/app/_server/site";
import { HoursFilterSentence } from "@/components/hours/hours-filter";
import { HoursLedger } from "@/components/hours/hours-ledger";
import { NextPage } from "@/components/shell/next-page";
import { Empty } from "@/components/ui/empty";
import { listCells } from "@/db/cells/queries";
import { countLooseEnds, sumPlanned } from "@/db/hours/queries";
import { findWorkerById } from "@/db/people/queries";
import { reachOf } from "@/lib/access/may";
import { hoursQuery } from "@/lib/hours/range";
import { addDays, rangeBounds } from "@/lib/time/site-day";

export const metadata: Metadata = { title: "Hours" };

const PAGE = 100;

interface HoursProps {
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}

/** Each worker's hours of a range of days; a lead sees the own cells, a worker the own days. */
export default async function HoursPage({ searchParams }: HoursProps) {
  const { person, scope, reach, cells: own } = await personFor("hours.see");
  if (reach === "self") {
    const self = person.workerId && (await findWorkerById(scope, person.workerId));
    if (self) redirect(`/hours/${self.number}`);
    return <Empty>Your account is no worker here yet. Ask an admin to say which one.</Empty>;
  }
  const query = hoursQuery.parse(await searchParams);
  const now = new Date();
  const { range, within } = await hoursView(scope, query, { cells: own, now });
  const { rules } = await siteOf(scope.siteId);
  const bounds = rangeBounds(range.from, addDays(range.to, 1), rules);
  const wanted = { within, after: query.after || null, limit: PAGE + 1 };
  const [cells, cards, planned, ends] = await Promise.all([
    listCells(scope),
    readCards(scope, range, wanted, now),
    sumPlanned(scope, range, within),
    countLooseEnds(scope, bounds, within),
  ]);
  const plans = new Map(planned.map(({ number, plannedSeconds }) => [number, plannedSeconds]));
  const counts = new Map(ends.map(({ number, count }) => [number, count]));
  const shown = cards.slice(0, PAGE);
  return (
    <>
      <h1 className="sr-only">Hours</h1>
      <HoursFilterSentence
        range={range}
        cell={query.cell}
        cells={cells.filter(({ id }) => own === null || own.includes(id))}
        mayExport={reachOf(person.held, "hours.export") !== null}
      />
      {shown.length > 0 ? (
        <HoursLedger
          rows={shown.map((card) => ({
            card,
            plannedSeconds: plans.get(card.number) ?? 0,
            looseEnds: counts.get(card.number) ?? 0,
          }))}
          range={range}
        />
      ) : (
        <Empty>Nobody here has hours on these days.</Empty>
      )}
      {cards.length > PAGE && (
        <NextPage path="/hours" query={{ ...query, ...range }} after={shown.at(-1)!.number} />
      )}
    </>
  );
}
