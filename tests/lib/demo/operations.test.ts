import { describe, expect, test } from "vitest";
import { models } from "@/lib/demo/models";
import { type Hazard, operations, routingOf } from "@/lib/demo/operations";
import { sum } from "@/lib/sum";

const hazards: Hazard[] = [
  "dust",
  "noise",
  "solvent",
  "spray",
  "hot-surface",
  "rollers",
  "crush",
  "fumes",
];

const hoursOf = (model: (typeof models)[number]) =>
  sum(routingOf(model).map(({ runMinutes }) => runMinutes * model.effort)) / 60;

describe("operations", () => {
  test("have codes of three digits that rise along the routing", () => {
    const codes = operations.map(({ code }) => code);
    expect(codes.filter((code) => !/^\d{3}$/.test(code))).toEqual([]);
    expect(codes).toEqual([...new Set(codes)].sort());
  });

  test("name only hazards that have a caution, and each of those somewhere", () => {
    expect(new Set(operations.flatMap((each) => each.hazards))).toEqual(new Set(hazards));
  });

  test("are inspected in the cell that inspects, and nowhere else", () => {
    for (const { cell, activity } of operations) {
      expect(activity === "inspect").toBe(cell === "Inspection");
    }
  });
});

describe("routingOf", () => {
  test("takes every instrument through 30 to 60 operations, from timber to the case", () => {
    for (const model of models) {
      const routing = routingOf(model);
      expect(routing.length).toBeGreaterThanOrEqual(30);
      expect(routing.length).toBeLessThanOrEqual(60);
      expect(routing.at(0)?.code).toBe("010");
      expect(routing.at(-1)?.name).toBe("Clean, case and label");
    }
  });

  // Trade estimates of tests/checks/trade.json, op-sequence and op-acoustic: touch labour in a
  // factory is 4 to 8 hours for a solid body and 6 to 14 for a flat-top.
  test.each([
    ["Heron", 6, 14],
    ["Wren", 6, 14],
    ["Dipper", 6, 14],
    ["Kestrel", 4, 8],
  ])("gives the %s between %d and %d hours of work", (name, from, to) => {
    const model = models.find((each) => each.name === name)!;
    expect(hoursOf(model)).toBeGreaterThan(from);
    expect(hoursOf(model)).toBeLessThan(to);
  });

  test("winds pickups only for instruments that carry them", () => {
    const codes = (name: string) =>
      routingOf(models.find((each) => each.name === name)!).map(({ code }) => code);
    expect(codes("Kestrel")).toContain("430");
    expect(codes("Heron")).not.toContain("450");
    expect(codes("Dipper")).toContain("450");
  });
});
