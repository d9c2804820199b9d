import { describe, expect, test } from "vitest";
import { benchOf, HERON, NIA, sessionOf, TestKiosk, WREN } from "@/tests/make/bench";

const heron = { ticket: HERON, operation: "120" };
const pinKeyed = (kiosk: TestKiosk) =>
  kiosk.key("271828").send({ on: "signed-in", session: sessionOf(), bench: benchOf() });

describe("a break", () => {
  test("interrupts the work and goes back to it", () => {
    const kiosk = TestKiosk.atWork().send({ on: "show-break" }, { on: "break", break: "rest" });
    expect(kiosk.view.doing).toEqual({ kind: "rest" });
    expect(kiosk.view.resumes).toMatchObject({ kind: "work" });
    kiosk.send({ on: "stay" }, { on: "end-break" });
    expect(kiosk.last).toMatchObject({ kind: "break-end", break: "rest" });
    expect(kiosk.view.items).toMatchObject([heron]);
  });

  test("is not ended where none is", () => {
    const kiosk = TestKiosk.atWork().send({ on: "end-break" });
    expect(kiosk.kinds).not.toContain("break-end");
  });
});

describe("other work", () => {
  test("replaces the ticket, which one tap takes up again", () => {
    const kiosk = TestKiosk.atWork();
    kiosk.send({ on: "show-other-work" }, { on: "other-work", code: "cleaning" }, { on: "stay" });
    expect(kiosk.view.doing).toEqual({ kind: "indirect", code: "cleaning" });
    kiosk.send({ on: "resume" });
    expect(kiosk.last).toMatchObject({ kind: "work", activity: "run", items: [heron] });
  });
});

describe("setup", () => {
  test("is done with one tap, and the run begins on the same ticket", () => {
    const kiosk = TestKiosk.atBench()
      .take(WREN, false, "setup")
      .send({ on: "stay" }, { on: "run" });
    expect(kiosk.last).toMatchObject({
      kind: "work",
      activity: "run",
      items: [{ ticket: WREN, operation: "120" }],
    });
  });
});

describe("the end of a shift", () => {
  test("asks for the PIN, and only then is it kept", () => {
    const kiosk = TestKiosk.atBench().send({ on: "end-shift" });
    expect(kiosk.state.screen).toMatchObject({ at: "pin", reason: { for: "end-shift" } });
    expect(kiosk.kinds).toEqual(["shift-start"]);
    pinKeyed(kiosk);
    expect(kiosk.kinds).toEqual(["shift-start", "shift-end"]);
    expect(kiosk.state.sessions[NIA]).toBeUndefined();
    expect(kiosk.effects).toContainEqual({ do: "end-sessions", worker: NIA });
  });

  test("with work still open asks first, and offers to count it", () => {
    const kiosk = TestKiosk.atWork().send({ on: "end-shift" });
    expect(kiosk.state.screen).toEqual({ at: "end-open-work" });
    expect(kiosk.send({ on: "count" }).state.screen).toMatchObject({ at: "count" });
    kiosk.send({ on: "back" }, { on: "end-shift" }, { on: "end-shift" });
    expect(kiosk.state.screen).toMatchObject({ at: "pin" });
  });

  test("opens nothing afterwards but the door", () => {
    const kiosk = pinKeyed(TestKiosk.atBench().send({ on: "end-shift" }));
    kiosk.send({ on: "stay" }, { on: "scan-for", add: false });
    expect(kiosk.state.screen.at).toBe("done");
    expect(kiosk.pass(4).state.screen.at).toBe("door");
  });
});

describe("a wrong ticket", () => {
  test("is moved after the PIN, from when its work began", () => {
    const kiosk = TestKiosk.atWork();
    const work = kiosk.last?.id;
    kiosk.send({ on: "show-hours" }, { on: "wrong-ticket" });
    expect(kiosk.state.screen).toMatchObject({ at: "pin", reason: { for: "reassign" } });
    pinKeyed(kiosk).send({ on: "scan", text: `T${WREN}` });
    kiosk.send({ on: "take", choice: { ticket: WREN, operation: "120", activity: "run" } });
    expect(kiosk.last).toMatchObject({
      kind: "reassign",
      event: work,
      activity: "run",
      items: [{ ticket: WREN, operation: "120" }],
    });
    expect(kiosk.view.items).toMatchObject([{ ticket: WREN }]);
  });

  test("of several, the one that is wrong is named and the others stay", () => {
    const kiosk = TestKiosk.atWork().take(WREN, true).send({ on: "stay" });
    kiosk.send({ on: "show-hours" }, { on: "wrong-ticket" });
    kiosk.send({ on: "pick-item", item: heron });
    expect(kiosk.state.screen).toMatchObject({
      reason: { purpose: { kept: [{ ticket: WREN, operation: "120" }] } },
    });
  });

  test("may have been other work", () => {
    const kiosk = TestKiosk.atWork().send({ on: "show-hours" }, { on: "wrong-ticket" });
    pinKeyed(kiosk).send({ on: "show-other-work" }, { on: "other-work", code: "cleaning" });
    expect(kiosk.last).toMatchObject({ kind: "reassign", code: "cleaning" });
    expect(kiosk.view.doing).toEqual({ kind: "indirect", code: "cleaning" });
  });
});

describe("a wrong count", () => {
  test("is called out by its report", () => {
    const kiosk = TestKiosk.atWork().send({ on: "count" }, { on: "counted", stop: true });
    const report = kiosk.last?.id;
    kiosk.send({ on: "stay" }, { on: "show-hours" }, { on: "wrong-count" });
    expect(kiosk.last).toMatchObject({ kind: "object", subject: report });
  });

  test("of several, the worker points at it", () => {
    const kiosk = TestKiosk.atWork().send({ on: "count" });
    kiosk.send({ on: "step", field: "good", by: -1 }, { on: "counted", stop: false });
    kiosk.send({ on: "stay" }, { on: "count" }, { on: "counted", stop: true }, { on: "stay" });
    kiosk.send({ on: "show-hours" }, { on: "wrong-count" });
    expect(kiosk.state.screen).toEqual({ at: "pick-report" });
    const [first] = kiosk.view.reports;
    kiosk.send({ on: "object", report: first!.event });
    expect(kiosk.last).toMatchObject({ kind: "object", subject: first!.event });
  });
});
