import { Choice } from "@/components/shell/choice";
import { SentenceForm } from "@/components/shell/sentence-form";
import type { DayRange } from "@/lib/hours/range";

/** Whose hours and of which days, as a sentence; the same choice as a file on the day's rim. */
export function HoursFilterSentence({
  range,
  cell,
  cells,
  mayExport,
}: {
  range: DayRange;
  cell: string;
  cells: readonly { id: string; name: string }[];
  mayExport: boolean;
}) {
  const file = `/api/hours?${new URLSearchParams({ ...range, ...(cell ? { cell } : {}) })}`;
  return (
    <SentenceForm
      action="/hours"
      book={
        <>
          {"Hours of people of "}
          <Choice
            name="cell"
            label="Home cell"
            value={cell}
            options={[["", "all cells"], ...cells.map(({ id, name }) => [id, name] as const)]}
          />
        </>
      }
      day={
        <span className="flex flex-wrap items-baseline gap-x-3">
          <DayFields range={range} />
          <span className="desk-acts">
            {mayExport && (
              <a href={file} className="button" data-rim="right" download>
                Save as CSV
              </a>
            )}
          </span>
        </span>
      }
    />
  );
}

/** From one day through another, with the button that shows them. */
export function DayFields({ range }: { range: DayRange }) {
  return (
    <span>
      {"from "}
      <input
        key={`from ${range.from}`}
        type="date"
        name="from"
        aria-label="First day"
        defaultValue={range.from}
      />
      {" to "}
      <input
        key={`to ${range.to}`}
        type="date"
        name="to"
        aria-label="Last day"
        defaultValue={range.to}
      />{" "}
      <button type="submit">show</button>
    </span>
  );
}
