import { expect, test } from "vitest";
import { breaksOf } from "@/lib/limits/shift-facts";

test("breaksOf lists rests, meals and the gaps between spans, in order", () => {
  const rate = null;
  const spans = [
    { kind: "work" as const, rate, start: 0, end: 10 },
    { kind: "rest" as const, rate, start: 10, end: 20 },
    { kind: "work" as const, rate, start: 25, end: 30 },
    { kind: "meal" as const, rate, start: 30, end: 40 },
  ];
  expect(breaksOf({ start: 0, end: 40, spans })).toEqual([
    { kind: "rest", start: 10, end: 20 },
    { kind: "gap", start: 20, end: 25 },
    { kind: "meal", start: 30, end: 40 },
  ]);
});
