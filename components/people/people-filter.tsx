import type { ReactNode } from "react";
import { Choice } from "@/components/shell/choice";
import { SentenceForm } from "@/components/shell/sentence-form";
import { Icon } from "@/components/ui/icon";
import type { PeopleQuery } from "@/lib/people/schema";

const presence = [
  ["", "who work here"],
  ["1", "and those who left"],
] as const;

/** Which people the list shows, as a sentence, and what can be done on the day's rim. */
export function PeopleFilterSentence({
  query,
  cells,
  acts,
}: {
  query: PeopleQuery;
  cells: readonly { id: string; name: string }[];
  acts: ReactNode;
}) {
  return (
    <SentenceForm
      action="/people"
      book={
        <>
          {"People of "}
          <Choice
            name="cell"
            label="Home cell"
            value={query.cell}
            options={[["", "all cells"], ...cells.map(({ id, name }) => [id, name] as const)]}
          />{" "}
          <Choice name="left" label="Who left" value={query.left} options={presence} />
        </>
      }
      day={
        <span className="flex flex-wrap items-baseline gap-x-3">
          <span>
            {"called "}
            <input
              key={query.q}
              name="q"
              type="search"
              size={12}
              aria-label="Part of a name or number"
              defaultValue={query.q}
            />
            <button type="submit" aria-label="Find" className="desk-find">
              <Icon name="find" />
            </button>
          </span>
          <span className="desk-acts">{acts}</span>
        </span>
      }
    />
  );
}
