import type { StandardRow } from "@/lib/standards/in-force";

/** What became of a row: a later entry for its day replaced it, it is over, holds, or is to come. */
type RowState = "replaced" | "over" | "in-force" | "to-come";

/** A row with its place in time. */
export type DatedRow<R> = R & {
  state: RowState;
  /** The day before which it held; null while none follows, and for one that never held. */
  until: string | null;
};

/**
 * Puts the rows of one base or adder in order, the latest first, each with what became of it. Rows
 * are only ever added, so every one that was entered is among them.
 *
 * @param day the site date on which "in force" is asked
 */
export function standardHistory<R extends StandardRow>(
  rows: readonly R[],
  day: string,
): DatedRow<R>[] {
  const ordered = [...rows].sort((a, b) =>
    a.effectiveFrom < b.effectiveFrom ? 1 : a.effectiveFrom > b.effectiveFrom ? -1 : b.seq - a.seq,
  );
  const counting = ordered.filter(
    (row, place) => ordered[place - 1]?.effectiveFrom !== row.effectiveFrom,
  );
  return ordered.map((row) => {
    const place = counting.indexOf(row);
    if (place === -1) return { ...row, state: "replaced", until: null };
    const until = counting[place - 1]?.effectiveFrom ?? null;
    if (row.effectiveFrom > day) return { ...row, state: "to-come", until };
    return { ...row, state: until === null || until > day ? "in-force" : "over", until };
  });
}
