import { describe, expect, test } from "vitest";
import { payPolicy } from "@/lib/pay/schema";
import { secondsOf } from "@/lib/time/stretches";
import { zoneClock } from "@/lib/time/zone-clock";
import { timesheetOf } from "@/lib/timesheet/timesheet";

const at = (text: string) => Date.parse(`${text}-04:00`) / 1000;
const span = (start: string, end: string, kind: "work" | "rest" | "meal" = "work") => {
  return { start: at(`2026-06-${start}`), end: at(`2026-06-${end}`), kind, rate: null };
};

describe("timesheetOf", () => {
  const policy = payPolicy.parse({ rounding: { mode: "nearest", minutes: 15 } });
  const spans = [
    span("14T21:53:00", "15T01:00:00"),
    span("15T01:00:00", "15T01:40:00", "meal"),
    span("15T01:40:00", "15T06:05:00"),
    span("16T08:00:00", "16T09:00:00", "meal"),
  ];
  const sheet = timesheetOf(spans, policy, zoneClock("America/New_York"));

  test("keeps time as tapped beside time as rounded, in workdays", () => {
    const byDate = (pieces: typeof sheet.paid) =>
      pieces.map((piece) => [piece.date, secondsOf([piece]) / 60]);
    expect(byDate(sheet.worked)).toEqual([
      ["2026-06-14", 127],
      ["2026-06-15", 60],
      ["2026-06-15", 265],
    ]);
    expect(byDate(sheet.paid)).toEqual([
      ["2026-06-14", 120],
      ["2026-06-15", 60],
      ["2026-06-15", 260],
    ]);
  });
  test("dates what was made of breaks", () => {
    expect(sheet.steps.map(({ rule, date }) => [rule, date])).toEqual([
      ["meal-unpaid", "2026-06-15"],
      ["meal-unpaid", "2026-06-16"],
    ]);
  });
  test("knows the workweeks, and the shifts with work", () => {
    expect([...sheet.weeks.keys()]).toEqual(["2026-06-08", "2026-06-15"]);
    expect(sheet.shifts).toEqual([
      {
        start: at("2026-06-14T21:53:00"),
        end: at("2026-06-15T06:05:00"),
        date: "2026-06-14",
        workedSeconds: (127 + 60 + 265) * 60,
        breaks: [
          { kind: "meal", start: at("2026-06-15T01:00:00"), end: at("2026-06-15T01:40:00") },
        ],
      },
    ]);
  });
});
