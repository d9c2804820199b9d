import { describe, expect, test } from "vitest";
import { zoneCorrections } from "@/lib/time/corrections";
import { isTimeZone, offsetMs, utcMs, wallClock, zoneDataRelease } from "@/lib/time/zone";
import { timeChecks } from "./checks";

const MINUTE_MS = 60_000;
const HOUR_MS = 60 * MINUTE_MS;
const STEP_MS = 6 * HOUR_MS;

type Transition = [at: string, before: number, after: number];
const years = timeChecks<{ tz: string; year: number }, { transitions_utc: Transition[] }>("tz-");

/** Looks at every sixth hour of a year, then at every minute around a change. */
function transitionsOf(zone: string, year: number): Transition[] {
  const found: Transition[] = [];
  let before = offsetMs(Date.UTC(year, 0, 1) - STEP_MS, zone);
  for (let at = Date.UTC(year, 0, 1); at < Date.UTC(year + 1, 0, 1); at += STEP_MS) {
    const after = offsetMs(at, zone);
    if (before === after) continue;
    let change = at;
    while (offsetMs(change - MINUTE_MS, zone) === after) change -= MINUTE_MS;
    const stamp = new Date(change).toISOString().replace(".000Z", "Z");
    found.push([stamp, before / MINUTE_MS, after / MINUTE_MS]);
    before = after;
  }
  return found;
}

describe("offsetMs", () => {
  test.each(years)(
    "$given.tz changes in $given.year when it should ($source)",
    ({ given, expect: expected }) => {
      expect(transitionsOf(given.tz, given.year)).toEqual(expected.transitions_utc);
    },
  );
  test.each(["America/Vancouver", "America/Edmonton", "Africa/Casablanca"])(
    "%s keeps one offset in the years after it gave up changing its clocks",
    (zone) => {
      expect(transitionsOf(zone, 2027)).toEqual([]);
    },
  );
  test("an older name of a corrected zone is corrected too", () => {
    for (const { zones, fromMs } of zoneCorrections)
      for (const zone of zones) expect(offsetMs(fromMs, zone)).toBe(offsetMs(fromMs, zones[0]));
  });
  test("a corrected zone is known in any case of its letters", () => {
    const winter = Date.parse("2027-01-15T12:00:00Z");
    expect(offsetMs(winter, "america/vancouver")).toBe(-7 * HOUR_MS);
  });
  test("a correction does not reach back before its day", () => {
    const winter = Date.parse("2026-01-15T12:00:00Z");
    expect(offsetMs(winter, "America/Vancouver")).toBe(-8 * HOUR_MS);
  });
});

describe("wallClock", () => {
  test("shows local time to the millisecond", () => {
    const shown = wallClock(Date.parse("2026-03-08T07:00:00.250Z"), "America/New_York");
    expect(shown.toString()).toBe("2026-03-08T03:00:00.25");
  });
  test("refuses a zone that is none", () => {
    expect(() => wallClock(0, "Larkmoor/Works")).toThrow(/zone.*larkmoor/i);
  });
});

describe("utcMs", () => {
  test("reads a wall clock as if it hung in Greenwich", () => {
    const shown = wallClock(Date.parse("2026-06-09T12:00:00Z"), "Asia/Tokyo");
    expect(utcMs(shown)).toBe(Date.parse("2026-06-09T21:00:00Z"));
  });
});

describe("isTimeZone", () => {
  test.each([
    ["Europe/Madrid", true],
    ["UTC", true],
    ["Europe/Larkmoor", false],
    ["", false],
  ])("%j: %s", (text, is) => expect(isTimeZone(text)).toBe(is));
});

describe("zoneDataRelease", () => {
  test("names the release that Node brings", () => {
    expect(zoneDataRelease()).toMatch(/^20\d\d[a-z]$/);
  });
});
