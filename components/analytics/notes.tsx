import Link from "next/link";
import { type SeamFilter, seamAddress } from "@/lib/analytics/filter";
import type { SeamTotals } from "@/lib/analytics/lines";
import { hoursOf, signedHours } from "@/lib/analytics/words";

/**
 * What stands above the table: what finished work cannot show on the left, and on the right the line
 * that reconciles the two bases.
 */
export function SeamNotes({
  filter,
  totals,
  over,
}: {
  filter: SeamFilter;
  totals: SeamTotals;
  over: { tickets: number; seconds: number };
}) {
  return (
    <div className="seam-notes">
      <p>{over.tickets > 0 ? <OverNote filter={filter} over={over} /> : <NothingOver />}</p>
      <BetweenNote totals={totals} />
    </div>
  );
}

function OverNote({
  filter,
  over,
}: {
  filter: SeamFilter;
  over: { tickets: number; seconds: number };
}) {
  const isOpen = filter.over === "1";
  const href = seamAddress("/analytics/seam", filter, { over: isOpen ? "" : "1" });
  const subject =
    over.tickets === 1 ? "1 unfinished ticket is" : `${over.tickets} unfinished tickets are`;
  return (
    <>
      <b className="text-over">
        {subject} {hoursOf(over.seconds)} h over standard
      </b>{" "}
      already.{" "}
      <Link href={href} scroll={false} aria-expanded={isOpen}>
        {isOpen ? "Hide them" : "Show them"}
      </Link>
      {isOpen && (
        <>
          {", or "}
          <a href={seamAddress("/analytics/seam/csv", filter, {})} download>
            save as CSV
          </a>
        </>
      )}
    </>
  );
}

function NothingOver() {
  return <>No unfinished ticket is over its standard.</>;
}

function BetweenNote({ totals: { matched, booked, between } }: { totals: SeamTotals }) {
  const moved = signedHours(between.movedSeconds);
  return (
    <p>
      Finished work took {hoursOf(matched.directSeconds)} h; with{" "}
      {signedHours(between.inProcessActualSeconds)} h in process that is all{" "}
      {hoursOf(booked.directSeconds)} h booked. It earned {hoursOf(matched.earnedSeconds)} h; with{" "}
      {signedHours(between.inProcessEarnedSeconds)} in process
      {moved === "0.0" ? "" : ` and ${moved} moved between cells`}, {hoursOf(booked.earnedSeconds)}.
    </p>
  );
}
