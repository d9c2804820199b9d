import { describe, expect, test } from "vitest";
import { tapWords } from "@/lib/hours/tap-words";
import { eventBodies } from "@/lib/ledger/schema";

describe("tapWords", () => {
  test.each([
    ["work", { activity: "setup", items: [] }, "Work, setup"],
    ["indirect", { code: "machine-down" }, "Other work, machine down"],
    ["break-start", { break: "meal" }, "Meal started"],
    ["break-end", { break: "rest" }, "Rest ended"],
    ["report", { good: 2, rework: 0, scrap: 1, stop: true }, "Counted 2 good, 1 scrap, done"],
    ["inspect", { good: 0, rework: 0, scrap: 0 }, "Counted nothing"],
    ["shift-start", {}, "Shift started"],
    ["from-the-future", {}, "from-the-future"],
  ])("%s %j", (kind, body, words) => expect(tapWords({ kind, body })).toBe(words));

  test("every kind that the ledger knows has words of its own", () => {
    const kinds = Object.keys(eventBodies);
    const said = kinds.map((kind) => tapWords({ kind, body: {} }));
    expect(kinds.filter((kind, at) => said[at] === kind)).toEqual([]);
  });
});
