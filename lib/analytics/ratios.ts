import { assert } from "@/lib/assert";

/** Seconds of some finished or booked work. */
export interface WorkSums {
  earnedSeconds: number;
  /** Setup, run, rework and inspect. */
  directSeconds: number;
  /** Of it, what has no standard: left out of efficiency, and said. */
  noStandardSeconds: number;
  /** Of it, what was done again; and of that, what has no standard either. */
  reworkSeconds: number;
  noStandardReworkSeconds: number;
}

/**
 * Earned ÷ direct; time without a standard is left out. Null where no time is left to divide by:
 * neither 0 % nor without end.
 */
export function efficiency(
  work: Pick<WorkSums, "earnedSeconds" | "directSeconds" | "noStandardSeconds">,
): number | null {
  return ratio(work.earnedSeconds, work.directSeconds - work.noStandardSeconds);
}

/** The same as if nothing had been done twice. */
export function efficiencyWithoutRework(work: WorkSums): number | null {
  const timedSeconds = work.directSeconds - work.noStandardSeconds;
  const redoneSeconds = work.reworkSeconds - work.noStandardReworkSeconds;
  return ratio(work.earnedSeconds, timedSeconds - redoneSeconds);
}

/** Direct ÷ attendance: worker efficiency by ISO 22400-2. Null where nobody attended. */
export function utilization(time: {
  directSeconds: number;
  attendanceSeconds: number;
}): number | null {
  return ratio(time.directSeconds, time.attendanceSeconds);
}

/**
 * Earned ÷ attendance. Efficiency × utilization is the same where all time has a standard; null
 * where nobody attended.
 */
export function productivity(time: {
  earnedSeconds: number;
  attendanceSeconds: number;
}): number | null {
  return ratio(time.earnedSeconds, time.attendanceSeconds);
}

function ratio(part: number, whole: number): number | null {
  assert(Number.isFinite(part) && Number.isFinite(whole), "ratio: finite seconds");
  return whole > 0 ? part / whole : null;
}
