// @vitest-environment happy-dom
import { cleanup, render, screen } from "@testing-library/react";
import { afterEach, expect, test } from "vitest";
import { DayStrip } from "@/components/seam/day-strip";

const span = { from: 0, to: 36_000 };
const stretches = [
  { start: 0, end: 9000, kind: "work" as const },
  { start: 9000, end: 10_800, kind: "meal" as const },
];

afterEach(cleanup);

/** The pieces of a strip as `kind left width`. */
const pieces = () =>
  [...screen.getByRole("img").querySelectorAll<HTMLElement>("[data-kind]")].map(
    ({ dataset, style }) => `${dataset.kind} ${style.left} ${style.width}`,
  );

test("a day is drawn in clock time and named in words", () => {
  render(<DayStrip stretches={stretches} span={span} label="Thu 14 May, 2.5 h on tickets" />);
  expect(screen.getByRole("img", { name: "Thu 14 May, 2.5 h on tickets" })).toBeDefined();
  expect(pieces()).toEqual(["work 0% 25%", "meal 25% 5%"]);
});

test("the plan is a line beneath, now is a mark, and only while it is on the strip", () => {
  const plan = { from: 3600, to: 32_400 };
  const shown = render(
    <DayStrip stretches={[]} span={span} label="day" planned={plan} nowAt={18_000} />,
  );
  const strip = screen.getByRole("img");
  const planned = strip.querySelector<HTMLElement>("[data-planned]");
  expect([planned?.style.left, planned?.style.width]).toEqual(["10%", "80%"]);
  expect(strip.querySelector<HTMLElement>("[data-now]")?.style.left).toBe("50%");
  shown.rerender(<DayStrip stretches={[]} span={span} label="day" nowAt={40_000} />);
  expect(strip.querySelector("[data-now]")).toBeNull();
  expect(strip.querySelector("[data-planned]")).toBeNull();
});
