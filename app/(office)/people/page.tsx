import type { Metadata } from "next";
import Link from "next/link";
import { personFor } from "@/app/_server/page-actor";
import { siteOf } from "@/app/_server/site";
import { PeopleFilterSentence } from "@/components/people/people-filter";
import { PeopleTable } from "@/components/people/people-table";
import { NextPage } from "@/components/shell/next-page";
import { Empty } from "@/components/ui/empty";
import { listCells } from "@/db/cells/queries";
import { listWorkers } from "@/db/people/queries";
import { reachOf } from "@/lib/access/may";
import { type PeopleQuery, peopleQuery } from "@/lib/people/schema";
import { localDate, ruleAt } from "@/lib/time/site-day";

export const metadata: Metadata = { title: "People" };

const PAGE = 100;

interface PeopleProps {
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}

/** Who clocks labour here: a lead sees the own cells. */
export default async function PeoplePage({ searchParams }: PeopleProps) {
  const { person, scope, cells: own } = await personFor("people.see");
  const query = peopleQuery.parse(await searchParams);
  const { rules } = await siteOf(scope.siteId);
  const now = Date.now();
  const today = localDate(now, ruleAt(rules, now).timeZone);
  const filter = {
    text: query.q,
    within: withinOf(query, own),
    hereOn: query.left ? null : today,
  };
  const [cells, found] = await Promise.all([
    listCells(scope),
    listWorkers(scope, filter, { after: query.after || null, limit: PAGE + 1 }),
  ]);
  const workers = found.slice(0, PAGE);
  const mayChange = reachOf(person.held, "people.change") !== null;
  const mayGiveRoles = reachOf(person.held, "people.give-roles") !== null;
  return (
    <>
      <h1 className="sr-only">People</h1>
      <PeopleFilterSentence
        query={query}
        cells={cells.filter(({ id }) => own === null || own.includes(id))}
        acts={
          <>
            {mayChange && (
              <Link href="/people/new" className="button" data-rim="right">
                Add a worker
              </Link>
            )}
            {mayGiveRoles && (
              <Link href="/people/accounts" className="button" data-rim="right">
                Accounts and roles
              </Link>
            )}
          </>
        }
      />
      {workers.length > 0 ? (
        <PeopleTable workers={workers} today={today} />
      ) : (
        <Empty>{query.q ? `Nobody here is called ${query.q}.` : "Nobody is here yet."}</Empty>
      )}
      {found.length > PAGE && (
        <NextPage path="/people" query={query} after={workers.at(-1)!.number} />
      )}
    </>
  );
}

/** The cells to look in: the chosen one where it is theirs to see, else all that are. */
function withinOf({ cell }: PeopleQuery, own: string[] | null): string[] | null {
  if (!cell) return own;
  return own === null || own.includes(cell) ? [cell] : [];
}
