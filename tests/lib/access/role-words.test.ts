import { expect, test } from "vitest";
import { roleWords } from "@/lib/access/role-words";

test("roleWords says each role once", () => {
  expect(roleWords([])).toBe("");
  expect(roleWords([{ role: "lead", cells: ["a", "b"] }])).toBe("lead");
  const two = [
    { role: "admin" as const, cells: [] },
    { role: "lead" as const, cells: ["a"] },
  ];
  expect(roleWords(two)).toBe("admin and lead");
});
