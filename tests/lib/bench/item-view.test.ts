import { describe, expect, test } from "vitest";
import type { BenchItem } from "@/lib/kiosks/schema";
import { benchOf, HERON, NIA, operationOf, TestKiosk, ticketOf, WREN } from "@/tests/make/bench";

const heronItem: BenchItem = {
  ticket: HERON,
  operation: "120",
  weight: 2400,
  model: "Heron",
  options: [],
  name: "Fret press and level",
  quantity: 4,
  openQuantity: 4,
  good: 0,
  setupSeconds: 300,
  runSeconds: 600,
  bookedSeconds: 1000,
  hazards: [],
};

describe("itemView", () => {
  test("compares all of the operation: setup and every piece, against all time ever booked", () => {
    const kiosk = TestKiosk.atBench();
    const lot = ticketOf(HERON, [operationOf({ actualSeconds: 500 })]);
    kiosk.send({ on: "scan-for", add: false }, { on: "scan", text: `T${HERON}` });
    kiosk.state = { ...kiosk.state, finding: { code: HERON, purpose: { for: "work" } } };
    kiosk.send({ on: "ticket", code: HERON, ticket: lot });
    kiosk.send({ on: "take", choice: { ticket: HERON, operation: "120", activity: "run" } });
    const [item] = kiosk.touch(100).view.items;
    expect(item).toMatchObject({ standardSeconds: 300 + 4 * 600, actualSeconds: 600, share: 1 });
  });

  test("grows by the fair share of each ticket while two are worked on at once", () => {
    const kiosk = TestKiosk.atWork().take(WREN, true).send({ on: "stay" }).touch(1000);
    const [heron, wren] = kiosk.view.items;
    // 4 × 600 s against 600 s + 300 s of setup not yet earned: 8 to 3
    expect(heron?.share).toBeCloseTo(2400 / 3300);
    expect(heron?.actualSeconds).toBe(60 + Math.round((1000 * 2400) / 3300));
    expect(wren?.actualSeconds).toBe(Math.round((1000 * 900) / 3300));
  });

  test("what the server booked before this stretch is in it, once", () => {
    const kiosk = TestKiosk.atWork();
    const { pending } = kiosk.state;
    const since = pending.at(-1)!.at;
    const work = { activity: "run" as const, items: [heronItem], since, said: false };
    kiosk.send({ on: "bench", worker: NIA, bench: benchOf({ work }) });
    expect(kiosk.view.items).toMatchObject([{ actualSeconds: 1000 + 60 }]);
  });

  test("counts of this worker that wait here are in it, those answered are not twice", () => {
    const kiosk = TestKiosk.atWork().send({ on: "count" }, { on: "step", field: "good", by: -1 });
    kiosk.send({ on: "counted", stop: false }, { on: "stay" }).touch(10);
    expect(kiosk.view.items).toMatchObject([{ good: 3, open: 1 }]);
    const { pending } = kiosk.state;
    const counted = { ...heronItem, good: 3, openQuantity: 1 };
    const work = { activity: "run" as const, items: [counted], since: pending[1]!.at, said: false };
    const bench = benchOf({ work });
    kiosk.send({ on: "bench", worker: NIA, bench });
    kiosk.state = { ...kiosk.state, pending: pending.slice(0, 2) };
    expect(kiosk.view.items).toMatchObject([{ good: 3, open: 1 }]);
  });

  test("without a standard there is none, never nought", () => {
    const kiosk = TestKiosk.atBench();
    const bare = ticketOf(WREN, [operationOf({ setupSeconds: null, runSeconds: null })]);
    kiosk.state = { ...kiosk.state, finding: { code: WREN, purpose: { for: "work" } } };
    kiosk.send({ on: "ticket", code: WREN, ticket: bare });
    kiosk.send({ on: "take", choice: { ticket: WREN, operation: "120", activity: "run" } });
    expect(kiosk.touch(30).view.items).toMatchObject([
      { standardSeconds: null, actualSeconds: 30 },
    ]);
  });
});
