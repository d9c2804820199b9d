import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { actualMinutes, seamVerdict, standardMinutes } from "@/lib/seam/verdict";

const minutes = (n: number) => n * 60;
const running = { finished: false };
const finished = { finished: true };
const lengths = fc.record({
  standardSeconds: fc.integer({ min: 0, max: 200_000 }),
  actualSeconds: fc.integer({ min: 0, max: 400_000 }),
});

describe("seamVerdict", () => {
  test.each([
    {
      of: [48, 31],
      when: running,
      word: "left",
      by: 17,
      because: "running work says what is left",
    },
    { of: [48, 47], when: running, word: "left", by: 1, because: "tolerance hides no time left" },
    { of: [48, 62], when: running, word: "over", by: 14, because: "past the standard is over" },
    { of: [48, 50], when: running, word: "on-standard", by: 2, because: "4 % past is within 5 %" },
    { of: [40, 42], when: finished, word: "on-standard", by: 2, because: "5 % exactly is within" },
    { of: [40, 38], when: finished, word: "on-standard", by: 2, because: "5 % short is within" },
    { of: [40, 43], when: finished, word: "over", by: 3, because: "7.5 % past is over" },
    { of: [48, 44], when: finished, word: "under", by: 4, because: "finished short is under" },
    { of: [0, 0], when: finished, word: "on-standard", by: 0, because: "nothing of nothing" },
    {
      of: [0, 9],
      when: finished,
      word: "over",
      by: 9,
      because: "a standard of nothing has no share",
    },
  ])("$of min is $by $word: $because", ({ of: [standard, actual], when, word, by }) => {
    const pair = { standardSeconds: minutes(standard!), actualSeconds: minutes(actual!) };
    expect(seamVerdict(pair, when)).toEqual({ word, minutes: by });
  });

  test("one second past the tolerance is over", () => {
    const pair = (actualSeconds: number) => ({ standardSeconds: 6000, actualSeconds });
    expect(seamVerdict(pair(6300), finished).word).toBe("on-standard");
    expect(seamVerdict(pair(6301), finished).word).toBe("over");
  });

  test("a site's own tolerance replaces ours", () => {
    const pair = { standardSeconds: minutes(40), actualSeconds: minutes(43) };
    expect(seamVerdict(pair, { finished: true, tolerancePercent: 10 }).word).toBe("on-standard");
  });

  test("without a standard it says so and how long it took", () => {
    const pair = { standardSeconds: null, actualSeconds: 1350 };
    expect(seamVerdict(pair, finished)).toEqual({ word: "no-standard", minutes: 22 });
  });

  test("a difference that the screen cannot show is on standard", () => {
    const pair = { standardSeconds: 300, actualSeconds: 330 };
    expect(seamVerdict(pair, finished)).toEqual({ word: "on-standard", minutes: 0 });
  });

  test("for any pair, the minutes are the difference of the two figures on the screen", () => {
    fc.assert(
      fc.property(lengths, fc.boolean(), (pair, done) => {
        const shown = standardMinutes(pair.standardSeconds) - actualMinutes(pair.actualSeconds);
        expect(seamVerdict(pair, { finished: done }).minutes).toBe(Math.abs(shown));
      }),
    );
  });

  test("for any pair, over is only said past the standard, left and under only short of it", () => {
    fc.assert(
      fc.property(lengths, fc.boolean(), (pair, done) => {
        const { word } = seamVerdict(pair, { finished: done });
        const apart = pair.actualSeconds - pair.standardSeconds;
        if (word === "over") expect(apart).toBeGreaterThan(0);
        if (word === "left") expect([apart < 0, done]).toEqual([true, false]);
        if (word === "under") expect([apart < 0, done]).toEqual([true, true]);
      }),
    );
  });
});

describe("minutes on the screen", () => {
  test("a standard is shown to the nearest minute, halves up", () => {
    expect([89, 90, 149].map(standardMinutes)).toEqual([1, 2, 2]);
  });
  test("time gone counts full minutes only", () => {
    expect([59, 60, 119].map(actualMinutes)).toEqual([0, 1, 1]);
  });
});
