import { expect, test } from "vitest";
import { groupBy } from "@/lib/group-by";

test("groupBy keeps the order of keys and items as they came", () => {
  const groups = groupBy(["pear", "apple", "plum", "ash"], (word) => word[0]);
  expect([...groups]).toEqual([
    ["p", ["pear", "plum"]],
    ["a", ["apple", "ash"]],
  ]);
});
