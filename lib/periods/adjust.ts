import { type Bucket, buckets } from "@/lib/pay/schema";

/** The figures of a paid workday, or of a change to one. */
export interface PaidFigures {
  workedSeconds: number;
  paidSeconds: number;
  buckets: Record<Bucket, number>;
  premiums: Record<string, number>;
}

/** A paid workday of a worker; `workweek` and `date` tell it from every other. */
export interface PaidWorkday extends PaidFigures {
  workweek: string;
  date: string;
  policy: string;
}

/**
 * What must be paid, or taken back, after a period was closed: the statement as it is now, less what
 * was frozen and less the adjustments made already (LEDGER.md 10), by workweek and workday. Days
 * that come to the same are left out; figures have signs.
 *
 * @param paid the frozen rows and earlier adjustments of the same worker and period, in any order
 */
export function adjustmentsOf(
  now: readonly PaidWorkday[],
  paid: readonly PaidWorkday[],
): PaidWorkday[] {
  const keyOf = ({ workweek, date }: PaidWorkday) => `${workweek} ${date}`;
  const changes = new Map<string, PaidWorkday>();
  for (const [days, sign] of [
    [now, 1],
    [paid, -1],
  ] as const) {
    for (const day of days) {
      const before = changes.get(keyOf(day));
      changes.set(keyOf(day), plus(before ?? nothing(day), day, sign));
    }
  }
  return [...changes.values()]
    .filter(isSomething)
    .toSorted((a, b) => keyOf(a).localeCompare(keyOf(b)));
}

/** Sums figures; of none everything is 0. */
export function sumFigures(figures: readonly PaidFigures[]): PaidFigures {
  return figures.reduce<PaidFigures>((total, each) => plus(total, each, 1), noFigures());
}

function noFigures(): PaidFigures {
  return {
    workedSeconds: 0,
    paidSeconds: 0,
    buckets: { regular: 0, overtime: 0, double: 0 },
    premiums: {},
  };
}

function nothing({ workweek, date, policy }: PaidWorkday): PaidWorkday {
  return { workweek, date, policy, ...noFigures() };
}

function plus<T extends PaidFigures>(one: T, other: PaidFigures, sign: 1 | -1): T {
  const add = (a: number, b: number) => a + sign * b;
  const codes = [...Object.keys(one.premiums), ...Object.keys(other.premiums)];
  return {
    ...one,
    workedSeconds: add(one.workedSeconds, other.workedSeconds),
    paidSeconds: add(one.paidSeconds, other.paidSeconds),
    buckets: {
      regular: add(one.buckets.regular, other.buckets.regular),
      overtime: add(one.buckets.overtime, other.buckets.overtime),
      double: add(one.buckets.double, other.buckets.double),
    },
    premiums: Object.fromEntries(
      codes.map((code) => [code, add(one.premiums[code] ?? 0, other.premiums[code] ?? 0)]),
    ),
  };
}

function isSomething({ workedSeconds, paidSeconds, buckets: by, premiums }: PaidWorkday): boolean {
  const figures = [workedSeconds, paidSeconds, ...buckets.map((bucket) => by[bucket])];
  return [...figures, ...Object.values(premiums)].some((seconds) => seconds !== 0);
}
