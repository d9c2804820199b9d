import Link from "next/link";
import { Choice } from "@/components/shell/choice";
import { SentenceForm } from "@/components/shell/sentence-form";
import type { HoursFilter } from "@/lib/hours/filter";

/** Whose hours the page shows and of which days, as a sentence; the file is of the same. */
export function HoursFilterSentence({
  filter,
  cells,
  exports,
  agrees,
}: {
  filter: HoursFilter;
  /** Empty for someone who sees only their own. */
  cells: readonly string[];
  exports: boolean;
  /** True for a lead, who agrees to the cards of the own cells. */
  agrees: boolean;
}) {
  const { from, to, cell } = filter;
  return (
    <SentenceForm
      action="/hours"
      book={
        cells.length === 0 ? (
          "Your hours"
        ) : (
          <>
            {"Hours of "}
            <Choice
              name="cell"
              label="Home cell"
              value={cell}
              options={[["", "all cells"], ...cells.map((name) => [name, name] as const)]}
            />
          </>
        )
      }
      day={
        <>
          {"from "}
          <input
            key={`from ${from}`}
            name="from"
            type="date"
            aria-label="First day"
            defaultValue={from}
          />
          {" to "}
          <input key={`to ${to}`} name="to" type="date" aria-label="Last day" defaultValue={to} />{" "}
          <button type="submit">Show</button>
          {agrees && (
            <Link className="hours-save ml-4" href="/hours/agreement">
              Agree to cards
            </Link>
          )}
          {exports && (
            <Link className="hours-save" href="/hours/cards">
              Cards of a period
            </Link>
          )}
          {exports && (
            <a
              className="hours-save"
              href={`/hours/csv?${new URLSearchParams({ from, to, cell })}`}
              download
            >
              Save as CSV
            </a>
          )}
        </>
      }
    />
  );
}
