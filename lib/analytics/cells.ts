import type { AttendanceRow, SeamBoard } from "@/lib/analytics/facts";
import { linesOf, noLine, type SeamLine } from "@/lib/analytics/lines";
import { efficiencyWithoutRework, productivity, utilization } from "@/lib/analytics/ratios";
import { type Reconciliation, reconcile } from "@/lib/analytics/reconcile";
import { addWork, type Basis, NO_WORK, type Work, type WorkRow } from "@/lib/analytics/sums";
import { UNKNOWN } from "@/lib/matching/parts";
import { sum } from "@/lib/sum";

/** What a cell's attendance was made of; attendance = direct + indirect + rest + unassigned. */
type CellTime = Omit<AttendanceRow, "place" | "cell"> & { attendanceSeconds: number };

/** A cell with what it attended, took and earned. */
export interface CellLine {
  name: string;
  time: CellTime;
  /** On the chosen basis. */
  line: SeamLine;
  matched: Work;
  booked: Work;
  between: Reconciliation;
  withoutRework: number | null;
  /** Booked figures, whichever basis is chosen. */
  utilization: number | null;
  productivity: number | null;
}

const NO_TIME: Omit<AttendanceRow, "place" | "cell"> = {
  directSeconds: 0,
  reworkSeconds: 0,
  indirectSeconds: 0,
  restSeconds: 0,
  unassignedSeconds: 0,
  mealSeconds: 0,
};

/** The cells in which anyone attended or anything was earned, in the order of the work. */
export function cellLines(
  rows: readonly WorkRow[],
  board: Pick<SeamBoard, "cells" | "attendance">,
  how: { basis: Basis; places: number },
): CellLine[] {
  const lines = new Map(linesOf(rows, how).map((line) => [line.key, line]));
  const cells = [...board.cells, { id: UNKNOWN, name: "No cell" }];
  return cells.flatMap(({ id, name }) => {
    const own = rows.filter(({ key, place }) => key === id && place === 0);
    const attended = board.attendance.find((row) => row.cell === id && row.place === 0);
    if (own.length === 0 && !attended) return [];
    const line = lines.get(id) ?? noLine(id, how.places - 1);
    return [cellLine({ name, line, time: timeOf(attended ? [attended] : []), ...basesOf(own) })];
  });
}

/** All cells in one line. */
export function cellTotal(
  rows: readonly WorkRow[],
  lines: readonly CellLine[],
  how: { basis: Basis; places: number },
): CellLine {
  const together = [...Array(how.places).keys()].flatMap((place) =>
    (["matched", "booked"] as const).map((basis) => {
      const some = rows.filter((row) => row.place === place && row.basis === basis);
      return { basis, place, key: "all", ...addWork(some) };
    }),
  );
  const [line] = linesOf(together, how);
  const own = together.filter(({ place }) => place === 0);
  const time = timeOf(lines.map((one) => one.time));
  return cellLine({ name: "All cells", line: line!, time, ...basesOf(own) });
}

function basesOf(own: readonly WorkRow[]): { matched: Work; booked: Work } {
  const of = (basis: Basis) => own.find((row) => row.basis === basis) ?? NO_WORK;
  return { matched: of("matched"), booked: of("booked") };
}

function cellLine(cell: Pick<CellLine, "name" | "line" | "time" | "matched" | "booked">): CellLine {
  const { line, time, matched, booked } = cell;
  return {
    ...cell,
    between: reconcile({
      booked: { earnedSeconds: booked.earnedSeconds, actualSeconds: booked.directSeconds },
      matched: {
        earnedSeconds: matched.earnedSeconds,
        actualSeconds: matched.directSeconds,
        reportEarnedSeconds: matched.reportEarnedSeconds,
      },
    }),
    withoutRework: efficiencyWithoutRework(line.work),
    utilization: utilization(time),
    productivity: productivity({ ...time, earnedSeconds: booked.earnedSeconds }),
  };
}

function timeOf(some: readonly Omit<AttendanceRow, "place" | "cell">[]): CellTime {
  const names = Object.keys(NO_TIME) as (keyof typeof NO_TIME)[];
  const time = { ...NO_TIME };
  for (const name of names) time[name] = sum(some.map((one) => one[name]));
  const { directSeconds, indirectSeconds, restSeconds, unassignedSeconds } = time;
  const attendanceSeconds = directSeconds + indirectSeconds + restSeconds + unassignedSeconds;
  return { ...time, attendanceSeconds };
}
