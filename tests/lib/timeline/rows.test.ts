import { describe, expect, test } from "vitest";
import { derivedRows } from "@/lib/timeline/rows";
import type { Folded, Segment } from "@/lib/timeline/schema";

const items = [
  { ticket: "26000017", operation: "010", weight: 2 },
  { ticket: "26000025", operation: "020", weight: 1 },
];
const work: Segment = {
  start: 100,
  end: 110,
  doing: { kind: "work", activity: "run", items },
  cell: "mill",
  said: true,
  event: "e1",
};
const folded: Folded = {
  segments: [
    { ...work, start: 90, end: 100, doing: { kind: "indirect", code: "cleaning" }, said: false },
    work,
    { ...work, start: 110, end: null },
    { ...work, start: 120, end: 130, doing: { kind: "meal" } },
  ],
  shifts: [
    { start: 90, end: null, startEvent: "e0", endEvent: null, provisional: false, cell: null },
  ],
  looseEnds: [{ code: "already-in", subject: "e1", at: 100, settled: true }],
  reports: [],
  standing: null,
};

describe("derivedRows", () => {
  const rows = derivedRows(folded, () => true);

  test("keeps one row an item, whose shares sum to the interval", () => {
    const ofWork = rows.segments.filter(({ startMs }) => startMs === 100_000);
    expect(ofWork).toMatchObject([
      { item: 0, ticket: "26000017", operation: "010", weight: 2, seconds: 7, activity: "run" },
      { item: 1, ticket: "26000025", operation: "020", weight: 1, seconds: 3, said: true },
    ]);
  });

  test("leaves the shares of what runs open", () => {
    const running = rows.segments.filter(({ startMs }) => startMs === 110_000);
    expect(running.map(({ endMs, seconds }) => [endMs, seconds])).toEqual([
      [null, null],
      [null, null],
    ]);
  });

  test("keeps other time in one row, with its code where it has one", () => {
    const other = rows.segments.filter(({ ticket }) => ticket === null);
    expect(other).toMatchObject([
      { activity: "indirect", code: "cleaning", item: 0, seconds: 10, weight: null },
      { activity: "meal", code: null, item: 0, seconds: 10 },
    ]);
  });

  test("turns seconds into instants, also of shifts and loose ends", () => {
    expect(rows.shifts).toMatchObject([{ startMs: 90_000, endMs: null, startEventId: "e0" }]);
    expect(rows.looseEnds).toEqual([
      { code: "already-in", subject: "e1", atMs: 100_000, settled: true },
    ]);
  });

  test("leaves out what lies elsewhere", () => {
    const few = derivedRows(folded, (atMs) => atMs >= 110_000);
    expect(few.segments.map(({ startMs }) => startMs)).toEqual([110_000, 110_000, 120_000]);
    expect(few.shifts).toEqual([]);
    expect(few.looseEnds).toEqual([]);
  });
});
