import { describe, expect, test } from "vitest";
import { loupeOf } from "@/lib/analytics/opened";

describe("loupeOf", () => {
  test("is a whole number, and never makes smaller", () => {
    expect([loupeOf(100, 30), loupeOf(100, 100), loupeOf(100, 300), loupeOf(100, 0)]).toEqual([
      3, 1, 1, 1,
    ]);
  });
});
