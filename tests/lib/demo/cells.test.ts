import { describe, expect, test } from "vitest";
import { cells } from "@/lib/demo/cells";
import { operations } from "@/lib/demo/operations";

describe("cells", () => {
  test("there are eleven, each with a name of its own and other work that is usual there", () => {
    expect(new Set(cells.map(({ name }) => name)).size).toBe(11);
    for (const { otherWork } of cells) expect(otherWork.length).toBeGreaterThan(1);
  });

  test("each has work to do", () => {
    const busy = new Set(operations.map(({ cell }) => cell));
    expect(cells.filter(({ name }) => !busy.has(name))).toEqual([]);
  });
});
