import type { StandardRow } from "@/lib/standards/in-force";

/** A standard that is not set yet. */
export type Draft = Pick<StandardRow, "option" | "setupSeconds" | "runSeconds" | "effectiveFrom">;

/** Before any day that a site has known. */
const EVER = "0001-01-01";

/** The rows as they would be once the draft is set: it is the latest entry. */
export function rowsWith(draft: Draft, rows: readonly StandardRow[]): StandardRow[] {
  return [...rows, { ...draft, seq: Number.MAX_SAFE_INTEGER }];
}

/** The rows as if the draft had held for ever, which is what a replay asks. */
export function rowsUnder(draft: Draft, rows: readonly StandardRow[]): StandardRow[] {
  const others = rows.filter(({ option }) => option !== draft.option);
  return [...others, { ...draft, effectiveFrom: EVER, seq: Number.MAX_SAFE_INTEGER }];
}
