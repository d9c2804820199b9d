import { describe, expect, test } from "vitest";
import { sheetOnBench } from "@/lib/sheet/on-bench";
import { sum } from "@/lib/sum";
import { NIA, sessionOf, type TestKiosk } from "@/tests/make/bench";
import { ARCHTOP, BASS, builtTicket, kioskWith } from "@/tests/make/sheet";

/** Nia is in and on the bass; its sheet is before her. */
function onSheet(): TestKiosk {
  const kiosk = kioskWith(builtTicket(BASS), builtTicket(ARCHTOP)).signIn();
  return kiosk
    .send({ on: "start-shift" }, { on: "stay" })
    .send({ on: "go-on", item: BASS }, { on: "stay" });
}

const sheetOf = (kiosk: TestKiosk, item = BASS) => sheetOnBench(kiosk.state, kiosk.view, item)!;
const statesOf = (kiosk: TestKiosk) => sheetOf(kiosk).steps.map(({ state }) => state);
const secondsOf = (kiosk: TestKiosk) => sheetOf(kiosk).steps.map((step) => step.actualSeconds);

describe("atSheet", () => {
  test("an instrument that is built in steps stands with its sheet", () => {
    expect(onSheet().state.screen).toEqual({
      at: "sheet",
      item: BASS,
      picked: null,
      isLocked: false,
    });
  });

  test("a step is tapped off with one tap, and the sheet stays", () => {
    const kiosk = onSheet().touch(420).send({ on: "tap-off", step: "1" });
    expect(kiosk.last).toMatchObject({ kind: "step-done", ...BASS, step: "1" });
    expect(kiosk.state.screen).toMatchObject({ at: "sheet", picked: null });
    expect(secondsOf(kiosk)).toEqual([420, 0, 0]);
    expect(kiosk.effects.at(-1)).toEqual({ do: "sound", sound: "accept" });
  });

  test("a double tap is one", () => {
    const kiosk = onSheet().touch(60);
    kiosk.send({ on: "tap-off", step: "1" }, { on: "tap-off", step: "1" });
    expect(kiosk.kinds.filter((kind) => kind === "step-done")).toHaveLength(1);
  });

  test("it may be taken back for 10 s as if it was never tapped", () => {
    const kiosk = onSheet().touch(60).send({ on: "tap-off", step: "1" }).touch(5);
    kiosk.send({ on: "undo" });
    expect(statesOf(kiosk)).toEqual(["open", "open", "open"]);
    expect(kiosk.state.screen).toMatchObject({ at: "sheet", item: BASS });
    expect(sheetOf(kiosk).notTappedSeconds).toBe(65);
  });

  test("another step out of order takes one more tap", () => {
    const kiosk = onSheet().touch(60).send({ on: "pick-step", step: "3" });
    expect(kiosk.state.screen).toMatchObject({ picked: "3" });
    kiosk.send({ on: "tap-off", step: "3" });
    expect(statesOf(kiosk)).toEqual(["open", "open", "done"]);
    expect(kiosk.state.screen).toMatchObject({ picked: null });
  });

  test("picking it again lets it go", () => {
    const kiosk = onSheet().send({ on: "pick-step", step: "3" }, { on: "pick-step", step: "3" });
    expect(kiosk.state.screen).toMatchObject({ picked: null });
  });

  test("a done step is taken back after later ones, with the time it took", () => {
    const kiosk = onSheet();
    for (const step of ["1", "2"]) kiosk.touch(300).send({ on: "tap-off", step });
    kiosk.touch(40).send({ on: "pick-step", step: "1" }, { on: "take-back", step: "1" });
    expect(kiosk.last).toMatchObject({ kind: "step-open", step: "1" });
    expect(statesOf(kiosk)).toEqual(["open", "done", "open"]);
    expect(secondsOf(kiosk)).toEqual([300, 300, 0]);
  });

  test("a step that does not apply is skipped with a word why", () => {
    const kiosk = onSheet().send({ on: "pick-step", step: "2" }, { on: "skip-step", step: "2" });
    expect(kiosk.state.screen).toEqual({ at: "skip-step", item: BASS, step: "2" });
    kiosk.send({ on: "skip-because", reason: "not-on-this" });
    expect(kiosk.last).toMatchObject({ kind: "step-skip", step: "2", note: "not-on-this" });
    expect(sheetOf(kiosk).steps[1]).toMatchObject({ state: "skipped", reason: "not-on-this" });
  });

  test("steps tapped off in a bunch share their time and say so", () => {
    const kiosk = onSheet().touch(960).send({ on: "tap-off", step: "2" });
    kiosk.send({ on: "tap-off", step: "3" });
    expect(secondsOf(kiosk)).toEqual([0, 360, 600]);
    expect(sheetOf(kiosk).steps.map(({ together }) => together)).toEqual([false, true, true]);
  });

  test("a break and other work are no step's time", () => {
    const kiosk = onSheet().touch(100);
    kiosk.send({ on: "stop-here" }, { on: "show-break" }, { on: "break", break: "rest" });
    kiosk.send({ on: "stay" }).touch(600).send({ on: "end-break" }, { on: "stay" });
    expect(kiosk.state.screen).toMatchObject({ at: "sheet", item: BASS });
    kiosk.touch(20).send({ on: "tap-off", step: "1" });
    expect(secondsOf(kiosk)).toEqual([120, 0, 0]);
  });

  test("stays, but asks for a badge when nobody touched it for five minutes", () => {
    const kiosk = onSheet().touch(1).pass(299);
    expect(kiosk.state.screen).toMatchObject({ at: "sheet", isLocked: false });
    kiosk.pass(1).send({ on: "tap-off", step: "1" });
    expect(kiosk.state.screen).toMatchObject({ at: "sheet", isLocked: true });
    expect(kiosk.kinds).not.toContain("step-done");
  });

  test("one's own badge opens it again; without one the PIN does", () => {
    const kiosk = onSheet().pass(400).send({ on: "scan", text: "W10420" });
    expect(kiosk.state.screen).toMatchObject({ at: "sheet", isLocked: true });
    kiosk.send({ on: "key-pin" }).key("271828");
    kiosk.send({ on: "signed-in", session: sessionOf(), bench: null });
    expect(kiosk.state.screen).toMatchObject({ at: "sheet", isLocked: false });
    expect(kiosk.state.visit?.worker).toBe(NIA);
  });
});

