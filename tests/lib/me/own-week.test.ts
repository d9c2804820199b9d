import { describe, expect, test } from "vitest";
import { cardDays, paySpans, weeksOf } from "@/lib/agreement/card";
import { type OwnFacts, ownWeek } from "@/lib/me/own-week";
import type { OwnPart } from "@/lib/me/view";
import { zoneClock } from "@/lib/time/zone-clock";

const at = (text: string) => Date.parse(`2026-05-${text}:00Z`);
const nowMs = at("12T10:00");
const around = { from: "2026-04-20", to: "2026-05-25" };
const clock = zoneClock("UTC");

function part(startMs: number, endMs: number, activity: OwnPart["activity"] = "run"): OwnPart {
  const seconds = (endMs - startMs) / 1000;
  const none = { ticket: null, operation: null, operationName: null, code: null };
  return { startMs, endMs, item: 0, activity, seconds, ...none };
}

const parts = [
  part(at("04T06:00"), at("04T14:00")),
  part(at("11T06:00"), at("11T10:00")),
  part(at("11T10:00"), at("11T10:10"), "meal"),
  part(at("11T10:10"), at("11T14:30")),
];
const weeks = weeksOf({ versions: [], choices: [] }, "w", around, clock);
const plan = (date: string) => ({
  date: `2026-05-${date}`,
  start: at(`${date}T06:00`) / 1000,
  end: at(`${date}T14:30`) / 1000,
});
const facts: OwnFacts = {
  me: { number: "1042", name: "Ilo Varn", cell: "Mill" },
  asked: "2026-05-12",
  today: "2026-05-12",
  parts,
  planned: [plan("11"), plan("12"), plan("13")],
  weeks,
  card: cardDays({ parts, confirms: [] }, { weeks, range: around, digestOf: () => "", nowMs }),
  spans: paySpans(parts, nowMs),
  period: { from: "2026-05-04", to: "2026-05-18", isClosed: false },
  ends: [{ subject: "a", atMs: at("11T10:10") }],
  changes: [],
  clock,
  nowMs,
};

describe("ownWeek", () => {
  const own = ownWeek(facts);

  test("shows the workweek of the date, planned so far beside tapped and paid", () => {
    expect(own.week).toMatchObject({
      from: "2026-05-11",
      to: "2026-05-18",
      label: "Mon 11 May to Sun 17 May",
      isNow: true,
      before: "2026-05-04",
      after: null,
      plannedSeconds: (8.5 + 4) * 3600,
      tappedSeconds: 8.5 * 3600,
    });
    expect(own.days.map(({ date }) => date)).toHaveLength(7);
  });

  test("a meal too short to be one is paid, and the day says why", () => {
    expect(own.week.paidSeconds).toBe(8.5 * 3600);
    expect(own.days[0]).toMatchObject({ paidSeconds: 8.5 * 3600 });
    expect(own.days[0]?.trail.length).toBeGreaterThan(0);
  });

  test("sums the period that the week lies in", () => {
    expect(own.period).toMatchObject({
      label: "Mon 4 May to Sun 17 May",
      tappedSeconds: 16.5 * 3600,
      isClosed: false,
    });
  });

  test("a week before leads back to now", () => {
    const before = ownWeek({ ...facts, asked: "2026-05-04", period: null });
    expect(before.week).toMatchObject({ isNow: false, after: "2026-05-11" });
    expect(before.period).toBeNull();
  });

  test("asks when a shift ended, beginning at its planned end", () => {
    expect(own.ends).toEqual([
      { subject: "a", day: "Mon 11 May", lastTap: "10:10", proposed: "2026-05-11T14:30" },
    ]);
    const now = ownWeek({ ...facts, planned: [] }).ends[0];
    expect(now?.proposed).toBe("2026-05-11T10:10");
  });
});
