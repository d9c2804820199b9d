import { describe, expect, test } from "vitest";
import { type ShownFacts, shownDays } from "@/lib/periods/shown-days";
import { EARLIER, makeDay, PERIOD } from "@/tests/make/frozen";

const trail = [{ rule: "regular", seconds: 36_000, text: "10:00:00 within every limit: regular." }];
const day = { ...makeDay("2026-06-01", 36_000), trail };
const facts: ShownFacts = {
  periodId: PERIOD.id,
  stated: [day],
  rows: [],
  workdays: [{ date: "2026-06-01", startMs: 0, endMs: 86_400_000 }],
  warnings: [{ code: "shift-length", date: "2026-06-01", text: "Long." }],
  parts: [
    {
      startMs: 3_600_000,
      endMs: 7_200_000,
      item: 0,
      activity: "rework",
      ticket: null,
      operation: null,
      code: null,
      seconds: 3600,
    },
  ],
  nowMs: 0,
};

describe("shownDays", () => {
  test("puts a day beside its strip, its warnings and its reasons", () => {
    expect(shownDays(facts)).toMatchObject([
      {
        date: "2026-06-01",
        hours: { paid: "10.00" },
        trail,
        warnings: ["Long."],
        stretches: [{ start: 3600, end: 7200, kind: "rework" }],
        reference: null,
      },
    ]);
  });
  test("of a closed period the frozen rows count, adjustments of others apart", () => {
    const own = { ...day, aboutId: PERIOD.id, aboutFrom: PERIOD.from };
    const change = { ...makeDay("2026-05-20", -3600), trail: [], aboutId: EARLIER };
    const rows = [own, { ...change, aboutFrom: "2026-05-17" }];
    const shown = shownDays({ ...facts, stated: null, rows });
    expect(shown.map(({ key, reference, hours }) => [key, reference, hours.paid])).toEqual([
      ["2026-05-31/2026-06-01", null, "10.00"],
      ["2026-05-17/2026-05-31/2026-05-20", "2026-05-17/2026-05-20", "-1.00"],
    ]);
    expect(shown[1]!.stretches).toEqual([]);
  });
});
