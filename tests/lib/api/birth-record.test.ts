import { describe, expect, test } from "vitest";
import { birthRecordOf, type TicketLife } from "@/lib/api/birth-record";
import { birthRecord } from "@/lib/api/tickets";

const who = { workerNumber: "1042", workerName: "Ilo Varn" };
const counts = { openQuantity: 2, good: 1, rework: 0, scrap: 1 };
const segment = {
  ...who,
  endAt: new Date("2026-03-03T07:00:00Z"),
  activity: "run" as const,
  ticket: "26048176",
  operation: "010",
  code: null,
  cell: "Mill",
  said: false,
};

/** Worked on from 2 March, 23:30 in Chicago; the standard changed on 3 March. */
const life: TicketLife = {
  ticket: {
    number: "26048176",
    status: "open",
    model: "Heron",
    options: ["Sunburst"],
    order: "1001",
    quantity: 4,
    dueOn: null,
    operation: "010",
    operationName: "Mill work",
    stage: "Mill",
    cell: "Mill",
    createdAt: new Date("2026-02-01T00:00:00Z"),
    finishedAt: null,
  },
  operations: ["010", "020"].map((operation) => ({
    operation,
    name: `Work ${operation}`,
    stage: "Mill",
    cell: "Mill",
    state: "working",
    ...counts,
    finishedAt: null,
  })),
  standards: [
    { effectiveFrom: "2026-01-01", seq: 1, option: null, setupSeconds: 600, runSeconds: 1800 },
    { effectiveFrom: "2026-01-01", seq: 2, option: "Sunburst", setupSeconds: 0, runSeconds: 300 },
    { effectiveFrom: "2026-03-03", seq: 3, option: null, setupSeconds: 60, runSeconds: 60 },
  ].map((row) => ({ ...row, operation: "010" })),
  segments: [
    { ...segment, activity: "rework", startAt: new Date("2026-02-27T15:00:00Z"), seconds: 100 },
    { ...segment, startAt: new Date("2026-03-03T05:30:00Z"), seconds: 5400 },
    { ...segment, startAt: new Date("2026-03-03T08:00:00Z"), endAt: null, seconds: null },
    { ...segment, startAt: new Date("2026-03-03T08:00:00Z"), operation: "999", seconds: 7 },
  ],
  reports: [
    {
      ...who,
      kind: "report",
      at: new Date("2026-03-03T07:00:00Z"),
      operation: "010",
      good: 1,
      rework: 0,
      scrap: 1,
      stop: true,
      causedBy: null,
      defects: ["tear-out"],
      cell: "Mill",
    },
  ],
};
const rules = [{ fromMs: 0, timeZone: "America/Chicago", productionDayStartsAtMinutes: 0 }];
const facts = { rules, nowMs: Date.parse("2026-03-10T12:00:00Z"), mayName: false };

describe("birthRecordOf", () => {
  const record = birthRecordOf(life, facts);

  test("is what the contract says, and names nobody", () => {
    expect(birthRecord.strict().parse(record)).toEqual(record);
    expect(JSON.stringify(record)).not.toMatch(/worker|1042|Ilo/);
  });
  test("takes the standard of the production day of the first work, rework aside", () => {
    expect(record.operations[0]).toMatchObject({
      setupSeconds: 600,
      runSeconds: 2100,
      quantity: 4,
      standardSeconds: 600 + 4 * 2100,
      firstWorkAt: "2026-03-03T05:30:00.000Z",
    });
  });
  test("sums what is booked and has ended, for the operation alone", () => {
    expect(record.operations.map(({ actualSeconds }) => actualSeconds)).toEqual([5500, 0]);
  });
  test("says where no standard is set, instead of nothing", () => {
    expect(record.operations[1]).toMatchObject({
      setupSeconds: null,
      runSeconds: null,
      standardSeconds: null,
      firstWorkAt: null,
    });
  });
  test("without work the day of the report decides, without a report today", () => {
    const standardOf = (other: TicketLife, nowMs: number) =>
      birthRecordOf(other, { ...facts, nowMs }).operations[0]?.setupSeconds;
    const untouched = { ...life, segments: [], reports: [] };
    const early = life.reports.map((row) => ({ ...row, at: new Date("2026-03-01T12:00:00Z") }));
    expect(standardOf({ ...untouched, reports: early }, facts.nowMs)).toBe(600);
    expect(standardOf(untouched, facts.nowMs)).toBe(60);
    expect(standardOf(untouched, Date.parse("2026-03-02T12:00:00Z"))).toBe(600);
  });
  test("names people to those who may know them", () => {
    const named = birthRecordOf(life, { ...facts, mayName: true });
    const worker = { worker: "1042", name: "Ilo Varn" };
    expect(named.segments[0]).toMatchObject({ worker });
    expect(named.reports[0]).toMatchObject({ worker });
  });
});
