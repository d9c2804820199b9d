import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { sum } from "@/lib/sum";
import {
  clockText,
  dateText,
  dayText,
  decimalHour,
  decimalHours,
  groupedHours,
  hoursAndMinutes,
} from "@/lib/time/format";
import { wallClock } from "@/lib/time/zone";

describe("decimalHours", () => {
  // "Sum in minutes or seconds, round once": tests/checks/work-measurement.json, common practice
  test("three times 7:20 is 22 hours, and the column says so", () => {
    const column = decimalHours([26_400, 26_400, 26_400]);
    expect(column).toEqual({ total: "22.00", parts: ["7.34", "7.33", "7.33"] });
  });
  test.each([
    [17, "0.00", "below half a hundredth"],
    [18, "0.01", "half is up"],
    [36, "0.01", "a whole hundredth"],
    [54, "0.02", "one and a half"],
    [360_000, "100.00", "no separator at a hundred hours"],
  ])("%i s is %s: %s", (seconds, text) => {
    expect(decimalHours([seconds])).toEqual({ total: text, parts: [text] });
    expect(decimalHour(seconds)).toBe(text);
  });
  // "Hour:minute to decimal hours": tests/checks/work-measurement.json
  test.each([
    ["0:06", "0.10"],
    ["0:15", "0.25"],
    ["0:20", "0.33"],
    ["1:45", "1.75"],
    ["7:20", "7.33"],
    ["7:59", "7.98"],
  ])("%s is %s", (text, decimal) => {
    const [hours, minutes] = text.split(":").map(Number);
    expect(decimalHour(hours! * 3600 + minutes! * 60)).toBe(decimal);
  });
  test("the largest fraction gets the hundredth, an equal one only if it is earlier", () => {
    expect(decimalHours([12, 24, 24]).parts).toEqual(["0.00", "0.01", "0.01"]);
    expect(decimalHours([24, 24, 24]).parts).toEqual(["0.01", "0.01", "0.00"]);
  });
  test("nothing at all is 0.00", () => {
    expect(decimalHours([])).toEqual({ total: "0.00", parts: [] });
  });
  test("for any parts, the column adds up and no part is a hundredth off", () => {
    fc.assert(
      fc.property(fc.array(fc.nat(100_000), { maxLength: 12 }), (seconds) => {
        const { total, parts } = decimalHours(seconds);
        const hundredths = parts.map((part) => Math.round(Number(part) * 100));
        expect(sum(hundredths)).toBe(Math.round(Number(total) * 100));
        hundredths.forEach((part, index) => {
          expect(Math.abs(part - seconds[index]! / 36)).toBeLessThan(1);
        });
      }),
    );
  });
  test.each([[[-1]], [[0.5]]])("refuses %j", (parts) => {
    expect(() => decimalHours(parts)).toThrow("whole seconds");
  });
});

describe("hoursAndMinutes", () => {
  test.each([
    [0, "0 min"],
    [59, "0 min"],
    [60, "1 min"],
    [3599, "59 min"],
    [3600, "1 h 00 min"],
    [25_500, "7 h 05 min"],
    [363_600, "101 h 00 min"],
  ])("%i s is %s", (seconds, text) => expect(hoursAndMinutes(seconds)).toBe(text));
});

describe("clockText", () => {
  test("is local, on 24 hours, with the seconds cut off", () => {
    expect(clockText(Date.parse("2026-06-09T11:05:59.999Z"), "America/New_York")).toBe("07:05");
    expect(clockText(Date.parse("2026-06-10T04:00:00Z"), "America/New_York")).toBe("00:00");
  });
  test("keeps a zone's correction from its day on", () => {
    const winter = (year: number) => Date.parse(`${year}-01-15T20:30:00Z`);
    expect(clockText(winter(2026), "America/Vancouver")).toBe("12:30");
    expect(clockText(winter(2027), "America/Vancouver")).toBe("13:30");
  });
  test("for any instant it shows the hour and minute of the wall clock", () => {
    const zones = ["America/New_York", "Asia/Kathmandu", "Europe/London", "Africa/Casablanca"];
    const instants = fc.integer({ min: 0, max: Date.UTC(2100, 0, 1) });
    fc.assert(
      fc.property(instants, fc.constantFrom(...zones), (atMs, zone) => {
        const shown = wallClock(atMs, zone).toPlainTime().toString({ smallestUnit: "minute" });
        expect(clockText(atMs, zone)).toBe(shown);
      }),
    );
  });
});

describe("dayText", () => {
  test("has weekday, day and month in that order, in the language's words", () => {
    expect(dayText("2026-05-14", "en")).toBe("Thu 14 May");
    expect(dayText("2026-05-14", "es")).toBe("jue 14 may");
  });
});

describe("groupedHours", () => {
  test.each([
    [0, "0.00"],
    [99_999, "999.99"],
    [100_000, "1,000.00"],
    [257_350, "2,573.50"],
    [123_456_789, "1,234,567.89"],
  ])("writes %i hundredths as %s", (hundredths, text) =>
    expect(groupedHours(hundredths)).toBe(text),
  );
});

describe("dateText", () => {
  test.each([
    ["2026-05-04", "4 May 2026"],
    ["2025-12-31", "31 Dec 2025"],
  ])("writes %s as %s", (date, text) => expect(dateText(date)).toBe(text));
});
