import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { judge } from "@/lib/tickets/judge";
import { makeCount, makeTicket, makeWork } from "@/tests/make/ticket";

const states = (ticket: ReturnType<typeof judge>) => ticket.operations.map(({ state }) => state);

describe("judge: states", () => {
  test("the first operation is ready, the others wait", () => {
    expect(states(judge(makeTicket(), [], []))).toEqual(["ready", "waiting", "waiting"]);
  });
  test("time or a count begins it", () => {
    const begun = ["working", "waiting", "waiting"];
    expect(states(judge(makeTicket(4), [], [makeWork("110", [0, 5])]))).toEqual(begun);
    expect(states(judge(makeTicket(4), [makeCount("110", 5, [1])], []))).toEqual(begun);
  });
  test("finished, and the next is ready", () => {
    const ticket = judge(makeTicket(), [makeCount("110", 5, [1])], [makeWork("110", [0, 5])]);
    expect(states(ticket)).toEqual(["finished", "ready", "waiting"]);
    expect(ticket.operations.map(({ predecessorOpen }) => predecessorOpen)).toEqual([
      false,
      false,
      true,
    ]);
  });
  test("work ahead of its turn is work", () => {
    const ticket = judge(makeTicket(), [], [makeWork("130", [0, 5])]);
    expect(states(ticket)).toEqual(["ready", "waiting", "working"]);
  });
  test("all finished finish the ticket, at the last of them", () => {
    const counts = ["130", "120", "110"].map((operation, i) => makeCount(operation, 9 - i, [1]));
    expect(judge(makeTicket(), counts, [])).toMatchObject({ status: "finished", endedMs: 540_000 });
    expect(judge(makeTicket(), counts.slice(1), [])).toMatchObject({
      status: "open",
      endedMs: null,
    });
  });
  test("a whole instrument lost closes what is open and leaves what is finished", () => {
    const counts = [makeCount("110", 1, [1]), makeCount("120", 2, [0, 0, 1])];
    const ticket = judge(makeTicket(), counts, []);
    expect(ticket).toMatchObject({ status: "scrapped", endedMs: 120_000 });
    expect(states(ticket)).toEqual(["finished", "finished", "closed"]);
  });
  test("a cancelled ticket is closed, whatever was finished", () => {
    const ticket = judge(makeTicket(1, { isCancelled: true }), [makeCount("110", 1, [1])], []);
    expect(ticket).toMatchObject({ status: "cancelled", endedMs: null });
    expect(states(ticket)).toEqual(["finished", "closed", "closed"]);
  });
  test("a ticket without operations is not finished", () => {
    expect(judge(makeTicket(1, { operations: [] }), [], []).status).toBe("open");
  });
});

describe("judge: time", () => {
  const work = [
    makeWork("110", [9, 12], { worker: "ben" }),
    makeWork("110", [0, 5], { activity: "rework" }),
    makeWork("110", [6, 8], { activity: "setup" }),
    makeWork("120", [20, null], { seconds: 45 }),
  ];
  const [mill, neck] = judge(makeTicket(), [], work).operations;

  test("everybody's counts, and rework is part of it", () => {
    expect(mill).toMatchObject({ actualSeconds: 600, reworkSeconds: 300 });
  });
  test("the first second that is not rework decides the standard", () => {
    expect(mill?.firstWorkMs).toBe(360_000);
    expect(judge(makeTicket(), [], work.slice(1, 2)).operations[0]?.firstWorkMs).toBeNull();
  });
  test("what runs has the seconds that it has until now", () => {
    expect(neck?.actualSeconds).toBe(45);
  });
});

describe("judge: laws", () => {
  test("for any records, the order in which they come plays no part", () => {
    const operation = fc.constantFrom("110", "120", "130", "990");
    const minute = fc.nat(60);
    const worker = fc.constantFrom("ana", "ben");
    const counts = fc.uniqueArray(
      fc
        .tuple(operation, minute, fc.tuple(fc.nat(2), fc.nat(2), fc.nat(1)), worker)
        .map(([code, at, numbers, who]) => makeCount(code, at, numbers, { worker: who })),
      { selector: ({ event }) => event, maxLength: 8 },
    );
    const work = fc.uniqueArray(
      fc
        .tuple(operation, minute, fc.option(fc.integer({ min: 1, max: 30 })), worker)
        .map(([code, from, long, who]) =>
          makeWork(code, [from, long === null ? null : from + long], { worker: who }),
        ),
      { selector: ({ event }) => event, maxLength: 8 },
    );
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 4 }), counts, work, (lot, reports, time) => {
        const judged = judge(makeTicket(lot), reports, time);
        const reversed = judge(makeTicket(lot), [...reports].reverse(), [...time].reverse());
        expect(reversed).toEqual(judged);
      }),
    );
  });
});
