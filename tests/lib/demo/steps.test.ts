import { describe, expect, test } from "vitest";
import { models } from "@/lib/demo/models";
import { routingOf } from "@/lib/demo/operations";
import { stepsOf } from "@/lib/demo/steps";
import { sum } from "@/lib/sum";

const whole = models.filter((model) => model.whole);

describe("stepsOf", () => {
  test("the steps of an operation take as long as the operation itself", () => {
    for (const model of whole) {
      const stepped = routingOf(model).filter(({ code }) => stepsOf(model, code).length > 0);
      expect(stepped).toHaveLength(1);
      const [{ code, runMinutes }] = stepped as [(typeof stepped)[number]];
      expect(sum(stepsOf(model, code).map(({ minutes }) => minutes))).toBe(runMinutes);
    }
  });
  test("are on one sheet, each with a number and a name of its own", () => {
    for (const model of whole) {
      const steps = stepsOf(model, "495");
      expect(steps.length).toBeLessThanOrEqual(10);
      expect(new Set(steps.map(({ step }) => step)).size).toBe(steps.length);
      expect(new Set(steps.map(({ name }) => name)).size).toBe(steps.length);
    }
  });
  test("what goes by stations has none", () => {
    for (const model of models.filter((each) => !each.whole)) {
      expect(routingOf(model).flatMap(({ code }) => stepsOf(model, code))).toEqual([]);
    }
  });
});
