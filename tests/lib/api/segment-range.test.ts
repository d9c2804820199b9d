import { describe, expect, test } from "vitest";
import { decideSegmentRange } from "@/lib/api/segment-range";

const rules = [{ fromMs: 0, timeZone: "America/Chicago", productionDayStartsAtMinutes: 360 }];
const atMs = Date.parse("2026-03-09T10:59:59Z"); // 05:59:59 in Chicago: still the day before

describe("decideSegmentRange", () => {
  test.each([
    [{}, { from: "2026-03-02", to: "2026-03-09" }],
    [{ to: "2026-03-01" }, { from: "2026-02-22", to: "2026-03-01" }],
    [{ from: "2026-03-08" }, { from: "2026-03-08", to: "2026-03-09" }],
    [
      { from: "2026-01-01", to: "2026-04-04" },
      { from: "2026-01-01", to: "2026-04-04" },
    ],
  ])("%j means %j", (asked, range) => {
    expect(decideSegmentRange(asked, rules, atMs)).toEqual({ ok: true, value: range });
  });
  test.each([
    [{ from: "2026-03-09" }, "exclusive"],
    [{ from: "2026-03-02", to: "2026-03-02" }, "exclusive"],
    [{ from: "2026-01-01", to: "2026-04-05" }, "at most 93 days"],
  ])("refuses %j at `to`", (asked, why) => {
    expect(decideSegmentRange(asked, rules, atMs)).toMatchObject({
      problem: { code: "invalid", errors: [{ path: "to", message: expect.stringContaining(why) }] },
    });
  });
});
