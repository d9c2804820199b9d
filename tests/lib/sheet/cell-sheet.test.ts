import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { cellSheet } from "@/lib/sheet/cell-sheet";
import { sum } from "@/lib/sum";
import { makeStepTap, makeTime, steps } from "@/tests/make/sheet";

describe("cellSheet", () => {
  test("shows every step with its standard, its time and how it stands", () => {
    const taps = [
      makeStepTap("1", 7),
      makeStepTap("3", 20, { kind: "skip", reason: "not-on-this" }),
    ];
    const sheet = cellSheet(steps, 1440, { taps, time: [makeTime([0, 22])] });
    expect(sheet).toMatchObject({
      standardSeconds: 1440,
      actualSeconds: 1320,
      notTappedSeconds: 900,
      steps: [
        { step: "1", standardSeconds: 480, state: "done", actualSeconds: 420, atMs: 420_000 },
        { step: "2", standardSeconds: 360, state: "open", actualSeconds: 0, atMs: null },
        { step: "3", standardSeconds: 600, state: "skipped", reason: "not-on-this" },
      ],
    });
  });
  test("a later standard of the operation is shared as the steps take it", () => {
    const { steps: shown } = cellSheet(steps, 720, { taps: [], time: [] });
    expect(shown.map(({ standardSeconds }) => standardSeconds)).toEqual([240, 180, 300]);
  });
  test("without a standard no step has one, and the time is there all the same", () => {
    const sheet = cellSheet(steps, null, {
      taps: [makeStepTap("2", 4)],
      time: [makeTime([0, 4])],
    });
    expect(sheet.steps.map(({ standardSeconds }) => standardSeconds)).toEqual([null, null, null]);
    expect(sheet.steps[1]).toMatchObject({ state: "done", actualSeconds: 240 });
  });
  test("a step that is taken back is open, with the time it took", () => {
    const taps = [makeStepTap("1", 4), makeStepTap("1", 5, { kind: "open" })];
    const [first] = cellSheet(steps, 1440, { taps, time: [makeTime([0, 6])] }).steps;
    expect(first).toMatchObject({ state: "open", actualSeconds: 240, reason: null });
  });
  test("a tap on a step that the routing does not have keeps its time, under its code", () => {
    const sheet = cellSheet(steps, 1440, {
      taps: [makeStepTap("9", 4)],
      time: [makeTime([0, 4])],
    });
    expect(sheet.steps[3]).toMatchObject({ step: "9", name: "9", actualSeconds: 240 });
  });
  test("steps that were tapped off together say so", () => {
    const taps = [makeStepTap("1", 4), makeStepTap("2", 4), makeStepTap("3", 9)];
    const sheet = cellSheet(steps, 1440, { taps, time: [makeTime([0, 9])] });
    expect(sheet.steps.map(({ together }) => together)).toEqual([true, true, false]);
  });
  test("for any standard, the steps' standards sum to it", () => {
    fc.assert(
      fc.property(fc.nat(100_000), (standard) => {
        const sheet = cellSheet(steps, standard, { taps: [], time: [] });
        expect(sum(sheet.steps.map(({ standardSeconds }) => standardSeconds ?? 0))).toBe(standard);
      }),
    );
  });
});
