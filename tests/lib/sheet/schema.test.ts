import { describe, expect, test } from "vitest";
import { operationSheet } from "@/lib/sheet/schema";

describe("operationSheet", () => {
  test("refuses a step that took less than nothing", () => {
    const sheet = { steps: [], notTappedSeconds: 0, taps: [], time: [], handOver: null };
    expect(operationSheet.safeParse(sheet).success).toBe(true);
    expect(operationSheet.safeParse({ ...sheet, notTappedSeconds: -1 }).success).toBe(false);
  });
});
