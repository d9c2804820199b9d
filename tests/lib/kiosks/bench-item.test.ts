import { describe, expect, test } from "vitest";
import { type BenchSource, benchItem, isSame, itemsOn } from "@/lib/kiosks/bench-item";
import { deriveWindow } from "@/lib/timeline/derive";
import type { LedgerEvent } from "@/lib/timeline/schema";
import { makeContext, makeFacts, makeWindow, RECEIVED_MS, WORKER_ID } from "@/tests/make/context";
import { makeEvent } from "@/tests/make/events";

const item = { ticket: "26000017", operation: "010", weight: 2400 };
const ago = (minutes: number) => RECEIVED_MS - minutes * 60_000;

/** The bench after some events, of which `window` had kept a part. */
function source(
  events: LedgerEvent[],
  facts = makeFacts(),
  window = makeWindow({ firstMs: ago(120) }),
): BenchSource {
  const context = makeContext({ facts: [facts] });
  const { folded } = deriveWindow(window, events, { rules: context.rules, asOfMs: RECEIVED_MS });
  return { window, folded, context, atMs: RECEIVED_MS };
}

const start = makeEvent(1, ago(120), { kind: "shift-start" });
const run = (number: number, minutes: number) =>
  makeEvent(number, ago(minutes), { kind: "work", activity: "run", items: [item] });

describe("benchItem", () => {
  test("says what is known of the item, with the standard in force", () => {
    const shown = benchItem(item, source([start, run(2, 60)]));
    expect(shown).toEqual({
      ...item,
      model: "Heron",
      options: [],
      name: "Mill work",
      quantity: 1,
      openQuantity: 1,
      good: 0,
      setupSeconds: 600,
      runSeconds: 1800,
      bookedSeconds: 0,
      hazards: ["dust"],
    });
  });

  test("counts all time before the present stretch: others', and one's own of the batch", () => {
    const booked = [
      { workerId: "other", seconds: 100, sinceMs: null, weight: null, total: null },
      { workerId: "third", seconds: 0, sinceMs: ago(10), weight: 1, total: 4 },
    ];
    const events = [
      start,
      run(2, 60),
      makeEvent(3, ago(30), { kind: "indirect", code: "x" }),
      run(4, 20),
    ];
    const shown = benchItem(item, source(events, makeFacts({ booked })));
    expect(shown.bookedSeconds).toBe(100 + 150 + 30 * 60);
  });

  test("puts one's own time of the window in place of what was kept of it", () => {
    const kept = deriveWindow(makeWindow({ firstMs: ago(120) }), [start, run(2, 60)], {
      rules: makeContext().rules,
      asOfMs: ago(50),
    });
    const segments = kept.segments.changed.map((row) =>
      row.ticket ? { ...row, endMs: ago(40), seconds: 1200 } : row,
    );
    const booked = [
      { workerId: WORKER_ID, seconds: 1200 + 500, sinceMs: null, weight: null, total: null },
    ];
    const window = makeWindow({ firstMs: ago(120), segments });
    const events = [
      start,
      run(2, 60),
      makeEvent(3, ago(30), { kind: "indirect", code: "x" }),
      run(4, 20),
    ];
    const shown = benchItem(item, source(events, makeFacts({ booked }), window));
    expect(shown.bookedSeconds).toBe(500 + 30 * 60);
  });

  test("counts the pieces of the batch too, each once", () => {
    const counts = { good: 2, rework: 0, scrap: 1, stop: false };
    const report = makeEvent(3, ago(30), {
      kind: "report",
      ticket: "26000017",
      operation: "010",
      ...counts,
    });
    const facts = makeFacts({ quantity: 8, good: 1 });
    expect(benchItem(item, source([start, run(2, 60), report], facts))).toMatchObject({
      good: 3,
      openQuantity: 4,
    });
    const kept = deriveWindow(makeWindow({ firstMs: ago(120) }), [start, run(2, 60), report], {
      rules: makeContext().rules,
      asOfMs: RECEIVED_MS,
    });
    const window = makeWindow({ firstMs: ago(120), reports: kept.reports.changed });
    const known = makeFacts({ quantity: 8, good: 3, scrap: 1 });
    expect(benchItem(item, source([start, run(2, 60), report], known, window))).toMatchObject({
      good: 3,
      openQuantity: 4,
    });
  });

  test("shows an unknown ticket by its number", () => {
    const unknown = { ...item, ticket: "99" };
    expect(benchItem(unknown, source([start]))).toMatchObject({
      ticket: "99",
      name: "010",
      model: "",
      runSeconds: null,
      quantity: 0,
    });
  });
});

describe("itemsOn", () => {
  test("lists what a worker is on, in a break too, and nothing in other time", () => {
    const rest = makeEvent(3, ago(30), { kind: "break-start", break: "rest" });
    const other = makeEvent(3, ago(30), { kind: "indirect", code: "x" });
    expect(itemsOn(source([start, run(2, 60), rest]).folded)).toMatchObject([{ operation: "010" }]);
    expect(itemsOn(source([start, run(2, 60), other]).folded)).toEqual([]);
    expect(itemsOn(source([]).folded)).toEqual([]);
  });
});

describe("isSame", () => {
  test("compares ticket and operation", () => {
    expect(isSame(item, { ticket: "26000017", operation: "010" })).toBe(true);
    expect(isSame(item, { ticket: "26000017", operation: "020" })).toBe(false);
    expect(isSame(item, { ticket: "26000025", operation: "010" })).toBe(false);
  });
});
