import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { fairWeights, type Weighable } from "@/lib/timeline/weights";

const item = (
  runSeconds: number,
  openPieces: number,
  setupSeconds = 0,
  setupEarned = false,
): Weighable => ({
  shareBy: "standard",
  standard: { setupSeconds, runSeconds },
  openPieces,
  setupEarned,
});
const unknown: Weighable = {
  shareBy: "standard",
  standard: null,
  openPieces: 3,
  setupEarned: false,
};
const equal: Weighable = { ...item(900, 5), shareBy: "equal" };

describe("fairWeights", () => {
  test.each([
    { because: "run standard by open pieces", of: [item(600, 4), item(300, 1)], is: [2400, 300] },
    {
      because: "the setup counts until it is earned",
      of: [item(600, 1, 120), item(600, 1, 120, true)],
      is: [720, 600],
    },
    {
      because: "no standard weighs the mean of the others",
      of: [item(600, 1), unknown, item(300, 1)],
      is: [600, 450, 300],
    },
    {
      because: "a half second of the mean is up",
      of: [item(1, 1), item(2, 1), unknown],
      is: [1, 2, 2],
    },
    {
      because: "nothing left on one item weighs nothing beside one that has",
      of: [item(600, 0, 120, true), item(600, 2)],
      is: [0, 1200],
    },
    {
      because: "an item with nothing left counts in the mean",
      of: [item(600, 0, 0, true), item(600, 2), unknown],
      is: [0, 1200, 600],
    },
    { because: "all without a standard are equal", of: [unknown, unknown], is: [1, 1] },
    { because: "nothing left on any is equal", of: [item(600, 0), item(0, 3)], is: [1, 1] },
    { because: "an equal operation is equal", of: [equal, equal, equal], is: [1, 1, 1] },
    {
      because: "an equal one among others weighs their mean",
      of: [equal, item(600, 1)],
      is: [600, 600],
    },
    { because: "one alone has all of it", of: [item(600, 2)], is: [1200] },
  ])("$because", ({ of, is }) => expect(fairWeights(of)).toEqual(is));

  test("for any items, there is some weight, and all are whole seconds", () => {
    const any = fc.record({
      shareBy: fc.constantFrom("standard", "equal"),
      standard: fc.option(fc.record({ setupSeconds: fc.nat(7200), runSeconds: fc.nat(36_000) })),
      openPieces: fc.nat(50),
      setupEarned: fc.boolean(),
    });
    fc.assert(
      fc.property(fc.array(any, { minLength: 1, maxLength: 20 }), (items) => {
        const weights = fairWeights(items);
        expect(weights).toHaveLength(items.length);
        expect(weights.every((weight) => Number.isInteger(weight) && weight >= 0)).toBe(true);
        expect(Math.max(...weights)).toBeGreaterThan(0);
      }),
    );
  });
  test("refuses a count below nothing", () => {
    expect(() => fairWeights([item(600, -1)])).toThrow("0 or more");
  });
});
