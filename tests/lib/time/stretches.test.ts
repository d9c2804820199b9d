import { expect, test } from "vitest";
import { overlapOf, secondsOf } from "@/lib/time/stretches";

test("secondsOf sums lengths; none is 0", () => {
  expect(
    secondsOf([
      { start: 5, end: 9 },
      { start: 20, end: 21 },
    ]),
  ).toBe(5);
  expect(secondsOf([])).toBe(0);
});

test("overlapOf is what two stretches have in common, and not after its start where nothing", () => {
  expect(overlapOf({ start: 0, end: 10 }, { start: 5, end: 20 })).toEqual({ start: 5, end: 10 });
  const apart = overlapOf({ start: 0, end: 5 }, { start: 5, end: 20 });
  expect(apart.end - apart.start).toBe(0);
});
