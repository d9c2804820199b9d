import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { seamParts } from "@/lib/seam/parts";

const whole = { book: false, day: false };
const lengths = fc.record({
  standardSeconds: fc.nat(10_000),
  actualSeconds: fc.nat(20_000),
});
const scales = fc.integer({ min: 60, max: 15_000 });

describe("seamParts", () => {
  test("running work leaves the mirrored outline of what is not used", () => {
    expect(seamParts({ standardSeconds: 48, actualSeconds: 32 }, 64)).toEqual({
      book: 0.75,
      day: 0.5,
      over: 0,
      hand: 0.25,
      folded: whole,
    });
  });

  test("an overhang begins where the mirrored standard ends", () => {
    expect(seamParts({ standardSeconds: 32, actualSeconds: 48 }, 64)).toEqual({
      book: 0.5,
      day: 0.5,
      over: 0.25,
      hand: 0,
      folded: whole,
    });
  });

  test("what is longer than the leaf ends at its rim, folded", () => {
    expect(seamParts({ standardSeconds: 32, actualSeconds: 99 }, 64)).toEqual({
      book: 0.5,
      day: 0.5,
      over: 0.5,
      hand: 0,
      folded: { book: false, day: true },
    });
  });

  test("a standard and an actual off the scale show no overhang, but both folds", () => {
    expect(seamParts({ standardSeconds: 70, actualSeconds: 72 }, 64)).toEqual({
      book: 1,
      day: 1,
      over: 0,
      hand: 0,
      folded: { book: true, day: true },
    });
  });

  test("without a standard all of the actual is one piece", () => {
    expect(seamParts({ standardSeconds: null, actualSeconds: 16 }, 64)).toEqual({
      book: 0,
      day: 0.25,
      over: 0,
      hand: 0,
      folded: whole,
    });
  });

  test("for any pair, the day mirrors the book like for like", () => {
    fc.assert(
      fc.property(lengths, scales, (pair, scale) => {
        const { book, day, over, hand } = seamParts(pair, scale);
        expect(day + hand).toBeCloseTo(book);
        expect(Math.min(over, hand)).toBe(0);
        expect(day + over).toBeCloseTo(Math.min(1, pair.actualSeconds / scale));
      }),
    );
  });

  test("for any pair, no piece leaves its leaf, and only a longer one is folded", () => {
    fc.assert(
      fc.property(lengths, scales, (pair, scale) => {
        const { book, day, over, folded } = seamParts(pair, scale);
        expect(book).toBeLessThanOrEqual(1);
        expect(day + over).toBeLessThanOrEqual(1);
        expect(folded).toEqual({
          book: pair.standardSeconds > scale,
          day: pair.actualSeconds > scale,
        });
      }),
    );
  });
});
