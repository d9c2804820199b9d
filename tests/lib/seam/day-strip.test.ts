import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { placeStretches, stripSpan } from "@/lib/seam/day-strip";

const hour = (n: number) => n * 3600;
const work = (from: number, to: number) => ({
  start: hour(from),
  end: hour(to),
  kind: "work" as const,
});
const day = { from: hour(6), to: hour(16) };

describe("placeStretches", () => {
  test("places each stretch in percent of the strip, in the order given", () => {
    const stretches = [work(6, 7), { ...work(7, 9.5), kind: "rest" as const }];
    expect(placeStretches(stretches, day)).toEqual([
      { kind: "work", left: 0, width: 10 },
      { kind: "rest", left: 10, width: 25 },
    ]);
  });

  test("cuts what begins before the strip or ends after it", () => {
    expect(placeStretches([work(5, 7), work(15, 20)], day)).toEqual([
      { kind: "work", left: 0, width: 10 },
      { kind: "work", left: 90, width: 10 },
    ]);
  });

  test("leaves out what only touches the strip", () => {
    expect(placeStretches([work(4, 6), work(16, 17)], day)).toEqual([]);
  });

  test("what is too short to see is drawn at its least width", () => {
    const [blink] = placeStretches([{ start: hour(8), end: hour(8) + 1, kind: "work" }], day);
    expect(blink?.width).toBe(0.3);
  });
});

describe("stripSpan", () => {
  test("is the whole hours around what happened and what was planned", () => {
    const planned = { from: hour(7), to: hour(15.5) };
    expect(stripSpan([work(6.9, 12)], planned)).toEqual({ from: hour(6), to: hour(16) });
    expect(stripSpan([], planned)).toEqual({ from: hour(7), to: hour(16) });
  });

  test("an empty day, and a shift that has just begun, still have an hour", () => {
    expect(stripSpan([])).toEqual({ from: 0, to: hour(1) });
    expect(stripSpan([work(8, 8)])).toEqual({ from: hour(8), to: hour(9) });
  });

  test("for any day, every stretch lies within its span", () => {
    const stretches = fc.array(
      fc
        .tuple(fc.nat(2_000_000_000), fc.nat(80_000))
        .map(([start, length]) => ({ start, end: start + length, kind: "work" as const })),
      { minLength: 1, maxLength: 12 },
    );
    fc.assert(
      fc.property(stretches, (list) => {
        const { from, to } = stripSpan(list);
        for (const { start, end } of list) {
          expect(from).toBeLessThanOrEqual(start);
          expect(to).toBeGreaterThanOrEqual(end);
        }
        expect([from % 3600, to % 3600]).toEqual([0, 0]);
      }),
    );
  });
});
