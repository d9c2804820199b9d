import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { type BookedTime, stepTimes } from "@/lib/sheet/step-times";
import type { StepTap } from "@/lib/sheet/taps";
import { sum } from "@/lib/sum";
import { makeStepTap, makeTime } from "@/tests/make/sheet";

const minutesOf = (taps: readonly StepTap[], time: readonly BookedTime[]) => {
  const { seconds, together, notTappedSeconds } = stepTimes(taps, time);
  return {
    steps: Object.fromEntries([...seconds].map(([step, each]) => [step, each / 60])),
    together: [...together],
    left: notTappedSeconds / 60,
  };
};

describe("stepTimes", () => {
  test("the seconds since the tap before belong to the next step, the rest to none yet", () => {
    const taps = [makeStepTap("1", 7), makeStepTap("2", 13)];
    expect(minutesOf(taps, [makeTime([0, 20])])).toEqual({
      steps: { "1": 7, "2": 6 },
      together: [],
      left: 7,
    });
  });
  test("a step is as long as was worked on it: a break, a night and other work are left out", () => {
    const taps = [makeStepTap("1", 40), makeStepTap("2", 1500)];
    const time = [makeTime([0, 10]), makeTime([25, 45]), makeTime([1440, 1490])];
    expect(minutesOf(taps, time)).toEqual({ steps: { "1": 25, "2": 55 }, together: [], left: 0 });
  });
  test("on two tickets at once a step takes its ticket's share of the time", () => {
    const taps = [makeStepTap("1", 10)];
    expect(minutesOf(taps, [makeTime([0, 20], 10 * 60)])).toEqual({
      steps: { "1": 5 },
      together: [],
      left: 5,
    });
  });
  test("two people's time on one instrument belongs to the step that either taps off next", () => {
    const taps = [makeStepTap("1", 10), makeStepTap("2", 20, { worker: "1077" })];
    const time = [makeTime([0, 20]), makeTime([5, 20])];
    expect(minutesOf(taps, time)).toEqual({ steps: { "1": 15, "2": 20 }, together: [], left: 0 });
  });
  test("a bunch shares the time since the tap before by its steps' weights, and is marked", () => {
    const taps = [
      makeStepTap("1", 8),
      makeStepTap("2", 24),
      makeStepTap("3", 24, { atMs: 24 * 60_000 + 20_000 }),
    ];
    const time = [{ start: 0, end: 24 * 60 + 20, seconds: 24 * 60 + 20 }];
    const { seconds, together, notTappedSeconds } = stepTimes(taps, time);
    // 980 s by 360 : 600
    expect([...seconds]).toEqual([
      ["1", 480],
      ["2", 368],
      ["3", 612],
    ]);
    expect([...together]).toEqual(["2", "3"]);
    expect(notTappedSeconds).toBe(0);
  });
  test("a step that is tapped off twice in a bunch weighs once", () => {
    const taps = [makeStepTap("1", 10), makeStepTap("1", 10), makeStepTap("3", 10)];
    expect(minutesOf(taps, [makeTime([0, 9])]).steps).toEqual({ "1": 4, "3": 5 });
  });
  test("one that is taken back keeps its time, and what is done again comes on top", () => {
    const taps = [
      makeStepTap("1", 8),
      makeStepTap("2", 14),
      makeStepTap("1", 16, { kind: "open" }),
      makeStepTap("1", 20),
    ];
    expect(minutesOf(taps, [makeTime([0, 21])])).toEqual({
      steps: { "1": 14, "2": 6 },
      together: [],
      left: 1,
    });
  });
  test("one that does not apply takes nothing", () => {
    const taps = [makeStepTap("1", 8, { kind: "skip" }), makeStepTap("2", 14)];
    expect(minutesOf(taps, [makeTime([0, 14])]).steps).toEqual({ "2": 14 });
  });
  test("a tap before any time is booked takes none, and nothing booked is nothing left", () => {
    expect(minutesOf([makeStepTap("1", 5)], [])).toEqual({
      steps: { "1": 0 },
      together: [],
      left: 0,
    });
    expect(minutesOf([], [makeTime([0, 9])]).left).toBe(9);
  });

  const tap = fc.record({
    step: fc.constantFrom("1", "2", "3", "4"),
    second: fc.nat(3_000),
    kind: fc.constantFrom("done", "done", "done", "open", "skip" as const),
    weight: fc.nat(900),
  });
  const taps = fc
    .array(tap, { maxLength: 20 })
    .map((all) =>
      all
        .sort((a, b) => a.second - b.second)
        .map(({ step, second, kind, weight }, place) =>
          makeStepTap(step, 0, { event: `tap-${place}`, kind, weight, atMs: second * 1000 }),
        ),
    );
  const time = fc
    .array(fc.tuple(fc.nat(3_000), fc.nat(600), fc.double({ min: 0, max: 1, noNaN: true })))
    .map((all) =>
      all.map(([start, length, share]) => ({
        start,
        end: start + length,
        seconds: Math.round(length * share),
      })),
    );

  test("for any taps and time, the steps and what is not tapped off sum to what was booked", () => {
    fc.assert(
      fc.property(taps, time, (all, booked) => {
        const { seconds, notTappedSeconds } = stepTimes(all, booked);
        expect(sum([...seconds.values()]) + notTappedSeconds).toBe(
          sum(booked.map((one) => one.seconds)),
        );
        for (const each of [...seconds.values(), notTappedSeconds]) {
          expect(Number.isInteger(each) && each >= 0).toBe(true);
        }
      }),
    );
  });
  test("for any taps, time that is cut in two anywhere falls to the same steps", () => {
    fc.assert(
      fc.property(taps, fc.nat(3_000), (all, cut) => {
        const whole = [{ start: 0, end: 3_000, seconds: 3_000 }];
        const parts = [
          { start: 0, end: cut, seconds: cut },
          { start: cut, end: 3_000, seconds: 3_000 - cut },
        ];
        expect(stepTimes(all, parts)).toEqual(stepTimes(all, whole));
      }),
    );
  });
  test("for any taps, time that comes after them all changes no step", () => {
    fc.assert(
      fc.property(taps, time, fc.nat(500), (all, booked, more) => {
        const later = [...booked, { start: 9_000, end: 9_000 + more, seconds: more }];
        const [before, after] = [stepTimes(all, booked), stepTimes(all, later)];
        expect(after.seconds).toEqual(before.seconds);
        expect(after.notTappedSeconds).toBe(before.notTappedSeconds + more);
      }),
    );
  });
});
