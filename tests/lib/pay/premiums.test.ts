import { describe, expect, test } from "vitest";
import { premiumStretches, secondsIn } from "@/lib/pay/premiums";
import { type Premium, payPolicy } from "@/lib/pay/schema";
import { zoneClock } from "@/lib/time/zone-clock";
import { zonedText } from "@/lib/time/zoned-text";

const zone = "America/New_York";
const at = (text: string) => Date.parse(text) / 1000;
const premium = (one: object): Premium =>
  payPolicy.parse({ premiums: [{ code: "x", ...one }] }).premiums[0]!;

/** Stretches in a week around the change of clocks on 8 March 2026, a Sunday. */
function stretches(...premiums: object[]): string[] {
  const within = { start: at("2026-03-06T00:00:00-05:00"), end: at("2026-03-10T00:00:00-04:00") };
  return premiumStretches(premiums.map(premium), within, zoneClock(zone)).map(({ start, end }) =>
    [start, end].map((second) => zonedText(second, zone).slice(5, 16)).join(" to "),
  );
}

describe("premiumStretches", () => {
  test("a window over midnight belongs to the day on which it opens", () => {
    expect(stretches({ from: "22:00", to: "06:00", days: ["saturday"] })).toEqual([
      "03-07T22:00 to 03-08T06:00",
    ]);
  });
  test("without days it opens on all, and the bounds cut it", () => {
    expect(stretches({ from: "22:00", to: "06:00" })).toEqual([
      "03-06T00:00 to 03-06T06:00",
      "03-06T22:00 to 03-07T06:00",
      "03-07T22:00 to 03-08T06:00",
      "03-08T22:00 to 03-09T06:00",
      "03-09T22:00 to 03-10T00:00",
    ]);
  });
  test("days without times are whole days, that of 23 hours too", () => {
    expect(stretches({ days: ["sunday"] })).toEqual(["03-08T00:00 to 03-09T00:00"]);
    expect(stretches({ from: "18:00", to: "24:00", days: ["sunday"] })).toEqual([
      "03-08T18:00 to 03-09T00:00",
    ]);
  });
  test("listed dates are whole, and alone mean no weekday", () => {
    expect(stretches({ dates: ["2026-03-07"] })).toEqual(["03-07T00:00 to 03-08T00:00"]);
    expect(stretches({ dates: ["2026-03-07"], from: "22:00", days: [] })).toEqual([
      "03-07T00:00 to 03-08T00:00",
    ]);
  });
  test("what overlaps is one stretch", () => {
    expect(
      stretches({ dates: ["2026-03-07"] }, { from: "22:00", to: "02:00", days: ["saturday"] }),
    ).toEqual(["03-07T00:00 to 03-08T03:00"]);
  });
  test("a time that the clocks skip opens the window with the instant after the gap", () => {
    expect(stretches({ from: "02:30", to: "04:00", days: ["sunday"] })).toEqual([
      "03-08T03:00 to 03-08T04:00",
    ]);
  });
});

describe("secondsIn", () => {
  test("counts what pieces and stretches share", () => {
    const piece = { rate: null, week: "2026-03-08", date: "2026-03-09" };
    const pieces = [
      { ...piece, start: 0, end: 10 },
      { ...piece, start: 20, end: 30 },
    ];
    expect(
      secondsIn(pieces, [
        { start: 5, end: 25 },
        { start: 29, end: 90 },
      ]),
    ).toBe(11);
    expect(secondsIn(pieces, [])).toBe(0);
  });
});
