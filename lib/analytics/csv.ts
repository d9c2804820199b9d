import type { CellLine } from "@/lib/analytics/cells";
import type { OverRow, SeamSegment } from "@/lib/analytics/facts";
import type { Opening } from "@/lib/analytics/filter";
import type { OperationLine, SeamLine } from "@/lib/analytics/lines";
import type { Work } from "@/lib/analytics/sums";
import { type CsvCell, writeCsv } from "@/lib/csv/write";

const workHeader = [
  "pieces",
  "earned_seconds",
  "actual_seconds",
  "no_standard_seconds",
  "rework_seconds",
  "rework_other_cell_seconds",
  "efficiency",
];

/** The lines by operation as a file: seconds are whole, a ratio that is none is empty. */
export function operationsCsv(lines: readonly OperationLine[]): string {
  return writeCsv({
    header: ["operation", "name", "stage", "cell", ...workHeader],
    rows: lines.map(({ key, operation, ...line }) => [
      key,
      operation?.name ?? "",
      operation?.stage ?? "",
      operation?.cell ?? "",
      ...workCells(line),
    ]),
    bom: true,
  });
}

/** The lines that an operation opens to. */
export function openedCsv(by: Opening, lines: readonly SeamLine[]): string {
  return writeCsv({
    header: [by, ...workHeader],
    rows: lines.map((line) => [line.key, ...workCells(line)]),
    bom: true,
  });
}

/** A ticket's time on an operation; nobody is named. */
export function segmentsCsv(segments: readonly SeamSegment[]): string {
  const instant = (ms: number | null) => (ms === null ? "" : new Date(ms).toISOString());
  return writeCsv({
    header: ["start", "end", "activity", "cell", "seconds"],
    rows: segments.map(({ startMs, endMs, activity, cell, seconds }) => {
      return [instant(startMs), instant(endMs), activity, cell ?? "", seconds];
    }),
    bom: true,
  });
}

/** The unfinished tickets over their standard. */
export function overCsv(over: readonly OverRow[]): string {
  return writeCsv({
    header: ["ticket", "operation", "standard_seconds", "actual_seconds", "over_seconds"],
    rows: over.map(({ ticket, operation, standardSeconds, actualSeconds }) => {
      const overSeconds = actualSeconds - standardSeconds;
      return [ticket, operation, standardSeconds, actualSeconds, overSeconds];
    }),
    bom: true,
  });
}

/** The lines by cell, the sum of all last. */
export function cellsCsv(lines: readonly CellLine[], total: CellLine): string {
  return writeCsv({
    header: [
      "cell",
      "attendance_seconds",
      "direct_seconds",
      "indirect_seconds",
      "rest_seconds",
      "unassigned_seconds",
      "meal_seconds",
      ...workHeader,
      "efficiency_without_rework",
      "utilization",
      "productivity",
    ],
    rows: [...lines, total].map(({ name, time, line, ...ratios }) => [
      name,
      time.attendanceSeconds,
      time.directSeconds,
      time.indirectSeconds,
      time.restSeconds,
      time.unassignedSeconds,
      time.mealSeconds,
      ...workCells(line),
      ratioCell(ratios.withoutRework),
      ratioCell(ratios.utilization),
      ratioCell(ratios.productivity),
    ]),
    bom: true,
  });
}

function workCells({ work, efficiency }: { work: Work; efficiency: number | null }): CsvCell[] {
  return [
    work.pieces,
    work.earnedSeconds,
    work.directSeconds,
    work.noStandardSeconds,
    work.reworkSeconds,
    work.elsewhereSeconds,
    ratioCell(efficiency),
  ];
}

function ratioCell(ratio: number | null): CsvCell {
  return ratio === null ? null : { number: ratio.toFixed(4) };
}
