import { describe, expect, test } from "vitest";
import { isCorrectable, type Tap, tapWords } from "@/lib/hours/taps";

const item = { ticket: "26048176", operation: "120" };

describe("tapWords", () => {
  test.each([
    ["work", { activity: "run", items: [item] }, "run on 26-04817-6, 120"],
    ["work", { activity: "setup", items: [item, item] }, "setup on 26-04817-6, 120 and 1 more"],
    ["indirect", { code: "waiting-material" }, "waiting material"],
    ["break-start", { break: "meal" }, "meal break"],
    ["report", { ...item, good: 0, rework: 1, scrap: 0, stop: true }, "done: 0 good, 1 rework"],
    ["report", { ...item, good: 2, rework: 0, scrap: 0, stop: false }, "counted: 2 good"],
    ["pause", { items: [] }, "paused nothing"],
    ["shift-end", {}, "shift ended"],
    ["step-done", {}, "step done"],
    ["work", {}, " on nothing"],
    ["insert", { event: { kind: "break-start", break: "rest" } }, "rest break"],
    [
      "insert",
      { event: { kind: "work", activity: "run", items: [item] } },
      "run on 26-04817-6, 120",
    ],
    ["insert", {}, "entered"],
  ])("says of %s %j: %s", (kind, body, words) => {
    expect(tapWords({ kind, body })).toBe(words);
  });
});

describe("isCorrectable", () => {
  const tap: Tap = {
    id: "a",
    kind: "work",
    atMs: 0,
    receivedMs: 0,
    kiosk: null,
    by: null,
    keptFor: null,
    corrected: null,
    body: {},
  };
  test("what says what somebody did, while it counts", () => {
    expect(isCorrectable(tap)).toBe(true);
    expect(isCorrectable({ ...tap, kind: "insert" })).toBe(true);
    expect(isCorrectable({ ...tap, corrected: { kind: "move", toMs: 1 } })).toBe(true);
  });
  test.each([
    { kind: "move" },
    { kind: "confirm" },
    { keptFor: "unproved" },
    { corrected: { kind: "void" as const, toMs: null } },
  ])("not %j", (other) => expect(isCorrectable({ ...tap, ...other })).toBe(false));
});
