import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { duePeriods } from "@/lib/periods/rhythm";
import { addDays } from "@/lib/time/site-day";

const fortnight = { startsOn: "2026-05-03", days: 14 };

describe("duePeriods", () => {
  test("the first begins where the rhythm does, and today has one", () => {
    expect(duePeriods(fortnight, null, "2026-05-20")).toEqual([
      { from: "2026-05-03", to: "2026-05-17" },
      { from: "2026-05-17", to: "2026-05-31" },
    ]);
  });
  test.each([
    ["2026-05-16", 0, "the last one still runs"],
    ["2026-05-17", 1, "it ended yesterday"],
  ])("on %s %i are due: %s", (today, count) => {
    expect(duePeriods(fortnight, "2026-05-17", today)).toHaveLength(count);
  });
  test("none before the first day of the rhythm", () => {
    expect(duePeriods(fortnight, null, "2026-05-02")).toEqual([]);
  });
  test("a new rhythm begins on its day: what lies before is a shorter period", () => {
    const weekly = { startsOn: "2026-06-03", days: 7 };
    expect(duePeriods(weekly, "2026-05-31", "2026-06-04")).toEqual([
      { from: "2026-05-31", to: "2026-06-03" },
      { from: "2026-06-03", to: "2026-06-10" },
    ]);
  });
  test("one whose first day has passed fits itself in", () => {
    const weekly = { startsOn: "2026-05-06", days: 7 };
    expect(duePeriods(weekly, "2026-05-17", "2026-05-21")).toEqual([
      { from: "2026-05-17", to: "2026-05-20" },
      { from: "2026-05-20", to: "2026-05-27" },
    ]);
  });
  test("for any rhythm, periods follow each other without gap or overlap, none is longer", () => {
    const offset = fc.integer({ min: -40, max: 200 });
    const days = fc.integer({ min: 1, max: 62 });
    fc.assert(
      fc.property(offset, days, offset, (start, length, now) => {
        const rhythm = { startsOn: addDays("2026-05-01", start), days: length };
        const due = duePeriods(rhythm, "2026-05-10", addDays("2026-05-10", now));
        let at = "2026-05-10";
        for (const { from, to } of due) {
          expect(from).toBe(at);
          expect(to > from && to <= addDays(from, length)).toBe(true);
          at = to;
        }
      }),
    );
  });
});
