import type { ReactNode } from "react";
import { Icon } from "@/components/ui/icon";
import type { Reconciliation } from "@/lib/periods/cards-view";

/** The foot of the page: what was agreed to on the left, the file on the right, line by line. */
export function PeriodFoot({
  reconciliation,
  book,
  day,
}: {
  reconciliation: Reconciliation;
  /** What stands on each leaf beside the figures: a heading, a note, acts. */
  book: { title: string; note: ReactNode; acts: ReactNode };
  day: { title: string; note: ReactNode; acts: ReactNode };
}) {
  const { people, lines } = reconciliation;
  const all = [
    {
      name: "people",
      book: String(people[0]),
      day: String(people[1]),
      isMatched: people[0] === people[1],
    },
    ...lines,
  ];
  return (
    <section className="period-foot" aria-label={`${book.title} and ${day.title}`}>
      <div className="period-words">
        <h2>{book.title}</h2>
        <div className="text-ink-2">{book.note}</div>
        {book.acts}
      </div>
      <table className="period-sums">
        <caption className="sr-only">
          {book.title} against {day.title}
        </caption>
        <thead className="sr-only">
          <tr>
            <th scope="col">what</th>
            <th scope="col">{book.title}</th>
            <th scope="col">{day.title}</th>
            <th scope="col">whether they match</th>
          </tr>
        </thead>
        <tbody>
          {all.map(({ name, book: left, day: right, isMatched }) => (
            <tr key={name}>
              <th scope="row">{name}</th>
              <td data-standard="">{left}</td>
              <td data-actual="">{right}</td>
              <td>
                <span className={`tag ${isMatched ? "text-ink-2" : "font-[650] text-over"}`}>
                  <Icon name={isMatched ? "good" : "over"} />
                  {isMatched ? "the same" : "differs"}
                </span>
              </td>
            </tr>
          ))}
        </tbody>
      </table>
      <div className="period-words period-words-day">
        <h2>{day.title}</h2>
        <div className="text-ink-2">{day.note}</div>
        {day.acts}
      </div>
    </section>
  );
}
