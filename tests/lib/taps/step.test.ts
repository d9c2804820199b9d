import { describe, expect, test } from "vitest";
import { firstState } from "@/lib/bench/first-state";
import { benchView } from "@/lib/bench/view";
import { step } from "@/lib/taps/step";
import { cell, device, HERON, NIA, sessionOf, TestKiosk, WREN } from "@/tests/make/bench";

describe("step", () => {
  test("a browser that is no kiosk asks for a code, and begins anew when it became one", () => {
    const known = { device: null, cell: null, sessions: [], benches: {}, pending: [] };
    const kiosk = new TestKiosk().send({ on: "started", known });
    kiosk.send({ on: "enrol", code: "K7QF" }, { on: "enrol", code: "K7QF" });
    expect(kiosk.effects).toEqual([{ do: "enrol", code: "K7QF" }]);
    kiosk.send({ on: "enrol-refused", says: "wrong" });
    expect(kiosk.state.screen).toMatchObject({ at: "enrol", says: "wrong", busy: false });
    kiosk.send({ on: "enrol", code: "K7QF" }, { on: "enrolled", device });
    expect(kiosk.state).toMatchObject({ device, screen: { at: "enrol", isDone: true } });
  });

  test("a reload in the middle finds sessions and records where they were", () => {
    const before = TestKiosk.atWork().state;
    const known = {
      device,
      cell,
      sessions: [sessionOf()],
      benches: before.benches,
      pending: before.pending,
    };
    const kiosk = new TestKiosk().send({ on: "started", known });
    expect(kiosk.state.screen.at).toBe("door");
    expect(kiosk.view.items).toMatchObject([{ ticket: HERON }]);
  });

  test("my bench goes 20 s after the last touch", () => {
    const kiosk = TestKiosk.atWork().pass(19.9).send({ on: "touch" });
    expect(kiosk.pass(19.9).state.screen.at).toBe("bench");
    expect(kiosk.pass(0.1).state).toMatchObject({ screen: { at: "door" }, visit: null });
  });

  test("a number left half keyed is gone 20 s later, an empty door stays", () => {
    const kiosk = TestKiosk.atDoor().key("10").pass(20);
    expect(kiosk.state.screen).toEqual({ at: "door", digits: "", says: null });
    expect(kiosk.pass(3600).state.screen.at).toBe("door");
  });

  test("a ticket scanned straight at the bench is offered for new work", () => {
    const kiosk = TestKiosk.atWork().send({ on: "scan", text: `T${WREN}` });
    expect(kiosk.state.screen).toMatchObject({ at: "offer", purpose: { for: "work" } });
  });

  test("after the end of a shift a scanned ticket opens nothing", () => {
    const kiosk = TestKiosk.atBench().send({ on: "end-shift" }).key("271828");
    kiosk.send({ on: "signed-in", session: sessionOf(), bench: null });
    kiosk.send({ on: "scan", text: `T${WREN}` });
    expect(kiosk.state.screen.at).toBe("done");
  });

  test("the connection is told apart by its last change, not by every answer", () => {
    const kiosk = TestKiosk.atDoor().send({ on: "link", is: "away" });
    const since = kiosk.nowMs;
    kiosk.pass(5).send({ on: "link", is: "away" });
    expect(kiosk.state.link).toEqual({ is: "away", sinceMs: since });
  });

  test("sounds are turned off for this tablet and stay off", () => {
    const kiosk = TestKiosk.atDoor().send({ on: "mute", muted: true });
    expect(kiosk.state.device?.muted).toBe(true);
    expect(kiosk.effects).toEqual([{ do: "mute", muted: true }]);
  });

  test("nothing that is tapped before the kiosk knows what it is does anything", () => {
    expect(step(firstState, { on: "start-shift" }, 5, benchView)).toEqual([
      { ...firstState, nowMs: 5, touchedMs: 5 },
      [],
    ]);
  });

  test("who stands here is nobody's business after the badge of another", () => {
    const kiosk = TestKiosk.atWork();
    expect(kiosk.state.visit?.worker).toBe(NIA);
    expect(kiosk.send({ on: "leave" }).state.visit).toBeNull();
  });
});
