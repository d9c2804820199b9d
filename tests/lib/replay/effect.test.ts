import { describe, expect, test } from "vitest";
import { effectOf, type TouchedOperation } from "@/lib/replay/effect";
import { siteRules } from "@/tests/make/events";

const rules = [{ ...siteRules, timeZone: "UTC", productionDayStartsAtMinutes: 0 }];
const at = (date: string) => Date.parse(`${date}T09:00:00Z`);
const row = {
  seq: 1,
  option: null,
  effectiveFrom: "2026-01-05",
  setupSeconds: 600,
  runSeconds: 3000,
};
const draft = { option: null, setupSeconds: 600, runSeconds: 5000, effectiveFrom: "2026-05-18" };

function touched(ticket: string, change: Partial<TouchedOperation> = {}): TouchedOperation {
  return {
    ticket,
    isOpen: true,
    openQuantity: 4,
    firstWorkMs: null,
    firstCountMs: null,
    options: [],
    standards: [row],
    ...change,
  };
}
const ask = (operations: TouchedOperation[]) => effectOf(operations, { draft, rules });

describe("effectOf", () => {
  test("those not begun take it, and the plan grows by their open pieces", () => {
    expect(ask([touched("a"), touched("b", { openQuantity: 1 })])).toMatchObject({
      takes: ["a", "b"],
      plannedSeconds: 10_000,
      keeps: [],
    });
  });

  test("those begun keep theirs to their end, also where only a count says that they were", () => {
    const begun = touched("a", { firstWorkMs: at("2026-05-17") });
    const counted = touched("b", { firstCountMs: at("2026-05-17") });
    expect(ask([begun, counted])).toMatchObject({ takes: [], keeps: ["a", "b"], again: [] });
  });

  test("what began on its day or since is earned again, finished or not", () => {
    const done = { isOpen: false, openQuantity: 0 };
    const operations = [
      touched("a", { firstWorkMs: at("2026-05-17") }),
      touched("b", { firstWorkMs: at("2026-05-18") }),
      touched("c", { ...done, firstWorkMs: at("2026-05-19") }),
      touched("d", { ...done, firstWorkMs: at("2026-05-17") }),
    ];
    expect(ask(operations)).toMatchObject({ keeps: ["a"], again: ["b", "c"] });
  });

  test("an adder concerns only tickets with its option", () => {
    const inlaid = touched("b", { options: ["Inlay"] });
    const adder = { ...draft, option: "Inlay", setupSeconds: 0, runSeconds: 300 };
    expect(effectOf([touched("a"), inlaid], { draft: adder, rules })).toMatchObject({
      takes: ["b"],
      plannedSeconds: 1200,
    });
  });

  test("without a standard so far, all of the draft comes to the plan", () => {
    expect(ask([touched("a", { standards: [] })]).plannedSeconds).toBe(20_600);
  });
});
