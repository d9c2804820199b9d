import { groupBy } from "@/lib/group";
import { standardHistory } from "@/lib/standards/history";
import type { StandardRow } from "@/lib/standards/in-force";

/** A row as it was entered, with who entered it. */
export interface EnteredRow extends StandardRow {
  id: string;
  operation: string;
  reason: string;
  enteredBy: string;
}

/** An operation of a model's routing with the base standard that holds for it. */
export interface StandardLine {
  operation: string;
  name: string;
  stage: string;
  /** Null where no standard is in force. */
  inForce: EnteredRow | null;
  /** The options that add to it on that day. */
  options: string[];
  /** The next day from which another base holds, if one is set. */
  changesOn: string | null;
}

/**
 * Puts a model's operations in route order, each with the standard in force on a day.
 *
 * @param entries all ever entered for the model
 */
export function standardLines(
  routing: readonly { operation: string; name: string; stage: string }[],
  entries: readonly EnteredRow[],
  day: string,
): StandardLine[] {
  const byOperation = groupBy(entries, ({ operation }) => operation);
  return routing.map(({ operation, name, stage }) => {
    const byOption = groupBy(byOperation.get(operation) ?? [], ({ option }) => option);
    const base = standardHistory(byOption.get(null) ?? [], day);
    const options = [...byOption].flatMap(([option, rows]) => {
      const holds = standardHistory(rows, day).find(({ state }) => state === "in-force");
      const adds = holds && holds.setupSeconds + holds.runSeconds > 0;
      return option !== null && adds ? [option] : [];
    });
    const inForce = base.find(({ state }) => state === "in-force") ?? null;
    const changesOn = base.findLast(({ state }) => state === "to-come")?.effectiveFrom ?? null;
    return { operation, name, stage, inForce, options, changesOn };
  });
}
