import { describe, expect, test } from "vitest";
import { handOverReasons, skipReasons } from "@/lib/sheet/reasons";

describe("skipReasons", () => {
  test("are few enough for one screen, each once, and short enough for a note", () => {
    for (const reasons of [skipReasons, handOverReasons]) {
      expect(new Set(reasons).size).toBe(reasons.length);
      expect(reasons.length).toBeLessThanOrEqual(4);
    }
  });
});
