import type { CellLine } from "@/lib/analytics/cells";
import type { OperationLine } from "@/lib/analytics/lines";
import { efficiency } from "@/lib/analytics/ratios";
import type { CellsAnswer, OperationsAnswer } from "@/lib/analytics/schema";
import { addWork, timedSeconds, type Work } from "@/lib/analytics/sums";

/** Writes lines by operation as the contract has them. */
export function operationsAnswerOf(lines: readonly OperationLine[]): OperationsAnswer {
  return {
    items: lines.map(({ key, operation, work }) => ({
      operation: key,
      stage: operation?.stage ?? null,
      cell: operation?.cell ?? null,
      ...comparedOf(work),
    })),
    totals: comparedOf(addWork(lines.map(({ work }) => work))),
  };
}

function comparedOf(work: Work): OperationsAnswer["totals"] {
  const hasStandard = timedSeconds(work) > 0 || work.earnedSeconds > 0 || work.directSeconds === 0;
  return {
    finished: work.pieces,
    standardSeconds: hasStandard ? work.earnedSeconds : null,
    actualSeconds: work.directSeconds,
    noStandardSeconds: work.noStandardSeconds,
    reworkSeconds: work.reworkSeconds,
    efficiency: efficiency(work),
  };
}

/** Writes lines by cell as the contract has them. */
export function cellsAnswerOf(lines: readonly CellLine[], total: CellLine): CellsAnswer {
  return {
    items: lines.map((line) => ({ cell: line.name, ...figuresOf(line) })),
    totals: figuresOf(total),
  };
}

function figuresOf({ time, matched, booked, line, ...ratios }: CellLine): CellsAnswer["totals"] {
  return {
    attendanceSeconds: time.attendanceSeconds,
    directSeconds: time.directSeconds,
    indirectSeconds: time.indirectSeconds,
    reworkSeconds: time.reworkSeconds,
    restSeconds: time.restSeconds,
    mealSeconds: time.mealSeconds,
    unassignedSeconds: time.unassignedSeconds,
    earnedSeconds: booked.earnedSeconds,
    matchedEarnedSeconds: matched.earnedSeconds,
    matchedActualSeconds: matched.directSeconds,
    noStandardSeconds: line.work.noStandardSeconds,
    efficiency: line.efficiency,
    utilization: ratios.utilization,
    productivity: ratios.productivity,
  };
}
