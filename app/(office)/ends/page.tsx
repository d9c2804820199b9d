import type { Metadata } from "next";
import { v7 as uuidv7 } from "uuid";
import { personFor } from "@/app/_server/page-actor";
import { siteOf } from "@/app/_server/site";
import { settle } from "@/app/(office)/ends/actions";
import { EndsFilterSentence } from "@/components/ends/ends-filter";
import { EndsLedger } from "@/components/ends/ends-ledger";
import { OpenEnd } from "@/components/ends/open-end";
import { NextPage } from "@/components/shell/next-page";
import { Empty } from "@/components/ui/empty";
import { listCells } from "@/db/cells/queries";
import { countEnds, findOpenEnd, listEnds } from "@/db/ends/queries";
import { reachOf } from "@/lib/access/may";
import { cursorOf } from "@/lib/api/cursor";
import { endsFilter } from "@/lib/ends/schema";
import { endGroups, endOpen, positionOf, readKey } from "@/lib/ends/view";
import { ruleAt } from "@/lib/time/site-day";

export const metadata: Metadata = { title: "Loose ends" };

const PAGE = 60;

interface EndsProps {
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}

/** What a person must settle, the worst and oldest first, and how each may be. */
export default async function EndsPage({ searchParams }: EndsProps) {
  const { person, scope, cells: within } = await personFor("ends.see");
  const { cell, code, open: named, after } = endsFilter.parse(await searchParams);
  const now = new Date();
  const wanted = { within, cell, code };
  const [site, cells, rows, counts, found] = await Promise.all([
    siteOf(scope.siteId),
    listCells(scope),
    listEnds(scope, wanted, { after, limit: PAGE + 1 }),
    countEnds(scope, wanted),
    findOpenEnd(scope, wanted, readKey(named)),
  ]);
  const { timeZone } = ruleAt(site.rules, now.getTime());
  const groups = endGroups(rows.slice(0, PAGE), timeZone);
  const open = found && endOpen(found, { timeZone, nowMs: now.getTime() });
  const line = groups.flatMap(({ lines }) => lines).find(({ key }) => key === open?.key);
  const may = (action: Parameters<typeof reachOf>[1]) => reachOf(person.held, action) !== null;
  const choices = within === null ? cells : cells.filter(({ id }) => within.includes(id));
  const address = Object.fromEntries(
    Object.entries({ cell, code }).filter(([, value]) => value !== ""),
  );
  return (
    <>
      <h1 className="sr-only">Loose ends</h1>
      <EndsFilterSentence
        cell={cell}
        code={code}
        cells={choices.map(({ name }) => name)}
        counts={counts}
      />
      {rows.length === 0 ? (
        <Empty>{emptyWords({ cell, code })}</Empty>
      ) : (
        <EndsLedger
          groups={groups}
          open={open?.key ?? ""}
          address={address}
          linksTickets={may("tickets.see")}
        >
          {open && line && (
            <OpenEnd
              line={line}
              open={open}
              formId={uuidv7()}
              action={settle}
              timeZone={timeZone}
              nowSecond={Math.floor(now.getTime() / 1000)}
              looksAtHours={may("hours.see")}
            />
          )}
        </EndsLedger>
      )}
      {rows.length > PAGE && (
        <NextPage path="/ends" query={address} after={cursorOf(positionOf(rows[PAGE - 1]!))} />
      )}
    </>
  );
}

function emptyWords({ cell, code }: { cell: string; code: string }): string {
  if (cell || code) return "Nothing like that is left to settle. Choose wider.";
  return "Nothing is left to settle. Every record has its place.";
}
