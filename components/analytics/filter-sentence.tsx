import Link from "next/link";
import { Choice } from "@/components/shell/choice";
import { SentenceForm } from "@/components/shell/sentence-form";
import { type SeamFilter, seamAddress } from "@/lib/analytics/filter";

const bases = [
  ["matched", "Finished work"],
  ["booked", "All time booked"],
] as const;

interface SentenceProps {
  filter: SeamFilter;
  models: readonly string[];
  cells: readonly string[];
  stages: readonly string[];
}

/** Which work is compared and on which basis, as a sentence; the file is of the same. */
export function SeamSentence({ filter, models, cells, stages }: SentenceProps) {
  return (
    <SentenceForm
      action="/analytics/seam"
      book={
        <>
          <BasisChoice filter={filter} />
          {" on "}
          <Choice
            name="model"
            label="Model"
            value={filter.model}
            options={withAll("all models", models)}
          />
          {" in "}
          <Choice
            name="cell"
            label="Cell"
            value={filter.cell}
            options={withAll("all cells", cells)}
          />
          {" at "}
          <Choice
            name="stage"
            label="Stage"
            value={filter.stage}
            options={withAll("all stages", stages)}
          />
        </>
      }
      day={
        <>
          <DaysChoice filter={filter} />
          <span className="seam-links">
            <Link href={seamAddress("/analytics/cells", filter, CELLS_ONLY)}>By cell</Link>
            <SaveLink path="/analytics/seam/csv" filter={{ ...filter, open: "", over: "" }} />
          </span>
        </>
      }
    />
  );
}

/** What the cells page does not ask. */
const CELLS_ONLY = { model: "", stage: "", cell: "", open: "", ticket: "", over: "" } as const;

/** The same for the page of cells. */
export function CellsSentence({ filter }: { filter: SeamFilter }) {
  return (
    <SentenceForm
      action="/analytics/cells"
      book={
        <>
          <BasisChoice filter={filter} />
          {" of each cell"}
        </>
      }
      day={
        <>
          <DaysChoice filter={filter} />
          <span className="seam-links">
            <Link href={seamAddress("/analytics/seam", filter, {})}>By operation</Link>
            <SaveLink path="/analytics/cells/csv" filter={filter} />
          </span>
        </>
      }
    />
  );
}

function BasisChoice({ filter }: { filter: SeamFilter }) {
  return <Choice name="basis" label="Basis" value={filter.basis} options={bases} />;
}

function DaysChoice({ filter: { from, to } }: { filter: SeamFilter }) {
  return (
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
    </>
  );
}

function withAll(all: string, names: readonly string[]): (readonly [string, string])[] {
  return [["", all], ...names.map((name) => [name, name] as const)];
}

/** Saves a table as a file. */
export function SaveLink({ path, filter }: { path: string; filter: SeamFilter }) {
  return (
    <a href={seamAddress(path, filter, {})} download>
      Save as CSV
    </a>
  );
}
