import { describe, expect, test } from "vitest";
import { badgeCode } from "@/lib/codes/badge-code";
import type { KioskTicket } from "@/lib/kiosks/schema";
import {
  AVOCET,
  HERON,
  NIA,
  numbered,
  operationOf,
  PLOVER,
  TestKiosk,
  ticketOf,
  WREN,
} from "@/tests/make/bench";

const scanning = (add = false) => TestKiosk.atBench().send({ on: "scan-for", add });

/** The kiosk after this ticket was looked up for new work. */
function found(ticket: KioskTicket): TestKiosk {
  const kiosk = scanning();
  kiosk.state = { ...kiosk.state, finding: { code: ticket.ticket, purpose: { for: "work" } } };
  return kiosk.send({ on: "ticket", code: ticket.ticket, ticket });
}

describe("a scanned ticket", () => {
  test("is offered, and one tap begins the work", () => {
    const kiosk = scanning().send({ on: "scan", text: `T${HERON}` });
    expect(kiosk.state.screen).toMatchObject({ at: "offer", ticket: HERON });
    kiosk.send({ on: "take", choice: { ticket: HERON, operation: "120", activity: "run" } });
    expect(kiosk.last).toMatchObject({
      kind: "work",
      activity: "run",
      items: [{ ticket: HERON, operation: "120" }],
    });
  });

  test.each([
    { text: "hello", says: { what: "form" }, digits: "", because: "no code of ours" },
    { text: "26-04817", says: { what: "form" }, digits: "2604817", because: "too short" },
    { text: badgeCode(NIA).replace("W", "C"), says: { what: "carrier" }, digits: "" },
    { text: "26048276", says: { what: "check" }, digits: "26048276" },
    { text: numbered("2699999"), says: { what: "not-found" }, digits: numbered("2699999") },
  ])("$text is said to be $says.what and books nothing", ({ text, says, digits }) => {
    const kiosk = scanning();
    const before = kiosk.kinds;
    kiosk.send({ on: "scan", text });
    expect(kiosk.state.screen).toMatchObject({ at: "scan", says, digits });
    expect(kiosk.kinds).toEqual(before);
    expect(kiosk.effects.at(-1)).toEqual({ do: "sound", sound: "refuse" });
  });

  test("a misread names the nearest ticket of the cell and the doubtful digit", () => {
    const wrong = HERON.replace("8", "9");
    const kiosk = scanning().key(wrong).send({ on: "submit" });
    expect(kiosk.state.screen).toMatchObject({
      says: { what: "check", nearest: HERON, doubtful: HERON.indexOf("8") },
    });
    kiosk.send({ on: "take-ticket", ticket: HERON });
    expect(kiosk.state.screen).toMatchObject({ at: "offer", ticket: HERON });
  });

  test("held before the camera says no only once", () => {
    const kiosk = scanning().send({ on: "scan", text: "hello" });
    const { length } = kiosk.effects;
    kiosk.send({ on: "scan", text: "hello" });
    expect(kiosk.effects).toHaveLength(length);
  });

  test("cannot be looked up while the server is away, and says so", () => {
    const kiosk = scanning();
    kiosk.state = { ...kiosk.state, finding: { code: "1", purpose: { for: "work" } } };
    kiosk.send({ on: "no-ticket", code: "1", away: true });
    expect(kiosk.state.screen).toMatchObject({ at: "scan", says: { what: "away" } });
  });

  test("looked up for a screen that was left opens nothing", () => {
    const kiosk = scanning().send({ on: "back" });
    kiosk.send({ on: "ticket", code: HERON, ticket: ticketOf(HERON, [operationOf()]) });
    expect(kiosk.state.screen.at).toBe("bench");
  });
});

