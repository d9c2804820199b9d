import { describe, expect, test } from "vitest";
import { earnedSetups, setupTimes } from "@/lib/matching/setups";
import { sum } from "@/lib/sum";
import { afterEight, makeReport, makeWork } from "@/tests/make/book";
import { makeParts } from "@/tests/make/matching";

const whenBooked = new Set(["010"]);
const DAY = "2026-05-14";
const setup = (start: number, other = {}) => makeWork(start, 60, { activity: "setup", ...other });
const rival = (ticket: string, startsAt: number, day = DAY) => {
  return { ticket, operation: "010", day, cell: "mill", firstMs: afterEight(startsAt) };
};
const earned = (...[records, facts]: Parameters<typeof makeParts>) =>
  makeParts(records, { whenBooked, ...facts }).booked.flatMap(({ activity, day, seconds }) =>
    activity === "earned" ? [[day, seconds]] : [],
  );

describe("setupTimes", () => {
  test("only of operations whose setup is earned when it is booked", () => {
    const { booked } = makeParts({ work: [setup(30), setup(0), makeWork(90, 5)] });
    expect(setupTimes("1", booked, whenBooked)).toEqual([rival("1", 0)]);
    expect(setupTimes("1", booked, new Set())).toEqual([]);
  });
});

describe("earnedSetups", () => {
  test("a setup is earned on each day on which it is booked, the count earns the run alone", () => {
    const work = [setup(0), setup(90), setup(24 * 3600)];
    expect(earned({ work, reports: [makeReport(200)] })).toEqual([
      [DAY, 1800 + 600],
      ["2026-05-15", 600],
    ]);
  });
  test("once a cell and day: by the ticket whose setup began first", () => {
    expect(earned({ work: [setup(60)] }, { rivals: [rival("26000001", 0)] })).toEqual([]);
    expect(earned({ work: [setup(60)] }, { rivals: [rival("26000001", 61)] })).toEqual([
      [DAY, 600],
    ]);
    expect(earned({ work: [setup(60)] }, { rivals: [rival("26000001", 60)] })).toEqual([]);
    expect(earned({ work: [setup(60)] }, { rivals: [rival("26999999", 60)] })).toEqual([
      [DAY, 600],
    ]);
    const elsewhere = [
      rival("26000001", 0, "2026-05-13"),
      { ...rival("26000001", 0), cell: "neck" },
    ];
    expect(earned({ work: [setup(60)] }, { rivals: elsewhere })).toEqual([[DAY, 600]]);
  });
  test("without setup time none is earned", () => {
    expect(earned({ work: [makeWork(0, 60)], reports: [makeReport(60)] })).toEqual([[DAY, 1800]]);
    expect(earnedSetups([], [], { operations: [], strays: [], reworks: [] })).toEqual([]);
  });
  test("a finished operation's matched earning has the setups that it won", () => {
    const { matched } = makeParts({ work: [setup(0)], reports: [makeReport(90)] }, { whenBooked });
    expect(sum(matched.map(({ earnedSeconds }) => earnedSeconds))).toBe(2400);
  });
});
