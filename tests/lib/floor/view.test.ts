import { describe, expect, test } from "vitest";
import { type DueRow, floorOf, type OpenRow } from "@/lib/floor/view";

const NOW = Date.UTC(2026, 4, 14, 12);
const rules = [
  {
    fromMs: 0,
    timeZone: "America/Chicago",
    productionDayStartsAtMinutes: 0,
    shiftLimitSeconds: 50_400,
    sinceLimitSeconds: 1800,
    restMaxSeconds: 1200,
    mealMaxSeconds: 4500,
    restBetweenShiftsSeconds: 39_600,
  },
];

const row = (fields: Partial<OpenRow> = {}): OpenRow => ({
  worker: "1042",
  name: "Ilo Varn",
  cell: "Neck",
  since: 1000,
  item: 0,
  activity: "run",
  code: null,
  ticket: "26048176",
  operation: "110",
  weight: 5,
  operationName: "Carve neck",
  model: "Heron",
  options: [],
  quantity: 4,
  firstWorkAt: null,
  bookedSeconds: 60,
  standards: [
    { seq: 1, option: null, effectiveFrom: "2026-01-01", setupSeconds: 300, runSeconds: 1000 },
    { seq: 2, option: null, effectiveFrom: "2026-05-14", setupSeconds: 300, runSeconds: 2000 },
    { seq: 3, option: "Burst", effectiveFrom: "2026-01-01", setupSeconds: 0, runSeconds: 100 },
  ],
  ...fields,
});

const floor = (open: OpenRow[], due: DueRow[] = []) =>
  floorOf({ cells: ["Body", "Neck"], open, due, opensAt: null, rules }, NOW);

describe("floorOf", () => {
  test("gathers everyone who is on one ticket operation, with its standard for all pieces", () => {
    const [neck] = floor([row(), row({ worker: "1050", name: "Oda", since: 1100 })]).cells;
    expect(neck).toMatchObject({ cell: "Neck", inCount: 2 });
    expect(neck!.work).toHaveLength(1);
    expect(neck!.work[0]).toMatchObject({ standardSeconds: 300 + 4 * 2000, bookedSeconds: 60 });
    expect(neck!.work[0]!.people.map(({ worker }) => worker)).toEqual(["1042", "1050"]);
  });

  test("the standard is that of the production day of the first work, with the options' adders", () => {
    const firstWorkAt = Date.UTC(2026, 4, 14, 4) / 1000; // 23:00 on the 13th in Chicago
    const [neck] = floor([row({ firstWorkAt, options: ["Burst"] })]).cells;
    expect(neck!.work[0]!.standardSeconds).toBe(300 + 4 * (1000 + 100));
  });

  test("a ticket that nobody knows has no standard and keeps what was scanned", () => {
    const unknown = { operationName: null, model: null, quantity: null, standards: [] };
    const [neck] = floor([row(unknown)]).cells;
    expect(neck!.work[0]).toMatchObject({ standardSeconds: null, name: "110", model: "" });
  });

  test("one who minds several tickets is on each, with weights in the order of the items", () => {
    const rows = [
      row({ item: 1, ticket: "26000012", weight: 7 }),
      row({ item: 0, ticket: "26048176", weight: 5 }),
    ];
    const [neck] = floor(rows).cells;
    expect(neck!.inCount).toBe(1);
    expect(neck!.work.map(({ ticket, people }) => [ticket, people[0]])).toEqual([
      ["26000012", expect.objectContaining({ weights: [5, 7], share: 1 })],
      ["26048176", expect.objectContaining({ weights: [5, 7], share: 0 })],
    ]);
  });

  test("breaks, other work and unassigned time stand apart from tickets", () => {
    const off = { ticket: null, operation: null, weight: null };
    const [neck] = floor([
      row({ ...off, activity: "indirect", code: "cleaning" }),
      row({ ...off, worker: "1050", activity: "meal" }),
    ]).cells;
    expect(neck).toMatchObject({
      inCount: 2,
      work: [],
      elsewhere: [
        { worker: "1042", doing: "indirect", code: "cleaning" },
        { worker: "1050", doing: "meal" },
      ],
    });
  });

  test("cells stand in their order, empty ones are left out, missing people keep theirs in", () => {
    const due = { worker: "7", name: "Bao", cell: "Body", plannedAt: 900 };
    const view = floor([row(), row({ worker: "8", cell: null })], [due]);
    expect(view.cells.map(({ cell, inCount }) => [cell, inCount])).toEqual([
      ["Body", 0],
      ["Neck", 1],
      ["Elsewhere", 1],
    ]);
    expect(view.cells[0]!.missing).toEqual([{ worker: "7", name: "Bao", plannedAt: 900 }]);
    expect(floor([]).cells).toEqual([]);
  });
});
