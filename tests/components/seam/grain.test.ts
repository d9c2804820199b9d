import { readFileSync } from "node:fs";
import fc from "fast-check";
import { describe, expect, test } from "vitest";

// The stylesheet alone knows how wide a gauge is, so the grain is chosen there; its own
// declarations are evaluated here, and must choose as the plain rule does.
const css = readFileSync(new URL("../../../app/styles/seam.css", import.meta.url), "utf8");

/** Evaluates a pitch declared for boards of `selector`, in px, at `minute` px to the minute. */
function pitch(selector: string, property: string, minute: number): number {
  const rule = css.slice(css.indexOf(`${selector} > b {`));
  const [, declared] = new RegExp(`${property}: (min\\([^;]+\\));`).exec(rule) ?? [];
  const sum = declared!
    .replaceAll("var(--minute)", String(minute))
    .replaceAll(/(\d)px/g, "$1")
    .replaceAll(/\b(min|max)\(/g, "Math.$1(");
  return new Function(`return ${sum}`)();
}

/** The plain rule: the smallest of the units that keeps its lines `apart`; none is beyond sight. */
function smallest(units: number[], apart: number, minute: number): number | undefined {
  return units.find((unit) => unit * minute >= apart);
}

const minutePixels = fc.double({ min: 0.016, max: 60, noNaN: true });

describe("the grain of a gauge", () => {
  test.each([
    [".seam", "a row", [10, 20, 60, 480]],
    ['.seam[data-size="cell"]', "a cell", [20, 60, 480]],
  ])("%s: lines of %s are the smallest of its units that keeps 7 px", (selector, _, units) => {
    fc.assert(
      fc.property(minutePixels, (minute) => {
        const unit = smallest(units, 7, minute);
        expect(pitch(selector, "--coarse", minute)).toBeCloseTo(unit! * minute);
      }),
    );
  });

  const hero = '.seam:is([data-size="phone"], [data-size="bench"])';
  const coarser = new Map([
    [1, 5],
    [2, 10],
    [5, 20],
    [10, 60],
    [20, 60],
    [60, 480],
  ]);

  test("a hero's fine grain is the smallest unit that keeps 5 px, within its coarser one", () => {
    fc.assert(
      fc.property(fc.double({ min: 0.1, max: 60, noNaN: true }), (minute) => {
        const unit = smallest([...coarser.keys()], 5, minute)!;
        expect(pitch(hero, "--fine", minute)).toBeCloseTo(unit * minute);
        expect(pitch(hero, "--coarse", minute)).toBeCloseTo(coarser.get(unit)! * minute);
      }),
    );
  });

  test("the bench of 64 min on a leaf of 640 px is ruled at 1 and 5 min", () => {
    expect(pitch(hero, "--fine", 10)).toBe(10);
    expect(pitch(hero, "--coarse", 10)).toBe(50);
  });
});
