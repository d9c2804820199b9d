import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { type FinishedOperation, replay, replayFrom } from "@/lib/replay/replay";
import { siteRules } from "@/tests/make/events";

const rules = [{ ...siteRules, timeZone: "UTC", productionDayStartsAtMinutes: 0 }];
const today = "2026-05-28";
const at = (date: string) => Date.parse(`${date}T09:00:00Z`);
const row = {
  seq: 1,
  option: null,
  effectiveFrom: "2026-01-05",
  setupSeconds: 600,
  runSeconds: 3000,
};
const draft = { option: null, setupSeconds: 600, runSeconds: 6000, effectiveFrom: "2026-06-01" };

function finished(date: string, change: Partial<FinishedOperation> = {}): FinishedOperation {
  const good = change.good ?? 2;
  return {
    ticket: date,
    quantity: good,
    good,
    firstWorkMs: at(date),
    finishedMs: at(date),
    actualSeconds: 9000,
    standards: [row],
    options: [],
    setupEarned: "first-good",
    reports: [{ event: date, kind: "report", good, rework: 0, scrap: 0, atMs: at(date) }],
    ...change,
  };
}
const ask = (operations: readonly FinishedOperation[]) =>
  replay(operations, { draft, today, rules });

describe("replay", () => {
  test("re-earns finished work week by week: setup once, run for each good piece", () => {
    const { weeks, total } = ask([finished("2026-05-01"), finished("2026-05-28", { good: 1 })]);
    expect(weeks.map(({ from, to }) => [from, to])).toEqual([
      ["2026-05-01", "2026-05-07"],
      ["2026-05-08", "2026-05-14"],
      ["2026-05-15", "2026-05-21"],
      ["2026-05-22", "2026-05-28"],
    ]);
    expect(weeks.map((week) => [week.pieces, week.wasSeconds, week.wouldSeconds])).toEqual([
      [2, 6600, 12_600],
      [0, null, 0],
      [0, null, 0],
      [1, 3600, 6600],
    ]);
    expect(total).toMatchObject({
      wasSeconds: 10_200,
      wouldSeconds: 19_200,
      actualSeconds: 18_000,
    });
    expect(total.wasEfficiency).toBeCloseTo(10_200 / 18_000, 12);
    expect(total.wouldEfficiency).toBeCloseTo(19_200 / 18_000, 12);
  });

  test("leaves out what was finished on other days, the day before the four weeks too", () => {
    expect(replayFrom(today)).toBe("2026-05-01");
    expect(ask([finished("2026-04-30"), finished("2026-05-29")]).total.pieces).toBe(0);
  });

  test("as it was, goes by the day on which the work began, not by that of its finish", () => {
    const later = { ...row, seq: 2, effectiveFrom: "2026-05-12", runSeconds: 4000 };
    const begun = finished("2026-05-12", {
      standards: [row, later],
      firstWorkMs: at("2026-05-11"),
    });
    expect(ask([begun]).total.wasSeconds).toBe(6600);
  });

  test("work without a standard has no efficiency as it was, and earns at the draft", () => {
    const { total } = ask([finished("2026-05-12", { standards: [] })]);
    expect(total).toMatchObject({ wasSeconds: null, wasEfficiency: null, wouldSeconds: 12_600 });
  });

  test("efficiency as it was leaves out the time that had no standard", () => {
    const { total } = ask([
      finished("2026-05-12", { standards: [] }),
      finished("2026-05-13", { actualSeconds: 6600 }),
    ]);
    expect(total.wasEfficiency).toBe(1);
  });

  test("nothing finished is no efficiency, and no division by nothing", () => {
    const { total, secondsPerPiece } = ask([]);
    expect(total).toMatchObject({ pieces: 0, wasEfficiency: null, wouldEfficiency: null });
    expect(secondsPerPiece).toEqual([]);
  });

  test("an inspection earns for every piece that it saw", () => {
    const event = { event: "e", kind: "inspect" as const, atMs: at("2026-05-12") };
    const reports = [{ ...event, good: 1, rework: 1, scrap: 0 }];
    expect(ask([finished("2026-05-12", { reports })]).total.wasSeconds).toBe(6600);
  });

  test("for any finished work, the weeks add up to the whole and time does not move", () => {
    const any = fc.record({
      day: fc.integer({ min: 1, max: 28 }),
      good: fc.integer({ min: 0, max: 9 }),
    });
    fc.assert(
      fc.property(fc.array(any, { maxLength: 20 }), (made) => {
        const operations = made.map(({ day, good }) =>
          finished(`2026-05-${String(day).padStart(2, "0")}`, { good }),
        );
        const { weeks, total } = ask(operations);
        for (const key of ["pieces", "wouldSeconds", "actualSeconds"] as const) {
          expect(weeks.reduce((all, week) => all + week[key], 0)).toBe(total[key]);
        }
        expect(weeks.reduce((all, week) => all + (week.wasSeconds ?? 0), 0)).toBe(
          total.wasSeconds ?? 0,
        );
        expect(total.actualSeconds).toBe(9000 * made.length);
      }),
    );
  });
});
