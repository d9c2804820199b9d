import type { DatedRow } from "@/lib/standards/history";
import type { EnteredRow } from "@/lib/standards/lines";
import { minutesText } from "@/lib/standards/minutes";
import type { StandardEntry } from "@/lib/standards/schema";
import { dateText } from "@/lib/time/format";

/** As many boards as the leaf has room for, the draft not counted. */
const SHOWN = 3;

/** The standards of an operation as boards side by side, oldest left; a draft is only an outline. */
export function StandardBoards({
  history,
  draft,
}: {
  history: readonly DatedRow<EnteredRow>[];
  draft: StandardEntry | null;
}) {
  const rows = history.filter(({ state }) => state !== "replaced").slice(0, SHOWN);
  if (rows.length === 0 && !draft) return <p className="text-t-4">No standard was ever set.</p>;
  return (
    <ol className="standards-boards" aria-label="Standards by day">
      {rows.toReversed().map((row) => (
        <li key={row.id} data-state={row.state}>
          <b>{minutesText(row.runSeconds)}</b> min a piece
          <span>{row.setupSeconds > 0 && `setup ${minutesText(row.setupSeconds)}`}</span>
          <span>{spanWords(row)}</span>
        </li>
      ))}
      {draft && (
        <li data-state="draft">
          <b>{minutesText(draft.runSeconds)}</b> min a piece, draft
          <span>{draft.setupSeconds > 0 && `setup ${minutesText(draft.setupSeconds)}`}</span>
          <span>from {dateText(draft.effectiveFrom)}</span>
        </li>
      )}
    </ol>
  );
}

function spanWords({ state, effectiveFrom, until }: DatedRow<EnteredRow>): string {
  const from = dateText(effectiveFrom);
  if (state === "in-force") return `in force since ${from}`;
  if (state === "to-come") return `to come, ${from}`;
  return until ? `${from} until ${dateText(until)}` : from;
}
