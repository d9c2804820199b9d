import { describe, expect, test } from "vitest";
import { calendarAt } from "@/lib/demo/calendar";

const instant = (second: number) => new Date(second * 1000).toISOString();

describe("calendarAt", () => {
  test("begins on a Monday at the town's midnight, eight whole weeks before this week", () => {
    const calendar = calendarAt(Date.parse("2026-05-14T16:20:00Z"));
    expect(instant(calendar.startsAt)).toBe("2026-03-16T05:00:00.000Z");
    expect(calendar.today).toBe(59);
    expect(calendar.days.find(({ index }) => index === 59)).toMatchObject({
      date: "2026-05-14",
      weekday: 4,
    });
  });

  test("today is the town's day, not the one of Greenwich", () => {
    const calendar = calendarAt(Date.parse("2026-05-18T03:00:00Z"));
    expect(calendar.days.find(({ index }) => index === calendar.today)?.date).toBe("2026-05-17");
    expect(calendar.days.find(({ index }) => index === calendar.today)?.weekday).toBe(7);
  });

  test("a minute of a day is the same on the wall before and after the clocks change", () => {
    const { days } = calendarAt(Date.parse("2026-03-20T12:00:00Z"));
    const at = (date: string) => instant(days.find((day) => day.date === date)!.at(390));
    expect(at("2026-03-06")).toBe("2026-03-06T12:30:00.000Z");
    expect(at("2026-03-09")).toBe("2026-03-09T11:30:00.000Z");
  });

  test("minutes beyond midnight belong to the next day", () => {
    const { days } = calendarAt(Date.parse("2026-05-14T16:20:00Z"));
    const day = days.find(({ date }) => date === "2026-05-12")!;
    expect(instant(day.at(1860))).toBe("2026-05-13T12:00:00.000Z");
  });

  test("reaches two weeks ahead, so that shifts are planned", () => {
    const { days, today } = calendarAt(Date.parse("2026-05-14T16:20:00Z"));
    expect(days.at(-1)!.index).toBe(today + 14);
  });
});
