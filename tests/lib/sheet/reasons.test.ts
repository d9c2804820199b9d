import { describe, expect, test } from "vitest";
import { handOverReasons, skipReasons } from "@/lib/sheet/reasons";

describe("skipReasons", () => {
  test("like those for a hand-over, are few enough for one screen, each once", () => {
    for (const reasons of [skipReasons, handOverReasons]) {
      expect(new Set(reasons).size).toBe(reasons.length);
      expect(reasons).toHaveLength(4);
    }
  });
});
