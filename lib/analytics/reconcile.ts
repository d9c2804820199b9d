/** Both bases of the same days and cells, in whole seconds. */
export interface Bases {
  booked: { earnedSeconds: number; actualSeconds: number };
  matched: {
    earnedSeconds: number;
    actualSeconds: number;
    /** The earning of the same finished work in the cells of its counts. */
    reportEarnedSeconds: number;
  };
}

/** What lies between finished work and all time booked; below 0 it is less. */
export interface Reconciliation {
  /** By how much work in process grew: time booked, and hours earned, on what is not finished. */
  inProcessActualSeconds: number;
  inProcessEarnedSeconds: number;
  /** Earned where it was counted, but worked elsewhere: 0 over all cells. */
  movedSeconds: number;
}

/**
 * Reconciles the two bases: booked = matched + the change of work in process + what is moved between
 * cells. Time stays in the cell where it was worked, so only earning moves.
 */
export function reconcile({ booked, matched }: Bases): Reconciliation {
  return {
    inProcessActualSeconds: booked.actualSeconds - matched.actualSeconds,
    inProcessEarnedSeconds: booked.earnedSeconds - matched.reportEarnedSeconds,
    movedSeconds: matched.reportEarnedSeconds - matched.earnedSeconds,
  };
}
