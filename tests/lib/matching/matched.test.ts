import { describe, expect, test } from "vitest";
import { makeOperation, makeReport, makeWork } from "@/tests/make/book";
import { makeParts } from "@/tests/make/matching";

const DAY = "2026-05-14";
const NEXT = 24 * 3600;

describe("matchedParts", () => {
  test("nothing is matched before it is finished", () => {
    expect(makeParts({ work: [makeWork(0, 60)] }).matched).toEqual([]);
  });
  test("all the time ever booked counts on the day of the finish, also what comes later", () => {
    const work = [makeWork(0, 60), makeWork(NEXT + 900, 40)];
    const { matched } = makeParts({ work, reports: [makeReport(NEXT)] });
    expect(matched).toEqual([
      {
        operation: "010",
        rework: "",
        day: "2026-05-15",
        cell: "mill",
        pieces: 1,
        actualSeconds: 100,
        reworkSeconds: 0,
        elsewhereSeconds: 0,
        noStandardSeconds: 0,
        noStandardReworkSeconds: 0,
        earnedSeconds: 2400,
        reportEarnedSeconds: 2400,
      },
    ]);
  });
  test("earning is shared among cells by the time that earns, pieces count in the own cell", () => {
    const work = [
      makeWork(0, 100),
      makeWork(100, 300, { cell: "neck" }),
      makeWork(400, 999, { cell: "neck", activity: "rework" }),
    ];
    const { matched } = makeParts({ work, reports: [makeReport(1500)] });
    expect(matched).toMatchObject([
      {
        cell: "mill",
        pieces: 1,
        actualSeconds: 100,
        earnedSeconds: 600,
        reportEarnedSeconds: 2400,
      },
      {
        cell: "neck",
        pieces: 0,
        actualSeconds: 1299,
        reworkSeconds: 999,
        earnedSeconds: 1800,
        reportEarnedSeconds: 0,
      },
    ]);
  });
  test("without time that earns, earning stays in the cell of the count", () => {
    const { matched } = makeParts({ reports: [makeReport(10, { cell: "spray" })] });
    expect(matched).toMatchObject([
      { cell: "spray", pieces: 0, earnedSeconds: 2400, reportEarnedSeconds: 2400 },
      { cell: "mill", pieces: 1, earnedSeconds: 0 },
    ]);
  });
  test("without a standard its time is told apart", () => {
    const operations = [{ ...makeOperation("010", "mill"), standards: [] }];
    const work = [makeWork(0, 60), makeWork(60, 9, { activity: "rework" })];
    const { matched } = makeParts({ operations, work, reports: [makeReport(80)] });
    expect(matched).toMatchObject([
      { earnedSeconds: 0, noStandardSeconds: 69, noStandardReworkSeconds: 9, reworkSeconds: 9 },
    ]);
  });
  test("a rework operation takes its time on its own day, earns nothing, and is no missing standard", () => {
    const work = [makeWork(0, 60), makeWork(NEXT, 50, { activity: "rework", cell: "mill" })];
    const reports = [
      makeReport(60),
      makeReport(100, { operation: "020", good: 0, rework: 1, causedBy: "010", cell: "neck" }),
      makeReport(NEXT + 50),
    ];
    const { matched } = makeParts({ work, reports });
    expect(matched.map(({ rework, day, actualSeconds }) => [rework, day, actualSeconds])).toEqual([
      ["", DAY, 60],
      ["r100", "2026-05-15", 50],
    ]);
    expect(matched[1]).toMatchObject({ reworkSeconds: 50, earnedSeconds: 0, noStandardSeconds: 0 });
  });
});
