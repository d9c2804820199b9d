import type { Metadata } from "next";
import { v7 as uuidv7 } from "uuid";
import { personFor } from "@/app/_server/page-actor";
import { siteOf } from "@/app/_server/site";
import { setStandard } from "@/app/(office)/standards/actions";
import { ReplayLedger } from "@/components/replay/replay-ledger";
import { StandardPanel } from "@/components/standards/standard-panel";
import { StandardsFilter } from "@/components/standards/standards-filter";
import { StandardsTable } from "@/components/standards/standards-table";
import { Empty } from "@/components/ui/empty";
import { listModels, listRouting, listStandardEntries } from "@/db/standards/entries";
import { listReplayed } from "@/db/standards/replayed";
import { reachOf } from "@/lib/access/may";
import { standardsPage } from "@/lib/replay/page";
import { replayFrom } from "@/lib/replay/replay";
import { standardsQuery } from "@/lib/standards/schema";
import { dayBounds, productionDay } from "@/lib/time/site-day";
import "@/app/styles/standards.css";

export const metadata: Metadata = { title: "Standards" };

interface StandardsProps {
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}

/** A model's standards; one opens to its history, a drafted change, and what that would do. */
export default async function StandardsPage({ searchParams }: StandardsProps) {
  const { person, scope } = await personFor("standards.see");
  const query = standardsQuery.parse(await searchParams);
  const { rules } = await siteOf(scope.siteId);
  const today = productionDay(Date.now(), rules);
  const model = query.model || null;
  const since = sinceOf(query.from, today);
  const [models, routing, entries, operations] = await Promise.all([
    listModels(scope),
    listRouting(scope, model),
    listStandardEntries(scope, { model }),
    query.op && model
      ? listReplayed(scope, {
          model,
          operation: query.op,
          since: new Date(dayBounds(since, rules).start * 1000),
        })
      : [],
  ]);
  const view = standardsPage({ models, routing, entries, operations }, { query, today, rules });
  const maySet = reachOf(person.held, "standards.set") !== null;
  return (
    <>
      <h1 className="sr-only">Standards</h1>
      <StandardsFilter view={view} />
      {view.lines.length === 0 ? (
        <Empty>
          {models.length === 0
            ? "No model is on file yet."
            : "No operation is like that. Choose another model or stage."}
        </Empty>
      ) : (
        <div className="desk-pair standards-pair" data-open={view.open ? "" : undefined}>
          <StandardsTable view={view} />
          <StandardPanel view={view} maySet={maySet} id={uuidv7()} action={setStandard} />
        </div>
      )}
      {view.open?.replay && <ReplayLedger open={view.open} replay={view.open.replay} />}
    </>
  );
}

/** From when on tickets are wanted: the replay's four weeks, or the draft's day where it is earlier. */
function sinceOf(from: string, today: string): string {
  const first = replayFrom(today);
  return /^\d{4}-\d\d-\d\d$/.test(from) && from < first && from > "1990-01-01" ? from : first;
}
