import type { WorkSums } from "@/lib/analytics/ratios";

/** On which work standard and actual are compared (CALCULATIONS.md 3). */
export type Basis = "matched" | "booked";

/** What some work took and earned, in whole seconds. */
export interface Work extends WorkSums {
  pieces: number;
  /** Of the rework, what another cell caused. */
  elsewhereSeconds: number;
  /** The earning in the cells of its counts: on the booked basis the earning itself. */
  reportEarnedSeconds: number;
}

/** A sum as the database gives it: of which basis, of which range by its place, and of what. */
export interface WorkRow extends Work {
  basis: Basis;
  place: number;
  key: string;
}

export const NO_WORK: Work = {
  pieces: 0,
  earnedSeconds: 0,
  directSeconds: 0,
  noStandardSeconds: 0,
  reworkSeconds: 0,
  noStandardReworkSeconds: 0,
  elsewhereSeconds: 0,
  reportEarnedSeconds: 0,
};

/** Adds up work; none is nothing. */
export function addWork(some: readonly Work[]): Work {
  const total = { ...NO_WORK };
  for (const one of some) {
    for (const name of Object.keys(NO_WORK) as (keyof Work)[]) total[name] += one[name];
  }
  return total;
}

/** The time that has a standard to be held against. */
export function timedSeconds(work: Pick<Work, "directSeconds" | "noStandardSeconds">): number {
  return work.directSeconds - work.noStandardSeconds;
}
