import { describe, expect, test } from "vitest";
import { type StandardsFacts, standardsPage } from "@/lib/replay/page";
import { standardsQuery } from "@/lib/standards/schema";
import { siteRules } from "@/tests/make/events";

const rules = [{ ...siteRules, timeZone: "UTC", productionDayStartsAtMinutes: 0 }];
const today = "2026-05-14";
const at = (date: string) => Date.parse(`${date}T09:00:00Z`);
const row = {
  seq: 1,
  id: "row-1",
  operation: "110",
  option: null,
  effectiveFrom: "2026-03-02",
  setupSeconds: 600,
  runSeconds: 3000,
  reason: "Time study",
  enteredBy: "Ilo Varn",
};
const ticket = (number: string, date: string | null) => ({
  ticket: number,
  isOpen: date === null,
  openQuantity: date === null ? 2 : 0,
  quantity: 2,
  good: date === null ? 0 : 2,
  firstWorkMs: date === null ? null : at(date),
  firstCountMs: date === null ? null : at(date),
  finishedMs: date === null ? null : at(date),
  actualSeconds: date ? 9000 : 0,
  options: [],
  setupEarned: "first-good" as const,
  reports: date
    ? [{ event: number, kind: "report" as const, good: 2, rework: 0, scrap: 0, atMs: at(date) }]
    : [],
});
const facts: StandardsFacts = {
  models: [
    { name: "Curlew", createdAt: new Date(at("2026-03-02")), firstStandardOn: null, options: [] },
  ],
  routing: [
    { operation: "010", name: "Joint top", stage: "Body", cell: "Body" },
    { operation: "110", name: "Carve neck", stage: "Neck", cell: "Neck" },
  ],
  entries: [row],
  operations: [ticket("26000010", null), ticket("26000029", "2026-05-12")],
};
const show = (query: Record<string, string>) =>
  standardsPage(facts, { query: standardsQuery.parse(query), today, rules });

describe("standardsPage", () => {
  test("lists the first model's operations as of today where nothing is said", () => {
    expect(show({})).toMatchObject({
      model: "Curlew",
      day: today,
      stages: ["Body", "Neck"],
      lines: [
        { operation: "010", inForce: null },
        { operation: "110", inForce: { seq: 1 } },
      ],
      open: null,
    });
  });

  test("a stage narrows the list, and keeps the other stages to choose from", () => {
    const { lines, stages } = show({ stage: "Neck" });
    expect(lines.map(({ operation }) => operation)).toEqual(["110"]);
    expect(stages).toEqual(["Body", "Neck"]);
  });

  test("an operation that is only looked at has its history and no replay", () => {
    expect(show({ op: "110" }).open).toMatchObject({
      name: "Carve neck",
      history: [{ state: "in-force" }],
      drafted: null,
      replay: null,
      effect: null,
    });
  });

  test("a draft shows the replay and what it does; one that cannot be set says why instead", () => {
    const draft = { op: "110", setup: "10", run: "75", from: "2026-05-18", reason: "Study" };
    const { open } = show(draft);
    expect(open?.replay?.total).toMatchObject({ wasSeconds: 6600, wouldSeconds: 9600 });
    expect(open?.effect).toMatchObject({ takes: ["26000010"], plannedSeconds: 3000, keeps: [] });
    const refused = show({ ...draft, run: "0" }).open;
    expect(refused?.replay).toBeNull();
    expect(refused?.drafted?.errors.run).toContain("A standard of 0 earns nothing");
  });

  test("an operation that the model does not have opens nothing", () => {
    expect(show({ op: "999" }).open).toBeNull();
  });
});
