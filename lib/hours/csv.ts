import { writeCsv } from "@/lib/csv/write";
import { decimalDays } from "@/lib/hours/decimal";
import type { WorkerHours } from "@/lib/hours/sheet";

const header = [
  "worker",
  "name",
  "cell",
  "date",
  "attended_hours",
  "direct_hours",
  "indirect_hours",
  "rest_hours",
  "unassigned_hours",
  "meal_hours",
];

/**
 * Writes hours as a file, a row for each worker and day with attendance. Direct, indirect, rest and
 * unassigned add up to attended in every row; a worker's days add up to the range rounded once.
 */
export function hoursCsv(sheet: readonly WorkerHours[]): string {
  const rows = sheet.flatMap(({ worker, name, cell, days }) => {
    const hours = decimalDays(days.map(({ sums }) => sums));
    return days.map(({ date }, index) => {
      const { attended, direct, indirect, rest, unassigned, meal } = hours[index]!;
      const figures = [attended, direct, indirect, rest, unassigned, meal];
      return [worker, name, cell, date, ...figures.map((number) => ({ number }))];
    });
  });
  return writeCsv({ header, rows, bom: true });
}
