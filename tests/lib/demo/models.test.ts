import { describe, expect, test } from "vitest";
import { models, NEW_MODEL } from "@/lib/demo/models";
import { sum } from "@/lib/sum";

describe("models", () => {
  test("are seven, and their shares of the tickets are a whole", () => {
    expect(models.map(({ name }) => name)).toEqual([
      "Heron",
      "Wren",
      "Avocet",
      "Dipper",
      "Kestrel",
      "Curlew",
      "Plover",
    ]);
    expect(sum(models.map(({ share }) => share * 100))).toBeCloseTo(100);
  });

  test("one of them is new, and all have two finishes", () => {
    expect(models.filter(({ name }) => name === NEW_MODEL)).toHaveLength(1);
    for (const { options } of models) expect(new Set(options).size).toBe(2);
  });
});
