import { describe, expect, test } from "vitest";
import { judge } from "@/lib/tickets/judge";
import { openRework, type Rework, reworkAt, reworkOf } from "@/lib/tickets/reworks";
import { makeCount, makeTicket, makeWork } from "@/tests/make/ticket";

const rework: Rework = {
  event: "e1",
  operation: "110",
  foundBy: "120",
  causedBy: "110",
  pieces: 1,
  done: 0,
  counts: [],
  openedMs: 60_500,
  closedMs: null,
};

describe("reworkOf", () => {
  const finished =
    (...codes: string[]) =>
    (code: string) =>
      codes.includes(code);
  test("a piece that fails later reworks the operation that caused it", () => {
    const failed = makeCount("120", 9, [0, 2], { causedBy: "110" });
    expect(reworkOf(failed, finished("110"))).toMatchObject({
      event: "count-120-9",
      operation: "110",
      foundBy: "120",
      causedBy: "110",
      pieces: 2,
      closedMs: null,
    });
  });
  test("a piece that fails on the finished operation itself reworks that one", () => {
    const failed = makeCount("120", 9, [0, 1], { causedBy: "110" });
    expect(reworkOf(failed, finished("110", "120"))).toMatchObject({
      operation: "120",
      causedBy: "110",
    });
  });
  test("while the operation is open, a piece of rework keeps it open and opens no other", () => {
    expect(reworkOf(makeCount("120", 9, [1, 1]), finished())).toBeNull();
    expect(reworkOf(makeCount("120", 9, [1, 1], { causedBy: "999" }), finished("110"))).toBeNull();
    expect(reworkOf(makeCount("120", 9, [1]), finished("110", "120"))).toBeNull();
  });
});

describe("openRework, reworkAt", () => {
  const closed = { ...rework, event: "e0", openedMs: 0, closedMs: 60_000 };
  test("counts go to the oldest that is open", () => {
    const [second, third] = [rework, { ...rework, event: "e2" }];
    expect(openRework([closed, second, third], "110")).toBe(second);
    expect(openRework([closed], "110")).toBeUndefined();
    expect(openRework([rework], "120")).toBeUndefined();
  });
  test("time goes to the one that was open when it began, from its whole second on", () => {
    const at = (startMs: number, operation = "110") =>
      reworkAt([closed, rework], { operation, startMs })?.event;
    expect([at(59_000), at(60_000), at(90_000)]).toEqual(["e0", "e1", "e1"]);
    expect(at(90_000, "120")).toBeUndefined();
    expect(reworkAt([closed], { operation: "110", startMs: 60_000 })).toBeUndefined();
  });
});

describe("judge: rework operations", () => {
  const counts = [makeCount("110", 10, [1]), makeCount("120", 20, [0, 1], { causedBy: "110" })];
  const work = [
    makeWork("110", [0, 10]),
    makeWork("120", [12, 20]),
    makeWork("110", [25, 40], { activity: "rework" }),
  ];
  test("its time counts there, and the first operation keeps its finish and its time", () => {
    const judged = judge(makeTicket(), counts, work);
    expect(judged.operations[0]).toMatchObject({ finishedMs: 600_000, actualSeconds: 600 });
    expect(judged.reworks).toMatchObject([
      { event: "count-120-20", operation: "110", actualSeconds: 900, closedMs: null },
    ]);
    expect(judged.looseEnds).toEqual([]);
  });
  test("a good count on it closes it, without counting twice and without a question", () => {
    const judged = judge(makeTicket(), [...counts, makeCount("110", 40, [1])], work);
    expect(judged.reworks).toMatchObject([{ closedMs: 2_400_000, done: 1 }]);
    expect(judged.operations[0]).toMatchObject({ good: 1, finishedMs: 600_000 });
    expect(judged.looseEnds).toEqual([]);
  });
  test("work and counts after it has closed ask as ever", () => {
    const late = [...counts, makeCount("110", 40, [1]), makeCount("110", 50, [1])];
    const judged = judge(makeTicket(), late, [...work, makeWork("110", [45, 50])]);
    expect(judged.looseEnds.map(({ code }) => code)).toEqual(["past-finish", "over-count"]);
  });
  test("a piece that is lost in its rework is lost to all that follows", () => {
    const judged = judge(
      makeTicket(2),
      [
        makeCount("110", 10, [2]),
        makeCount("120", 20, [1, 1], { causedBy: "110" }),
        makeCount("110", 40, [0, 0, 1]),
      ],
      work,
    );
    expect(judged.operations[0]).toMatchObject({ good: 1, scrap: 1, finishedMs: 600_000 });
    expect(judged.operations[1]).toMatchObject({ quantity: 1, finishedMs: 2_400_000 });
    expect(judged.looseEnds).toEqual([]);
  });
  test("what the operation that found it has passed is done, also without a count of its own", () => {
    const judged = judge(makeTicket(), [...counts, makeCount("120", 50, [1])], work);
    expect(judged.reworks[0]).toMatchObject({ closedMs: 3_000_000 });
  });
  test("a ticket is not finished while pieces of it are reworked", () => {
    const all = ["110", "120", "130"].map((code, at) => makeCount(code, at + 1, [1]));
    const failed = makeCount("130", 9, [0, 1]);
    expect(judge(makeTicket(), [...all, failed], [])).toMatchObject({
      status: "open",
      endedMs: null,
    });
    const mended = makeCount("130", 12, [1]);
    expect(judge(makeTicket(), [...all, failed, mended], [])).toMatchObject({
      status: "finished",
      endedMs: 720_000,
    });
  });
});
