import { describe, expect, test } from "vitest";
import { judge } from "@/lib/tickets/judge";
import { obstacles } from "@/lib/tickets/obstacles";
import { makeCount, makeTicket } from "@/tests/make/ticket";

const ask = (ticket: ReturnType<typeof judge>, place: number, cells = ["mill", "neck", "spray"]) =>
  obstacles(ticket.operations[place]!, { status: ticket.status, cells });
const fresh = judge(makeTicket(), [], []);

describe("obstacles", () => {
  test("nothing stands before the first operation in its own cell", () => {
    expect(ask(fresh, 0)).toEqual([]);
  });
  test("its cell, its predecessor", () => {
    expect(ask(fresh, 1)).toEqual(["predecessor-open"]);
    expect(ask(fresh, 0, ["spray"])).toEqual(["wrong-cell"]);
    expect(ask(fresh, 1, ["mill"])).toEqual(["wrong-cell", "predecessor-open"]);
  });
  test("finished is finished, whatever came before", () => {
    const ticket = judge(makeTicket(), [makeCount("120", 1, [1])], []);
    expect(ask(ticket, 1)).toEqual(["finished"]);
    expect(ask(ticket, 2)).toEqual(["predecessor-open"]);
  });
  test("once the predecessor is finished the way is free", () => {
    expect(ask(judge(makeTicket(), [makeCount("110", 1, [1])], []), 1)).toEqual([]);
  });
  test("a closed ticket says so, and not that something is open before it", () => {
    const scrapped = judge(makeTicket(), [makeCount("110", 1, [0, 0, 1])], []);
    expect(ask(scrapped, 2)).toEqual(["ticket-closed"]);
    expect(ask(scrapped, 0)).toEqual(["finished", "ticket-closed"]);
  });
});
