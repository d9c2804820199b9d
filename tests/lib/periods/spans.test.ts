import { describe, expect, test } from "vitest";
import { spansOf, type TimePart } from "@/lib/periods/spans";

const part = (from: number, to: number | null, activity: TimePart["activity"], item = 0) => ({
  startMs: from * 1000,
  endMs: to === null ? null : to * 1000,
  item,
  activity,
});
const shown = (parts: TimePart[], until = 10_000) =>
  spansOf(parts, until * 1000).map(({ start, end, kind }) => [start, end, kind]);

describe("spansOf", () => {
  test("work of any sort is work, on tickets or not; breaks are what they are", () => {
    const parts = [
      part(0, 10, "unassigned"),
      part(10, 20, "setup"),
      part(20, 30, "rest"),
      part(30, 40, "indirect"),
      part(40, 50, "meal"),
      part(50, 60, "rework"),
    ];
    expect(shown(parts)).toEqual([
      [0, 20, "work"],
      [20, 30, "rest"],
      [30, 40, "work"],
      [40, 50, "meal"],
      [50, 60, "work"],
    ]);
  });
  test("an interval of several tickets counts once", () => {
    expect(shown([part(0, 10, "run"), part(0, 10, "run", 1), part(10, 20, "run")])).toEqual([
      [0, 20, "work"],
    ]);
  });
  test("time that runs is cut at now, and is nothing before it began", () => {
    expect(shown([part(0, null, "run")], 7)).toEqual([[0, 7, "work"]]);
    expect(shown([part(9, null, "run")], 7)).toEqual([]);
  });
  test("a gap between shifts stays one", () => {
    expect(shown([part(0, 10, "run"), part(20, 30, "run")])).toHaveLength(2);
  });
});
