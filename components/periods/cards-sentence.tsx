import Link from "next/link";
import { Choice } from "@/components/shell/choice";
import { SentenceForm } from "@/components/shell/sentence-form";
import type { CardsFilter } from "@/lib/periods/schema";
import { dayText } from "@/lib/time/format";
import { addDays } from "@/lib/time/site-day";

/** Which period's cards the page shows, and how far they have come. */
export function CardsSentence({
  filter,
  periods,
  cells,
  count,
}: {
  filter: CardsFilter;
  periods: readonly { id: string; from: string; to: string; isClosed: boolean }[];
  cells: readonly string[];
  count: { all: number; toLookAt: number; closedBy: string | null; isOver: boolean };
}) {
  const shown = (date: string) => dayText(date, "en-GB").slice(4);
  const options = periods.map(({ id, from, to, isClosed }) => {
    const words = `${shown(from)} to ${shown(addDays(to, -1))}${isClosed ? ", closed" : ""}`;
    return [id, words] as const;
  });
  return (
    <SentenceForm
      action="/hours/cards"
      book={
        <>
          {"Cards for "}
          <Choice name="period" label="Pay period" value={filter.period} options={options} />
          {" in "}
          <Choice
            name="cell"
            label="Home cell"
            value={filter.cell}
            options={[["", "all cells"], ...cells.map((name) => [name, name] as const)]}
          />
        </>
      }
      day={
        <>
          <Standing {...count} />
          <Link className="hours-save" href="/hours">
            Any days
          </Link>
        </>
      }
    />
  );
}

function Standing({
  all,
  toLookAt,
  closedBy,
  isOver,
}: {
  all: number;
  toLookAt: number;
  closedBy: string | null;
  isOver: boolean;
}) {
  if (closedBy !== null) {
    return (
      <>
        closed by <b>{closedBy}</b>, <b>{all}</b> cards
      </>
    );
  }
  return (
    <>
      {isOver ? "over, " : "still runs, "}
      <b>{all - toLookAt}</b> of {all} agreed, <b>{toLookAt}</b> to look at
    </>
  );
}
