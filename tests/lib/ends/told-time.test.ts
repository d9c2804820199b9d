import { describe, expect, test } from "vitest";
import { toldTime } from "@/lib/ends/told-time";

const zone = "America/Chicago";

describe("toldTime", () => {
  test("reads a time on the site's wall", () => {
    expect(toldTime("2026-05-06T14:30", zone)).toEqual({
      ok: true,
      value: Date.parse("2026-05-06T19:30:00Z"),
    });
  });
  test("none was told", () => expect(toldTime("", zone)).toEqual({ ok: true, value: null }));
  test.each([
    ["2026-03-08T02:30", /put forward/],
    ["2026-11-01T01:30", /twice/],
  ])("asks again for %s", (local, why) => {
    const told = toldTime(local, zone);
    expect(told.ok ? "" : told.problem.errors?.[0]).toMatchObject({
      path: "time",
      message: expect.stringMatching(why),
    });
  });
});
