import { describe, expect, test } from "vitest";
import { reconcile } from "@/lib/analytics/reconcile";

describe("reconcile", () => {
  test("what is booked and not finished is work in process; earning elsewhere is moved", () => {
    const booked = { earnedSeconds: 100, actualSeconds: 130 };
    const matched = { earnedSeconds: 70, actualSeconds: 90, reportEarnedSeconds: 80 };
    const line = reconcile({ booked, matched });
    expect(line).toEqual({
      inProcessActualSeconds: 40,
      inProcessEarnedSeconds: 20,
      movedSeconds: 10,
    });
    expect(matched.earnedSeconds + line.inProcessEarnedSeconds + line.movedSeconds).toBe(100);
    expect(matched.actualSeconds + line.inProcessActualSeconds).toBe(130);
  });
  test("more finished than was booked is work in process that shrank", () => {
    const booked = { earnedSeconds: 0, actualSeconds: 10 };
    const matched = { earnedSeconds: 50, actualSeconds: 60, reportEarnedSeconds: 50 };
    expect(reconcile({ booked, matched })).toEqual({
      inProcessActualSeconds: -50,
      inProcessEarnedSeconds: -50,
      movedSeconds: 0,
    });
  });
});
