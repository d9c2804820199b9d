import { bunchesOf, secondOf } from "@/lib/sheet/bunches";
import type { StepTap } from "@/lib/sheet/taps";
import { sum } from "@/lib/sum";
import { split } from "@/lib/timeline/split";

/** Time booked to an operation by anybody: `[start, end)` in epoch seconds, and its fair share of it. */
export interface BookedTime {
  start: number;
  end: number;
  seconds: number;
}

/** How an operation's time falls to its steps. */
export interface StepTimes {
  /** By step; one that was never tapped off has none. */
  seconds: ReadonlyMap<string, number>;
  /** Steps whose time was shared out among a bunch: a guess, which studies leave out. */
  together: ReadonlySet<string>;
  /** Time since the last step was tapped off. */
  notTappedSeconds: number;
}

/**
 * Gives an operation's time to its steps (LEDGER.md 5): the seconds since the tap before belong to
 * the next step tapped off, by whomever; after the last one to none yet. Their sum is the time booked,
 * to the second, whatever else was done in between. A bunch shares its time by the weights of its
 * steps. One that is taken back keeps what it took, and what is done to it again comes on top; one
 * that does not apply takes nothing.
 *
 * @param taps of the operation, in order
 * @param time of the operation, in any order; two people's may overlap
 */
export function stepTimes(taps: readonly StepTap[], time: readonly BookedTime[]): StepTimes {
  const seconds = new Map<string, number>();
  const together = new Set<string>();
  let given = 0;
  for (const bunch of bunchesOf(taps.filter(({ kind }) => kind === "done"))) {
    const weights = weightsOf(bunch);
    const until = secondsBefore(time, secondOf(bunch.at(-1)!));
    const shares = split(until - given, [...weights.values()]);
    for (const [place, step] of [...weights.keys()].entries()) {
      seconds.set(step, (seconds.get(step) ?? 0) + shares[place]!);
      if (weights.size > 1) together.add(step);
    }
    given = until;
  }
  return { seconds, together, notTappedSeconds: sum(time.map((one) => one.seconds)) - given };
}

/** The steps of a bunch, each once, with the weight that was stored when it was booked. */
function weightsOf(bunch: readonly StepTap[]): Map<string, number> {
  return new Map(bunch.map(({ step, weight }) => [step, weight]));
}

/** The whole seconds that had been booked by an instant; never fewer at a later one. */
function secondsBefore(time: readonly BookedTime[], at: number): number {
  return sum(
    time.map(({ start, end, seconds }) => {
      if (at >= end) return seconds;
      return at <= start ? 0 : Math.floor((seconds * (at - start)) / (end - start));
    }),
  );
}
