import { UNKNOWN } from "@/lib/matching/parts";
import { type DayRule, dayBounds, daysTouched, type Stretch } from "@/lib/time/site-day";

/** The rows of a roll-up of operations that are summed again at once. */
export interface OperationDay {
  day: string;
  operation: string;
}

/** The row of the attendance roll-up that is summed again, with the bounds of its day. */
export interface CellDay extends Stretch {
  day: string;
  cell: string;
}

/** A standard that was set for the past: from which day on, of which model and operation. */
export interface StandardKey {
  modelId: string;
  from: string;
  operation: string;
}

/** Writes what a mark names; the operation comes last, as its code may hold blanks. */
export function operationDayKey({ day, operation }: OperationDay): string {
  return `${day} ${operation}`;
}

/** Reads the keys of marks, each day and operation once, in their order. */
export function readOperationDays(keys: readonly string[]): OperationDay[] {
  return [...new Set(keys)].sort().map((key) => {
    const blank = key.indexOf(" ");
    return { day: key.slice(0, blank), operation: key.slice(blank + 1) };
  });
}

/** Writes the mark of a standard that was set for the past. */
export function standardKey({ modelId, from, operation }: StandardKey): string {
  return `${modelId} ${from} ${operation}`;
}

/** Reads the mark of a standard. */
export function readStandardKey(key: string): StandardKey {
  const [modelId = "", from = "", ...operation] = key.split(" ");
  return { modelId, from, operation: operation.join(" ") };
}

/** Writes the mark of a stretch of time in a cell; epoch milliseconds, null: nobody knows which. */
export function attendanceKey(stretch: {
  startMs: number;
  endMs: number;
  cell: string | null;
}): string {
  return `${stretch.startMs} ${stretch.endMs} ${stretch.cell ?? UNKNOWN}`;
}

/** Reads marks of time as the cells' production days that they touch, each once, in their order. */
export function readCellDays(keys: readonly string[], rules: readonly DayRule[]): CellDay[] {
  const found = new Map<string, CellDay>();
  for (const key of new Set(keys)) {
    const [startMs, endMs, cell = UNKNOWN] = key.split(" ");
    const stretch = { start: Number(startMs) / 1000, end: Math.ceil(Number(endMs) / 1000) };
    for (const { date: day } of daysTouched(stretch, rules)) {
      found.set(`${day} ${cell}`, { day, cell, ...dayBounds(day, rules) });
    }
  }
  return [...found].sort(([a], [b]) => (a < b ? -1 : 1)).map(([, cellDay]) => cellDay);
}
