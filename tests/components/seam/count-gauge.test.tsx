// @vitest-environment happy-dom
import { cleanup, render, screen } from "@testing-library/react";
import { afterEach, expect, test } from "vitest";
import { CountGauge } from "@/components/seam/count-gauge";

afterEach(cleanup);

/** The pieces of a count as `kind left width`. */
const pieces = () =>
  [...screen.getByRole("img").querySelectorAll<HTMLElement>(".seam-pieces")].map(
    ({ dataset, style }) => `${dataset.kind} ${style.left} ${style.width}`,
  );
const book = () => screen.getByRole("img").querySelector<HTMLElement>(".seam-book");
const missing = () => screen.getByRole("img").querySelector<HTMLElement>(".seam-hand");

test("a full count mirrors its ticket, good first, then rework, then scrap", () => {
  render(<CountGauge ticket={3} count={{ good: 1, rework: 1, scrap: 1 }} label="3 of 3 counted" />);
  expect(screen.getByRole("img", { name: "3 of 3 counted" })).toBeDefined();
  expect(book()?.style.width).toBe("37.5%");
  expect(pieces()).toEqual(["good 50% 12.5%", "rework 62.5% 12.5%", "scrap 75% 12.5%"]);
  expect(missing()).toBeNull();
});

test("what is not counted yet is only outlined", () => {
  render(<CountGauge ticket={3} count={{ good: 2, rework: 0, scrap: 0 }} label="2 of 3 counted" />);
  expect(pieces()).toEqual(["good 50% 25%"]);
  expect([missing()?.style.left, missing()?.style.width]).toEqual(["75%", "12.5%"]);
});

test("more than the ticket asks for pushes out past the mirror", () => {
  render(<CountGauge ticket={3} count={{ good: 6, rework: 0, scrap: 0 }} label="6 of 3 counted" />);
  expect(book()?.style.width).toBe("18.75%");
  expect(pieces()).toEqual(["good 50% 37.5%"]);
});

test("nothing of nothing draws without a division by zero", () => {
  render(<CountGauge ticket={0} count={{ good: 0, rework: 0, scrap: 0 }} label="none" />);
  expect(book()?.style.width).toBe("0%");
  expect(pieces()).toEqual([]);
});
