import { describe, expect, test } from "vitest";
import { hoursPage, type StretchRow } from "@/lib/hours/page";
import type { HoursRow } from "@/lib/hours/sheet";

const row = (worker: string, date: string, seconds: number): HoursRow => ({
  worker,
  name: `Worker ${worker}`,
  cell: "Mill",
  date,
  activity: "run",
  seconds,
  runs: false,
});
const stretch = (
  start: number,
  end: number | null,
  more: Partial<StretchRow> = {},
): StretchRow => ({
  start,
  end,
  item: 0,
  activity: "run",
  ticket: "26048176",
  operation: "120",
  code: null,
  seconds: end === null ? null : end - start,
  cell: "Mill",
  said: false,
  event: "a",
  ...more,
});
const tap = {
  id: "a",
  kind: "work",
  atMs: 100_000,
  receivedMs: 101_000,
  kiosk: "Mill 1",
  by: null,
  keptFor: null,
  corrected: null,
  body: {},
};
const days = [
  { date: "2026-05-14", start: 0, end: 1000 },
  { date: "2026-05-15", start: 1000, end: 2000 },
];
const facts = {
  rows: [row("1", "2026-05-14", 900), row("1", "2026-05-15", 500), row("2", "2026-05-14", 10)],
  planned: [
    { worker: "1", date: "2026-05-14", start: 0, end: 800 },
    { worker: "1", date: "2026-05-16", start: 2000, end: 2400 },
  ],
  ends: [{ worker: "2", count: 3 }],
  stretches: [stretch(100, 1500), stretch(100, 1500, { item: 1, seconds: 700 })],
  taps: [tap],
};

describe("hoursPage", () => {
  test("tells planned time and loose ends of each worker, and none as none", () => {
    const { workers, total } = hoursPage(facts, { filter: { worker: "", day: "" }, days });
    expect(workers.map((each) => [each.worker, each.plannedSeconds, each.looseEnds])).toEqual([
      ["1", 1200, 0],
      ["2", null, 3],
    ]);
    expect(workers.map((each) => each.days)).toEqual([null, null]);
    expect(total).toMatchObject({ people: 2, plannedSeconds: 1200, spanSeconds: 1410 });
  });

  test("opens a worker by day, each interval cut to its day and drawn once", () => {
    const { workers } = hoursPage(facts, { filter: { worker: "1", day: "" }, days });
    const strips = workers[0]?.days?.map((day) =>
      day.stretches.map(({ start, end }) => [start, end]),
    );
    expect(strips).toEqual([[[100, 1000]], [[1000, 1500]]]);
    expect(workers[0]?.days?.map(({ planned }) => planned)).toEqual([{ from: 0, to: 800 }, null]);
    expect(workers[0]?.days?.flatMap(({ taps }) => taps)).toEqual([]);
  });

  test("opens a day to its taps with the time that each began; a cut share is not told", () => {
    const { workers } = hoursPage(facts, { filter: { worker: "1", day: "2026-05-14" }, days });
    const [day] = workers[0]?.days ?? [];
    expect(day?.taps[0]?.tap.id).toBe("a");
    expect(day?.taps[0]?.began.map(({ item, end, seconds }) => [item, end, seconds])).toEqual([
      [0, 1000, null],
      [1, 1000, null],
    ]);
  });
});
