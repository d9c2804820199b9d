import { readFileSync } from "node:fs";
import fc from "fast-check";
import { describe, expect, test } from "vitest";

// The stylesheet alone knows how wide a gauge is, so the grain is chosen there; its own
// declarations are evaluated here, and must choose as the plain rule does.
const css = readFileSync(new URL("../../../app/styles/seam.css", import.meta.url), "utf8");

/** The declared value of a custom property for boards of `selector`, else for all boards. */
function declared(selector: string, property: string): string {
  for (const boards of [`${selector} > b {`, ".seam > b {"]) {
    const from = css.indexOf(boards);
    const rule = from < 0 ? "" : css.slice(from, css.indexOf("}", from));
    const [, value] = new RegExp(`${property}:([^;]+);`).exec(rule) ?? [];
    if (value) return value;
  }
  throw new Error(`seam.css declares no ${property} for ${selector}`);
}

/** Evaluates a pitch declared for boards of `selector`, in px, at `minute` px to the minute. */
function pitch(selector: string, property: string, minute: number): number {
  const value = declared(selector, property).replaceAll(/var\((--[\w-]+)\)/g, (_, name) =>
    String(name === "--minute" ? minute : pitch(selector, name, minute)),
  );
  const sum = value
    .replaceAll(/(\d)px/g, "$1")
    .replaceAll("calc(", "(")
    .replaceAll(/\b(min|max)\(/g, "Math.$1(");
  return new Function(`return ${sum}`)();
}

/**
 * The plain rule: the smallest of the units that keeps its lines `apart`. The stylesheet has no
 * comparison, only a steep penalty, so a hundred-thousandth of a pixel short of it is left aside.
 */
function smallest(units: number[], apart: number, minute: number): number | undefined {
  fc.pre(units.every((unit) => unit * minute >= apart || unit * minute < apart - 0.00005));
  return units.find((unit) => unit * minute >= apart);
}

const minutePixels = fc.double({ min: 0.15, max: 60, noNaN: true });

describe("the grain of a gauge", () => {
  test.each([
    [".seam", "a row", [10, 20, 60, 480]],
    ['.seam[data-size="cell"]', "a cell", [20, 60, 480]],
    ['.seam[data-size="count"]', "a count", [1, 5, 10, 50]],
  ])("%s: lines of %s are the smallest of its units that keeps 7 px", (selector, _, units) => {
    fc.assert(
      fc.property(minutePixels, (minute) => {
        const unit = smallest(units, 7, minute);
        expect(pitch(selector, "--coarse", minute)).toBeCloseTo(unit! * minute, 3);
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
        expect(pitch(hero, "--fine", minute)).toBeCloseTo(unit * minute, 3);
        expect(pitch(hero, "--coarse", minute)).toBeCloseTo(coarser.get(unit)! * minute, 3);
      }),
    );
  });

  test("the bench of 64 min on a leaf of 640 px is ruled at 1 and 5 min", () => {
    expect(pitch(hero, "--fine", 10)).toBe(10);
    expect(pitch(hero, "--coarse", 10)).toBe(50);
  });
});