describe("a kindly no", () => {
  test.each([
    { why: "wrong-cell", ticket: PLOVER, anyway: true },
    { why: "predecessor-open", obstacles: ["predecessor-open"] as const, anyway: true },
    { why: "finished", state: "finished" as const, anyway: false },
    { why: "ticket-closed", status: "finished" as const, anyway: false },
  ])("$why: nothing is booked until the worker decides", ({ why, anyway, ...change }) => {
    const { ticket = WREN, status = "open", obstacles = [], state = "ready" } = change;
    const operation =
      ticket === PLOVER
        ? operationOf({ here: false, cell: "Spray", obstacles: ["wrong-cell"] })
        : operationOf({ state, obstacles: [...obstacles] });
    const kiosk = found({ ...ticketOf(ticket, [operation]), status });
    expect(kiosk.state.screen).toMatchObject({ at: "refused", why });
    const before = kiosk.kinds.length;
    kiosk.send({ on: "go-ahead" });
    expect(kiosk.kinds.slice(before)).toEqual(anyway ? ["work"] : []);
  });

  test("someone else is on it: joining books both", () => {
    const others = [{ worker: "1043", name: "Tomas Velde" }];
    const kiosk = found(ticketOf(WREN, [operationOf({ workers: others })]));
    kiosk.send({ on: "take", choice: { ticket: WREN, operation: "120", activity: "run" } });
    expect(kiosk.state.screen).toMatchObject({ at: "refused", why: "someone-on-it" });
    expect(kiosk.send({ on: "go-ahead" }).last).toMatchObject({ kind: "work" });
  });

  test("calling the lead books waiting for the lead", () => {
    const kiosk = scanning().send({ on: "scan", text: `T${PLOVER}` }, { on: "call-lead" });
    expect(kiosk.last).toMatchObject({ kind: "indirect", code: "waiting-lead" });
  });

  test("picking another goes to the cell's tickets for the same purpose", () => {
    const kiosk = TestKiosk.atWork().send({ on: "scan-for", add: true });
    kiosk.send({ on: "scan", text: `T${PLOVER}` }, { on: "pick-another" });
    expect(kiosk.state.screen).toMatchObject({ at: "cell-tickets", purpose: { for: "add" } });
  });

  test("what lies on the bench already is not added again", () => {
    const kiosk = TestKiosk.atWork().take(HERON, true);
    expect(kiosk.state.screen).toMatchObject({ at: "refused", why: "on-bench" });
  });
});

describe("two tickets at once", () => {
  test("adding keeps the first, in one work event with both", () => {
    const kiosk = TestKiosk.atWork().take(WREN, true);
    expect(kiosk.last).toMatchObject({
      kind: "work",
      items: [{ ticket: HERON }, { ticket: WREN }],
    });
  });

  test("changing replaces it", () => {
    const kiosk = TestKiosk.atWork().take(WREN);
    expect(kiosk.last).toMatchObject({ kind: "work", items: [{ ticket: WREN }] });
  });
});

describe("a caution", () => {
  const taken = (kiosk: TestKiosk) => kiosk.take(AVOCET);

  test("must be answered before the work, and its answer is kept with it", () => {
    const kiosk = taken(TestKiosk.atBench());
    expect(kiosk.state.screen.at).toBe("caution");
    expect(kiosk.kinds).toEqual(["shift-start"]);
    kiosk.send({ on: "go-ahead" });
    expect(kiosk.kinds).toEqual(["shift-start", "caution-read", "work"]);
  });

  test("is asked once per shift and operation", () => {
    const kiosk = taken(TestKiosk.atBench()).send({ on: "go-ahead" }, { on: "stay" });
    kiosk.send({ on: "show-other-work" }, { on: "other-work", code: "cleaning" }, { on: "stay" });
    taken(kiosk);
    expect(kiosk.state.screen.at).toBe("done");
  });

  test("not now goes back and books nothing", () => {
    const kiosk = taken(TestKiosk.atBench()).send({ on: "back" });
    expect(kiosk.state.screen.at).toBe("offer");
    expect(kiosk.kinds).toEqual(["shift-start"]);
  });

  test("stays two minutes without a touch", () => {
    const kiosk = taken(TestKiosk.atBench());
    expect(kiosk.pass(119).state.screen.at).toBe("caution");
    expect(kiosk.pass(1).state.screen.at).toBe("door");
  });
});
