// @vitest-environment happy-dom
import { cleanup, render, screen } from "@testing-library/react";
import { afterEach, describe, expect, test } from "vitest";
import { LineRow } from "@/components/analytics/line-row";
import { linesOf } from "@/lib/analytics/lines";
import type { Work } from "@/lib/analytics/sums";
import { makeWorkRow } from "@/tests/make/work";

function show(work: Partial<Work>) {
  const [line] = linesOf([makeWorkRow("010", work)], { basis: "matched", places: 1 });
  render(
    <table>
      <tbody>
        <LineRow line={line!} code="010" name="Plane" spoken="Plane" scaleSeconds={36_000} />
      </tbody>
    </table>,
  );
  return screen.getAllByRole("row").map((row) => row.textContent);
}

afterEach(cleanup);

describe("LineRow", () => {
  test("earned stands left of the seam, actual and efficiency right of it", () => {
    expect(show({ pieces: 6, earnedSeconds: 7200, directSeconds: 9000 })).toEqual([
      "010Plane620.02.02.50.5 h over80 %",
    ]);
  });
  test("time without a standard is a dotted line of its own, left out and said", () => {
    const rows = show({ earnedSeconds: 7200, directSeconds: 9000, noStandardSeconds: 1800 });
    expect(rows).toEqual(["010Plane2.02.0on standard100 %", "010Planenone0.5no standardleft out"]);
    expect(screen.getAllByRole("img")[1]!.dataset.blank).toBe("");
  });
  test("nothing but that is that line alone, and no efficiency", () => {
    const rows = show({ pieces: 2, directSeconds: 1800, noStandardSeconds: 1800 });
    expect(rows).toEqual(["010Plane2none0.5no standardleft out"]);
    expect(rows.join()).not.toMatch(/NaN|%/);
  });
});
