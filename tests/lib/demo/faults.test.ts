import { describe, expect, test } from "vitest";
import { faultAt } from "@/lib/demo/faults";
import { operations } from "@/lib/demo/operations";
import { randomFrom } from "@/lib/demo/random";

const at = (code: string) => operations.find((operation) => operation.code === code)!;
const draws = (code: string, behind: string[]) => {
  const random = randomFrom("faults");
  return Array.from({ length: 50 }, () => faultAt(at(code), behind, random));
};

describe("faultAt", () => {
  test("an inspection finds what an earlier operation caused", () => {
    const causes = draws("420", ["360", "390", "410", "420"]).map(({ causedBy }) => causedBy);
    expect(new Set(causes)).toEqual(new Set(["390", "410"]));
  });

  test("only operations that the piece has been through can have caused it", () => {
    const causes = draws("200", ["190", "200"]).map(({ causedBy }) => causedBy);
    expect(new Set(causes)).toEqual(new Set(["190"]));
  });

  test("everywhere else it is the operation's own work, with a defect of its stage", () => {
    expect(draws("390", ["380", "390"])[0]).toEqual({ causedBy: "390", defect: "run" });
    for (const { stage, code } of operations) {
      expect(faultAt({ code, stage }, [], randomFrom("own")).defect).not.toBe("other");
    }
  });
});
