import type { FileDay, PayFile } from "@/lib/periods/file";

/** A cell of a table: text, or decimal hours. */
export type TableCell = { text: string } | { hours: string };

/** A file as a table: one row a worker and workday, adjustments after the days of each worker. */
export interface FileTable {
  header: string[];
  rows: TableCell[][];
}

const who = ["worker", "payroll_number", "name", "cell"];
const what = ["line", "period_from", "workweek", "workday", "reference", "policy"];
const figures = ["worked_hours", "paid_hours", "regular_hours", "overtime_hours", "double_hours"];

/** Lays a file out as the table that CSV and XLSX share; premiums have a column each, by code. */
export function fileTable({ period, people, totals }: PayFile): FileTable {
  const codes = Object.keys(totals.premiums).sort();
  const premiums = codes.map((code) => `premium_${code}_hours`);
  const rows = people.flatMap((person) => {
    const { worker, payrollNumber, name, cell } = person;
    const head = [worker, payrollNumber ?? "", name, cell];
    const rowOf = (day: FileDay, line: string, from: string, reference: string) => [
      ...[...head, line, from, day.workweek, day.date, reference, day.policy].map(textCell),
      ...figuresOf(day, codes),
    ];
    return [
      ...person.days.map((day) => rowOf(day, "hours", period.from, "")),
      ...person.adjustments.map((day) => {
        return rowOf(day, "adjustment", day.reference.split("/")[0]!, day.reference);
      }),
    ];
  });
  return { header: [...who, ...what, ...figures, ...premiums], rows };
}

function figuresOf({ hours }: FileDay, codes: readonly string[]): TableCell[] {
  const { worked, paid, regular, overtime, double, premiums } = hours;
  const each = [worked, paid, regular, overtime, double];
  return [...each, ...codes.map((code) => premiums[code] ?? "0.00")].map((text) => ({
    hours: text,
  }));
}

function textCell(text: string): TableCell {
  return { text };
}
