import { describe, expect, test } from "vitest";
import {
  beginActivity,
  beginBreak,
  cutAtLastTap,
  isPastDeadline,
  openShift,
  plannedEnd,
  segmentsOf,
} from "@/lib/timeline/open-shift";
import { foldFacts, makeEvent } from "@/tests/make/events";

const HOUR = 3600;
const start = makeEvent(1, 0, { kind: "shift-start" });
const begun = () =>
  openShift({ ...start, out: [], closes: null }, 8 * HOUR, { ...foldFacts, planned: [] });

function tapped(at: number) {
  const shift = begun();
  shift.lastTap = { at, event: "tap", kiosk: null };
  return shift;
}

describe("isPastDeadline", () => {
  test.each([
    { lastTap: 9, asOf: 22, past: false, because: "the limit is not past yet" },
    { lastTap: 9, asOf: 22.1, past: true, because: "the limit is past" },
    { lastTap: 22, asOf: 22.1, past: true, because: "a tap at the limit is within it" },
    { lastTap: 23, asOf: 33.9, past: false, because: "taps went on past the limit" },
    { lastTap: 23, asOf: 34, past: true, because: "they stopped for as long as people rest" },
    { lastTap: 43, asOf: 44.1, past: true, because: "36 hours are the longest" },
  ])("$because", ({ lastTap, asOf, past }) => {
    expect(isPastDeadline(tapped(lastTap * HOUR), asOf * HOUR)).toBe(past);
  });
});

describe("plannedEnd", () => {
  const end = (lastTap: number, planned: { start: number; end: number }[]) =>
    plannedEnd(tapped(lastTap * HOUR), {
      ...foldFacts,
      planned: planned.map((plan) => ({ start: plan.start * HOUR, end: plan.end * HOUR })),
    }) / HOUR;
  test.each([
    { lastTap: 10, planned: [], is: 10, because: "without a plan it is the last tap" },
    { lastTap: 10, planned: [{ start: 8, end: 16 }], is: 16, because: "the later of the two" },
    { lastTap: 17, planned: [{ start: 8, end: 16 }], is: 17, because: "the last tap if later" },
    {
      lastTap: 10,
      planned: [{ start: 0, end: 8 }],
      is: 10,
      because: "a plan over by then is none",
    },
    {
      lastTap: 10,
      planned: [{ start: 22, end: 30 }],
      is: 10,
      because: "nor is one past the limit",
    },
    { lastTap: 10, planned: [{ start: 8, end: 30 }], is: 22, because: "a plan ends at the limit" },
    {
      lastTap: 10,
      planned: [
        { start: 12, end: 20 },
        { start: 6, end: 14 },
      ],
      is: 14,
      because: "the plan that begins nearest holds",
    },
    {
      lastTap: 9,
      planned: [
        { start: 6, end: 8 },
        { start: 12, end: 18 },
      ],
      is: 18,
      because: "one that is over by then is passed over for a later one",
    },
    {
      lastTap: 9,
      planned: [
        { start: 10, end: 18 },
        { start: 6, end: 14 },
      ],
      is: 14,
      because: "of two as near the earlier one",
    },
  ])("$because", ({ lastTap, planned, is }) => expect(end(lastTap, planned)).toBe(is));
});

describe("segmentsOf", () => {
  test("ends each stretch where the next begins, and leaves empty ones out", () => {
    const shift = begun();
    const other = { doing: { kind: "indirect", code: "meeting" } as const, cell: "mill" };
    beginActivity(shift, { ...other, event: "a" }, { at: 8 * HOUR, said: false, event: "a" });
    beginBreak(shift, { kind: "rest", at: 9 * HOUR, event: "b" });
    expect(segmentsOf(shift, 10 * HOUR).map(({ start, end }) => [start, end])).toEqual([
      [8 * HOUR, 9 * HOUR],
      [9 * HOUR, 10 * HOUR],
    ]);
    expect(segmentsOf(shift, null).at(-1)?.end).toBeNull();
  });
});

describe("cutAtLastTap", () => {
  test("leaves what came before, and nothing said of what came after", () => {
    const shift = begun();
    const other = { doing: { kind: "indirect", code: "meeting" } as const, cell: "mill" };
    shift.lastTap = { at: 9 * HOUR, event: "tap", kiosk: null };
    beginActivity(shift, { ...other, event: "a" }, { at: 10 * HOUR, said: false, event: "a" });
    cutAtLastTap(shift);
    expect(segmentsOf(shift, 12 * HOUR)).toMatchObject([
      { start: 8 * HOUR, end: 9 * HOUR, doing: { kind: "unassigned" } },
      { start: 9 * HOUR, end: 12 * HOUR, doing: { kind: "unassigned" }, event: "tap" },
    ]);
  });
});
