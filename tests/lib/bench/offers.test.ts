import { describe, expect, test } from "vitest";
import { findOperation, mayGoAhead, offersOf, onlyWay, refusalOf } from "@/lib/bench/offers";
import { HERON, operationOf, TestKiosk, ticketOf, WREN } from "@/tests/make/bench";

const ways = (change: Parameters<typeof operationOf>[0], only: "run" | null = null) =>
  offersOf(ticketOf(WREN, [operationOf(change)]), { only }).map(({ activity }) => activity);

describe("offersOf", () => {
  test.each([
    { change: {}, offered: ["run"], because: "the setup is earned" },
    { change: { setupEarned: false }, offered: ["setup", "run"], because: "it is not" },
    { change: { setupEarned: false, setupSeconds: null }, offered: ["run"], because: "no setup" },
    { change: { rework: 1 }, offered: ["run", "rework"], because: "a piece waits for rework" },
    { change: { here: false }, offered: [], because: "it is another cell's" },
    { change: { state: "finished" as const }, offered: [], because: "nothing is open" },
    {
      change: { obstacles: ["predecessor-open" as const] },
      offered: [],
      because: "it is not next",
    },
  ])("offers $offered, for $because", ({ change, offered }) => {
    expect(ways(change)).toEqual(offered);
  });

  test("a ticket that joins others takes their way of working", () => {
    expect(ways({ setupEarned: false, rework: 2 }, "run")).toEqual(["run"]);
  });

  test("a closed ticket offers nothing", () => {
    const closed = { ...ticketOf(WREN, [operationOf()]), status: "scrapped" as const };
    expect(offersOf(closed, { only: null })).toEqual([]);
  });

  test("several operations come in routing order", () => {
    const both = [operationOf(), operationOf({ operation: "130" })];
    const offers = offersOf(ticketOf(WREN, both), { only: null });
    expect(offers.map(({ operation }) => operation)).toEqual(["120", "130"]);
  });
});

describe("onlyWay", () => {
  test("is the bench's for one more, the moved one's for a wrong one, open for new work", () => {
    const view = TestKiosk.atWork().view;
    expect(onlyWay({ for: "add" }, view)).toBe("run");
    expect(onlyWay({ for: "work" }, view)).toBeNull();
    const reassign = { for: "reassign", event: "e", kept: [] } as const;
    expect(onlyWay({ ...reassign, activity: "setup" }, view)).toBe("setup");
    expect(onlyWay({ ...reassign, activity: null }, view)).toBe("run");
  });
});

describe("refusalOf", () => {
  const later = operationOf({ operation: "130", obstacles: ["predecessor-open"] });
  const elsewhere = operationOf({ operation: "140", here: false, cell: "Spray", obstacles: [] });
  const finished = operationOf({ state: "finished", obstacles: ["finished"] });
  test.each([
    { operations: [finished, later], why: "predecessor-open", operation: "130" },
    { operations: [finished, elsewhere], why: "wrong-cell", operation: "140" },
    { operations: [elsewhere, later], why: "predecessor-open", operation: "130" },
    { operations: [finished], why: "finished", operation: undefined },
    { operations: [], why: "finished", operation: undefined },
    { operations: [operationOf()], why: "nothing-here", operation: "120" },
  ])("is $why about $operation", ({ operations, why, operation }) => {
    const refusal = refusalOf(ticketOf(WREN, operations));
    expect(refusal.why).toBe(why);
    expect(refusal.choice?.operation).toBe(operation);
  });

  test("of a closed ticket is that it is closed", () => {
    const closed = { ...ticketOf(WREN, [later]), status: "cancelled" as const };
    expect(refusalOf(closed)).toEqual({ why: "ticket-closed", choice: null });
  });
});

describe("mayGoAhead", () => {
  test("only where time worked would be right though unexpected", () => {
    const whys = ["someone-on-it", "predecessor-open", "wrong-cell", "finished"] as const;
    expect(whys.map(mayGoAhead)).toEqual([true, true, true, false]);
    expect(mayGoAhead("ticket-closed")).toBe(false);
    expect(mayGoAhead("on-bench")).toBe(false);
  });
});

describe("findOperation", () => {
  test("finds what this tablet knows, and nothing of what it does not", () => {
    const { state } = TestKiosk.atDoor();
    expect(findOperation(state, { ticket: HERON, operation: "120" })?.cell).toBe("Neck");
    expect(findOperation(state, { ticket: HERON, operation: "999" })).toBeNull();
    expect(findOperation(state, { ticket: "1", operation: "120" })).toBeNull();
  });
});
