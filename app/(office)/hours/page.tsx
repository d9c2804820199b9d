import type { Metadata } from "next";
import { hoursWanted } from "@/app/_server/hours";
import { personFor } from "@/app/_server/page-actor";
import { siteOf } from "@/app/_server/site";
import { correct } from "@/app/(office)/floor/actions";
import { HoursFigures } from "@/components/hours/hours-figures";
import { HoursFilterSentence } from "@/components/hours/hours-filter";
import { HoursLedger } from "@/components/hours/hours-ledger";
import { NextPage } from "@/components/shell/next-page";
import { Empty } from "@/components/ui/empty";
import { listCells } from "@/db/cells/queries";
import { countLooseEnds, listPlanned, listStretches, listTaps, sumHours } from "@/db/hours/queries";
import { reachOf } from "@/lib/access/may";
import { hoursFilter } from "@/lib/hours/filter";
import { hoursPage } from "@/lib/hours/page";
import { ruleAt } from "@/lib/time/site-day";

export const metadata: Metadata = { title: "Hours" };

const PAGE = 100;

interface HoursProps {
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}

/** Each worker's attended time in a range, opened by day, and a day down to its taps. */
export default async function HoursPage({ searchParams }: HoursProps) {
  const visit = await personFor("hours.see");
  const { scope, person, reach, cells } = visit;
  const query = await searchParams;
  const filter = hoursFilter.parse(query);
  const now = new Date();
  const asker = { ...person, reach, cells: cells ?? [] };
  const { wanted, range } = await hoursWanted(asker, filter, now);
  const after = typeof query.after === "string" ? query.after : undefined;
  const many = { ...wanted, after, limit: PAGE + 1 };
  const own = windowOf(filter.worker, wanted.days);
  const day = windowOf(
    filter.worker,
    wanted.days.filter(({ date }) => date === filter.day),
  );
  const [site, allCells, rows, planned, ends, stretches, taps] = await Promise.all([
    siteOf(scope.siteId),
    listCells(scope),
    sumHours(scope, many),
    listPlanned(scope, many),
    countLooseEnds(scope, many),
    own ? listStretches(scope, many, own) : [],
    day ? listTaps(scope, many, day) : [],
  ]);
  const view = hoursPage({ rows, planned, ends, stretches, taps }, { filter, days: wanted.days });
  const shown = view.workers.slice(0, PAGE);
  const address = { ...filter, ...range };
  return (
    <>
      <h1 className="sr-only">Hours</h1>
      <HoursFilterSentence
        filter={address}
        cells={reach === "self" ? [] : allCells.map(({ name }) => name)}
        exports={reachOf(person.held, "hours.export") !== null}
        agrees={reachOf(person.held, "hours.agree") !== null}
      />
      {shown.length > 0 ? (
        <>
          <HoursFigures total={view.total} isWhole={view.workers.length <= PAGE && !after} />
          <HoursLedger
            workers={shown}
            filter={address}
            timeZone={ruleAt(site.rules, now.getTime()).timeZone}
            nowSecond={Math.floor(now.getTime() / 1000)}
            linksTickets={reachOf(person.held, "tickets.see") !== null}
            correct={reachOf(person.held, "records.correct") !== null ? correct : null}
          />
        </>
      ) : (
        <Empty>Nobody was in on these days. Choose other dates or another cell.</Empty>
      )}
      {view.workers.length > PAGE && (
        <NextPage path="/hours" query={address} after={shown.at(-1)!.worker} />
      )}
    </>
  );
}

/** The window of one worker's days; null where no worker or no day is open. */
function windowOf(worker: string, days: readonly { start: number; end: number }[]) {
  const [first] = days;
  return worker && first ? { worker, start: first.start, end: days.at(-1)!.end } : null;
}