describe("atStopHere", () => {
  test("pauses the instrument for another day: it is off the bench, begun", () => {
    const kiosk = onSheet().touch(100).send({ on: "stop-here" }, { on: "put-aside" });
    expect(kiosk.last).toMatchObject({ kind: "pause", items: [BASS] });
    kiosk.touch(500).send({ on: "stay" });
    expect(kiosk.state.screen).toEqual({ at: "bench" });
    expect(sheetOf(kiosk).notTappedSeconds).toBe(100);
  });

  test("goes on with another instrument and back: each on its own sheet", () => {
    const kiosk = onSheet().touch(100).send({ on: "stop-here" }, { on: "show-other-sheets" });
    kiosk.send({ on: "go-on", item: ARCHTOP }, { on: "stay" });
    expect(kiosk.state.screen).toMatchObject({ at: "sheet", item: ARCHTOP });
    kiosk.touch(50).send({ on: "tap-off", step: "1" });
    kiosk.send({ on: "stop-here" }, { on: "show-other-sheets" });
    kiosk.send({ on: "go-on", item: BASS }, { on: "stay" }).touch(10);
    kiosk.send({ on: "tap-off", step: "1" });
    expect(secondsOf(kiosk)).toEqual([110, 0, 0]);
    expect(sheetOf(kiosk, ARCHTOP).steps[0]).toMatchObject({ state: "done", actualSeconds: 50 });
  });

  test("finishes by the count, whatever is not tapped off", () => {
    const kiosk = onSheet().touch(100).send({ on: "stop-here" }, { on: "count" });
    kiosk.send({ on: "counted", stop: true });
    expect(kiosk.last).toMatchObject({ kind: "report", ...BASS, good: 1, stop: true });
    const { steps, notTappedSeconds, actualSeconds } = sheetOf(kiosk);
    expect(sum(steps.map((step) => step.actualSeconds)) + notTappedSeconds).toBe(actualSeconds);
  });
});

describe("atHandOver", () => {
  test("says to whom and why; the item leaves the work", () => {
    const kiosk = onSheet().touch(100).send({ on: "stop-here" }, { on: "show-hand-over" });
    kiosk.send({ on: "hand-because", reason: "shift-ends" });
    expect(kiosk.kinds).not.toContain("hand-over");
    kiosk.send({ on: "hand-to", to: "1077" }, { on: "hand-because", reason: "shift-ends" });
    expect(kiosk.last).toMatchObject({
      kind: "hand-over",
      ...BASS,
      to: "1077",
      note: "shift-ends",
    });
    expect(kiosk.view.items).toEqual([]);
  });

  test("goes back to whom, then to the sheet", () => {
    const kiosk = onSheet().send({ on: "stop-here" }, { on: "show-hand-over" });
    kiosk.send({ on: "hand-to", to: "1077" }, { on: "back" });
    expect(kiosk.state.screen).toMatchObject({ at: "hand-over", to: null });
    kiosk.send({ on: "back" }, { on: "back" });
    expect(kiosk.state.screen).toMatchObject({ at: "sheet" });
  });
});

describe("atHanded", () => {
  const handOver = { event: "e1", from: "1077", to: NIA, atMs: 0, reason: "shift-ends" };
  const asked = () =>
    kioskWith(builtTicket(BASS, { handOver })).signIn().send({ on: "start-shift" }, { on: "stay" });

  test("asks the colleague once; taken, the time runs on it", () => {
    const kiosk = asked();
    expect(kiosk.state.screen).toEqual({ at: "handed", item: BASS, event: "e1" });
    kiosk.send({ on: "go-ahead" });
    expect(kiosk.last).toMatchObject({ kind: "work", activity: "run", items: [BASS] });
  });

  test("not now leaves it where it is, and is not asked again while one stands there", () => {
    const kiosk = asked().send({ on: "back" });
    expect(kiosk.state.screen).toEqual({ at: "bench" });
    kiosk.send({ on: "show-hours" }, { on: "back" });
    expect(kiosk.state.screen).toEqual({ at: "bench" });
    expect(kiosk.kinds).toEqual(["shift-start"]);
  });
});

describe("showSheet", () => {
  test("from the bench; of several tickets, which one is asked first", () => {
    const kiosk = onSheet().send({ on: "show-bench" });
    expect(kiosk.state.screen).toEqual({ at: "bench" });
    kiosk.send({ on: "show-sheet", item: null });
    expect(kiosk.state.screen).toMatchObject({ at: "sheet", item: BASS });
  });
});
