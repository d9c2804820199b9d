import { describe, expect, test } from "vitest";
import { readOptions } from "@/scripts/ground/connect";

const usage = "npm run key -- --role planner";

describe("readOptions", () => {
  const refusing = (...args: string[]) => {
    const given = process.argv;
    process.argv = [...given.slice(0, 2), ...args];
    try {
      return readOptions({ role: { type: "string" } }, usage);
    } finally {
      process.argv = given;
    }
  };
  test("gives what was said", () => {
    expect(refusing("--role", "lead")).toEqual({ role: "lead" });
  });
  test.each([["--rolle", "lead"], ["lead"], ["--role"]])(
    "refuses %s %s with how to call it",
    (...args) => {
      expect(() => refusing(...args)).toThrow(
        /^(Unknown|Unexpected|Option) .+Say: npm run key -- --role planner$/,
      );
    },
  );
});
