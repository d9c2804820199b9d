import { describe, expect, test } from "vitest";
import { weightsHere, withWeights } from "@/lib/bench/weights";
import { HERON, TestKiosk, WREN } from "@/tests/make/bench";

const { state } = TestKiosk.atDoor();
const heron = { ticket: HERON, operation: "120" };
const wren = { ticket: WREN, operation: "120" };

describe("weightsHere", () => {
  test("weighs by the standard of what is open and the setup that is not earned", () => {
    expect(weightsHere(state, [heron, wren])).toEqual([4 * 600, 600 + 300]);
  });

  test("an operation that this tablet does not know weighs the mean of the others", () => {
    expect(weightsHere(state, [heron, wren, { ticket: "1", operation: "9" }])).toEqual([
      2400, 900, 1650,
    ]);
  });

  test("none known: all the same", () => {
    expect(weightsHere(state, [{ ticket: "1", operation: "9" }])).toEqual([1]);
  });
});

describe("withWeights", () => {
  test("puts them on work, and leaves every other act as it is", () => {
    const work = { kind: "work", activity: "run", items: [heron, wren] } as const;
    expect(withWeights(state, { ...work, items: [...work.items] })).toEqual({
      ...work,
      items: [
        { ...heron, weight: 2400 },
        { ...wren, weight: 900 },
      ],
    });
    const report = { kind: "pause", items: [heron] } as const;
    expect(withWeights(state, { ...report, items: [heron] })).toEqual(report);
  });
});
