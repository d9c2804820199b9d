import { describe, expect, test } from "vitest";
import { groupBy } from "@/lib/group";

describe("groupBy", () => {
  test("keeps the order of keys and of the items under each", () => {
    const groups = groupBy([5, 2, 4, 7], (n) => (n % 2 === 0 ? "even" : "odd"));
    expect([...groups]).toEqual([
      ["odd", [5, 7]],
      ["even", [2, 4]],
    ]);
    expect([...groupBy([], () => 1)]).toEqual([]);
  });
});
