import { describe, expect, test } from "vitest";
import { cellSheet } from "@/lib/sheet/cell-sheet";
import { isOutOfOrder, nextStep, stepAfter, tappedOff } from "@/lib/sheet/order";
import type { StepTap } from "@/lib/sheet/taps";
import { makeStepTap, steps } from "@/tests/make/sheet";

const sheetWith = (...taps: StepTap[]) => cellSheet(steps, 1440, { taps, time: [] });

describe("nextStep", () => {
  test("is the first that is open, also one that was taken back", () => {
    expect(nextStep(sheetWith())?.step).toBe("1");
    expect(nextStep(sheetWith(makeStepTap("1", 1)))?.step).toBe("2");
    const back = [makeStepTap("1", 1), makeStepTap("2", 2), makeStepTap("1", 3, { kind: "open" })];
    expect(nextStep(sheetWith(...back))?.step).toBe("1");
  });
  test("leaves out what does not apply; none is left when all are done", () => {
    const skipped = makeStepTap("1", 1, { kind: "skip" });
    expect(nextStep(sheetWith(skipped))?.step).toBe("2");
    expect(nextStep(sheetWith(skipped, makeStepTap("2", 2), makeStepTap("3", 3)))).toBeNull();
  });
});

describe("stepAfter", () => {
  test("is the second that is open", () => {
    expect(stepAfter(sheetWith(makeStepTap("2", 1)))?.step).toBe("3");
    expect(stepAfter(sheetWith(makeStepTap("1", 1), makeStepTap("2", 1)))).toBeNull();
  });
});

describe("isOutOfOrder", () => {
  test("is an open step that is not the next", () => {
    const sheet = sheetWith(makeStepTap("1", 1));
    expect(["1", "2", "3", "9"].filter((step) => isOutOfOrder(sheet, step))).toEqual(["3"]);
  });
});

describe("tappedOff", () => {
  test("counts what is done of what applies", () => {
    expect(
      tappedOff(sheetWith(makeStepTap("1", 1), makeStepTap("2", 1, { kind: "skip" }))),
    ).toEqual({ done: 1, of: 2 });
  });
});
