import { describe, expect, test } from "vitest";
import { instantMs, isInstant } from "@/lib/time/instant";
import { timeCheck } from "./checks";

const valid = timeCheck<{ strings: string[] }, { valid: boolean[] }>("rfc3339-valid");
const equal = timeCheck<{ a: string; b: string }, { equal: boolean }>("rfc3339-equal");
const sorted = timeCheck<{ strings: string[] }, { time_order: string[] }>("sort-trap");
const unix = timeCheck<{ utc: string[] }, { seconds: number[] }>("unix");
const leap = timeCheck<{ from: string; to: string }, { posix_seconds: number }>("leap-second");

describe("instantMs", () => {
  test.each(valid.given.strings.map((text, i) => ({ text, is: valid.expect.valid[i] })))(
    `$text is an instant (${valid.source})`,
    ({ text, is }) => expect(isInstant(text)).toBe(is),
  );
  test(`the same instant with another offset is equal (${equal.source})`, () => {
    expect(instantMs(equal.given.a) === instantMs(equal.given.b)).toBe(equal.expect.equal);
  });
  test(`instants sort by time, not by spelling (${sorted.source})`, () => {
    const byTime = [...sorted.given.strings].sort((a, b) => instantMs(a)! - instantMs(b)!);
    expect(byTime).toEqual(sorted.expect.time_order);
  });
  test.each(unix.given.utc.map((text, i) => ({ text, seconds: unix.expect.seconds[i] })))(
    `$text is $seconds s (${unix.source})`,
    ({ text, seconds }) => expect(instantMs(text)! / 1000).toBe(seconds),
  );
  test(`a span over a leap second has POSIX length (${leap.source})`, () => {
    const span = instantMs(leap.given.to)! - instantMs(leap.given.from)!;
    expect(span / 1000).toBe(leap.expect.posix_seconds);
  });
  test.each([
    ["1990-12-31T23:59:60Z", "1991-01-01T00:00:00Z", "a leap second is the next minute's first"],
    ["1990-12-31T15:59:60-08:00", "1991-01-01T00:00:00Z", "also told with an offset"],
    ["2026-06-09T07:00:00.1239Z", "2026-06-09T07:00:00.123Z", "fractions are cut at the ms"],
    ["2026-06-09T07:00:00.5Z", "2026-06-09T07:00:00.500Z", "one digit is tenths"],
    ["0050-01-01T00:00:00Z", "0050-01-01T00:00:00.000Z", "years below 100 are themselves"],
  ])("%s is %s: %s", (text, same) => expect(instantMs(text)).toBe(Date.parse(same)));
  test.each([
    ["2026-06-09T07:00:00", "no offset"],
    ["2026-06-09 07:00:00Z", "a space for the T"],
    ["2026-06-09", "a date alone"],
    ["2026-13-01T00:00:00Z", "month 13"],
    ["2026-00-01T00:00:00Z", "month 0"],
    ["2026-02-29T00:00:00Z", "29 February of a common year"],
    ["2026-04-31T00:00:00Z", "31 April"],
    ["2026-04-00T00:00:00Z", "day 0"],
    ["2026-06-09T24:00:00Z", "hour 24"],
    ["2026-06-09T07:60:00Z", "minute 60"],
    ["2026-06-09T07:00:61Z", "second 61"],
    ["2026-06-09T07:00:60Z", "a leap second where none can be"],
    ["1990-12-31T23:59:60-08:00", "a leap second that is none in UTC"],
    ["2026-06-09T07:00:00+24:00", "offset of 24 hours"],
    ["2026-06-09T07:00:00+05:60", "offset of 60 minutes"],
    ["2026-06-09T07:00:00+0500", "offset without a colon"],
    ["2026-06-09T07:00:00.Z", "a point without a fraction"],
    ["2026-06-09T07:00Z", "no seconds"],
    [" 2026-06-09T07:00:00Z", "a space before it"],
    ["", "nothing"],
  ])("%j is no instant: %s", (text) => expect(instantMs(text)).toBeNull());
});
