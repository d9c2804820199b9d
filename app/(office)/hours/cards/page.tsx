import type { Metadata } from "next";
import Link from "next/link";
import { personFor } from "@/app/_server/page-actor";
import { readOpenCard, readPeriodPage } from "@/app/_server/periods";
import { closePeriod, reopenPeriod } from "@/app/(office)/hours/cards/actions";
import { CardDays } from "@/components/periods/card-days";
import { CardsLedger } from "@/components/periods/cards-ledger";
import { CardsSentence } from "@/components/periods/cards-sentence";
import { CloseForm, ReopenForm } from "@/components/periods/close-form";
import { FileLinks } from "@/components/periods/file-links";
import { PeriodFoot } from "@/components/periods/period-foot";
import { Empty } from "@/components/ui/empty";
import { listCells } from "@/db/cells/queries";
import { listPeriods } from "@/db/pay/queries";
import { reachOf } from "@/lib/access/may";
import { linesAgreed, reconcile } from "@/lib/periods/cards-view";
import { cardsFilter } from "@/lib/periods/schema";
import "@/app/styles/periods.css";

export const metadata: Metadata = { title: "Cards" };

/** As far back as the choice of periods goes: two years of fortnights. */
const PERIODS = 52;
/** The most cards that one page draws; a cell at a time shows the others. */
const LINES = 400;

interface CardsProps {
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}

/** The cards of a pay period: what is to look at, what was agreed to, and the file for pay. */
export default async function CardsPage({ searchParams }: CardsProps) {
  const { scope, person, cells: homeCells } = await personFor("periods.see");
  const filter = cardsFilter.parse(await searchParams);
  const now = new Date();
  const [periods, cells] = await Promise.all([
    listPeriods(scope, { limit: PERIODS }),
    listCells(scope),
  ]);
  const mayPolicies = reachOf(person.held, "policies.see") !== null;
  // what was asked for, else the one that waits to be closed, else the one that runs
  const period =
    periods.find(({ id }) => id === filter.period) ??
    periods.findLast(({ isClosed }) => !isClosed) ??
    periods[0];
  if (!period) {
    const act = mayPolicies && (
      <Link className="button" data-tone="solid" href="/hours/policies">
        Set pay periods
      </Link>
    );
    return <Empty act={act}>There is no pay period yet. Say when the first one begins.</Empty>;
  }
  const seen = await readPeriodPage(scope, period, { homeCells, now });
  const inCell = seen.lines.filter(({ worker }) => !filter.cell || worker.cell === filter.cell);
  const open = seen.lines.filter(({ state }) => state === "to look at");
  const ownChanges = seen.adjustments.filter(({ aboutId }) => aboutId === period.id);
  const address = { ...filter, period: period.id };
  const days = filter.worker
    ? await readOpenCard(scope, { period, seen, number: filter.worker, now })
    : null;
  const mayClose = reachOf(person.held, "periods.close") !== null;
  return (
    <>
      <h1 className="sr-only">Cards</h1>
      <CardsSentence
        filter={address}
        periods={periods}
        cells={homeCells ? [] : cells.map(({ name }) => name)}
        count={{
          all: inCell.length,
          toLookAt: inCell.filter(({ state }) => state === "to look at").length,
          closedBy: period.isClosed ? period.closedBy : null,
          isOver: seen.isOver,
        }}
      />
      {inCell.length === 0 ? (
        <Empty>Nobody has a card here. Choose another period or cell.</Empty>
      ) : (
        <CardsLedger
          lines={inCell.slice(0, LINES)}
          filter={address}
          days={days && <CardDays days={days} timeZone={seen.timeZone} />}
        />
      )}
      {inCell.length > LINES && (
        <p className="desk-aside">{inCell.length - LINES} more cards: choose a cell to see them.</p>
      )}
      {mayClose && (
        <PeriodFoot
          reconciliation={reconcile(
            period.isClosed ? seen.recorded : linesAgreed(seen.lines),
            period.isClosed ? seen.paid : seen.lines,
          )}
          book={{
            title: period.isClosed ? "The records now" : "Agreed cards",
            note: period.isClosed
              ? changesNote(ownChanges.length)
              : `${open.length} ${open.length === 1 ? "card is" : "cards are"} still to look at`,
            acts: mayPolicies && (
              <Link className="button" href="/hours/policies">
                Pay policies
              </Link>
            ),
          }}
          day={{
            title: "File for pay",
            note: period.isClosed
              ? `revision ${period.revision}, frozen as ${period.digest?.slice(0, 12)}`
              : openNote(seen.adjustments.length, seen.isOver),
            acts: period.isClosed ? (
              <>
                <FileLinks period={period.id} />
                <ReopenForm action={reopenPeriod} period={period.id} />
              </>
            ) : (
              seen.isOver && (
                <CloseForm
                  action={closePeriod}
                  period={period.id}
                  open={open.map(({ worker, toLookAt }) => {
                    return { id: worker.id, name: worker.name, why: toLookAt };
                  })}
                />
              )
            ),
          }}
        />
      )}
    </>
  );
}

function changesNote(count: number): string {
  if (count === 0) return "nothing was corrected since";
  const days = count === 1 ? "1 workday was" : `${count} workdays were`;
  return `${days} corrected since: paid with the open period`;
}

function openNote(adjustments: number, isOver: boolean): string {
  const corrections = adjustments === 1 ? "1 correction" : `${adjustments} corrections`;
  const changes = adjustments === 0 ? "" : `, with ${corrections} of closed days`;
  return isOver ? `all cards as they are now${changes}` : `can be closed when it is over${changes}`;
}
