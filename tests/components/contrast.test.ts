import { readFileSync } from "node:fs";
import { describe, expect, test } from "vitest";
import checks from "@/tests/checks/security.json";

// Every pair of colours that the screens use, in both themes, from the tokens themselves.
const css = readFileSync(new URL("../../app/globals.css", import.meta.url), "utf8");
const hex = "(#[0-9a-f]{6})";

/** The value of a token in both themes; one value stands for both. */
function token(name: string): { light: string; dark: string } {
  const two = new RegExp(`--${name}: light-dark\\(${hex}, ${hex}\\);`).exec(css);
  if (two) return { light: two[1]!, dark: two[2]! };
  const one = new RegExp(`--${name}: ${hex};`).exec(css);
  if (one) return { light: one[1]!, dark: one[1]! };
  throw new Error(`globals.css has no colour --${name}`);
}

/** WCAG 2.2, relative luminance of an sRGB colour. */
function luminance(colour: string): number {
  const [red, green, blue] = [1, 3, 5].map((at) => {
    const share = Number.parseInt(colour.slice(at, at + 2), 16) / 255;
    return share <= 0.04045 ? share / 12.92 : ((share + 0.055) / 1.055) ** 2.4;
  });
  return 0.2126 * red! + 0.7152 * green! + 0.0722 * blue!;
}

/** WCAG 2.2, contrast ratio of two colours, 1 to 21. */
function contrast(one: string, other: string): number {
  const [dim, bright] = [luminance(one), luminance(other)].sort((a, b) => a - b);
  return (bright! + 0.05) / (dim! + 0.05);
}

describe("contrast ratio", () => {
  const published = checks.find(({ id }) => id === "wcag-contrast-values") as unknown as {
    given: { pairs: [string, string][] };
    expect: { ratio: number[] };
    tolerance: number;
  };

  test("is WCAG's for the pairs of the checks", () => {
    published.given.pairs.forEach(([one, other], at) => {
      const apart = contrast(one, other) - published.expect.ratio[at]!;
      expect(Math.abs(apart)).toBeLessThanOrEqual(published.tolerance);
    });
  });
});

/** Pairs in use with the least ratio: 7 for text to read, 4.5 for other text, 3 for what is drawn. */
const pairs: [string, string, number][] = [
  ["ink", "surface-book", 7],
  ["ink", "surface-day", 7],
  ["ink", "surface-raised", 7],
  ["ink", "surface-sunk", 7],
  ["ink", "standard-fill", 4.5],
  ["ink", "hold-tint", 7],
  ["on-ink", "ink", 7],
  ["ink-2", "surface-book", 4.5],
  ["ink-2", "surface-day", 4.5],
  ["ink-3", "surface-book", 4.5],
  ["ink-3", "surface-day", 4.5],
  ["standard-ink", "surface-book", 4.5],
  ["standard-ink", "surface-day", 4.5],
  ["standard-edge", "surface-book", 3],
  ["standard-edge", "surface-day", 3],
  ["standard-edge", "standard-fill", 3],
  ["actual", "surface-day", 4.5],
  ["actual", "surface-book", 4.5],
  ["on-actual", "actual", 4.5],
  ["under", "surface-day", 4.5],
  ["over", "surface-day", 4.5],
  ["over", "surface-book", 4.5],
  ["on-over", "over", 4.5],
  ["hold", "surface-day", 4.5],
  ["hold", "surface-book", 4.5],
  ["hold", "hold-tint", 4.5],
  ["on-hold", "hold", 4.5],
  ["indirect", "surface-day", 4.5],
  ["indirect", "surface-book", 4.5],
  ["danger", "surface-day", 4.5],
  ["danger", "surface-book", 4.5],
  ["danger", "surface-raised", 4.5],
  ["on-danger", "danger", 4.5],
  ["line-strong", "surface-book", 3],
  ["line-strong", "surface-day", 3],
  ["focus", "surface-book", 3],
  ["focus", "surface-day", 3],
  ["focus", "surface-raised", 3],
  ["seam-dark", "surface-book", 3],
  ["seam-dark", "surface-day", 3],
  ["caution-ink", "caution", 7],
  ["on-mandatory", "mandatory", 4.5],
  ["prohibition", "on-mandatory", 3],
];

describe("the tokens", () => {
  test.each(pairs)("%s on %s keeps %d to 1, light and dark", (one, other, least) => {
    const [front, back] = [token(one), token(other)];
    expect(contrast(front.light, back.light)).toBeGreaterThanOrEqual(least);
    expect(contrast(front.dark, back.dark)).toBeGreaterThanOrEqual(least);
  });

  test("the browser's bar is the book leaf's colour in both themes", () => {
    const layout = readFileSync(new URL("../../app/layout.tsx", import.meta.url), "utf8");
    const { light, dark } = token("surface-book");
    expect(layout).toContain(`(prefers-color-scheme: light)", color: "${light}"`);
    expect(layout).toContain(`(prefers-color-scheme: dark)", color: "${dark}"`);
  });
});
