import fc from "fast-check";
import { describe, expect, test } from "vitest";
import {
  addDays,
  type DayRule,
  dayBounds,
  daysTouched,
  listDays,
  localDate,
  productionDay,
  rangeBounds,
  ruleAt,
} from "@/lib/time/site-day";

const at = (text: string) => Date.parse(text);
const rule = (fromMs: number, timeZone: string, minutes = 0): DayRule => ({
  fromMs,
  timeZone,
  productionDayStartsAtMinutes: minutes,
});
const newYork = [rule(0, "America/New_York")];
const fromSix = [rule(0, "America/New_York", 360)];

describe("localDate", () => {
  test("is the calendar on the site's wall, not Greenwich's", () => {
    expect(localDate(at("2026-06-10T03:59:59Z"), "America/New_York")).toBe("2026-06-09");
    expect(localDate(at("2026-06-10T04:00:00Z"), "America/New_York")).toBe("2026-06-10");
  });
});

describe("listDays", () => {
  test("leaves the last one out", () => {
    expect(listDays("2026-02-27", "2026-03-02")).toEqual([
      "2026-02-27",
      "2026-02-28",
      "2026-03-01",
    ]);
    expect(listDays("2026-03-02", "2026-03-02")).toEqual([]);
    expect(listDays("2026-03-02", "2026-02-27")).toEqual([]);
    expect(addDays("2026-03-01", -1)).toBe("2026-02-28");
  });
});

describe("ruleAt", () => {
  const rows = [{ fromMs: 10 }, { fromMs: 20 }];
  test.each([
    [5, 10],
    [10, 10],
    [19, 10],
    [20, 20],
  ])("at %i the row from %i holds", (ms, from) => expect(ruleAt(rows, ms).fromMs).toBe(from));
  test("refuses a site without rules", () => {
    expect(() => ruleAt([], 0)).toThrow("at least one row");
  });
});

describe("dayBounds", () => {
  const long = (date: string, rules: DayRule[]) => {
    const { start, end } = dayBounds(date, rules);
    return (end - start) / 3600;
  };
  test.each([
    ["2026-03-07", 24],
    ["2026-03-08", 23],
    ["2026-11-01", 25],
  ])("%s has %i hours", (date, hours) => expect(long(date, newYork)).toBe(hours));
  test("a production day from 06:00 keeps a night shift whole", () => {
    const { start, end } = dayBounds("2026-06-09", fromSix);
    expect(start).toBe(at("2026-06-09T06:00:00-04:00") / 1000);
    expect(end).toBe(at("2026-06-10T06:00:00-04:00") / 1000);
  });
  test("a later hour lengthens the last day under the old one", () => {
    const from = at("2026-06-10T00:00:00-04:00");
    const rules = [...newYork, rule(from, "America/New_York", 360)];
    expect(long("2026-06-09", rules)).toBe(30);
    expect(long("2026-06-10", rules)).toBe(24);
  });
  test("a row that begins with a day governs that day", () => {
    const from = at("2026-06-10T06:00:00-04:00");
    const rules = [...newYork, rule(from, "America/New_York", 360)];
    expect(dayBounds("2026-06-10", rules).start * 1000).toBe(from);
    expect(long("2026-06-09", rules)).toBe(30);
  });
  test("a row that begins in the middle of a day waits for the next day", () => {
    const from = at("2026-06-10T12:00:00-04:00");
    const rules = [...newYork, rule(from, "America/New_York", 360)];
    expect(long("2026-06-09", rules)).toBe(24);
    expect(long("2026-06-10", rules)).toBe(30);
  });
  test("a range is bounded by its first and last day", () => {
    expect(rangeBounds("2026-03-08", "2026-03-10", newYork)).toEqual({
      start: dayBounds("2026-03-08", newYork).start,
      end: dayBounds("2026-03-09", newYork).end,
    });
  });
});

describe("productionDay", () => {
  test.each([
    ["2026-06-09T05:59:59-04:00", "2026-06-08"],
    ["2026-06-09T05:59:59.999-04:00", "2026-06-08"],
    ["2026-06-09T06:00:00-04:00", "2026-06-09"],
    ["2026-06-10T05:59:59-04:00", "2026-06-09"],
  ])("%s belongs to %s when days begin at 06:00", (text, date) => {
    expect(productionDay(at(text), fromSix)).toBe(date);
  });

  const zone = fc.constantFrom("America/New_York", "Australia/Lord_Howe", "Europe/Madrid");
  const start = at("2026-01-01T00:00:00Z");
  const instant = fc.integer({ min: start, max: start + 365 * 86_400_000 });
  const rules = fc
    .array(fc.record({ fromMs: instant, zone, minutes: fc.nat(1439) }), {
      minLength: 1,
      maxLength: 4,
    })
    .map((rows) =>
      rows
        .sort((a, b) => a.fromMs - b.fromMs)
        .map((row) => rule(row.fromMs, row.zone, row.minutes)),
    );

  test("for any rules and instant, it is the one day whose bounds hold the instant", () => {
    fc.assert(
      fc.property(rules, instant, (rows, ms) => {
        const date = productionDay(ms, rows);
        const bounds = dayBounds(date, rows);
        expect(bounds.start * 1000).toBeLessThanOrEqual(ms);
        expect(ms).toBeLessThan(bounds.end * 1000);
      }),
    );
  });
  test("for any rules, days follow each other without gap or overlap", () => {
    fc.assert(
      fc.property(rules, instant, (rows, ms) => {
        const date = productionDay(ms, rows);
        expect(dayBounds(date, rows).end).toBe(dayBounds(addDays(date, 1), rows).start);
        expect(dayBounds(date, rows).end).toBeGreaterThan(dayBounds(date, rows).start);
      }),
    );
  });
});

describe("daysTouched", () => {
  const seconds = (text: string) => at(text) / 1000;
  test("a night shift touches two days, and an end at midnight does not touch the next", () => {
    const night = {
      start: seconds("2026-06-09T22:00:00-04:00"),
      end: seconds("2026-06-10T06:00:00-04:00"),
    };
    const evening = { ...night, end: seconds("2026-06-10T00:00:00-04:00") };
    const dates = (stretch: { start: number; end: number }) =>
      daysTouched(stretch, newYork).map(({ date }) => date);
    expect(dates(night)).toEqual(["2026-06-09", "2026-06-10"]);
    expect(dates(evening)).toEqual(["2026-06-09"]);
    expect(dates({ start: 5, end: 5 })).toEqual([]);
  });
});
