import { describe, expect, test } from "vitest";
import { livesOf } from "@/lib/matching/lives";
import { makeBook, makeReport, makeWork } from "@/tests/make/book";
import { matchingFacts } from "@/tests/make/matching";

describe("livesOf", () => {
  test("puts time and counts to their operation, what it does not have apart", () => {
    const work = [makeWork(0, 60), makeWork(60, 5, { operation: "990" }), makeWork(70, null)];
    const lives = livesOf(makeBook({ work, reports: [makeReport(60)] }), matchingFacts);
    expect(lives.operations.map((life) => life.work.length)).toEqual([1, 0]);
    expect(lives.strays.map(({ operation }) => operation)).toEqual(["990"]);
    expect(lives.operations[0]).toMatchObject({
      isOpen: false,
      good: 1,
      earning: { seconds: 2400 },
    });
    expect(lives.operations[1]).toMatchObject({ isOpen: true, finishedMs: null });
  });
  test("a count of a rework operation earns nothing, and its time is the rework's", () => {
    const work = [makeWork(0, 60), makeWork(200, 50, { activity: "rework" })];
    const reports = [
      makeReport(60),
      makeReport(100, { operation: "020", good: 0, rework: 1, causedBy: "010", cell: "neck" }),
      makeReport(250),
    ];
    const lives = livesOf(makeBook({ work, reports }), matchingFacts);
    expect(lives.operations[0]!.earning.reports).toHaveLength(1);
    expect(lives.operations[0]!.work.map(({ rework }) => rework?.event ?? null)).toEqual([
      null,
      "r100",
    ]);
    expect(lives.reworks).toMatchObject([{ actualSeconds: 50, done: 1 }]);
  });
});
