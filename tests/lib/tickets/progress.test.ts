import { describe, expect, test } from "vitest";
import { type ProgressRow, progressOf } from "@/lib/tickets/progress";

const rules = [{ fromMs: 0, timeZone: "UTC", productionDayStartsAtMinutes: 0 }];
const standards = [
  standard({ seq: 1, operation: "010", setupSeconds: 600, runSeconds: 100 }),
  standard({ seq: 2, operation: "010", setupSeconds: 900, runSeconds: 100, from: "2026-05-14" }),
  standard({ seq: 3, operation: "020", setupSeconds: 0, runSeconds: 1000 }),
];

function standard(row: {
  seq: number;
  operation: string;
  setupSeconds: number;
  runSeconds: number;
  from?: string;
}) {
  const { from = "2026-01-01", ...rest } = row;
  return { ...rest, option: null, effectiveFrom: from };
}

const row = (fields: Partial<ProgressRow> = {}): ProgressRow => ({
  operation: "010",
  state: "finished",
  good: 4,
  actualSeconds: 1200,
  firstWorkAt: new Date("2026-05-13T10:00:00Z"),
  finishedAt: new Date("2026-05-14T10:00:00Z"),
  ...fields,
});

const progress = (rows: ProgressRow[]) => progressOf(rows, { standards, options: [], rules });

describe("progressOf", () => {
  test("compares finished work only, by the standard of its first day", () => {
    const working = row({ operation: "020", state: "working", actualSeconds: 9999, good: 0 });
    expect(progress([row(), working])).toEqual({
      done: 1,
      of: 2,
      isWorkedOn: true,
      finished: { standardSeconds: 600 + 400, actualSeconds: 1200 },
      noStandardSeconds: 0,
    });
  });

  test("work that was only reported goes by the day on which it was finished", () => {
    expect(progress([row({ firstWorkAt: null })]).finished.standardSeconds).toBe(900 + 400);
  });

  test("time without a standard is left out and said", () => {
    const untimed = row({ operation: "410", actualSeconds: 700 });
    expect(progress([row(), untimed])).toMatchObject({
      done: 2,
      finished: { standardSeconds: 1000, actualSeconds: 1200 },
      noStandardSeconds: 700,
    });
    expect(progress([untimed]).finished).toEqual({ standardSeconds: null, actualSeconds: 0 });
  });

  test("scrap earns nothing, and a closed operation is out of the way but not finished work", () => {
    expect(progress([row({ good: 3 })]).finished.standardSeconds).toBe(600 + 300);
    expect(progress([row({ state: "closed" })])).toMatchObject({
      done: 1,
      finished: { standardSeconds: null },
    });
  });
});
