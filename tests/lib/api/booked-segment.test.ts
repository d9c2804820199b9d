import { describe, expect, test } from "vitest";
import { bookedSegmentOf } from "@/lib/api/booked-segment";
import { bookedSegment } from "@/lib/api/segments";

const row = {
  startAt: new Date("2026-03-02T14:00:00Z"),
  endAt: new Date("2026-03-02T14:30:00Z"),
  seconds: 1800,
  activity: "run" as const,
  ticket: "26048176",
  operation: "010",
  code: null,
  cell: "Mill",
  said: false,
  item: 0,
  workerId: "a row's own",
  workerNumber: "1042",
  workerName: "Ilo Varn",
};

describe("bookedSegmentOf", () => {
  test("names nobody to those who may not know, not even by number", () => {
    const segment = bookedSegmentOf(row, false);
    expect(bookedSegment.strict().parse(segment)).toEqual(segment);
    expect(JSON.stringify(segment)).not.toMatch(/worker|1042|Ilo|row's own/);
  });
  test("names the worker to those who may", () => {
    const worker = { worker: "1042", name: "Ilo Varn" };
    expect(bookedSegmentOf(row, true)).toEqual({ ...bookedSegmentOf(row, false), worker });
  });
  test("a segment that runs has no end", () => {
    expect(bookedSegmentOf({ ...row, endAt: null, seconds: null }, false)).toMatchObject({
      start: "2026-03-02T14:00:00.000Z",
      end: null,
      seconds: null,
    });
  });
});
