// @vitest-environment happy-dom
import { cleanup, fireEvent, screen, within } from "@testing-library/react";
import { afterEach, describe, expect, test } from "vitest";
import { draw } from "@/tests/components/kiosk";
import { NIA, type TestKiosk } from "@/tests/make/bench";
import { ARCHTOP, BASS, builtTicket, kioskWith } from "@/tests/make/sheet";

afterEach(cleanup);

const button = (name: string | RegExp) => screen.getByRole("button", { name });
const row = (name: string) => screen.getByRole("button", { name: new RegExp(name) });

/** Nia is in and on the bass; its sheet is before her. */
function onSheet(): TestKiosk {
  return kioskWith(builtTicket(BASS), builtTicket(ARCHTOP))
    .signIn()
    .send({ on: "start-shift" }, { on: "stay" })
    .send({ on: "go-on", item: BASS }, { on: "stay" });
}

describe("SheetScreen", () => {
  test("lists the steps with their standards; the time that runs stands at the next", () => {
    draw(onSheet().touch(300));
    expect(screen.getAllByRole("listitem")).toHaveLength(3);
    expect(screen.getByText("Assemble whole instrument, 24 min")).toBeDefined();
    const next = row("Fit bridge");
    expect(next.getAttribute("aria-current")).toBe("step");
    expect(
      within(next).getByRole("img", { name: /8 min standard, 5 min actual, 3 min left/ }),
    ).toBeDefined();
    expect(within(next).getByText("running")).toBeDefined();
  });

  test("one tap taps the next step off, and says what comes then", () => {
    const taps = draw(onSheet().touch(60));
    fireEvent.click(button("Tap off step 1 then: Bushings and tuners"));
    expect(taps).toEqual([{ on: "tap-off", step: "1" }]);
  });

  test("a step that was tapped off says what it took, and the last tap may be undone", () => {
    const taps = draw(onSheet().touch(420).send({ on: "tap-off", step: "1" }));
    const done = row("Fit bridge");
    expect(within(done).getByText("1 under")).toBeDefined();
    fireEvent.click(button(/^Undo last tap/));
    expect(taps).toEqual([{ on: "undo" }]);
  });

  test("another step is picked on its row; out of order is said before it is done", () => {
    const taps = draw(onSheet().send({ on: "pick-step", step: "3" }));
    expect(row("Solder and test").getAttribute("aria-pressed")).toBe("true");
    fireEvent.click(button("Tap off step 3 out of order, tap once more"));
    fireEvent.click(button("Does not apply"));
    fireEvent.click(button("Not that one"));
    expect(taps).toEqual([
      { on: "tap-off", step: "3" },
      { on: "skip-step", step: "3" },
      { on: "pick-step", step: null },
    ]);
  });

  test("a done step that is picked may be taken back", () => {
    const kiosk = onSheet().touch(60).send({ on: "tap-off", step: "1" });
    const taps = draw(kiosk.send({ on: "pick-step", step: "1" }));
    fireEvent.click(button("Take back step 1 it keeps its time"));
    expect(taps).toEqual([{ on: "take-back", step: "1" }]);
  });

  test("steps of a bunch say that they were tapped off together", () => {
    const kiosk = onSheet().touch(960).send({ on: "tap-off", step: "1" });
    draw(kiosk.send({ on: "tap-off", step: "2" }));
    expect(screen.getAllByText("together")).toHaveLength(2);
  });

  test("when every step is done or left out, the bar is Done", () => {
    const kiosk = onSheet();
    for (const step of ["1", "2"]) kiosk.touch(60).send({ on: "tap-off", step });
    kiosk.send({ on: "skip-step", step: "3" }, { on: "skip-because", reason: "not-on-this" });
    const taps = draw(kiosk);
    expect(within(row("Solder and test")).getByText("Not on this one")).toBeDefined();
    fireEvent.click(button("Done say how it came out"));
    expect(taps).toEqual([{ on: "count" }]);
  });

  test("after five minutes without a touch it asks whose hand it is", () => {
    const taps = draw(onSheet().pass(301));
    expect(screen.queryByRole("button", { name: /^Tap off/ })).toBeNull();
    expect(screen.getByText("Show your badge")).toBeDefined();
    fireEvent.click(button("Key my PIN"));
    expect(taps).toEqual([{ on: "key-pin" }]);
  });
});

describe("SkipStepScreen", () => {
  test("asks for one of four words why", () => {
    const taps = draw(onSheet().send({ on: "skip-step", step: "2" }));
    expect(screen.getByText("Bushings and tuners")).toBeDefined();
    fireEvent.click(button("Done elsewhere"));
    expect(taps).toEqual([{ on: "skip-because", reason: "done-elsewhere" }]);
  });
});

describe("StopHereScreen", () => {
  test("offers every way to stop, and says what each leaves behind", () => {
    const taps = draw(onSheet().send({ on: "stop-here" }));
    for (const name of [/^Break/, /1 more begun here/, /^Other work/, /go on another day/])
      fireEvent.click(button(name));
    fireEvent.click(button(/^Hand it over/));
    fireEvent.click(button(/3 steps are not tapped off/));
    expect(taps.map(({ on }) => on)).toEqual([
      "show-break",
      "show-other-sheets",
      "show-other-work",
      "put-aside",
      "show-hand-over",
      "count",
    ]);
  });
});

describe("OtherSheetsScreen", () => {
  test("lists the instruments that are begun, with how far each is", () => {
    const kiosk = onSheet().send({ on: "stop-here" }, { on: "show-other-sheets" });
    const taps = draw(kiosk);
    fireEvent.click(button(/0 of 3 tapped off/));
    expect(taps).toMatchObject([{ on: "go-on", item: ARCHTOP }]);
  });
});

describe("HandOverScreen", () => {
  test("asks who goes on, and then why", () => {
    const kiosk = onSheet().send({ on: "stop-here" }, { on: "show-hand-over" });
    const who = draw(kiosk);
    fireEvent.click(button(/^Ilo Varn/));
    expect(who).toEqual([{ on: "hand-to", to: "1077" }]);
    cleanup();
    const why = draw(kiosk.send({ on: "hand-to", to: "1077" }));
    fireEvent.click(button("My shift ends"));
    expect(why).toEqual([{ on: "hand-because", reason: "shift-ends" }]);
  });
});

describe("HandedScreen", () => {
  test("says who hands what over and why; it is taken with one tap", () => {
    const handOver = { event: "e1", from: "1077", to: NIA, atMs: 0, reason: "shift-ends" };
    const kiosk = kioskWith(builtTicket(BASS, { handOver })).signIn();
    const taps = draw(kiosk.send({ on: "start-shift" }, { on: "stay" }));
    expect(screen.getByRole("heading").textContent).toBe("Ilo Varn hands you thisMy shift ends");
    fireEvent.click(button("Take it"));
    fireEvent.click(button("Not now"));
    expect(taps.map(({ on }) => on)).toEqual(["go-ahead", "back"]);
  });
});
