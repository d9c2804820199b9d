import { describe, expect, test } from "vitest";
import { badgeCode } from "@/lib/codes/badge-code";
import { benchOf, NIA, TestKiosk } from "@/tests/make/bench";

const breakTapped = (kiosk: TestKiosk) =>
  kiosk.send({ on: "show-break" }, { on: "break", break: "meal" });

describe("a finished act", () => {
  test("says so only when it is on the tablet's disk", () => {
    const kiosk = TestKiosk.atWork();
    kiosk.slowDisk = true;
    breakTapped(kiosk);
    expect(kiosk.state.screen.at).toBe("break");
    kiosk.keep();
    expect(kiosk.state.screen).toMatchObject({ at: "done", deed: { what: "break" } });
    expect(kiosk.effects.at(-1)).toEqual({ do: "sound", sound: "accept" });
  });

  test("tapped twice is one act", () => {
    const kiosk = TestKiosk.atWork();
    kiosk.slowDisk = true;
    breakTapped(kiosk).send({ on: "break", break: "meal" });
    const records = kiosk.effects.filter((effect) => effect.do === "record");
    expect(records.map((effect) => effect.do === "record" && effect.bodies[0]?.kind)).toEqual([
      "shift-start",
      "work",
      "break-start",
    ]);
    kiosk.keep().send({ on: "break", break: "meal" });
    expect(kiosk.kinds).toEqual(["shift-start", "work", "break-start"]);
  });

  test("that the disk would not take leaves the screen as it was, and says so", () => {
    const kiosk = TestKiosk.atWork();
    kiosk.slowDisk = true;
    breakTapped(kiosk).send({ on: "not-recorded" });
    expect(kiosk.state).toMatchObject({ screen: { at: "break" }, notKept: true, saving: null });
    expect(kiosk.kinds).toEqual(["shift-start", "work"]);
    expect(kiosk.send({ on: "back" }).state.notKept).toBe(false);
  });

  test("lets the door come after 4 s, and a touch fills the time again", () => {
    const kiosk = breakTapped(TestKiosk.atWork()).pass(3).send({ on: "touch" });
    expect(kiosk.pass(3.9).state.screen.at).toBe("done");
    expect(kiosk.pass(0.1).state.screen.at).toBe("door");
  });
});

describe("undo", () => {
  test("takes the act back, and the work runs as if it was never tapped", () => {
    const kiosk = breakTapped(TestKiosk.atWork());
    const act = kiosk.last?.id;
    kiosk.send({ on: "undo" });
    expect(kiosk.last).toMatchObject({ kind: "undo", event: act });
    expect(kiosk.view.doing).toMatchObject({ kind: "work" });
    expect(kiosk.state.undo).toBeNull();
  });

  test("stands at the door for the rest of its 10 s, for whoever did it", () => {
    const kiosk = breakTapped(TestKiosk.atWork()).pass(4);
    expect(kiosk.state.screen.at).toBe("door");
    kiosk.pass(5.9).send({ on: "undo" });
    expect(kiosk.last).toMatchObject({ kind: "undo", worker: NIA });
    expect(kiosk.state.screen).toMatchObject({ at: "done", deed: { what: "undo" } });
    expect(kiosk.pass(4).state.screen.at).toBe("door");
  });

  test("is gone after 10 s, also where the clock ticked late", () => {
    const late = breakTapped(TestKiosk.atWork());
    late.nowMs += 10_000;
    late.send({ on: "undo" });
    expect(late.kinds).not.toContain("undo");
    expect(breakTapped(TestKiosk.atWork()).pass(4).pass(6).state.undo).toBeNull();
  });

  test("of a shift's end works without its session", () => {
    const kiosk = TestKiosk.atBench().send({ on: "end-shift" }).key("271828");
    kiosk.send({ on: "signed-in", session: { ...kiosk.state.sessions[NIA]! }, bench: null });
    kiosk.send({ on: "undo" });
    expect(kiosk.kinds).toEqual(["shift-start", "shift-end", "undo"]);
    expect(kiosk.view.shiftStart).not.toBeNull();
  });
});

describe("the server's answer", () => {
  test("takes the records out of the row, and its bench is the newer", () => {
    const kiosk = TestKiosk.atWork();
    const ids = kiosk.state.pending.map(({ id }) => id);
    const bench = benchOf({ next: [] });
    kiosk.send({ on: "settled", ids, benches: { [NIA]: bench } });
    expect(kiosk.state.pending).toEqual([]);
    expect(kiosk.state.benches[NIA]).toBe(bench);
  });

  test("that a session is over asks for the PIN again and loses nothing", () => {
    const kiosk = TestKiosk.atWork().send({ on: "session-over", worker: NIA });
    expect(kiosk.state.screen).toMatchObject({ at: "pin", worker: NIA });
    expect(kiosk.kinds).toEqual(["shift-start", "work"]);
    kiosk.send({ on: "back" }, { on: "scan", text: badgeCode(NIA) });
    expect(kiosk.state.screen.at).toBe("pin");
  });
});
