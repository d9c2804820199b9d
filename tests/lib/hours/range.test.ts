import { describe, expect, test } from "vitest";
import { datesOf, hoursQuery, rangeOf } from "@/lib/hours/range";

const THURSDAY = "2026-05-14";

describe("rangeOf", () => {
  test.each([
    ["nothing", {}, "2026-05-04", THURSDAY],
    ["both", { from: "2026-04-27", to: "2026-05-10" }, "2026-04-27", "2026-05-10"],
    ["the first day", { from: "2026-05-01" }, "2026-05-01", "2026-05-01"],
    ["the last day", { to: "2026-05-01" }, "2026-05-01", "2026-05-01"],
    [
      "both the wrong way round",
      { from: "2026-05-02", to: "2026-05-01" },
      "2026-05-01",
      "2026-05-02",
    ],
    ["more than a year", { from: "2024-01-01", to: "2026-01-01" }, "2024-01-01", "2024-12-31"],
  ])("%s said", (_, said, from, to) => {
    expect(rangeOf(hoursQuery.parse(said), THURSDAY)).toEqual({ from, to });
  });

  test("on a Monday it begins a week ago, on a Sunday thirteen days ago", () => {
    expect(rangeOf({ from: "", to: "" }, "2026-05-11").from).toBe("2026-05-04");
    expect(rangeOf({ from: "", to: "" }, "2026-05-17").from).toBe("2026-05-04");
  });

  test("an odd address counts as not said", () => {
    expect(hoursQuery.parse({ from: "2026-02-30", cell: "x", after: "-" })).toEqual({
      from: "",
      to: "",
      cell: "",
      after: "",
    });
  });
});

describe("datesOf", () => {
  test("both ends are in it", () => {
    expect(datesOf({ from: "2026-02-27", to: "2026-03-01" })).toEqual([
      "2026-02-27",
      "2026-02-28",
      "2026-03-01",
    ]);
  });
});
