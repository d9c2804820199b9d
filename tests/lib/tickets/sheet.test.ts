import { describe, expect, test } from "vitest";
import type { BirthRecord } from "@/lib/api/tickets";
import { sheetOf } from "@/lib/tickets/sheet";

const operation = (fields: Partial<BirthRecord["operations"][number]> = {}) => ({
  operation: "110",
  name: "Carve neck",
  stage: "Neck",
  cell: "Neck",
  state: "finished" as const,
  quantity: 4,
  openQuantity: 0,
  good: 3,
  rework: 0,
  scrap: 1,
  setupSeconds: 600,
  runSeconds: 1000,
  standardSeconds: 4600,
  actualSeconds: 5000,
  firstWorkAt: null,
  finishedAt: null,
  ...fields,
});

const segment = (start: string, fields: Partial<BirthRecord["segments"][number]> = {}) => ({
  start,
  end: null,
  seconds: null,
  activity: "run" as const,
  ticket: "26048176",
  operation: "110",
  code: null,
  cell: "Neck",
  said: false,
  worker: { worker: "1042", name: "Ilo Varn" },
  ...fields,
});

const report = (at: string) => ({
  kind: "report" as const,
  at,
  operation: "110",
  good: 3,
  rework: 0,
  scrap: 1,
  stop: true,
  causedBy: null,
  defects: [],
  cell: "Neck",
});

const record = (fields: Partial<BirthRecord> = {}): BirthRecord => ({
  ticket: "26048176",
  status: "open",
  model: "Heron",
  options: [],
  order: null,
  quantity: 4,
  dueOn: null,
  operation: null,
  operationName: null,
  stage: null,
  cell: null,
  createdAt: "2026-05-01T00:00:00Z",
  finishedAt: null,
  operations: [operation()],
  segments: [],
  reports: [],
  ...fields,
});

describe("sheetOf", () => {
  test("a finished operation is compared for its good pieces, an open one for all", () => {
    const open = operation({ operation: "120", state: "working", good: 1, actualSeconds: 100 });
    const sheet = sheetOf(record({ operations: [operation(), open] }));
    expect(sheet.operations.map(({ pair }) => pair)).toEqual([
      { standardSeconds: 600 + 3000, actualSeconds: 5000 },
      { standardSeconds: 4600, actualSeconds: 100 },
    ]);
    expect(sheet).toMatchObject({
      finished: { standardSeconds: 3600, actualSeconds: 5000 },
      done: 1,
    });
  });

  test("without a standard there is no pair to sum", () => {
    const untimed = operation({ setupSeconds: null, runSeconds: null, standardSeconds: null });
    const sheet = sheetOf(record({ operations: [untimed] }));
    expect(sheet.operations[0]!.pair.standardSeconds).toBeNull();
    expect(sheet.finished).toEqual({ standardSeconds: null, actualSeconds: 0 });
  });

  test("every segment and count stands behind its operation, in the order of time", () => {
    const later = segment("2026-05-14T10:00:00+02:00");
    const first = segment("2026-05-14T07:59:00Z", { end: "2026-05-14T08:00:00Z", seconds: 60 });
    const sheet = sheetOf(
      record({ segments: [later, first], reports: [report("2026-05-14T07:59:30Z")] }),
    );
    expect(sheet.operations[0]!.lines.map(({ line }) => line)).toEqual([
      "segment",
      "report",
      "segment",
    ]);
    expect(sheet.operations[0]!.onIt).toEqual(["Ilo Varn"]);
  });

  test("what was booked on an operation that the ticket does not have is not lost", () => {
    const stray = segment("2026-05-14T08:00:00Z", { operation: "999" });
    expect(sheetOf(record({ segments: [stray] })).strays).toMatchObject([{ operation: "999" }]);
  });
});
