import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { type AgreedDay, type DayPart, dayText } from "@/lib/agreement/day-text";

const HOUR = 3_600_000;
const START = Date.UTC(2026, 4, 14);
const day: AgreedDay = {
  date: "2026-05-14",
  startMs: START,
  endMs: START + 24 * HOUR,
  policy: "straight 1",
};

function part(from: number, to: number | null, other: Partial<DayPart> = {}): DayPart {
  return {
    startMs: START + from * HOUR,
    endMs: to === null ? null : START + to * HOUR,
    item: 0,
    activity: "run",
    ticket: "26000017",
    operation: "010",
    code: null,
    seconds: to === null ? null : (to - from) * 3600,
    ...other,
  };
}

describe("dayText", () => {
  const parts = [part(6, 9), part(9, 10, { activity: "meal", ticket: null }), part(10, 14)];

  test("says policy, day and every part by time", () => {
    expect(dayText([part(6, 9)], day)).toBe(
      `{"day":"2026-05-14","lines":[[${START + 6 * HOUR},${START + 9 * HOUR},"run","26000017","010",null,10800]],"policy":"straight 1"}`,
    );
  });

  test("is null where there is no time, or some of it runs", () => {
    expect(dayText([], day)).toBeNull();
    expect(dayText([part(30, 32)], day)).toBeNull();
    expect(dayText([...parts, part(14, null)], day)).toBeNull();
  });

  test("cuts a night shift at the workday, so that each day is agreed to by itself", () => {
    const night = part(22, 30);
    const next = { ...day, date: "2026-05-15", startMs: day.endMs, endMs: day.endMs + 24 * HOUR };
    expect(dayText([night], day)).toContain(`[${START + 22 * HOUR},${day.endMs},`);
    expect(dayText([night], next)).toContain(`[${day.endMs},${START + 30 * HOUR},`);
  });

  test("a part that only touches the day's edge is not part of it", () => {
    expect(dayText([...parts, part(24, 25), part(-2, 0)], day)).toBe(dayText(parts, day));
  });

  test.each([
    ["when", part(6, 9.5)],
    ["what", part(6, 9, { activity: "rework" })],
    ["the ticket", part(6, 9, { ticket: "26000025" })],
    ["the operation", part(6, 9, { operation: "020" })],
    ["the other work", part(6, 9, { code: "cleaning" })],
    ["the share", part(6, 9, { seconds: 1 })],
  ])("is another text when %s changes", (_, changed) => {
    expect(dayText([changed], day)).not.toBe(dayText([part(6, 9)], day));
  });

  test("is another text under another version of the policy", () => {
    expect(dayText(parts, { ...day, policy: "straight 2" })).not.toBe(dayText(parts, day));
  });

  test("for any order of the parts, is the same text", () => {
    const shared = [part(6, 9), part(6, 9, { item: 1, ticket: "26000025" }), ...parts.slice(1)];
    fc.assert(
      fc.property(fc.shuffledSubarray(shared, { minLength: 4 }), (shuffled) => {
        expect(dayText(shuffled, day)).toBe(dayText(shared, day));
      }),
    );
  });
});
