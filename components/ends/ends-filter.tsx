import { Choice } from "@/components/shell/choice";
import { SentenceForm } from "@/components/shell/sentence-form";
import { endWords } from "@/lib/ends/words";
import type { LooseEndCode } from "@/lib/ledger/schema";

/** Which loose ends the list shows, as a sentence, and how many there are. */
export function EndsFilterSentence({
  cell,
  code,
  cells,
  counts,
}: {
  cell: string;
  code: LooseEndCode | "";
  /** The cells to choose from; empty where there is no choice. */
  cells: readonly string[];
  counts: readonly { code: LooseEndCode; count: number }[];
}) {
  const total = counts.reduce((sum, each) => sum + each.count, 0);
  const codes = new Set([...counts.map((each) => each.code), ...(code ? [code] : [])]);
  return (
    <SentenceForm
      action="/ends"
      book={
        <>
          {"To be settled in "}
          <Choice
            name="cell"
            label="Home cell"
            value={cell}
            options={[["", "all cells"], ...cells.map((name) => [name, name] as const)]}
          />
        </>
      }
      day={
        <>
          <Choice
            name="code"
            label="What about"
            value={code}
            options={[
              ["", "whatever it is"],
              ...[...codes].map((each) => [each, endWords[each]] as const),
            ]}
          />
          <span className="ml-6 text-t-3">
            <b>{total}</b> to settle
          </span>
        </>
      }
    />
  );
}
