// @vitest-environment happy-dom
import { cleanup, render } from "@testing-library/react";
import { afterEach, expect, test } from "vitest";
import { SeamAxis } from "@/components/seam/axis";

afterEach(cleanup);

/** The marks of an axis as `figure left`. */
function marks(scaleSeconds: number) {
  const { container } = render(<SeamAxis scaleSeconds={scaleSeconds} unitShown />);
  return [...container.querySelectorAll<HTMLElement>(".seam-axis > span")].map(
    ({ textContent, style }) => `${textContent} ${style.left}`,
  );
}

test("the same marks stand on both leaves, mirrored; the unit is said once", () => {
  expect(marks(50 * 60)).toEqual(["20 30%", "20 70%", "40 10%", "40 min 90%"]);
});

test("a long scale counts in hours", () => {
  expect(marks(4 * 3600).at(-1)).toBe("4 h 100%");
});
