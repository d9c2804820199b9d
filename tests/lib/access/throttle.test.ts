import { describe, expect, test } from "vitest";
import { SHUT_SECONDS, TRIES_MAX, waitsSeconds } from "@/lib/access/throttle";
import security from "@/tests/checks/security.json";

const rule = security.find(({ id }) => id === "throttle-100")!.expect as unknown as {
  max_consecutive_failures: number;
  growing_delay_example_s: [number, number];
};

describe("waitsSeconds", () => {
  test("never more than 100 tries in a row (NIST SP 800-63B 5.2.2)", () => {
    expect(TRIES_MAX).toBe(rule.max_consecutive_failures);
    expect(waitsSeconds).toHaveLength(TRIES_MAX);
    expect(waitsSeconds.at(-1)).toBe(SHUT_SECONDS);
  });

  test("four slips cost nothing, then the wait grows from seconds to an hour", () => {
    expect(waitsSeconds.slice(0, 8)).toEqual([0, 0, 0, 0, 5, 10, 20, 40]);
    expect(waitsSeconds.at(-2)).toBe(rule.growing_delay_example_s[1]);
  });

  test("a wait is never shorter than the one before", () => {
    expect(waitsSeconds).toEqual([...waitsSeconds].sort((a, b) => a - b));
  });
});
