import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { handedTo, sheetItem, sheetOnBench, sheetsToGoOn } from "@/lib/sheet/on-bench";
import { sum } from "@/lib/sum";
import { NIA } from "@/tests/make/bench";
import {
  ARCHTOP,
  BASS,
  builtTicket,
  kioskWith,
  makeOperationSheet,
  makeStepTap,
} from "@/tests/make/sheet";

const piece = { weights: [], item: 0 };
/** A colleague worked on the bass yesterday, tapped off a step, and so did Nia. */
const yesterday = {
  taps: [makeStepTap("1", 8, { worker: "1077" })],
  time: [
    { ...piece, worker: "1077", start: 0, end: 600, seconds: 600 },
    { ...piece, worker: NIA, start: 700, end: 760, seconds: 60 },
  ],
};
const atWork = (...built: ReturnType<typeof builtTicket>[]) =>
  kioskWith(...built)
    .signIn()
    .send({ on: "start-shift" }, { on: "stay" })
    .send({ on: "go-on", item: BASS }, { on: "stay" });

describe("sheetOnBench", () => {
  test("goes on from what others did and from yesterday, offline too", () => {
    const kiosk = atWork(builtTicket(BASS, yesterday)).touch(100);
    const before = sheetOnBench(kiosk.state, kiosk.view, BASS);
    expect(before?.steps.map((step) => step.actualSeconds)).toEqual([480, 0, 0]);
    expect(before?.notTappedSeconds).toBe(120 + 60 + 100);
    kiosk.send({ on: "tap-off", step: "2" });
    const after = sheetOnBench(kiosk.state, kiosk.view, BASS);
    expect(after?.steps.map((step) => step.actualSeconds)).toEqual([480, 280, 0]);
  });

  test("counts one's own time once, also when the server tells it again", () => {
    const kiosk = atWork(builtTicket(BASS, yesterday)).touch(100);
    const [event] = kiosk.state.pending.filter(({ kind }) => kind === "work");
    const start = Math.floor(Date.parse(event!.at) / 1000);
    const running = { worker: NIA, start, end: null, seconds: null, weights: [1], item: 0 };
    const ticket = builtTicket(BASS, { ...yesterday, time: [...yesterday.time, running] });
    kiosk.send({ on: "ticket", code: BASS.ticket, ticket });
    expect(sheetOnBench(kiosk.state, kiosk.view, BASS)?.notTappedSeconds).toBe(280);
  });

  test("a tap that the server has told is undone here at once", () => {
    const kiosk = atWork(builtTicket(BASS)).touch(100).send({ on: "tap-off", step: "1" });
    const { id, at } = kiosk.last!;
    const told = makeStepTap("1", 0, { event: id, atMs: Date.parse(at), worker: NIA });
    const ticket = builtTicket(BASS, { taps: [told] });
    kiosk.send({ on: "ticket", code: BASS.ticket, ticket }, { on: "undo" });
    expect(sheetOnBench(kiosk.state, kiosk.view, BASS)?.steps[0]?.state).toBe("open");
  });

  test("an operation without steps has none", () => {
    const kiosk = atWork(builtTicket(BASS));
    expect(sheetOnBench(kiosk.state, kiosk.view, { ...BASS, operation: "120" })).toBeNull();
  });

  test("without a standard it is laid out all the same", () => {
    const { steps } = makeOperationSheet();
    const untimed = steps.map((step) => ({ ...step, standardSeconds: null }));
    const kiosk = atWork(builtTicket(BASS, { steps: untimed })).touch(30);
    expect(sheetOnBench(kiosk.state, kiosk.view, BASS)).toMatchObject({
      standardSeconds: null,
      notTappedSeconds: 30,
    });
  });

  test("for any taps and pauses, the steps sum to the time on the instrument", () => {
    const act = fc.record({
      on: fc.constantFrom("tap-off", "take-back", "break", "other", "stay" as const),
      step: fc.constantFrom("1", "2", "3"),
      seconds: fc.integer({ min: 1, max: 250 }),
    });
    fc.assert(
      fc.property(fc.array(act, { maxLength: 12 }), (acts) => {
        const kiosk = atWork(builtTicket(BASS), builtTicket(ARCHTOP));
        let worked = 0;
        for (const { on, step, seconds } of acts) {
          kiosk.touch(seconds);
          if (kiosk.view.doing?.kind === "work" && kiosk.view.items[0]?.ticket === BASS.ticket) {
            worked += seconds;
          }
          if (on === "tap-off" || on === "take-back") kiosk.send({ on, step });
          if (on === "break") {
            kiosk.send({ on: "stop-here" }, { on: "show-break" }, { on: "break", break: "rest" });
            kiosk.send({ on: "stay" }).touch(30).send({ on: "end-break" }, { on: "stay" });
          }
          if (on === "other") {
            kiosk.send({ on: "stop-here" }, { on: "show-other-sheets" });
            kiosk.send({ on: "go-on", item: ARCHTOP }, { on: "stay" }).touch(20);
            kiosk.send({ on: "stop-here" }, { on: "show-other-sheets" });
            kiosk.send({ on: "go-on", item: BASS }, { on: "stay" });
          }
        }
        const sheet = sheetOnBench(kiosk.state, kiosk.view, BASS)!;
        const steps = sum(sheet.steps.map((step) => step.actualSeconds));
        expect(steps + sheet.notTappedSeconds).toBe(worked);
        expect(sheet.actualSeconds).toBe(worked);
      }),
    );
  });
});

describe("sheetItem", () => {
  test("is the one ticket that is worked on, not in a break and not without steps", () => {
    const kiosk = atWork(builtTicket(BASS));
    expect(sheetItem(kiosk.state, kiosk.view)).toMatchObject(BASS);
    kiosk.send({ on: "stop-here" }, { on: "show-break" }, { on: "break", break: "meal" });
    expect(sheetItem(kiosk.state, kiosk.view)).toBeNull();
  });
});

describe("sheetsToGoOn", () => {
  test("are begun instruments that nobody else is on, one's own latest first", () => {
    const busy = builtTicket({ ticket: "26050095", operation: "495" });
    busy.operations[0]!.workers = [{ worker: "1077", name: "Ilo Varn" }];
    const kiosk = kioskWith(builtTicket(ARCHTOP), builtTicket(BASS, yesterday), busy).signIn();
    const on = () =>
      sheetsToGoOn(kiosk.state, NIA, kiosk.view).map((one) => [one.ticket, one.operation]);
    expect(on()).toEqual([
      [BASS.ticket, "495"],
      [ARCHTOP.ticket, "495"],
    ]);
    kiosk.send({ on: "start-shift" }, { on: "stay" }, { on: "go-on", item: BASS });
    expect(on()).toEqual([[ARCHTOP.ticket, "495"]]);
  });
});

describe("handedTo", () => {
  test("is what waits for this worker, and nobody else's", () => {
    const handOver = { event: "e1", from: "1077", to: NIA, atMs: 0, reason: null };
    const { state } = kioskWith(builtTicket(BASS, { handOver }));
    expect(handedTo(state, NIA)).toEqual({ item: BASS, event: "e1" });
    expect(handedTo(state, "1077")).toBeNull();
  });
});
