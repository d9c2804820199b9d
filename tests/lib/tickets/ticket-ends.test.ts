import { describe, expect, test } from "vitest";
import type { TicketFacts, TicketReport, TicketWork } from "@/lib/tickets/facts";
import { judge } from "@/lib/tickets/judge";
import { makeCount, makeTicket, makeWork } from "@/tests/make/ticket";

/** Loose ends as "code subject minute", the ticket's number left out. */
function ends(
  reports: TicketReport[],
  work: TicketWork[],
  { facts = makeTicket(), settled = [] }: { facts?: TicketFacts; settled?: string[] } = {},
): string[] {
  return judge(facts, reports, work, new Set(settled)).looseEnds.map((end) =>
    [
      end.code,
      end.subject.replace("26048176/", ""),
      end.at / 60,
      ...(end.settled ? ["settled"] : []),
    ].join(" "),
  );
}

const first = [makeWork("110", [0, 5])];
const done = [makeCount("110", 5, [1])];

describe("ticketEnds", () => {
  test("work in its turn, in its cell and up to its finish asks nothing", () => {
    const work = [...first, makeWork("120", [5, 9])];
    expect(ends([...done, makeCount("120", 9, [1])], work)).toEqual([]);
  });
  test("an operation that the ticket does not have", () => {
    expect(ends([makeCount("990", 2, [1])], [makeWork("995", [0, 1])])).toEqual([
      "unknown-ticket 995:work-995-0 0",
      "unknown-ticket count-990-2 2",
    ]);
  });
  test("a ticket that nobody knows has no operation at all", () => {
    const facts = makeTicket(1, { operations: [] });
    expect(ends(done, first, { facts })).toEqual(["unknown-ticket 110:work-110-0 0"]);
  });
  test("another cell's kiosk", () => {
    const work = [makeWork("110", [0, 5], { cell: "spray" })];
    expect(ends(done, work)).toEqual(["wrong-cell 110:work-110-0 0"]);
  });
  test("an act without a cell is in no wrong one", () => {
    expect(ends(done, [makeWork("110", [0, 5], { cell: null })])).toEqual([]);
  });
  test("ahead of an operation that is not finished, asked once per worker", () => {
    const work = [
      makeWork("120", [1, 2]),
      makeWork("120", [3, 4]),
      makeWork("120", [3, 4], { worker: "ben", event: "ben" }),
      makeWork("120", [6, 7]),
    ];
    expect(ends(done, [...first, ...work])).toEqual([
      "out-of-order 120:work-120-1 1",
      "out-of-order 120:ben 3",
    ]);
  });
  test("from the second of the finish on it is in order", () => {
    expect(ends(done, [...first, makeWork("120", [5, 9])])).toEqual([]);
  });
  test("more than the lot has", () => {
    const counts = [5, 6, 7].map((minute) => makeCount("110", minute, [1]));
    expect(ends(counts, first)).toEqual(["over-count count-110-6 6", "over-count count-110-7 7"]);
  });
  test("a count where nobody has booked time by then", () => {
    expect(ends(done, [])).toEqual(["count-without-work count-110-5 5"]);
    expect(ends(done, [makeWork("110", [6, 7])])).toEqual([
      "count-without-work count-110-5 5",
      "past-finish 110:work-110-6 6",
    ]);
  });
  test("a count for work that another did asks nothing", () => {
    expect(ends(done, [makeWork("110", [0, 5], { worker: "ben" })])).toEqual([]);
  });
  test("work ahead of its turn asks whoever worked, not whoever counted", () => {
    const work = [makeWork("120", [1, 5], { worker: "ben" })];
    expect(ends([makeCount("120", 5, [1])], work)).toEqual(["out-of-order 120:work-120-1 1"]);
  });
  test("time and count of one second belong together", () => {
    expect(ends([makeCount("110", 5, [1])], [makeWork("110", [5, null])])).toEqual([
      "past-finish 110:work-110-5 5",
    ]);
  });
  test("a count ahead of its turn that nobody worked for is out of order too", () => {
    expect(ends([makeCount("120", 5, [1])], [])).toEqual([
      "count-without-work count-120-5 5",
      "out-of-order count-120-5 5",
    ]);
  });
  test("whoever works on past another's last count, also while it runs", () => {
    const ben = { worker: "ben", event: "ben" };
    expect(ends(done, [...first, makeWork("110", [3, 8], ben)])).toEqual(["past-finish 110:ben 5"]);
    expect(ends(done, [...first, makeWork("110", [3, null], ben)])).toEqual([
      "past-finish 110:ben 5",
    ]);
    expect(ends(done, [...first, makeWork("110", [3, 5], ben)])).toEqual([]);
  });
  test("work begun after the finish is past it from its beginning", () => {
    expect(ends(done, [...first, makeWork("110", [7, 8])])).toEqual([
      "past-finish 110:work-110-7 7",
    ]);
  });
  test("whatever goes on after the instrument was lost", () => {
    const lost = [makeCount("110", 5, [0, 0, 1]), makeCount("120", 9, [0])];
    const work = [...first, makeWork("110", [3, 6], { worker: "ben" }), makeWork("120", [7, 9])];
    expect(ends(lost, work)).toEqual([
      "ticket-scrapped 110:work-110-3 5",
      "ticket-scrapped 120:work-120-7 7",
    ]);
  });
  test("a count after the instrument was lost", () => {
    const lost = [makeCount("110", 5, [0, 0, 1]), makeCount("120", 9, [1], { worker: "ben" })];
    expect(ends(lost, first)).toEqual([
      "count-without-work count-120-9 9",
      "over-count count-120-9 9",
      "ticket-scrapped count-120-9 9",
    ]);
  });
  test("the count that says it was lost asks nothing", () => {
    expect(ends([makeCount("110", 5, [0, 0, 1])], first)).toEqual([]);
  });
  test("an answer settles the one that it names", () => {
    const work = [makeWork("110", [0, 5], { cell: "spray" })];
    const settled = ["wrong-cell:26048176/110:work-110-0"];
    expect(ends(done, work, { settled })).toEqual(["wrong-cell 110:work-110-0 0 settled"]);
  });
  test("each names whose record it hangs on", () => {
    const { looseEnds } = judge(makeTicket(), [makeCount("110", 5, [1], { worker: "ben" })], []);
    expect(looseEnds.map(({ worker }) => worker)).toEqual(["ben"]);
  });
});
