import { describe, expect, test } from "vitest";
import { warnAlways } from "@/lib/limits/any-policy";
import { addDays } from "@/lib/time/site-day";
import { shiftOn } from "@/tests/make/shift-facts";

const found = (shifts: Parameters<typeof warnAlways>[0]) =>
  warnAlways(shifts).map(({ code, date }) => `${code} ${date}`);
const inRow = (first: string, count: number) =>
  Array.from({ length: count }, (_, days) => shiftOn(addDays(first, days), "08:00", "12:00"));

describe("warnAlways", () => {
  test("a shift of twelve hours is none too long, one minute more is", () => {
    expect(found([shiftOn("2026-06-09", "08:00", "20:00")])).toEqual([]);
    expect(found([shiftOn("2026-06-09", "08:00", "20:01")])).toEqual(["shift-length 2026-06-09"]);
  });
  test("the seventh day in a row is asked about, once a run", () => {
    expect(found(inRow("2026-06-06", 6))).toEqual([]);
    expect(found(inRow("2026-06-06", 10))).toEqual(["consecutive-days 2026-06-12"]);
    const twice = [...inRow("2026-06-01", 7), ...inRow("2026-06-09", 7)];
    expect(found(twice)).toEqual(["consecutive-days 2026-06-07", "consecutive-days 2026-06-15"]);
  });
  test("two shifts on one day are one day", () => {
    const days = inRow("2026-06-06", 6);
    expect(found([...days, shiftOn("2026-06-11", "18:00", "20:00")])).toEqual([]);
  });
});
