import { describe, expect, test } from "vitest";
import { handOverReasons, operationSheet, skipReasons } from "@/lib/sheet/schema";

describe("operationSheet", () => {
  test("refuses a step that took less than nothing", () => {
    const sheet = { steps: [], notTappedSeconds: 0, taps: [], time: [], handOver: null };
    expect(operationSheet.safeParse(sheet).success).toBe(true);
    expect(operationSheet.safeParse({ ...sheet, notTappedSeconds: -1 }).success).toBe(false);
  });
});

describe("skipReasons", () => {
  test("like those for a hand-over, are few enough for one screen, each once", () => {
    for (const reasons of [skipReasons, handOverReasons]) {
      expect(new Set(reasons).size).toBe(reasons.length);
      expect(reasons).toHaveLength(4);
    }
  });
});
