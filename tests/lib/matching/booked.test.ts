import { describe, expect, test } from "vitest";
import { bookedParts, mergeParts } from "@/lib/matching/booked";
import { livesOf } from "@/lib/matching/lives";
import { UNKNOWN } from "@/lib/matching/parts";
import type { TicketBook } from "@/lib/tickets/book";
import { makeBook, makeOperation, makeReport, makeWork } from "@/tests/make/book";
import { matchingFacts } from "@/tests/make/matching";

const DAY = "2026-05-14";
const parts = (records: Partial<TicketBook>) =>
  bookedParts(livesOf(makeBook(records), matchingFacts), matchingFacts);
const short = (records: Partial<TicketBook>) =>
  parts(records).map(({ operation, day, cell, activity, seconds }) => {
    return [operation, day, cell, activity, seconds];
  });

describe("bookedParts", () => {
  test("time is where and when it was worked, earning where and when it was counted", () => {
    const work = [makeWork(0, 60, { activity: "setup" }), makeWork(60, 600, { cell: "neck" })];
    expect(short({ work, reports: [makeReport(700)] })).toEqual([
      ["010", DAY, "mill", "setup", 60],
      ["010", DAY, "neck", "run", 600],
      ["010", DAY, "mill", "earned", 2400],
    ]);
  });
  test("what runs is left out until it ends", () => {
    expect(short({ work: [makeWork(0, null)] })).toEqual([]);
  });
  test("over midnight an interval of several items is cut by the shares of all", () => {
    const late = 16 * 3600 - 10;
    const one = makeWork(late, 20, { seconds: 20, endMs: makeWork(late, 30).endMs });
    const facts = { ...matchingFacts, sharesOf: () => [20, 10] };
    const cut = bookedParts(livesOf(makeBook({ work: [one] }), facts), facts);
    expect(cut.map(({ day, seconds }) => [day, seconds])).toEqual([
      [DAY, 7],
      ["2026-05-15", 13],
    ]);
  });
  test("without a standard nothing is earned, and the time says so", () => {
    const operations = [{ ...makeOperation("010", "mill"), standards: [] }];
    const found = parts({ operations, work: [makeWork(0, 60)], reports: [makeReport(60)] });
    expect(found).toMatchObject([
      { activity: "run", seconds: 60, noStandardSeconds: 60 },
      { activity: "earned", seconds: 0, pieces: 1 },
    ]);
  });
  test("time on an operation that the ticket does not have is booked, without a standard", () => {
    const work = [makeWork(0, 60, { operation: "990", cell: null })];
    expect(parts({ work })).toMatchObject([
      { operation: "990", cell: UNKNOWN, seconds: 60, noStandardSeconds: 60 },
    ]);
  });
  test("the time of a rework operation earns nothing by rule: that is no want of a standard", () => {
    const operations = [
      { ...makeOperation("010", "mill"), standards: [] },
      makeOperation("020", "neck"),
    ];
    const work = [makeWork(0, 60), makeWork(200, 50, { activity: "rework" })];
    const failed = { operation: "020", good: 0, rework: 1, causedBy: "010", cell: "neck" };
    const reports = [makeReport(60), makeReport(100, failed)];
    const time = parts({ operations, work, reports }).filter(({ seconds }) => seconds > 0);
    expect(time.map((one) => [one.activity, one.noStandardSeconds])).toEqual([
      ["run", 60],
      ["rework", 0],
    ]);
  });
  test("rework says whether another cell caused it", () => {
    const work = [
      makeWork(0, 60),
      makeWork(100, 30, { operation: "020", cell: "neck", activity: "rework" }),
    ];
    const failed = makeReport(90, { operation: "020", cell: "neck", good: 0, rework: 1 });
    const rework = (causedBy: string | null) =>
      parts({ work, reports: [{ ...failed, causedBy }] }).find(
        ({ activity }) => activity === "rework",
      );
    expect(rework("010")).toMatchObject({ seconds: 30, elsewhereSeconds: 30 });
    expect(rework("020")).toMatchObject({ seconds: 30, elsewhereSeconds: 0 });
    expect(rework(null)).toMatchObject({ seconds: 30, elsewhereSeconds: 0 });
  });
});

describe("mergeParts", () => {
  test("adds up one operation, day, cell and activity, and keeps when it first began", () => {
    const [one, other] = parts({ work: [makeWork(60, 5), makeWork(0, 7, { cell: "neck" })] });
    const merged = mergeParts([one!, { ...other!, cell: "neck" }]);
    expect(merged).toMatchObject([{ cell: "neck", seconds: 12, firstMs: one!.firstMs }]);
  });
  test("leaves out what is nothing", () => {
    const [one] = parts({ work: [makeWork(60, 5)] });
    expect(mergeParts([{ ...one!, seconds: 0 }])).toEqual([]);
  });
});
