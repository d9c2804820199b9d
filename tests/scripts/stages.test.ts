import { beforeEach, describe, expect, test, vi } from "vitest";
import { newTally, report, stage } from "@/scripts/ground/stages.mjs";

const found = { passed: 2, failed: 1, failures: ["one: do this"] };

let answers: unknown[] = [];
beforeEach(() => {
  answers = [];
  vi.spyOn(process.stderr, "write").mockReturnValue(true);
  vi.spyOn(process.stdout, "write").mockImplementation((text) => answers.push(text) > 0);
});

describe("stage", () => {
  test("counts what a stage finds, and what it throws as a failure of its own", async () => {
    const tally = newTally();
    expect(await stage(tally, "some", async () => found)).toBe(false);
    expect(await stage(tally, "more", () => Promise.reject(new Error("no")))).toBe(false);
    expect(tally).toMatchObject({ passed: 2, failed: 2, failures: ["one: do this", "more: no"] });
  });
  test("begins nothing for a person who has left", async () => {
    const work = vi.fn();
    expect(await stage(newTally({ isOver: true }), "some", work)).toBe(false);
    expect(work).not.toHaveBeenCalled();
  });
});

describe("report", () => {
  test("ends with the count alone on standard output, and with 1 when something failed", () => {
    expect(report({ ...newTally(), ...found })).toBe(1);
    expect(answers).toEqual(["2 passed, 1 failed\n"]);
  });
  test("gives no count of tests that were stopped", () => {
    expect(report(newTally({ isOver: true }))).toBe(130);
    expect(answers).toEqual([]);
  });
});
