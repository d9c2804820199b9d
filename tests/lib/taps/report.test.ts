import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { setCount } from "@/lib/taps/report";
import { HERON, TestKiosk, WREN } from "@/tests/make/bench";

const counting = () => TestKiosk.atWork().send({ on: "count" });
const heron = { ticket: HERON, operation: "120" };

describe("a count", () => {
  test("begins as if all that is open came out good: done is two touches", () => {
    const kiosk = counting();
    expect(kiosk.state.screen).toMatchObject({ at: "count", counts: { good: 4, rework: 0 } });
    kiosk.send({ on: "counted", stop: true });
    expect(kiosk.last).toMatchObject({ kind: "report", ...heron, good: 4, stop: true });
    expect(kiosk.view.doing).toEqual({ kind: "unassigned" });
  });

  test("lets the work run on where it does not close it", () => {
    const kiosk = counting();
    kiosk.send({ on: "step", field: "good", by: -1 }, { on: "counted", stop: false });
    expect(kiosk.last).toMatchObject({ good: 3, stop: false });
    expect(kiosk.view.items).toMatchObject([{ ...heron, open: 1, good: 3 }]);
  });

  test("rework asks what caused it, and the answer is kept", () => {
    const kiosk = counting().send({ on: "step", field: "rework", by: 1 });
    kiosk.send({ on: "counted", stop: true });
    expect(kiosk.state.screen).toMatchObject({ at: "cause", counts: { good: 3, rework: 1 } });
    kiosk.send({ on: "cause", operation: "110" });
    expect(kiosk.last).toMatchObject({ good: 3, rework: 1, scrap: 0, causedBy: "110" });
  });

  test("scrap asks first", () => {
    const kiosk = counting().send({ on: "step", field: "scrap", by: 1 });
    kiosk.send({ on: "counted", stop: true }, { on: "cause", operation: "120" });
    expect(kiosk.state.screen.at).toBe("scrap");
    expect(kiosk.kinds).not.toContain("report");
    kiosk.send({ on: "back" });
    expect(kiosk.state.screen).toMatchObject({ at: "count", counts: { good: 3, scrap: 1 } });
    kiosk.send({ on: "counted", stop: true }, { on: "cause", operation: "120" });
    expect(kiosk.send({ on: "go-ahead" }).last).toMatchObject({ scrap: 1, good: 3 });
  });

  test("is keyed on the pad, and no more than is open", () => {
    const kiosk = counting().send({ on: "key-count", field: "good" }).key("2");
    expect(kiosk.state.screen).toMatchObject({ counts: { good: 2 } });
    expect(kiosk.key("5").state.screen).toMatchObject({ counts: { good: 4 } });
    expect(kiosk.send({ on: "rub-out" }).state.screen).toMatchObject({ counts: { good: 2 } });
    expect(kiosk.send({ on: "submit" }).state.screen).toMatchObject({ keying: null });
  });

  test("nothing counted and done puts the ticket aside", () => {
    const kiosk = counting().send({ on: "key-count", field: "good" }).key("0");
    kiosk.send({ on: "counted", stop: true });
    expect(kiosk.last).toMatchObject({ kind: "pause", items: [heron] });
    expect(kiosk.view.previous?.items).toMatchObject([heron]);
  });

  test("of several tickets asks which one, and leaves the others running", () => {
    const kiosk = TestKiosk.atWork().take(WREN, true).send({ on: "stay" }, { on: "count" });
    expect(kiosk.state.screen).toEqual({ at: "pick-item", to: "count" });
    kiosk.send({ on: "pick-item", item: heron }, { on: "counted", stop: true });
    expect(kiosk.view.items).toMatchObject([{ ticket: WREN }]);
  });

  test("its card compares with setup and the good pieces, and names what is open", () => {
    const kiosk = counting();
    kiosk.touch(50);
    kiosk.send({ on: "step", field: "good", by: -1 }, { on: "counted", stop: true });
    expect(kiosk.state.screen).toMatchObject({
      at: "done",
      deed: {
        what: "finish",
        open: 1,
        time: { standardSeconds: 300 + 3 * 600, actualSeconds: 110 },
      },
    });
  });
});

describe("setCount", () => {
  const count = fc.nat(20);
  test("for any touches, counts stay within what is open and none is negative", () => {
    const touch = fc.record({
      field: fc.constantFrom("good" as const, "rework" as const, "scrap" as const),
      wanted: fc.integer({ min: -3, max: 25 }),
    });
    fc.assert(
      fc.property(count, fc.array(touch), (open, touches) => {
        let counts = { good: open, rework: 0, scrap: 0 };
        for (const { field, wanted } of touches) {
          counts = setCount(counts, open, field, wanted);
          const all = Object.values(counts);
          expect(all.every((each) => each >= 0)).toBe(true);
          expect(all.reduce((sum, each) => sum + each, 0)).toBeLessThanOrEqual(open);
        }
      }),
    );
  });

  test.each([
    { from: [4, 0, 0], field: "rework", wanted: 1, to: [3, 1, 0], because: "a good one turns bad" },
    { from: [2, 1, 0], field: "scrap", wanted: 1, to: [2, 1, 1], because: "one was uncounted" },
    { from: [3, 1, 0], field: "good", wanted: 4, to: [3, 1, 0], because: "only 4 are open" },
    { from: [3, 1, 0], field: "rework", wanted: 0, to: [3, 0, 0], because: "good is not given" },
  ] as const)("$from with $field $wanted of 4 is $to: $because", ({ from, field, wanted, to }) => {
    const [good, rework, scrap] = from;
    expect(Object.values(setCount({ good, rework, scrap }, 4, field, wanted))).toEqual([...to]);
  });
});
