import { describe, expect, test } from "vitest";
import { models, NEW_MODEL } from "@/lib/demo/models";
import { routingOf } from "@/lib/demo/operations";
import { standards, UNTIMED } from "@/lib/demo/standards";

const basesOf = (model: string, operation: string) =>
  standards.filter(
    (each) => each.model === model && each.operation === operation && each.option === null,
  );

describe("standards", () => {
  test("cover every operation of every model but one, which says so", () => {
    const missing = models.flatMap((model) =>
      routingOf(model)
        .filter(({ code }) => basesOf(model.name, code).length === 0)
        .map(({ code }) => ({ model: model.name, operation: code })),
    );
    expect(missing).toEqual([UNTIMED]);
  });

  test("are whole seconds, and the first of each is in force when the history begins", () => {
    for (const { setupSeconds, runSeconds } of standards) {
      expect(Number.isInteger(setupSeconds) && Number.isInteger(runSeconds)).toBe(true);
      expect(runSeconds).toBeGreaterThan(0);
    }
    for (const { model, operation } of standards) {
      const first = Math.min(...basesOf(model, operation).map(({ fromDay }) => fromDay));
      expect(first).toBeLessThan(0);
    }
  });

  test("change within the history, each time with a reason", () => {
    const changed = standards.filter(({ fromDay }) => fromDay > 0);
    expect(changed.length).toBeGreaterThanOrEqual(4);
    expect(changed.some(({ model }) => model === NEW_MODEL)).toBe(true);
    for (const { model, operation, runSeconds, reason } of changed) {
      expect(basesOf(model, operation)[0]!.runSeconds).not.toBe(runSeconds);
      expect(reason).not.toBe("");
    }
  });

  test("add time for the richer finish of each model", () => {
    const adders = standards.filter(({ option }) => option !== null);
    expect(new Set(adders.map(({ model }) => model)).size).toBe(models.length);
    for (const { model, option } of adders) {
      expect(models.find(({ name }) => name === model)!.options[1]).toBe(option);
    }
  });
});
