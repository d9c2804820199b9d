import { describe, expect, test } from "vitest";
import { type StandardRow, standardInForce } from "@/lib/standards/in-force";

const row = (
  seq: number,
  effectiveFrom: string,
  runSeconds: number,
  option: string | null = null,
): StandardRow => ({ seq, option, effectiveFrom, setupSeconds: seq, runSeconds });

const rows = [
  row(3, "2026-05-01", 1000),
  row(1, "2026-01-01", 1200),
  row(4, "2026-05-01", 900),
  row(2, "2026-03-01", 60, "sunburst"),
  row(5, "2026-06-01", 90, "sunburst"),
  row(6, "2026-06-01", 30, "inlay"),
];

describe("standardInForce", () => {
  test.each([
    { day: "2026-04-30", options: [], is: 1200, because: "the latest from that day or before" },
    {
      day: "2026-05-01",
      options: [],
      is: 900,
      because: "it holds on its first day; ties to the later entry",
    },
    { day: "2026-12-31", options: [], is: 900, because: "it holds until another follows" },
    { day: "2026-05-01", options: ["sunburst"], is: 960, because: "an option adds to the base" },
    {
      day: "2026-06-01",
      options: ["sunburst", "inlay"],
      is: 1020,
      because: "each option has dates of its own",
    },
    {
      day: "2026-02-01",
      options: ["sunburst"],
      is: 1200,
      because: "an adder not yet in force adds nothing",
    },
    {
      day: "2026-05-01",
      options: ["gold"],
      is: 900,
      because: "an option without an adder adds nothing",
    },
    {
      day: "2026-05-01",
      options: ["sunburst", "sunburst"],
      is: 960,
      because: "an option counts once",
    },
  ])("$day $options: $is s a piece: $because", ({ day, options, is }) => {
    expect(standardInForce(rows, day, options)?.runSeconds).toBe(is);
    expect(standardInForce([...rows].reverse(), day, options)?.runSeconds).toBe(is);
  });
  test("setups add like runs", () => {
    expect(standardInForce(rows, "2026-06-01", ["sunburst"])?.setupSeconds).toBe(4 + 5);
  });
  test("before the first base there is no standard", () => {
    expect(standardInForce(rows, "2025-12-31")).toBeNull();
    expect(
      standardInForce([row(1, "2026-01-01", 60, "inlay")], "2026-01-01", ["inlay"]),
    ).toBeNull();
    expect(standardInForce([], "2026-01-01")).toBeNull();
  });
  test("a standard of nothing is a standard", () => {
    expect(standardInForce([row(0, "2026-01-01", 0)], "2026-01-01")).toEqual({
      setupSeconds: 0,
      runSeconds: 0,
    });
  });
});
