import { type Basis, NO_WORK, type Work, type WorkRow } from "@/lib/analytics/sums";

/** A sum of work as the database gives it; what is not said is nothing. */
export function makeWorkRow(
  key: string,
  work: Partial<Work>,
  of: { basis?: Basis; place?: number } = {},
): WorkRow {
  const { basis = "matched", place = 0 } = of;
  return { ...NO_WORK, ...work, key, basis, place };
}
