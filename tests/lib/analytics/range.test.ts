import { describe, expect, test } from "vitest";
import { decideSpan, spanOf, trendWeeks, weeksOf } from "@/lib/analytics/range";

const today = "2026-05-14";

describe("spanOf", () => {
  test.each([
    [{ from: "", to: "" }, "2026-04-17", "2026-05-15", "four weeks up to today"],
    [{ from: "2026-05-01", to: "" }, "2026-05-01", "2026-05-15", "up to today"],
    [{ from: "2026-06-01", to: "" }, "2026-06-01", "2026-06-02", "a day to come is itself"],
    [{ from: "", to: "2026-05-01" }, "2026-04-04", "2026-05-02", "four weeks up to a day"],
    [{ from: "2026-05-09", to: "2026-05-02" }, "2026-05-02", "2026-05-10", "turned round"],
    [{ from: "2020-01-01", to: "2026-05-14" }, "2025-05-14", "2026-05-15", "its last days"],
  ])("%j is %s until before %s: %s", (asked, first, past) => {
    expect(spanOf(asked, today)).toEqual({ first, past });
  });
});

describe("decideSpan", () => {
  test("its end is exclusive, and four weeks are usual", () => {
    expect(decideSpan({}, today)).toEqual({
      ok: true,
      value: { first: "2026-04-17", past: "2026-05-15" },
    });
    const asked = { from: "2026-05-01", to: "2026-05-02" };
    expect(decideSpan(asked, today)).toMatchObject({
      value: { first: "2026-05-01", past: "2026-05-02" },
    });
  });
  test.each([
    [{ from: "2026-05-02", to: "2026-05-02" }, "Give a `to` after `from`: it is exclusive."],
    [{ from: "2026-05-03", to: "2026-05-02" }, "Give a `to` after `from`: it is exclusive."],
    [{ from: "2025-05-01", to: "2026-05-03" }, "Ask for at most 366 days at once."],
  ])("refuses %j", (asked, message) => {
    expect(decideSpan(asked, today)).toMatchObject({
      ok: false,
      problem: { code: "invalid", detail: message, errors: [{ path: "to", message }] },
    });
  });
  test("takes 366 days", () => {
    expect(decideSpan({ from: "2025-05-01", to: "2026-05-02" }, today).ok).toBe(true);
  });
});

describe("trendWeeks", () => {
  test("are eight, of seven days each, and end where the range ends", () => {
    const weeks = trendWeeks({ first: "2026-05-01", past: "2026-05-15" });
    expect(weeks).toHaveLength(8);
    expect(weeks[0]).toEqual({ first: "2026-03-20", past: "2026-03-27" });
    expect(weeks.at(-1)).toEqual({ first: "2026-05-08", past: "2026-05-15" });
  });
});

describe("weeksOf", () => {
  test("begin on Mondays, cut to the range, without gap", () => {
    expect(weeksOf({ first: "2026-05-09", past: "2026-05-20" })).toEqual([
      { first: "2026-05-09", past: "2026-05-11" },
      { first: "2026-05-11", past: "2026-05-18" },
      { first: "2026-05-18", past: "2026-05-20" },
    ]);
    expect(weeksOf({ first: "2026-05-11", past: "2026-05-18" })).toHaveLength(1);
  });
  test("a range of no day has none", () => {
    expect(weeksOf({ first: "2026-05-11", past: "2026-05-11" })).toEqual([]);
  });
});
