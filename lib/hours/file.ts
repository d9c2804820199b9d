import type { CsvCell, CsvFile } from "@/lib/csv/write";
import type { HoursCard } from "@/lib/hours/cards";
import { hoursText } from "@/lib/hours/decimals";

const header = [
  "worker",
  "name",
  "home_cell",
  "date",
  "attended_hours",
  "direct_hours",
  "indirect_hours",
  "rest_hours",
  "unassigned_hours",
  "meal_hours",
  "attended_seconds",
  "direct_seconds",
  "indirect_seconds",
  "rest_seconds",
  "unassigned_seconds",
  "meal_seconds",
] as const;

/**
 * Lays hours out for a file: a row a worker and day with time on it. Decimal hours add up, down each
 * worker's days and across each row; exact seconds stand beside them.
 */
export function hoursFile(cards: readonly HoursCard[]): CsvFile {
  return { header, rows: cards.flatMap(rowsOf), bom: true };
}

function rowsOf({ number, name, cell, days, decimals }: HoursCard): CsvCell[][] {
  return days.map(({ date, sums }, at) => {
    const { attended, direct, indirect, rest, unassigned, meal } = decimals.days[at]!;
    const hours = [attended, direct, indirect, rest, unassigned, meal];
    return [
      number,
      name,
      cell,
      date,
      ...hours.map((each) => ({ number: hoursText(each) })),
      sums.attendedSeconds,
      sums.directSeconds,
      sums.indirectSeconds,
      sums.restSeconds,
      sums.unassignedSeconds,
      sums.mealSeconds,
    ];
  });
}
