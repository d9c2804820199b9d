import { sum } from "@/lib/sum";

/** A standard in person-seconds: once per ticket operation, and per piece (CALCULATIONS.md 3). */
export interface Standard {
  setupSeconds: number;
  runSeconds: number;
}

/** A row as it was entered, for one model and operation; rows are only ever added. */
export interface StandardRow extends Standard {
  /** The order in which rows were entered: decides ties of one day. */
  seq: number;
  /** Null for the base, otherwise the option whose adder it is. */
  option: string | null;
  /** The site date from which it holds. */
  effectiveFrom: string;
}

/**
 * The standard in force on a day for one model and operation: of the base rows and of each option's
 * adders the latest with `effectiveFrom <= day` counts, ties by the later entry; the adders are
 * added to the base. Without a base in force there is no standard, whatever the adders say.
 *
 * @param rows of one model and operation, in any order
 * @param day production day, "YYYY-MM-DD"
 * @param options those that the ticket has
 */
export function standardInForce(
  rows: readonly StandardRow[],
  day: string,
  options: readonly string[] = [],
): Standard | null {
  const base = latest(rows, null, day);
  if (!base) return null;
  const adders = [...new Set(options)].map((option) => latest(rows, option, day));
  const parts = [base, ...adders.filter((adder) => adder !== undefined)];
  return {
    setupSeconds: sum(parts.map(({ setupSeconds }) => setupSeconds)),
    runSeconds: sum(parts.map(({ runSeconds }) => runSeconds)),
  };
}

function latest(rows: readonly StandardRow[], option: string | null, day: string) {
  return rows
    .filter((row) => row.option === option && row.effectiveFrom <= day)
    .reduce<StandardRow | undefined>(
      (best, row) => (best && isLater(best, row) ? best : row),
      undefined,
    );
}

function isLater(row: StandardRow, than: StandardRow): boolean {
  if (row.effectiveFrom !== than.effectiveFrom) return row.effectiveFrom > than.effectiveFrom;
  return row.seq > than.seq;
}
