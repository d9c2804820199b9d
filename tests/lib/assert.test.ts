import { describe, expect, test } from "vitest";
import { assert } from "@/lib/assert";

describe("assert", () => {
  test("stops a caller's mistake with the words of the rule it broke", () => {
    expect(() => assert(false, "split: whole numbers")).toThrow("split: whole numbers");
  });
  test("lets everything else pass", () => {
    expect(assert(true, "never said")).toBeUndefined();
  });
});
