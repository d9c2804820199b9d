import { describe, expect, test } from "vitest";
import { readOptions, whyNoDatabase } from "@/scripts/ground/connect";

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

describe("whyNoDatabase", () => {
  const fault = (message: string, code?: string) => Object.assign(new Error(message), { code });

  test.each([
    [fault('password authentication failed for user "ana"', "28P01"), /authentication failed.+/],
    [fault("", "ECONNREFUSED"), /ECONNREFUSED.+/], // several addresses were tried: no message
  ])("tells a person that %s, and where to look", (error, why) => {
    expect(whyNoDatabase(error)).toMatch(why);
    expect(whyNoDatabase(error)).toMatch(/look at DATABASE_URL\.$/);
  });
  test.each([fault("syntax error", "42601"), fault("a bug of ours"), "thrown text"])(
    "leaves %s to its stack",
    (error) => expect(whyNoDatabase(error)).toBeNull(),
  );
});
