/** A step that was tapped off at an instant. */
interface Tapped {
  atMs: number;
}

/** Steps tapped off no further apart are one bunch (CALCULATIONS.md 1). */
const BUNCH_SECONDS = 30;

/**
 * Puts taps that follow each other within 30 s into bunches: who taps off five steps after doing
 * them all says nothing of how long each took. A chain of such taps is one bunch however long it is.
 *
 * @param taps in order of time
 * @returns the taps in their order, cut into bunches of one or more
 */
export function bunchesOf<T extends Tapped>(taps: readonly T[]): T[][] {
  const bunches: T[][] = [];
  for (const tap of taps) {
    const open = bunches.at(-1);
    const last = open?.at(-1);
    const isNear = last !== undefined && secondOf(tap) - secondOf(last) <= BUNCH_SECONDS;
    if (open && isNear) open.push(tap);
    else bunches.push([tap]);
  }
  return bunches;
}

/** The whole second at which a tap counts, as the timeline floors it too. */
export function secondOf({ atMs }: Tapped): number {
  return Math.floor(atMs / 1000);
}
