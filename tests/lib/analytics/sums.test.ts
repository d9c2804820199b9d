import { describe, expect, test } from "vitest";
import { addWork, NO_WORK, timedSeconds } from "@/lib/analytics/sums";

describe("addWork", () => {
  test("adds figure by figure; none is nothing", () => {
    const one = { ...NO_WORK, pieces: 1, earnedSeconds: 2, directSeconds: 3 };
    expect(addWork([one, { ...one, elsewhereSeconds: 4 }])).toEqual({
      ...NO_WORK,
      pieces: 2,
      earnedSeconds: 4,
      directSeconds: 6,
      elsewhereSeconds: 4,
    });
    expect(addWork([])).toEqual(NO_WORK);
  });
});

describe("timedSeconds", () => {
  test("leaves out what has no standard", () => {
    expect(timedSeconds({ directSeconds: 9, noStandardSeconds: 4 })).toBe(5);
  });
});
