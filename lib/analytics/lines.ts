import type { SeamBoard, SeamOperation } from "@/lib/analytics/facts";
import { efficiency, productivity, utilization } from "@/lib/analytics/ratios";
import { type Reconciliation, reconcile } from "@/lib/analytics/reconcile";
import {
  addWork,
  type Basis,
  NO_WORK,
  timedSeconds,
  type Work,
  type WorkRow,
} from "@/lib/analytics/sums";
import type { SeamPair } from "@/lib/seam/verdict";
import { sum } from "@/lib/sum";

/** The range itself comes first, then the weeks of the trend. */
const WHOLE = 0;

/** Something that was worked on, with what it took and earned. */
export interface SeamLine {
  key: string;
  work: Work;
  /** What has a standard, like for like; null: nothing of it has. */
  pair: SeamPair | null;
  efficiency: number | null;
  /** Efficiency week by week, the oldest first; null where nothing was done. */
  trend: (number | null)[];
}

/** An operation's line, with what the site knows of it; null: an operation that nobody knows. */
export interface OperationLine extends SeamLine {
  operation: SeamOperation | null;
}

/** The sums over all lines on both bases, and what lies between them. */
export interface SeamTotals {
  matched: Work;
  booked: Work;
  between: Reconciliation;
  attendanceSeconds: number;
  indirectSeconds: number;
  efficiency: number | null;
  /** Booked figures, whichever basis is chosen; null where attendance is of more than the work. */
  utilization: number | null;
  productivity: number | null;
}

/** Lines of one basis by their key; keys in the order in which they come. */
export function linesOf(
  rows: readonly WorkRow[],
  { basis, places }: { basis: Basis; places: number },
): SeamLine[] {
  const own = rows.filter((row) => row.basis === basis);
  const whole = own.filter(({ place }) => place === WHOLE);
  return whole.map(({ key, basis: _, place: __, ...work }) => {
    const weeks = Array.from({ length: places - 1 }, (_week, at) =>
      own.find((row) => row.key === key && row.place === at + 1),
    );
    return { key, ...judged(work), trend: weeks.map((week) => (week ? efficiency(week) : null)) };
  });
}

/** Lines of one basis by range, each known by its place. */
export function rangeLines(
  rows: readonly WorkRow[],
  { basis, names }: { basis: Basis; names: readonly string[] },
): SeamLine[] {
  return names.flatMap((key, at) => {
    const row = rows.find((one) => one.basis === basis && one.place === at);
    if (!row) return [];
    const { key: _, basis: __, place: ___, ...work } = row;
    return [{ key, ...judged(work), trend: [] }];
  });
}

/** The lines by operation, in the order of the codes. */
export function operationLines(
  rows: readonly WorkRow[],
  { operations, ...how }: { operations: readonly SeamOperation[]; basis: Basis; places: number },
): OperationLine[] {
  const known = new Map(operations.map((operation) => [operation.code, operation]));
  return linesOf(rows, how).map((line) => ({ ...line, operation: known.get(line.key) ?? null }));
}

/** Splits work into what is compared and what has no standard. */
function judged(work: Work): Pick<SeamLine, "work" | "pair" | "efficiency"> {
  const actualSeconds = timedSeconds(work);
  const isCompared = actualSeconds > 0 || work.earnedSeconds > 0;
  const pair = isCompared ? { standardSeconds: work.earnedSeconds, actualSeconds } : null;
  return { work, pair, efficiency: efficiency(work) };
}

/**
 * Totals of the range, and what lies between the bases.
 *
 * @param isOfCells false where the work is of some models, stages or operations only: attendance is
 *   a cell's, so that it cannot be held against a part of its work
 */
export function seamTotals(
  rows: readonly WorkRow[],
  { attendance }: Pick<SeamBoard, "attendance">,
  { basis, isOfCells }: { basis: Basis; isOfCells: boolean },
): SeamTotals {
  const [matched, booked] = (["matched", "booked"] as const).map((one) =>
    addWork(rows.filter((row) => row.basis === one && row.place === WHOLE)),
  ) as [Work, Work];
  const whole = attendance.filter(({ place }) => place === WHOLE);
  const directSeconds = sum(whole.map((row) => row.directSeconds));
  const indirectSeconds = sum(whole.map((row) => row.indirectSeconds));
  const idleSeconds = sum(whole.map((row) => row.restSeconds + row.unassignedSeconds));
  const attendanceSeconds = directSeconds + indirectSeconds + idleSeconds;
  const time = { directSeconds, attendanceSeconds, earnedSeconds: booked.earnedSeconds };
  return {
    matched,
    booked,
    between: reconcile({
      booked: { earnedSeconds: booked.earnedSeconds, actualSeconds: booked.directSeconds },
      matched: {
        earnedSeconds: matched.earnedSeconds,
        actualSeconds: matched.directSeconds,
        reportEarnedSeconds: matched.reportEarnedSeconds,
      },
    }),
    attendanceSeconds,
    indirectSeconds,
    efficiency: efficiency(basis === "matched" ? matched : booked),
    utilization: isOfCells ? utilization(time) : null,
    productivity: isOfCells ? productivity(time) : null,
  };
}

/** How many unfinished tickets are over their standard, and by how much in all. */
export function overSums(over: SeamBoard["over"]): { tickets: number; seconds: number } {
  return {
    tickets: new Set(over.map(({ ticket }) => ticket)).size,
    seconds: sum(over.map((one) => one.actualSeconds - one.standardSeconds)),
  };
}

/** Work that is none, for a cell where there was only attendance. */
export function noLine(key: string, weeks: number): SeamLine {
  return { key, ...judged(NO_WORK), trend: Array.from({ length: weeks }, () => null) };
}
