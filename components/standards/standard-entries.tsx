import type { DatedRow } from "@/lib/standards/history";
import type { EnteredRow } from "@/lib/standards/lines";
import { minutesText } from "@/lib/standards/minutes";
import { dateText } from "@/lib/time/format";

const states: Record<DatedRow<EnteredRow>["state"], string> = {
  replaced: "replaced by a later entry for its day",
  over: "over",
  "in-force": "in force",
  "to-come": "to come",
};

/** Everything ever entered, with who and why: rows are only added, so nothing is missing. */
export function StandardEntries({ history }: { history: readonly DatedRow<EnteredRow>[] }) {
  if (history.length === 0) return null;
  return (
    <section>
      <h3 className="text-t-4">All that was entered</h3>
      <ol className="standards-entries">
        {history.map((row) => (
          <li key={row.id} className={row.state === "replaced" ? "text-ink-2" : ""}>
            <b>{dateText(row.effectiveFrom)}</b>: {minutesText(row.setupSeconds)} setup,{" "}
            {minutesText(row.runSeconds)} run, {states[row.state]}
            <span className="block text-ink-2">
              {row.reason} ({row.enteredBy})
            </span>
          </li>
        ))}
      </ol>
    </section>
  );
}
