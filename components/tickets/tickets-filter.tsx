import { Choice } from "@/components/shell/choice";
import { SentenceForm } from "@/components/shell/sentence-form";
import { Icon } from "@/components/ui/icon";
import type { TicketsFilter } from "@/lib/tickets/filter";

const statuses = [
  ["open", "Open tickets"],
  ["finished", "Finished tickets"],
  ["scrapped", "Scrapped tickets"],
  ["cancelled", "Cancelled tickets"],
  ["all", "All tickets"],
] as const;

/** Which tickets the list shows, as a sentence. */
export function TicketsFilterSentence({
  filter,
  models,
  cells,
}: {
  filter: TicketsFilter;
  models: readonly string[];
  cells: readonly string[];
}) {
  return (
    <SentenceForm
      action="/tickets"
      book={
        <>
          <Choice name="status" label="Status" value={filter.status} options={statuses} />
          {" of "}
          <Choice
            name="model"
            label="Model"
            value={filter.model}
            options={[["", "all models"], ...models.map((model) => [model, model] as const)]}
          />
        </>
      }
      day={
        <>
          {"next in "}
          <Choice
            name="cell"
            label="Cell of the next operation"
            value={filter.cell}
            options={[["", "any cell"], ...cells.map((cell) => [cell, cell] as const)]}
          />
          {" with number "}
          <input
            key={filter.q}
            name="q"
            type="search"
            inputMode="numeric"
            size={10}
            aria-label="Part of a ticket's or order's number"
            defaultValue={filter.q}
          />
          <button type="submit" aria-label="Find" className="desk-find">
            <Icon name="find" />
          </button>
        </>
      }
    />
  );
}
