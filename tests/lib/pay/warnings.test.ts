import { describe, expect, test } from "vitest";
import { type LocalSpan, stated } from "@/tests/make/pay";

const codes = (asked: Parameters<typeof stated>[0]) =>
  stated(asked).warnings.map(({ code, date }) => `${code} ${date}`);
const meal: LocalSpan[] = [
  ["2026-06-09T08:00", "2026-06-09T11:00"],
  ["2026-06-09T11:00", "2026-06-09T11:20", "meal"],
  ["2026-06-09T11:20", "2026-06-09T13:00"],
  ["2026-06-09T13:00", "2026-06-09T13:20", "meal"],
  ["2026-06-09T13:20", "2026-06-09T22:00"],
];

describe("warningsOf", () => {
  test("breaks are asked about one by one, with the time on the clock", () => {
    const warnings = stated({ policy: "us-federal", spans: meal }).warnings;
    expect(warnings.map(({ code, text }) => `${code}: ${text}`)).toEqual([
      "meal-short: A meal of 20 min from 11:00 is under 30 min and paid whole.",
      "meal-short: A meal of 20 min from 13:00 is under 30 min and paid whole.",
      "shift-length: The shift lasted 14 h 00 min, more than 12 hours.",
    ]);
  });
  test("each preset has its own limits", () => {
    expect(codes({ policy: "us-california", spans: meal })).toEqual(
      expect.arrayContaining(["meal-missing 2026-06-09", "rest-missing 2026-06-09"]),
    );
    expect(codes({ policy: "eu-working-time", spans: meal })).toContain("daily-rest 2026-06-09");
    expect(codes({ policy: "straight", spans: meal })).not.toContain("daily-rest 2026-06-09");
  });
  test("only those of the range are shown, though all time counts", () => {
    const spans: LocalSpan[] = [
      ["2026-06-09T14:30", "2026-06-09T22:30"],
      ["2026-06-10T08:00", "2026-06-10T12:00"],
    ];
    const policy = "eu-working-time";
    expect(codes({ policy, spans, from: "2026-06-10" })).toEqual(["daily-rest 2026-06-10"]);
    expect(codes({ policy, spans, to: "2026-06-10" })).toEqual(["break-missing 2026-06-09"]);
  });
  test("rounding that favours the worker is not asked about", () => {
    const policy = { rounding: { mode: "nearest" as const, minutes: 15 as const } };
    expect(codes({ policy, spans: [["2026-06-09T07:50", "2026-06-09T12:00"]] })).toEqual([]);
    expect(codes({ policy, spans: [["2026-06-09T08:00", "2026-06-09T12:00"]] })).toEqual([]);
    expect(codes({ policy, spans: [["2026-06-09T07:52", "2026-06-09T12:01"]] })).toEqual([]);
    expect(codes({ policy, spans: [["2026-06-09T08:00", "2026-06-09T12:07:29"]] })).toEqual([
      "rounding-bias 2026-06-09",
    ]);
  });
});
